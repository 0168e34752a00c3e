import type { Highs, HighsCallbackMap, ModelData } from 'highs';
import { type LinearModel, type Objective, objectiveOf } from '../model';
import type { LinearOutcome } from './linear-outcome';
import type { LinearOptions } from './linear-solver';
import { isWhole, readOutcome, worstBound } from './read-outcome';

/** Two values of an objective that differ by less are the same. */
const defaultAbsoluteGap = 1e-6;

/** What HiGHS takes for no limit on a count. */
const noLimit = 2_147_483_647;
/** HiGHS takes no endless time limit. */
const mostSeconds = 1e9;

/** A time limit as HiGHS takes it. */
export const timeLimit = (seconds: number): number => Math.min(mostSeconds, Math.max(0, seconds));

/** Solves a linear model for one of its objectives in HiGHS. Blocks its thread until the end. */
export function solveLinearModel(
  highs: Highs,
  model: LinearModel,
  objectiveName: string,
  options: LinearOptions,
): LinearOutcome {
  const objective = objectiveOf(model, objectiveName);
  if (options.limitSeconds <= 0) {
    return { kind: 'out-of-time', solution: null, bound: worstBound(objective) };
  }
  const absoluteGap = options.absoluteGap ?? defaultAbsoluteGap;
  return highs.withModel(toHighs(highs, model, objective), (instance) => {
    instance.options.set({
      output_flag: false,
      time_limit: timeLimit(options.limitSeconds),
      random_seed: options.seed ?? 0,
      mip_rel_gap: options.targetGap ?? 0,
      mip_abs_gap: absoluteGap,
      mip_max_nodes: options.nodeLimit ?? noLimit,
      simplex_iteration_limit: options.iterationLimit ?? noLimit,
    });
    if (options.start) instance.setSolution({ colValue: options.start });
    if (options.startPart) {
      const { columns, values } = options.startPart;
      instance.setSolution({ indices: columns, values });
    }
    instance.run(callbacks(highs, options));
    options.onIterations?.(Number(instance.info.get('simplex_iteration_count')));
    const outcome = readOutcome(highs, instance, { model, objective, absoluteGap });
    return outcome === 'unbounded or infeasible' ? tellApart(highs, model, options) : outcome;
  });
}

export function toHighs(
  highs: Highs,
  model: LinearModel,
  { sense, offset, costs }: Objective,
): ModelData {
  const numCols = model.columnNames.length;
  const numRows = model.rowNames.length;
  return {
    numCols,
    numRows,
    sense: highs.constants.objectiveSense[sense === 'minimise' ? 'minimize' : 'maximize'],
    offset,
    colCost: costs,
    colLower: model.columnLower,
    colUpper: model.columnUpper,
    rowLower: model.rowLower,
    rowUpper: model.rowUpper,
    matrix: {
      format: 'csr',
      numRows,
      numCols,
      starts: model.starts,
      indices: model.indices,
      values: model.values,
    },
    ...(isWhole(model) ? { integrality: Int32Array.from(model.isInteger) } : {}),
  };
}

function callbacks(highs: Highs, options: LinearOptions): HighsCallbackMap {
  const type = highs.constants.callbackType;
  const checkStop = (event: { interrupt(): void }): undefined => {
    if (options.shouldStop?.()) event.interrupt();
  };
  return {
    [type.simplexInterrupt]: checkStop,
    [type.ipmInterrupt]: checkStop,
    [type.mipInterrupt](event): undefined {
      const bound = event.data.mip_dual_bound;
      if (bound !== undefined && Number.isFinite(bound)) options.onBound?.(bound);
      checkStop(event);
    },
    [type.mipImprovingSolution](event): undefined {
      if (event.data.mip_solution) options.onSolution?.(event.data.mip_solution);
    },
  };
}

/** Infeasible or unbounded: any point at all tells which. */
function tellApart(
  highs: Highs,
  model: LinearModel,
  { limitSeconds }: LinearOptions,
): LinearOutcome {
  const costs = new Float64Array(model.columnNames.length);
  const objectives = { any: { sense: 'minimise', offset: 0, costs } } as const;
  const outcome = solveLinearModel(highs, { ...model, objectives }, 'any', { limitSeconds });
  return outcome.kind === 'optimal' ? { kind: 'unbounded' } : outcome;
}
