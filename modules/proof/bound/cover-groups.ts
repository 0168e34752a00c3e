import type { BoundRecord, Problem } from '../../problem';
import type { Interval } from '../minute-counts';

export type RecordSlice = BoundRecord['slices'][number];

/** Some people asked for, or too many, at one price. */
export interface PricedPeople {
  readonly people: number;
  readonly centsPerMinute: number;
}

/** A floor or a ceiling, by what it costs per minute when so many people are on duty. */
export interface CoverWindow extends Interval, PricedPeople {
  readonly isCeiling: boolean;
  /** Cover serves low ranks first. */
  readonly rank: number;
  /** Price of an hour where cents are rounded to whole ones; 0 where nothing is rounded. */
  readonly roundedCentsPerHour: number;
}

/** Floors or ceilings that count the same people at the same time, and share one multiplier. */
export interface CoverGroup {
  readonly of: RecordSlice['of'];
  readonly id: string | null;
  readonly skillId: string | null;
  /** seated: people in the post of the skill count; shared: everybody on duty who holds it. */
  readonly counting: 'seated' | 'shared';
  /** In the order in which cover serves them. */
  readonly windows: readonly CoverWindow[];
}

/**
 * The floors and ceilings of a problem in the groups of a bound record, firm ones at the prices of the
 * record: seated floors of one skill stand together, a shared floor or a ceiling stands alone.
 */
export function coverGroups(problem: Problem, record: BoundRecord): CoverGroup[] {
  const groups = new Map<string, CoverGroup>();
  const add = (group: Omit<CoverGroup, 'windows'>, window: CoverWindow): void => {
    const key = JSON.stringify([group.of, group.id, group.skillId, group.counting]);
    const windows = [...(groups.get(key)?.windows ?? []), window];
    groups.set(key, { ...group, windows });
  };
  const firmPrices = new Map(record.shortage.map((one) => [one.priority, one.centsPerMinute]));
  for (const floor of problem.floors.filter(({ people }) => people > 0)) {
    const { counting, skillId, floorId, priceCentsPerHour: price } = floor;
    add(
      { of: counting, id: counting === 'seated' ? null : floorId, skillId, counting },
      {
        ...intervalOf(floor),
        isCeiling: false,
        people: floor.people,
        centsPerMinute: price === null ? (firmPrices.get(floor.priority) ?? 0) : price / 60,
        rank: price === null ? floor.priority : wishedRank - price,
        roundedCentsPerHour: price ?? 0,
      },
    );
  }
  for (const ceiling of problem.ceilings) {
    const { counting, skillId, ceilingId, priceCentsPerHour: price } = ceiling;
    add(
      { of: 'ceiling', id: ceilingId, skillId, counting },
      {
        ...intervalOf(ceiling),
        isCeiling: true,
        people: ceiling.people,
        centsPerMinute: price === null ? record.surplusCentsPerMinute : price / 60,
        rank: 0,
        roundedCentsPerHour: price ?? 0,
      },
    );
  }
  return [...groups.values()].map((group) => ({
    ...group,
    windows: [...group.windows].sort((one, other) => one.rank - other.rank),
  }));
}

/** Above every priority and every price: wished floors come after firm ones, the dearest first. */
const wishedRank = Number.MAX_SAFE_INTEGER;

const intervalOf = ({ startMinute, endMinute }: Interval): Interval => ({ startMinute, endMinute });

/** The group that a slice of a record prices, or undefined when there is none. */
export const groupOf = (
  groups: readonly CoverGroup[],
  { of, id, skillId }: RecordSlice,
): CoverGroup | undefined =>
  groups.find((group) => group.of === of && group.id === id && group.skillId === skillId);
