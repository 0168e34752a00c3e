import type { Highs, HighsCallbackMap, Model, ModelData } from 'highs';
import { type LinearModel, type Objective, objectiveOf } from '../model';
import type { LinearOutcome, LinearSolution } from './linear-outcome';

export interface LinearOptions {
  /** Wall-clock seconds. */
  readonly limitSeconds: number;
  /** Relative distance of solution and bound at which to stop; 0 unless given. */
  readonly targetGap?: number;
  /** The same as an amount of the objective. */
  readonly absoluteGap?: number;
  readonly seed?: number;
  /** A point to start from, by column; ignored when it is no solution. */
  readonly start?: Float64Array;
  readonly onSolution?: (values: Float64Array) => void;
  readonly onBound?: (bound: number) => void;
  /** Asked many times a second; true ends the solve and keeps the best solution. */
  readonly shouldStop?: () => boolean;
}

/** Solves a linear model for one of its objectives. */
export type LinearSolver = (
  model: LinearModel,
  objectiveName: string,
  options: LinearOptions,
) => LinearOutcome;

/** Differences below this are arithmetic, not gaps. */
const exactGap = 1e-9;
/** `primal_solution_status` of HiGHS when the solution keeps all rows and bounds. */
const feasible = 2;

/** Solves a linear model for one of its objectives in HiGHS. Blocks its thread until the end. */
export function solveLinearModel(
  highs: Highs,
  model: LinearModel,
  objectiveName: string,
  options: LinearOptions,
): LinearOutcome {
  const objective = objectiveOf(model, objectiveName);
  if (options.limitSeconds <= 0)
    return { kind: 'out-of-time', solution: null, bound: worst(objective) };
  return highs.withModel(toHighs(highs, model, objective), (instance) => {
    instance.options.set({
      output_flag: false,
      time_limit: options.limitSeconds,
      random_seed: options.seed ?? 0,
      mip_rel_gap: options.targetGap ?? 0,
      mip_abs_gap: options.absoluteGap ?? 1e-6,
    });
    if (options.start) instance.setSolution({ colValue: options.start });
    instance.run(callbacks(highs, options));
    return readOutcome(highs, instance, { model, objective, objectiveName, options });
  });
}

function toHighs(highs: Highs, model: LinearModel, { sense, offset, costs }: Objective): ModelData {
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

const isWhole = (model: LinearModel): boolean => model.isInteger.includes(1);

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

interface Solve {
  readonly model: LinearModel;
  readonly objective: Objective;
  readonly objectiveName: string;
  readonly options: LinearOptions;
}

/** Status first: only an optimal status, or a limit with a feasible point, makes the numbers mean anything. */
function readOutcome(highs: Highs, instance: Model, solve: Solve): LinearOutcome {
  const status = highs.constants.modelStatus;
  const reached = instance.getModelStatus();
  switch (reached) {
    case status.optimal:
      return readOptimal(instance, solve);
    case status.empty:
      return readEmpty(solve);
    case status.infeasible:
      return { kind: 'infeasible' };
    case status.unbounded:
      return { kind: 'unbounded' };
    case status.unboundedOrInfeasible:
      return tellApart(highs, solve);
    case status.timeLimit:
    case status.interrupted:
      return {
        kind: reached === status.timeLimit ? 'out-of-time' : 'interrupted',
        solution:
          instance.info.get('primal_solution_status') === feasible ? readSolution(instance) : null,
        bound: boundOf(instance, solve),
      };
    default:
      return { kind: 'failed', message: `The solver ended with status ${reached}.` };
  }
}

function readOptimal(instance: Model, solve: Solve): LinearOutcome {
  const solution = readSolution(instance);
  if (!isWhole(solve.model)) {
    const { rowDual } = instance.getSolution();
    return { kind: 'optimal', solution, bound: solution.objective, duals: { rowDuals: rowDual } };
  }
  const bound = boundOf(instance, solve);
  const distance = Math.abs(solution.objective - bound);
  const gap = distance / Math.max(1, Math.abs(solution.objective));
  const isExact = gap <= exactGap || distance <= (solve.options.absoluteGap ?? 1e-6);
  return isExact
    ? { kind: 'optimal', solution, bound, duals: null }
    : { kind: 'good-enough', solution, bound, gap };
}

const readSolution = (instance: Model): LinearSolution => ({
  objective: instance.getObjectiveValue(),
  values: instance.getSolution().colValue,
});

function boundOf(instance: Model, { model, objective }: Solve): number {
  if (!isWhole(model)) return worst(objective);
  const bound = Number(instance.info.get('mip_dual_bound'));
  return Number.isFinite(bound) ? bound : worst(objective);
}

const worst = ({ sense }: Objective): number =>
  sense === 'minimise' ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY;

/** A model without rows and columns: its value is the constant. */
const readEmpty = ({ objective }: Solve): LinearOutcome => ({
  kind: 'optimal',
  solution: { objective: objective.offset, values: new Float64Array(objective.costs.length) },
  bound: objective.offset,
  duals: null,
});

/** Infeasible or unbounded: any point at all tells which. */
function tellApart(highs: Highs, { model, options }: Solve): LinearOutcome {
  const costs = new Float64Array(model.columnNames.length);
  const objectives = { any: { sense: 'minimise', offset: 0, costs } } as const;
  const { limitSeconds } = options;
  const outcome = solveLinearModel(highs, { ...model, objectives }, 'any', { limitSeconds });
  return outcome.kind === 'optimal' ? { kind: 'unbounded' } : outcome;
}
