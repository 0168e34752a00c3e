import type { BoundRecord, Problem } from '../../problem';
import type { Interval } from '../minute-counts';
import { type CoverGroup, type CoverWindow, groupOf, type RecordSlice } from './cover-groups';

/** What the floors and ceilings add to a bound. */
export interface CoverBound {
  /** Least cost of all slices, each with the number of people that suits it best. */
  readonly cents: number;
  /** Sums that are rounded to whole cents and may lose half a cent each. */
  readonly roundedSums: number;
  /** Sum of the sizes of all terms, for the error of the arithmetic. */
  readonly magnitude: number;
}

/**
 * For every slice the least, over the numbers v of people who may be on duty, of what its floors and
 * ceilings cost with v people plus v times the slice's multiplier. Time that no slice of the record holds
 * has the multiplier 0.
 */
export function priceCover(
  problem: Problem,
  record: BoundRecord,
  groups: readonly CoverGroup[],
): CoverBound {
  const slicesOf = new Map<CoverGroup, RecordSlice[]>();
  for (const slice of record.slices) {
    const group = groupOf(groups, slice);
    if (group) slicesOf.set(group, [...(slicesOf.get(group) ?? []), slice]);
  }
  const shiftEnds = problem.shifts.flatMap(({ startMinute, endMinute }) => [
    startMinute,
    endMinute,
  ]);
  let [cents, roundedSums, magnitude] = [0, 0, 0];
  for (const group of groups) {
    const slices = slicesOf.get(group) ?? [];
    const most = mostPeople(problem, group);
    const pieces = cutPieces(group, slices, shiftEnds);
    roundedSums += pieces.reduce((sum, piece) => sum + roundedSumsOf(piece), 0);
    for (const { multiplier, parts } of gatherPieces(pieces, slices)) {
      const { cost, worth } = cheapestCover(multiplier, parts, most);
      cents += cost + worth;
      magnitude += cost + Math.abs(worth);
    }
  }
  return { cents, roundedSums, magnitude };
}

/** A stretch in which neither the windows nor who is on duty change. */
interface Piece extends Interval {
  readonly windows: readonly CoverWindow[];
}

interface PricedPieces {
  readonly multiplier: number;
  readonly parts: readonly Piece[];
}

/** What pieces cost with the number of people that suits them best, and what those are worth. */
function cheapestCover(
  multiplier: number,
  parts: readonly Piece[],
  most: number,
): { cost: number; worth: number } {
  let best = { cost: Number.POSITIVE_INFINITY, worth: 0 };
  for (let people = 0; people <= most; people += 1) {
    const cost = parts.reduce((sum, part) => sum + costOf(part, people), 0);
    const worth = multiplier * people;
    if (cost + worth < best.cost + best.worth) best = { cost, worth };
  }
  return best;
}

const mostPeople = ({ people }: Problem, { skillId }: CoverGroup): number =>
  people.filter((person) => skillId === null || person.skillIds.includes(skillId)).length;

function cutPieces(
  { windows }: CoverGroup,
  slices: readonly RecordSlice[],
  shiftEnds: readonly number[],
): Piece[] {
  const ends = [...windows, ...slices].flatMap(({ startMinute, endMinute }) => [
    startMinute,
    endMinute,
  ]);
  const [first, last] = [Math.min(...ends), Math.max(...ends)];
  const inside = shiftEnds.filter((minute) => first < minute && minute < last);
  const cuts = [...new Set([...ends, ...inside])].sort((one, other) => one - other);
  return cuts.slice(1).flatMap((endMinute, index): Piece[] => {
    const startMinute = cuts[index] ?? endMinute;
    const open = windows.filter(
      (window) => window.startMinute <= startMinute && endMinute <= window.endMinute,
    );
    return open.length === 0 ? [] : [{ startMinute, endMinute, windows: open }];
  });
}

/** Pieces of one slice share the number of people; every other piece stands alone. */
function gatherPieces(pieces: readonly Piece[], slices: readonly RecordSlice[]): PricedPieces[] {
  const parts = new Map<RecordSlice, Piece[]>(slices.map((slice) => [slice, []]));
  const free: PricedPieces[] = [];
  for (const piece of pieces) {
    const slice = slices.find(
      ({ startMinute, endMinute }) =>
        startMinute <= piece.startMinute && piece.endMinute <= endMinute,
    );
    if (slice) parts.get(slice)?.push(piece);
    else free.push({ multiplier: 0, parts: [piece] });
  }
  return [...[...parts].map(([{ cents }, own]) => ({ multiplier: cents, parts: own })), ...free];
}

/** What a piece costs with so many people on duty; floors are served by rank, ceilings stand alone. */
function costOf({ startMinute, endMinute, windows }: Piece, people: number): number {
  let left = people;
  let centsPerMinute = 0;
  for (const window of windows) {
    if (window.isCeiling) {
      centsPerMinute += Math.max(0, people - window.people) * window.centsPerMinute;
      continue;
    }
    const served = Math.min(left, window.people);
    left -= served;
    centsPerMinute += (window.people - served) * window.centsPerMinute;
  }
  return centsPerMinute * (endMinute - startMinute);
}

/**
 * The proof rounds the price of each stretch of a priced window once. A stretch is made of whole pieces,
 * so where those come out in whole cents so does the stretch.
 */
const roundedSumsOf = ({ startMinute, endMinute, windows }: Piece): number =>
  windows.filter(
    ({ roundedCentsPerHour }) => (roundedCentsPerHour * (endMinute - startMinute)) % 60 !== 0,
  ).length;
