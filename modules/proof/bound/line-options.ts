import { type Problem, type ProblemPerson, type ProblemShift, rulesOf } from '../../problem';
import { premiumPay } from '../prove-pay';
import { weekendOf } from '../weekends';
import type { UnitPrices } from './price-spreads';
import { at, type CoverWorth, worthInPost } from './worth';

/** Prices that a bound puts on the line of one person. */
export interface LinePrices {
  readonly cover: CoverWorth;
  /** What the person earns on each shift (by position) by rules that join people. */
  readonly teamWorth: Float64Array | undefined;
  /** What one cent more pay is worth; not above 0. */
  readonly payWorth: number;
  readonly units: UnitPrices;
}

/** A shift the person may be on, in the post that is cheapest. */
export interface LineOption {
  readonly shift: ProblemShift;
  readonly cents: number;
  readonly marksWeekend: boolean;
}

/** What a person can do on one day; rules that look at other days are left to `stepMemory`. */
export interface LineDay {
  readonly options: readonly LineOption[];
  /** Cost of a day without a shift; null where a pin asks for one. */
  readonly freeCents: number | null;
}

/**
 * The choices of one person on every day: no shift in an absence, none without the skill, no Night
 * without leave to work them, none too near to a shift before or after the period, and pins kept.
 */
export function lineDays(problem: Problem, person: ProblemPerson, prices: LinePrices): LineDay[] {
  const { weekendCountsFridayNight } = rulesOf(problem, person);
  const byDay: LineOption[][] = problem.days.map(() => []);
  problem.shifts.forEach((shift, position) => {
    if (!mayWork(problem, person, shift)) return;
    const worth = bestWorth(problem, person, position, prices.cover);
    if (worth === null) return;
    byDay[shift.dayIndex]?.push({
      shift,
      cents:
        (1 - prices.payWorth) * premiumPay(problem, person, shift) +
        (shift.isNight ? prices.units.nights : 0) +
        wishCost(person, shift.dayIndex, shift.index, prices.units) -
        worth -
        at(prices.teamWorth, position),
      marksWeekend: weekendOf(problem, shift, weekendCountsFridayNight) !== null,
    });
  });
  return byDay.map((options, dayIndex) => ({
    options: options.filter(({ shift }) => pinsOn(person, dayIndex).every(keeps(shift.index))),
    freeCents: pinsOn(person, dayIndex).every(keeps(null))
      ? wishCost(person, dayIndex, null, prices.units)
      : null,
  }));
}

/** Whether a person may be on a shift at all, whatever the rest of the line; posts and pins are left out. */
export function mayWork(problem: Problem, person: ProblemPerson, shift: ProblemShift): boolean {
  const { restMinutes } = rulesOf(problem, person);
  return (
    (person.mayWorkNights || !shift.isNight) &&
    !person.absences.some(
      (away) => away.startMinute < shift.endMinute && shift.startMinute < away.endMinute,
    ) &&
    person.history.every(({ endMinute }) => shift.startMinute - endMinute >= restMinutes) &&
    person.following.every(({ startMinute }) => startMinute - shift.endMinute >= restMinutes) &&
    person.kindLimits.every(({ kindId, most }) => kindId !== shift.kindId || most > 0)
  );
}

/** Posts that the person is skilled for and the shift has. */
export const postsOf = (
  { skills }: Problem,
  person: ProblemPerson,
  shift: ProblemShift,
): readonly string[] =>
  skills
    .map(({ id }) => id)
    .filter((id) => person.skillIds.includes(id) && (shift.postSkillIds?.includes(id) ?? true));

/** Worth of the best post that person, shift and pins admit; null when there is none. */
function bestWorth(
  problem: Problem,
  person: ProblemPerson,
  position: number,
  cover: CoverWorth,
): number | null {
  const shift = problem.shifts[position];
  if (!shift) return null;
  const pinned = person.pins.filter(
    ({ shiftIndex, postSkillId }) => shiftIndex === shift.index && postSkillId !== null,
  );
  const posts = postsOf(problem, person, shift).filter((post) =>
    pinned.every(({ postSkillId }) => postSkillId === post),
  );
  if (posts.length === 0) return null;
  return Math.max(...posts.map((post) => worthInPost(cover, person, position, post)));
}

const pinsOn = (person: ProblemPerson, dayIndex: number): ProblemPerson['pins'] =>
  person.pins.filter((pin) => pin.dayIndex === dayIndex);

const keeps =
  (shiftIndex: number | null) =>
  (pin: ProblemPerson['pins'][number]): boolean =>
    pin.shiftIndex === shiftIndex;

/** Price of the wishes of a day that are not granted by this shift, or by none. */
const wishCost = (
  person: ProblemPerson,
  dayIndex: number,
  started: number | null,
  units: UnitPrices,
): number =>
  person.wishes.reduce((cents, { dayIndex: day, shiftIndex, wants, priceCents }) => {
    if (day !== dayIndex) return cents;
    const isOn = shiftIndex === null ? started !== null : started === shiftIndex;
    return isOn === (wants === 'on') ? cents : cents + priceCents + units.refusedWishes;
  }, 0);
