import type { Highs, Model } from 'highs';
import type { LinearModel, Objective } from '../model';
import type { LinearOutcome, LinearSolution } from './linear-outcome';

/** Differences below this are arithmetic, not gaps. */
const exactGap = 1e-9;
/** `primal_solution_status` of HiGHS when the solution keeps all rows and bounds. */
const feasible = 2;

/** Whether any column takes whole numbers only. */
export const isWhole = (model: LinearModel): boolean => model.isInteger.includes(1);

/** What was asked of the solver. */
interface Solve {
  readonly model: LinearModel;
  readonly objective: Objective;
  readonly absoluteGap: number;
}

/** Status first: only an optimal status, or a limit with a feasible point, makes the numbers mean anything. */
export function readOutcome(
  highs: Highs,
  instance: Model,
  solve: Solve,
): LinearOutcome | 'unbounded or infeasible' {
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
      return 'unbounded or infeasible';
    case status.timeLimit:
    case status.interrupted:
    case status.solutionLimit:
    case status.iterationLimit:
      return {
        kind: reached === status.interrupted ? 'interrupted' : 'out-of-time',
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
  const isExact = gap <= exactGap || distance <= solve.absoluteGap;
  return isExact
    ? { kind: 'optimal', solution, bound, duals: null }
    : { kind: 'good-enough', solution, bound, gap };
}

const readSolution = (instance: Model): LinearSolution => ({
  objective: instance.getObjectiveValue(),
  values: instance.getSolution().colValue,
});

function boundOf(instance: Model, { model, objective }: Solve): number {
  if (!isWhole(model)) return worstBound(objective);
  const bound = Number(instance.info.get('mip_dual_bound'));
  return Number.isFinite(bound) ? bound : worstBound(objective);
}

/** A bound that says nothing. */
export const worstBound = ({ sense }: Objective): number =>
  sense === 'minimise' ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY;

/** A model without rows and columns: its value is the constant. */
const readEmpty = ({ objective }: Solve): LinearOutcome => ({
  kind: 'optimal',
  solution: { objective: objective.offset, values: new Float64Array(objective.costs.length) },
  bound: objective.offset,
  duals: null,
});
