import type { Premiums } from '../rules';
import { addDays, datesOf, type LocalDate } from '../units';
import { floorsOn } from './expand-floors';
import { expandPeople } from './expand-people';
import { expandShifts } from './expand-shifts';
import { floorsLeft, type HeldOver } from './floors-left';
import { type ProblemFloor, type ProblemPay, problemVersion } from './problem';
import type { AssembledProblem, ProblemParts } from './problem-parts';
import { axisFrom, type TimeAxis } from './time-axis';

/**
 * Turns what the modules keep into one problem: kinds and floors on their dates, people with what
 * their contracts give, leave, and the shifts before the period. What cannot be used is left out and
 * told in the notes. The last date must not be before the first.
 */
export function assembleProblem(parts: ProblemParts): AssembledProblem {
  const { team, startsOn, endsOn, rules, pay } = parts;
  const holidays = new Set(parts.holidays.map(({ date }) => date));
  const isHoliday = (date: LocalDate): boolean => holidays.has(date);
  const dates = datesOf(startsOn, endsOn);
  const axis = axisFrom(startsOn, team.zone);
  const clock = { zone: team.zone, pay, isHoliday };
  const { shifts, notes: shiftNotes } = expandShifts(parts.shiftKinds, dates, axis, clock);
  const { people, notes: peopleNotes } = expandPeople(parts, shifts, axis);
  return {
    problem: {
      version: problemVersion,
      teamName: team.name,
      zone: team.zone,
      currency: team.currency,
      days: dates.map((date) => ({
        date,
        startMinute: axis.minuteOf(date, 0),
        isHoliday: isHoliday(date),
      })),
      skills: parts.skills.map(({ id, name }) => ({ id, name })),
      shifts: [...shifts],
      floors: expandFloors(parts, dates, isHoliday, axis),
      ceilings: [],
      people: [...people],
      rules: {
        ...rules,
        shortestRunDays: null,
        shortestRunFreeDays: null,
        kindsThatMayNotFollow: [],
      },
      teamRules: [],
      pay: expandPay(pay),
      fairness: [],
    },
    notes: [...shiftNotes, ...peopleNotes],
  };
}

/** The organisation has one percentage for all overtime: a single step from the first minute. */
function expandPay(pay: Premiums): ProblemPay {
  const { nightPercent, weekendPercent, holidayPercent, overtimePercent } = pay;
  return {
    nightPercent,
    weekendPercent,
    holidayPercent,
    overtimeSteps: [{ overMinutes: 0, percent: overtimePercent }],
  };
}

function expandFloors(
  parts: ProblemParts,
  dates: readonly LocalDate[],
  isHoliday: (date: LocalDate) => boolean,
  axis: TimeAxis,
): ProblemFloor[] {
  const on = (date: LocalDate, dayIndex: number): ProblemFloor[] =>
    floorsOn(parts.floors, date, dayIndex, isHoliday(date), axis);
  const [first = [], ...later] = dates.map(on);
  const prior = on(addDays(parts.startsOn, -1), -1);
  return [...floorsLeft(first, prior, heldOverOf(parts, axis)), ...later.flat()];
}

/** Everybody whose shift of the period before runs into this one. */
function heldOverOf(parts: ProblemParts, axis: TimeAxis): HeldOver[] {
  return parts.history
    .filter((past) => past.date < parts.startsOn)
    .map((past) => ({
      startMinute: axis.minuteAt(past.startsAtUtc),
      endMinute: axis.minuteAt(past.endsAtUtc),
      postSkillId: past.postSkillId,
      skillIds:
        parts.people.find(({ id }) => id === past.personId)?.skills.map(({ skillId }) => skillId) ??
        [],
    }))
    .filter(({ endMinute }) => endMinute > 0);
}
