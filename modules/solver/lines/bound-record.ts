import { levelWeight, type RosterModel } from '../../model';
import type { BoundRecord } from '../../problem';
import type { MasterPrices } from './pattern-master';
import type { SearchSpace } from './search-space';

/**
 * The prices behind a bound of the blend in the terms of the problem, so that the proof can reckon the
 * bound anew without model or solver.
 */
export function writeBoundRecord(space: SearchSpace, prices: MasterPrices): BoundRecord {
  const { model } = space;
  const weightOf = (name: string, priority: number | null = null): number => {
    const position = model.levels.findIndex(
      (level) => level.name === name && level.priority === priority,
    );
    return position < 0 ? 0 : levelWeight(model.levels, position);
  };
  const byRow = new Map(
    Array.from(space.rows.modelRows, (row, position) => [row, prices.rows[position] ?? 0]),
  );
  return {
    shortage: model.levels.flatMap(({ name, priority }) =>
      name === 'shortage' && priority !== null
        ? [{ priority, centsPerMinute: weightOf(name, priority) }]
        : [],
    ),
    surplusCentsPerMinute: weightOf('surplus'),
    slices: slicesOf(model, byRow),
    teamRules: model.teamRows.flatMap(({ row, ruleId, at }) => {
      const cents = byRow.get(row) ?? 0;
      return cents === 0 ? [] : [{ ruleId, at, cents }];
    }),
    spreads: spreadsOf(space, prices),
  };
}

function slicesOf(model: RosterModel, byRow: ReadonlyMap<number, number>): BoundRecord['slices'] {
  const floors = model.floors.map((floor) => ({
    of: floor.counting,
    skillId: floor.skillId,
    id: floor.counting === 'shared' ? (floor.floors[0]?.floorId ?? null) : null,
    startMinute: floor.startMinute,
    endMinute: floor.endMinute,
    cents: byRow.get(floor.row) ?? 0,
  }));
  const ceilings = model.ceilings.map((ceiling) => ({
    of: 'ceiling' as const,
    skillId: ceiling.skillId,
    id: ceiling.ceilingId,
    startMinute: ceiling.startMinute,
    endMinute: ceiling.endMinute,
    cents: byRow.get(ceiling.row) ?? 0,
  }));
  return [...floors, ...ceilings].filter(({ cents }) => cents !== 0);
}

function spreadsOf({ model, spreads }: SearchSpace, prices: MasterPrices): BoundRecord['spreads'] {
  const people = model.works.length;
  return spreads.flatMap(({ termIndex }, index) =>
    model.works.flatMap(({ person, personIndex }) => {
      const mostCents = prices.most[index * people + personIndex] ?? 0;
      const leastCents = prices.least[index * people + personIndex] ?? 0;
      return mostCents === 0 && leastCents === 0
        ? []
        : [{ term: termIndex, personId: person.id, mostCents, leastCents }];
    }),
  );
}
