import type { SizingCap, SizingFloor, SizingProblem } from '../problem';
import type { LinearModel } from './linear-model';
import { type Entry, ModelBuilder } from './model-builder';
import { coverSlices, holds, type Stretch, sliceWindows } from './time-slices';

/** A sizing problem as a linear model, with the way back to patterns and floors. */
export interface SizingModel {
  readonly problem: SizingProblem;
  /** Objectives: `shortage` in person-minutes, `size` in people or cents as the problem says. */
  readonly linear: LinearModel;
  /** Column of each pattern. */
  readonly people: readonly number[];
  /** Slices of each floor. */
  readonly slices: readonly (readonly SizingSlice[])[];
  /** The row that holds the whole shortage; stage two puts the least shortage on it. */
  readonly shortageRow: number;
}

/** A stretch of a floor over which the same patterns are on duty. */
export interface SizingSlice {
  readonly row: number;
  readonly short: number;
  readonly minutes: number;
}

/**
 * The covering model: columns people(pattern), whole numbers; rows floor(number, start): people on duty
 * + short >= floor; rows cap(number). Every floor stands alone: floors that add up reach the problem as
 * their sum. Time is a circle. Dantzig's reply to Edie, JORSA 2(3), 1954, 339-341.
 */
export function buildSizingModel(problem: SizingProblem): SizingModel {
  const builder = new ModelBuilder('Sizing', { shortage: 'minimise', size: 'minimise' });
  problem.patterns.forEach(({ label }, index) => {
    builder.explain(`t${index} = ${label}`);
  });
  const people = problem.patterns.map(({ costCents }, index) =>
    builder.addColumn({
      name: `people(t${index})`,
      isInteger: true,
      costs: { size: problem.objective === 'people' ? 1 : costCents },
    }),
  );
  const duties = problem.patterns.map((pattern) =>
    pattern.duties.flatMap((duty) => unroll(duty, problem.cycleMinutes)),
  );
  const slices = problem.floors.map((floor, index) =>
    addFloorRows(builder, problem, { floor, index, people, duties }),
  );
  problem.caps.forEach((cap, index) => {
    addCapRow(builder, problem, cap, `cap(${index})`, people);
  });
  const entries = slices.flat().map(({ short, minutes }) => [short, minutes] as const);
  const shortageRow = builder.addRow({ name: 'shortage', entries });
  return { problem, linear: builder.build(), people, slices, shortageRow };
}

interface FloorPlace {
  readonly floor: SizingFloor;
  readonly index: number;
  readonly people: readonly number[];
  /** Duties of each pattern within one round. */
  readonly duties: readonly (readonly Stretch[])[];
}

function addFloorRows(
  builder: ModelBuilder,
  { cycleMinutes, patterns }: SizingProblem,
  { floor, index, people, duties }: FloorPlace,
): SizingSlice[] {
  if (floor.people === 0) return [];
  const counting = patterns.flatMap(({ skillId }, pattern) =>
    floor.skillId === null || skillId === floor.skillId ? [pattern] : [],
  );
  const cuts = duties.flat().flatMap(({ startMinute, endMinute }) => [startMinute, endMinute]);
  const onDuty = (slice: Stretch) =>
    counting.filter((pattern) => duties[pattern]?.some((duty) => holds(duty, slice)));
  const slices = coverSlices(sliceWindows(unroll(floor, cycleMinutes), cuts), onDuty);
  return slices.map(({ startMinute, endMinute, covering }) => {
    const minutes = endMinute - startMinute;
    const name = `(${index},${startMinute})`;
    const costs = { shortage: minutes };
    const short = builder.addColumn({ name: `short${name}`, upper: floor.people, costs });
    const entries = covering.map((pattern): Entry => [people[pattern] ?? 0, 1]);
    const row = builder.addRow({
      name: `floor${name}`,
      lower: floor.people,
      entries: [...entries, [short, 1]],
    });
    return { row, short, minutes };
  });
}

/**
 * Limit on people: sum of people on the lines <= people, or <= percent of everybody, written as
 * sum of (100 on the lines - percent) x people <= 0. Rows cap(number). Source: the supervisor.
 */
function addCapRow(
  builder: ModelBuilder,
  { patterns }: SizingProblem,
  { lineIds, limit }: SizingCap,
  name: string,
  people: readonly number[],
): void {
  const weights = patterns.map(({ lineId }) => {
    const isIn = lineIds.includes(lineId) ? 1 : 0;
    return 'people' in limit ? isIn : 100 * isIn - limit.percentOfAll;
  });
  const entries = weights.flatMap((weight, pattern): Entry[] =>
    weight === 0 ? [] : [[people[pattern] ?? 0, weight]],
  );
  builder.addRow({ name, upper: 'people' in limit ? limit.people : 0, entries });
}

/** A stretch of the circle as one or two stretches of its first round. */
function unroll({ startMinute, endMinute }: Stretch, cycleMinutes: number): Stretch[] {
  if (endMinute <= cycleMinutes) return [{ startMinute, endMinute }];
  return [
    { startMinute, endMinute: cycleMinutes },
    { startMinute: 0, endMinute: endMinute - cycleMinutes },
  ];
}
