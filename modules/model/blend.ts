import type { Level } from './levels';
import { objectiveOf } from './linear-model';
import type { RosterModel } from './roster-model';

/** Name of the objective in which levels and cost are one sum. */
export const blendObjective = 'blend';

/** Cents that one unit of the last level weighs: a missing minute outweighs what any minute costs. */
const lastLevelCents = 5000;
/** How much more a unit of a level weighs than a unit of the next. */
const levelRatio = 20;
/** A team rule is broken by whole people, not by minutes. */
const minutesAUnit = 480;

/** What one unit of a level weighs in the blend, in cents. */
export function levelWeight(levels: readonly Level[], position: number): number {
  const later = levels.length - 1 - position;
  const weight = lastLevelCents * levelRatio ** later;
  return levels[position]?.name === 'teamRules' ? weight * minutesAUnit : weight;
}

/**
 * The model with one more objective `blend`: cost plus each level at a weight so great that it comes first
 * in practice. Searches use it; what they find is compared level by level.
 */
export function withLevelBlend(model: RosterModel): RosterModel {
  const cost = objectiveOf(model.linear, 'cost');
  const costs = cost.costs.slice();
  let offset = cost.offset;
  model.levels.forEach(({ objective }, position) => {
    const weight = levelWeight(model.levels, position);
    const level = objectiveOf(model.linear, objective);
    offset += weight * level.offset;
    level.costs.forEach((amount, column) => {
      if (amount !== 0) costs[column] = (costs[column] ?? 0) + weight * amount;
    });
  });
  const blend = { sense: 'minimise', offset, costs } as const;
  const objectives = { ...model.linear.objectives, [blendObjective]: blend };
  return { ...model, linear: { ...model.linear, objectives } };
}
