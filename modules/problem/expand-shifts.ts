import type { ShiftKind } from '../coverage';
import { type LocalDate, toInstant } from '../units';
import { type ClockRules, splitByClock } from './clock-split';
import type { ProblemShift } from './problem';
import type { TimeAxis } from './time-axis';

/** The shifts of a period, and the dates on which a clock change leaves nothing of a kind. */
export interface ExpandedShifts {
  readonly shifts: readonly ProblemShift[];
  readonly notes: readonly string[];
}

/** Puts every kind on every date, with the minutes that truly elapse and those that carry premiums. */
export function expandShifts(
  kinds: readonly ShiftKind[],
  dates: readonly LocalDate[],
  axis: TimeAxis,
  clock: ClockRules,
): ExpandedShifts {
  const shifts: ProblemShift[] = [];
  const notes: string[] = [];
  dates.forEach((date, dayIndex) => {
    for (const kind of kinds) {
      const startsAtUtc = toInstant(date, kind.startMinute, clock.zone);
      const endsAtUtc = toInstant(date, kind.endMinute, clock.zone);
      if (endsAtUtc <= startsAtUtc) {
        notes.push(
          `${kind.name} on ${date} falls into the hour the clock skips, so it is left out.`,
        );
        continue;
      }
      const { unpaidBreakMinutes } = kind;
      shifts.push({
        index: shifts.length,
        kindId: kind.id,
        kindName: kind.name,
        dayIndex,
        startMinute: axis.minuteAt(startsAtUtc),
        endMinute: axis.minuteAt(endsAtUtc),
        ...splitByClock({ startsAtUtc, endsAtUtc, unpaidBreakMinutes }, clock),
        isNight: kind.isNight,
        postSkillIds: kind.skillIds,
      });
    }
  });
  return { shifts, notes };
}
