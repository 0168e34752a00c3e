import type { Highs, Model } from 'highs';
import { type LinearModel, objectiveOf } from '../model';
import { timeLimit, toHighs } from './highs-adapter';
import type { LinearOutcome } from './linear-outcome';
import type { LinearSession, NewColumns, SessionOptions } from './linear-session';
import { worstBound } from './read-outcome';

/** Values of the option `simplex_strategy`. */
const dualSimplex = 1;
const primalSimplex = 4;

/** Opens a plain linear program in HiGHS for one of its objectives. */
export function openHighsSession(
  highs: Highs,
  model: LinearModel,
  objectiveName: string,
): LinearSession {
  const objective = objectiveOf(model, objectiveName);
  const instance = highs.createModel(toHighs(highs, model, objective));
  instance.options.set({ output_flag: false, presolve: 'off' });
  const rowCount = model.rowNames.length;
  return {
    addColumns: (columns) => addColumns(instance, rowCount, columns),
    changeRowBounds: (row, lower, upper) => {
      instance.changeRowBounds(row, lower, upper);
    },
    changeCosts: (columns, costs) => {
      instance.changeColsCost({ kind: 'set', indices: columns }, costs);
    },
    solve: (options) => solve(highs, instance, worstBound(objective), options),
    close: () => instance.dispose(),
  };
}

function addColumns(instance: Model, numRows: number, added: NewColumns): void {
  const numCols = added.costs.length;
  if (numCols === 0) return;
  instance.addCols({
    cost: Float64Array.from(added.costs),
    lower: Float64Array.from(added.lower),
    upper: Float64Array.from(added.upper),
    matrix: {
      format: 'csc',
      numRows,
      numCols,
      starts: Int32Array.from(added.starts),
      indices: Int32Array.from(added.rows),
      values: Float64Array.from(added.values),
    },
  });
}

function solve(
  highs: Highs,
  instance: Model,
  noBound: number,
  { limitSeconds, iterationLimit, method, shouldStop, onIterations }: SessionOptions,
): LinearOutcome {
  const { callbackType, modelStatus } = highs.constants;
  instance.zeroAllClocks();
  instance.options.set({
    time_limit: timeLimit(limitSeconds),
    simplex_iteration_limit: iterationLimit ?? 2_147_483_647,
    solver: method === 'interior' ? 'ipm' : 'simplex',
    run_crossover: 'off',
    simplex_strategy: method === 'primal' ? primalSimplex : dualSimplex,
  });
  const checkStop = (event: { interrupt(): void }): undefined => {
    if (shouldStop?.()) event.interrupt();
  };
  instance.run({
    [callbackType.simplexInterrupt]: checkStop,
    [callbackType.ipmInterrupt]: checkStop,
  });
  const counter = method === 'interior' ? 'ipm_iteration_count' : 'simplex_iteration_count';
  onIterations?.(Number(instance.info.get(counter)));
  const status = instance.getModelStatus();
  switch (status) {
    case modelStatus.optimal: {
      const { colValue, rowDual } = instance.getSolution();
      const value = instance.getObjectiveValue();
      return {
        kind: 'optimal',
        solution: { objective: value, values: colValue },
        bound: value,
        duals: { rowDuals: rowDual },
      };
    }
    case modelStatus.infeasible:
      return { kind: 'infeasible' };
    case modelStatus.unbounded:
    case modelStatus.unboundedOrInfeasible:
      return { kind: 'unbounded' };
    case modelStatus.timeLimit:
    case modelStatus.iterationLimit:
      return { kind: 'out-of-time', solution: null, bound: noBound };
    case modelStatus.interrupted:
      return { kind: 'interrupted', solution: null, bound: noBound };
    default:
      return { kind: 'failed', message: `The solver ended with status ${status}.` };
  }
}
