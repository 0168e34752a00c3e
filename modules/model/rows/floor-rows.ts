import type { Problem, ProblemFloor } from '../../problem';
import type { CoverIndex } from '../cover-index';
import { shortageObjective } from '../levels';
import type { Entry, ModelBuilder } from '../model-builder';
import { centsFor } from '../pay';
import { type CoveredSlice, coverSlices, type Stretch, sliceWindows } from '../time-slices';
import type { WorkColumn } from '../work-columns';

/** People who may be missing in a slice at one price, or of one priority of firm floors. */
export interface ShortColumn {
  readonly column: number;
  readonly people: number;
  /** null: firm. */
  readonly priceCentsPerHour: number | null;
  /** Of firm floors; null: wished. */
  readonly priority: number | null;
}

/** A slice of a floor as a row. */
export interface FloorRow extends Stretch {
  readonly row: number;
  readonly skillId: string | null;
  readonly counting: ProblemFloor['counting'];
  /** People asked for, firm and wished together. */
  readonly people: number;
  /** The floors that ask for them. */
  readonly floors: readonly ProblemFloor[];
  readonly covering: readonly WorkColumn[];
  /**
   * In the order in which people go missing: wished ones first, the cheapest first; then firm ones, those
   * of priority 1 last.
   */
  readonly shorts: readonly ShortColumn[];
}

/** Floors that add up, and who counts for them. */
interface FloorGroup extends Pick<FloorRow, 'skillId' | 'counting'> {
  readonly name: string;
  readonly floors: readonly ProblemFloor[];
  readonly counts: (work: WorkColumn) => boolean;
}

/**
 * Floors: cover + short >= people in every slice of time. Rows floor(group, start); columns
 * short(group, start, firm priority) for firm floors, whose minutes are the objective of their priority,
 * and short(group, start, price) for wished ones, whose price is part of the objective `cost`. The cover
 * fills firm floors first, by priority, then the dearest wished ones. Set covering with shortage as in
 * Dantzig's reply to Edie, JORSA 2(3), 1954.
 */
export function addFloorRows(
  builder: ModelBuilder,
  problem: Problem,
  index: CoverIndex,
): FloorRow[] {
  return groupFloors(problem).flatMap((group) => {
    const edges = group.floors.flatMap((floor) => index.edgesWithin(floor));
    return coverSlices(sliceWindows(group.floors, edges), (slice) =>
      index.covering(slice, group.counts),
    ).map((slice) => addFloorRow(builder, group, slice));
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

function addFloorRow(
  builder: ModelBuilder,
  { name, skillId, counting }: FloorGroup,
  slice: CoveredSlice<ProblemFloor, WorkColumn>,
): FloorRow {
  const { startMinute, endMinute, covering, windows: floors } = slice;
  const place = `${name},${startMinute}`;
  const shorts = neededInOrder(floors).map((needed) =>
    addShortColumn(builder, place, slice, needed),
  );
  const people = shorts.reduce((sum, short) => sum + short.people, 0);
  const entries: Entry[] = [
    ...covering.map(({ column }) => [column, 1] as const),
    ...shorts.map(({ column }) => [column, 1] as const),
  ];
  const row = builder.addRow({ name: `floor(${place})`, lower: people, entries });
  return { row, skillId, counting, startMinute, endMinute, people, floors, covering, shorts };
}

type Needed = Omit<ShortColumn, 'column'>;

/** People asked for at each price and priority, in the order in which they go missing. */
function neededInOrder(floors: readonly ProblemFloor[]): Needed[] {
  const needed = new Map<string, Needed>();
  for (const { priceCentsPerHour, people, ...floor } of floors) {
    const priority = priceCentsPerHour === null ? floor.priority : null;
    const key = `${priceCentsPerHour},${priority}`;
    const before = needed.get(key)?.people ?? 0;
    needed.set(key, { priceCentsPerHour, priority, people: before + people });
  }
  const price = (one: Needed) => one.priceCentsPerHour ?? Number.POSITIVE_INFINITY;
  const priority = (one: Needed) => one.priority ?? 0;
  return [...needed.values()].sort((one, other) =>
    price(one) === price(other) ? priority(other) - priority(one) : price(one) - price(other),
  );
}

function addShortColumn(
  builder: ModelBuilder,
  place: string,
  { startMinute, endMinute }: Stretch,
  needed: Needed,
): ShortColumn {
  const { priceCentsPerHour: price, priority, people } = needed;
  const minutes = endMinute - startMinute;
  const column = builder.addColumn({
    name: `short(${place},${price ?? `firm${priority}`})`,
    upper: people,
    costs:
      price === null
        ? { [shortageObjective(priority ?? 1)]: minutes }
        : { cost: centsFor(price, minutes) },
  });
  return { ...needed, column };
}
