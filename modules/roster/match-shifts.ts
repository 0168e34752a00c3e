import type { PlannedAssignment, PlannedRoster, Problem } from '../problem';
import type { Breach } from '../proof';
import { daysBetween, formatDay } from '../units';
import { originOf } from './axis';
import type { KeptShift } from './stored';

/** Names for sentences; a person or kind that is gone still has one. */
export interface ShiftNames {
  readonly person: (id: string) => string;
  readonly kind: (id: string) => string;
}

/**
 * Kept shifts as a roster of a problem made from today's data. What no longer fits that data is a
 * breach: a shift of a person or kind that is gone is left out, a shift whose kind has other times
 * now is counted with them.
 */
export function matchShifts(
  problem: Problem,
  shifts: readonly KeptShift[],
  names: ShiftNames,
): { readonly roster: PlannedRoster; readonly breaches: readonly Breach[] } {
  const origin = originOf(problem);
  const people = new Set(problem.people.map(({ id }) => id));
  const byKindAndDay = new Map(
    problem.shifts.map((shift) => [`${shift.kindId} ${shift.dayIndex}`, shift]),
  );
  const roster: PlannedAssignment[] = [];
  const breaches: Breach[] = [];
  for (const kept of shifts) {
    const dayIndex = daysBetween(origin.date, kept.date);
    const shift = byKindAndDay.get(`${kept.shiftKindId} ${dayIndex}`);
    const isSame =
      shift !== undefined &&
      kept.startsAtUtc === origin.instant + shift.startMinute * 60_000 &&
      kept.endsAtUtc === origin.instant + shift.endMinute * 60_000 &&
      kept.paidMinutes === shift.paidMinutes;
    const isKnown = people.has(kept.personId);
    if (!isSame || !isKnown) {
      const what = !isKnown ? 'person' : shift ? 'times' : 'kind';
      breaches.push(breachOf(kept, what, names));
    }
    if (shift && isKnown) {
      const { personId, skillId } = kept;
      roster.push({ personId, shiftIndex: shift.index, postSkillId: skillId });
    }
  }
  return { roster, breaches };
}

function breachOf(kept: KeptShift, what: 'person' | 'kind' | 'times', names: ShiftNames): Breach {
  const person = names.person(kept.personId);
  const kind = names.kind(kept.shiftKindId);
  const day = formatDay(kept.date);
  const reasons = {
    person: `${person} cannot be planned in this period any more (no contract or skill), but has ${kind} on ${day}`,
    kind: `${kind} is retired, but ${person} has it on ${day}`,
    times: `${kind} has other times or breaks now than when ${person} got it on ${day}`,
  };
  return {
    rule: `changed ${what}`,
    personId: kept.personId,
    date: kept.date,
    sentence: `${reasons[what]}. Run again.`,
  };
}
