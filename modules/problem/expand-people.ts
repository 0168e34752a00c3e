import type { Person } from '../people';
import { addDays, datesOf, daysBetween, type LocalDate } from '../units';
import { readTerms } from './contract-terms';
import { usableSkills } from './held-skills';
import { absencesOf, absencesWithoutContract, creditIn } from './leave-in-period';
import type { ProblemPerson, ProblemShift } from './problem';
import { historyDays, type NeighbourShift, type ProblemParts } from './problem-parts';
import type { TimeAxis } from './time-axis';

/** The people who can be planned in a period, and in sentences who or what was left out. */
export interface ExpandedPeople {
  readonly people: readonly ProblemPerson[];
  readonly notes: readonly string[];
}

/** Active people with a contract and a valid skill; the others get a note, inactive ones none. */
export function expandPeople(
  parts: ProblemParts,
  shifts: readonly ProblemShift[],
  axis: TimeAxis,
): ExpandedPeople {
  const notes: string[] = [];
  const people = parts.people
    .filter((person) => person.isActive)
    .flatMap((person) => {
      const expanded = expandPerson(parts, person, shifts, axis);
      notes.push(...expanded.notes);
      return expanded.person ? [expanded.person] : [];
    });
  return { people, notes };
}

function expandPerson(
  parts: ProblemParts,
  person: Person,
  shifts: readonly ProblemShift[],
  axis: TimeAxis,
): { readonly person: ProblemPerson | null; readonly notes: readonly string[] } {
  const terms = readTerms(person, datesOf(parts.startsOn, parts.endsOn));
  if (!terms) {
    return {
      person: null,
      notes: [`${person.name} has no contract in this period and is left out.`],
    };
  }
  const { skillIds, notes } = usableSkills(person, parts.skills, parts.endsOn);
  if (skillIds.length === 0) {
    const reason = `${person.name} has no skill valid through this period and is left out.`;
    return { person: null, notes: [...notes, reason] };
  }
  const leave = parts.leave.filter(({ personId }) => personId === person.id);
  const { pins, notes: pinNotes } = pinsOf(parts, person, shifts);
  return {
    person: {
      id: person.id,
      name: person.name,
      skillIds: [...skillIds],
      payCentsPerHour: terms.contract.payCentsPerHour,
      paidBy: terms.contract.paidBy,
      contractMinutes: terms.contractMinutes,
      creditMinutes: leave.reduce((sum, away) => sum + creditIn(away, parts), 0),
      minimumMinutes: terms.minimumMinutes,
      maximumMinutes: terms.maximumMinutes,
      mayWorkNights: terms.contract.mayWorkNights,
      absences: [
        ...absencesOf(leave, parts, axis),
        ...absencesWithoutContract(terms.datesWithout, axis),
      ],
      ...neighboursOf(parts, person, axis),
      pins,
      rules: null,
      kindLimits: [],
      wishes: [],
      isOutside: false,
    },
    notes: [...terms.notes, ...notes, ...pinNotes],
  };
}

/** Shifts of the days around the period that rest and runs can reach. */
function neighboursOf(
  parts: ProblemParts,
  person: Person,
  axis: TimeAxis,
): Pick<ProblemPerson, 'history' | 'following'> {
  const { startsOn, endsOn } = parts;
  const reach = historyDays(parts.rules);
  const between = (shifts: readonly NeighbourShift[], from: LocalDate, to: LocalDate) =>
    shifts
      .filter(({ personId, date }) => personId === person.id && date >= from && date <= to)
      .map((shift) => ({
        dayIndex: daysBetween(startsOn, shift.date),
        startMinute: axis.minuteAt(shift.startsAtUtc),
        endMinute: axis.minuteAt(shift.endsAtUtc),
        isNight: shift.isNight,
      }))
      .sort((one, other) => one.startMinute - other.startMinute);
  return {
    history: between(parts.history, addDays(startsOn, -reach), addDays(startsOn, -1)),
    following: between(parts.following, addDays(endsOn, 1), addDays(endsOn, reach)),
  };
}

function pinsOf(
  parts: ProblemParts,
  person: Person,
  shifts: readonly ProblemShift[],
): { readonly pins: ProblemPerson['pins']; readonly notes: readonly string[] } {
  const notes: string[] = [];
  const pins = parts.pins.flatMap(
    ({ personId, date, kindId, postSkillId }): ProblemPerson['pins'] => {
      if (personId !== person.id || date < parts.startsOn || date > parts.endsOn) return [];
      const dayIndex = daysBetween(parts.startsOn, date);
      if (kindId === null) return [{ dayIndex, shiftIndex: null, postSkillId: null }];
      const shift = shifts.find((one) => one.dayIndex === dayIndex && one.kindId === kindId);
      if (shift) return [{ dayIndex, shiftIndex: shift.index, postSkillId }];
      notes.push(
        `${person.name}: the shift pinned on ${date} is no longer offered, so the pin is dropped.`,
      );
      return [];
    },
  );
  return { pins, notes };
}
