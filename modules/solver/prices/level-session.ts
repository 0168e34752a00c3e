import { type LinearModel, objectiveOf, type RosterModel, relaxed } from '../../model';
import type { AnalysisTools, TimeLeft } from '../analysis-tools';
import type { LinearSession } from '../linear-session';

/** Least values of a relaxation. */
export interface LeastValues {
  /** In the order of the model's levels. */
  readonly levels: readonly number[];
  readonly costCents: number;
  /** Missing person-minutes of firm floors of every priority. */
  readonly shortageMinutes: number;
}

/** A relaxation kept in the solver, whose levels and cost are made least again and again. */
export interface LevelSession {
  readonly changeRow: (row: number, lower: number, upper: number) => void;
  /** First with the levels of `hint` held, which is quickest when they can be. null: out of time, or no solution. */
  readonly least: (hint: LeastValues | null) => LeastValues | null;
  readonly close: () => void;
}

/** Room for the arithmetic of the solver where a level is held at its least. */
const tolerance = 1e-6;

/** Opens the linear relaxation of a model; `linear` may have more columns and rows than the model. */
export function openLevels(
  tools: AnalysisTools,
  { levels, linear: own }: RosterModel,
  time: TimeLeft,
  linear: LinearModel = own,
): LevelSession {
  const names = [...levels.map(({ objective }) => objective), 'cost'];
  const objectives = names.map((name) => objectiveOf(linear, name));
  const costs = objectives[0]?.costs ?? new Float64Array();
  const first = { sense: 'minimise', offset: 0, costs } as const;
  const session = tools.open({ ...relaxed(linear), objectives: { first } }, 'first');
  const every = Int32Array.from(linear.columnNames.keys());
  const hold = (values: readonly number[]): void => {
    levels.forEach(({ row }, index) => {
      const value = values[index];
      const most = value === undefined ? Number.POSITIVE_INFINITY : value + roomFor(value);
      session.changeRowBounds(row, Number.NEGATIVE_INFINITY, most);
    });
  };
  const solveFor = (index: number, method: 'primal' | 'dual'): number | null => {
    const objective = objectives[index];
    if (!objective) return null;
    session.changeCosts(every, objective.costs);
    return leastValue(session, method, tools, time, objective.offset);
  };
  // Without a basis the dual simplex is the quicker one: no cost is below 0.
  let isFirst = true;
  const least = (hint: LeastValues | null): LeastValues | null => {
    if (hint) {
      hold(hint.levels);
      const cost = solveFor(levels.length, 'dual');
      // With fewer people asked for, the levels may be less than the hint only when they were above 0.
      if (cost !== null && hint.levels.every((value) => value <= tolerance)) {
        return { ...hint, costCents: cost };
      }
    }
    const values: number[] = [];
    for (const index of levels.keys()) {
      hold(values);
      const value = solveFor(index, isFirst ? 'dual' : 'primal');
      isFirst = false;
      if (value === null) return null;
      values.push(Math.max(0, value));
    }
    hold(values);
    const costCents = solveFor(levels.length, 'primal');
    return costCents === null
      ? null
      : { levels: values, costCents, shortageMinutes: sumOf(values) };
  };
  const sumOf = (values: readonly number[]): number =>
    levels.reduce((sum, { name }, at) => sum + (name === 'shortage' ? (values[at] ?? 0) : 0), 0);
  return {
    changeRow: (row, lower, upper) => session.changeRowBounds(row, lower, upper),
    least,
    close: () => session.close(),
  };
}

const roomFor = (value: number): number => tolerance * Math.max(1, value);

function leastValue(
  session: LinearSession,
  method: 'primal' | 'dual',
  tools: AnalysisTools,
  time: TimeLeft,
  offset: number,
): number | null {
  const outcome = session.solve({
    limitSeconds: time.seconds(),
    method,
    shouldStop: tools.isStopRequested,
  });
  return outcome.kind === 'optimal' ? outcome.bound + offset : null;
}
