import type { Problem, ProblemFloor } from '../../problem';
import type { Entry, ModelBuilder } from '../model-builder';
import { centsPerMinute } from '../pay';
import { type CoveredSlice, coverSlices, holds, type Stretch, sliceWindows } from '../time-slices';
import type { PersonWork, WorkColumn } from '../work-columns';

/** People who may be missing in a slice at one price; null: firm. */
export interface ShortColumn {
  readonly column: number;
  readonly people: number;
  readonly priceCentsPerHour: number | null;
}

/** A slice of a floor as a row. */
export interface FloorRow extends Stretch {
  readonly row: number;
  readonly skillId: string | null;
  readonly counting: ProblemFloor['counting'];
  /** People asked for, firm and wished together. */
  readonly people: number;
  readonly covering: readonly WorkColumn[];
  /** In the order in which people go missing: wished ones first, the cheapest first, firm ones last. */
  readonly shorts: readonly ShortColumn[];
}

/** Floors that add up, and who counts for them. */
interface FloorGroup extends Pick<FloorRow, 'skillId' | 'counting'> {
  readonly name: string;
  readonly floors: readonly ProblemFloor[];
  readonly counts: (work: WorkColumn) => boolean;
}

/**
 * Floors: cover + short >= people in every slice of time. Rows floor(group, start), columns
 * short(group, start) for firm floors, whose minutes are the objective `shortage`, and
 * short(group, start, price) for wished ones, whose price is part of the objective `cost`. The cover
 * fills firm floors first, then the dearest wished ones. Set covering with shortage as in Dantzig's
 * reply to Edie, JORSA 2(3), 1954.
 */
export function addFloorRows(
  builder: ModelBuilder,
  problem: Problem,
  works: readonly PersonWork[],
): FloorRow[] {
  const cuts = problem.shifts.flatMap(({ startMinute, endMinute }) => [startMinute, endMinute]);
  return groupFloors(problem).flatMap((group) => {
    const onShift = worksByShift(problem, works, group.counts);
    const coveringOf = (slice: Stretch) =>
      problem.shifts.flatMap((shift) => (holds(shift, slice) ? (onShift[shift.index] ?? []) : []));
    return coverSlices(sliceWindows(group.floors, cuts), coveringOf).map((slice) =>
      addFloorRow(builder, group, slice),
    );
  });
}

/**
 * Seated floors of one skill add up and count people in that post; seated floors of no skill add up and
 * count everybody on duty. A shared floor stands alone and counts everybody on duty who holds the skill.
 */
function groupFloors(problem: Problem): FloorGroup[] {
  const asking = problem.floors.filter(({ people }) => people > 0);
  const holders = (skillId: string) =>
    new Set(
      problem.people.flatMap(({ skillIds }, index) => (skillIds.includes(skillId) ? [index] : [])),
    );
  const seated = [...problem.skills.map(({ id }) => id), null].map((skillId, index) => ({
    name: skillId === null ? 'any' : `k${index}`,
    skillId,
    counting: 'seated' as const,
    floors: asking.filter((floor) => floor.counting === 'seated' && floor.skillId === skillId),
    counts: (work: WorkColumn) => skillId === null || work.postSkillId === skillId,
  }));
  const shared = asking
    .filter(({ counting }) => counting === 'shared')
    .map((floor, index) => {
      const who = floor.skillId === null ? null : holders(floor.skillId);
      return {
        name: `shared${index}`,
        skillId: floor.skillId,
        counting: 'shared' as const,
        floors: [floor],
        counts: ({ personIndex }: WorkColumn) => who?.has(personIndex) ?? true,
      };
    });
  return [...seated, ...shared];
}

function worksByShift(
  problem: Problem,
  works: readonly PersonWork[],
  counts: (work: WorkColumn) => boolean,
): WorkColumn[][] {
  const onShift: WorkColumn[][] = problem.shifts.map(() => []);
  for (const { columns } of works) {
    for (const work of columns) if (counts(work)) onShift[work.shift.index]?.push(work);
  }
  return onShift;
}

function addFloorRow(
  builder: ModelBuilder,
  { name, skillId, counting }: FloorGroup,
  slice: CoveredSlice<ProblemFloor, WorkColumn>,
): FloorRow {
  const place = `${name},${slice.startMinute}`;
  const shorts = neededByPrice(slice.windows).map(([priceCentsPerHour, people]) => ({
    column: addShortColumn(builder, place, slice, priceCentsPerHour, people),
    people,
    priceCentsPerHour,
  }));
  const people = shorts.reduce((sum, short) => sum + short.people, 0);
  const entries: Entry[] = [
    ...slice.covering.map(({ column }) => [column, 1] as const),
    ...shorts.map(({ column }) => [column, 1] as const),
  ];
  const row = builder.addRow({ name: `floor(${place})`, lower: people, entries });
  const { startMinute, endMinute, covering } = slice;
  return { row, skillId, counting, startMinute, endMinute, people, covering, shorts };
}

/** People asked for at each price: wished ones from the cheapest up, then firm ones (null). */
function neededByPrice(floors: readonly ProblemFloor[]): (readonly [number | null, number])[] {
  const needed = new Map<number | null, number>();
  for (const { priceCentsPerHour, people } of floors) {
    needed.set(priceCentsPerHour, (needed.get(priceCentsPerHour) ?? 0) + people);
  }
  const rank = (price: number | null) => price ?? Number.POSITIVE_INFINITY;
  return [...needed].sort(([one], [other]) => rank(one) - rank(other));
}

function addShortColumn(
  builder: ModelBuilder,
  place: string,
  { startMinute, endMinute }: Stretch,
  price: number | null,
  people: number,
): number {
  const minutes = endMinute - startMinute;
  return builder.addColumn({
    name: price === null ? `short(${place})` : `short(${place},${price})`,
    upper: people,
    costs: price === null ? { shortage: minutes } : { cost: centsPerMinute(price) * minutes },
  });
}
