import {
  placeRoster,
  type RosterModel,
  readRoster,
  type WorkColumn,
  weighRoster,
} from '../../model';
import type { PlannedRoster } from '../../problem';
import type { MendOptions, TakeOver } from './mending';
import { movesBetween } from './moves-between';
import { isOpen, keyOf, openShifts } from './open-shifts';
import { type IsLawful, personRows } from './person-rows';
import { roughCost } from './rough-cost';

/** Take-overs of one open shift that are weighed and told, at most. */
const mostTold = 12;

/** Columns that one take-over switches off and on. */
interface Change {
  readonly off: readonly WorkColumn[];
  readonly on: readonly WorkColumn[];
  readonly roughCents: number;
}

/** Take-overs, and the roster in which the best of each open shift are done one after the other. */
export interface FoundTakeOvers {
  readonly takeOvers: readonly TakeOver[];
  readonly patched: PlannedRoster;
}

/**
 * Enumerates every lawful way to fill each open shift of the window by one person who is free, or by one who
 * changes to it from another shift of the window which a third, free that day, takes. Fewest people first,
 * then cost. Needs no solver: an answer within a fraction of a second.
 */
export function findTakeOvers(
  model: RosterModel,
  roster: PlannedRoster,
  { fromMinute, untilMinute }: Pick<MendOptions, 'fromMinute' | 'untilMinute'>,
): FoundTakeOvers {
  const isLawful = personRows(model);
  const columns = model.works.flatMap((work) => work.columns);
  const isIn = ({ shift: { startMinute } }: WorkColumn) =>
    fromMinute <= startMinute && startMinute < untilMinute;
  const inWindow = columns.filter(isIn);
  const before = placeRoster(model, roster);
  const figures = weighRoster(model, before);
  let now = before;
  const takeOvers = openShifts(model, before, inWindow).flatMap((open) => {
    const ways = waysToFill({ model, values: before, inWindow, isLawful }, open).slice(0, mostTold);
    const still = waysToFill({ model, values: now, inWindow, isLawful }, open)[0];
    if (still && isOpen(model, now, open)) now = apply(now, still);
    return ways.map((way): TakeOver => {
      const after = apply(before, way);
      const { shortageMinutes, costCents } = weighRoster(model, after);
      return {
        shiftIndex: open.shift.index,
        postSkillId: open.postSkillId,
        moves: movesBetween(model, before, after),
        shortageMinutes,
        costChangeCents: costCents - figures.costCents,
      };
    });
  });
  return { takeOvers, patched: readRoster(model, now) };
}

interface Search {
  readonly model: RosterModel;
  readonly values: Float64Array;
  readonly inWindow: readonly WorkColumn[];
  readonly isLawful: IsLawful;
}

function waysToFill(search: Search, open: WorkColumn): Change[] {
  const { model, values, inWindow, isLawful } = search;
  const same = (one: WorkColumn, other: WorkColumn): boolean => keyOf(one) === keyOf(other);
  const columnsOf = model.works.map(
    ({ columns }) => new Set(columns.map(({ column }) => column).filter((at) => values[at] === 1)),
  );
  const fits = (work: WorkColumn, off: WorkColumn | null): boolean => {
    const own = new Set(columnsOf[work.personIndex]);
    if (off) own.delete(off.column);
    if (own.has(work.column)) return false;
    own.add(work.column);
    return isLawful(work.personIndex, own);
  };
  const cents = roughCost(model, columnsOf);
  const wayOf = (off: readonly WorkColumn[], on: readonly WorkColumn[]): Change => ({
    off,
    on,
    roughCents: cents(off, on),
  });
  const takers = inWindow.filter((work) => same(work, open));
  const singles = takers.filter((work) => fits(work, null)).map((work) => wayOf([], [work]));
  const pairs = takers.flatMap((taker) =>
    inWindow
      .filter(
        (given) =>
          given.personIndex === taker.personIndex &&
          values[given.column] === 1 &&
          fits(taker, given),
      )
      .flatMap((given) =>
        inWindow
          .filter(
            (next) =>
              same(next, given) && next.personIndex !== taker.personIndex && fits(next, null),
          )
          .map((next) => wayOf([given], [taker, next])),
      ),
  );
  const byCost = (one: Change, other: Change) => one.roughCents - other.roughCents;
  return [...singles.sort(byCost), ...pairs.sort(byCost)];
}

function apply(values: Float64Array, { off, on }: Change): Float64Array {
  const after = values.slice();
  for (const { column } of off) after[column] = 0;
  for (const { column } of on) after[column] = 1;
  return after;
}
