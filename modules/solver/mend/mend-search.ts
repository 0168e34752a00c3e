import {
  type LinearModel,
  levelSlacks,
  roundingSlackCents,
  weighRoster,
  withRowBounds,
} from '../../model';
import type { AnalysisTools, TimeLeft } from '../analysis-tools';
import { completeMending, type MendModel } from './mend-model';
import type { MendAim } from './mending';

/** Share of the remaining time for an aim that is not the last. */
const aimShare = 0.6;
/** Rows of the solver hold to this. */
const tolerance = 1e-6;
/** Bounds of the solver are trusted to a hundredth of a cent, and to a thousandth of a minute or person. */
const boundToleranceCents = 0.01;
const levelTolerance = 1e-3;

/** An aim as the solver takes it. */
interface Aim {
  readonly name: string;
  readonly row: number;
  /** Values are multiples of this. */
  readonly step: number;
  /** How far the model may lie from the whole figure. */
  readonly slack: number;
}

/** A mending and its figures: levels of the model, touched, moved, cost. */
interface Point {
  readonly values: Float64Array;
  readonly figures: readonly number[];
}

/** Solves for the aims of a mending one after the other, each with those before held at what was reached. */
export class MendSearch {
  #best: Point | null = null;
  readonly #aims: readonly Aim[];

  constructor(
    readonly tools: AnalysisTools,
    readonly time: TimeLeft,
    readonly mending: MendModel,
    readonly seed: number,
  ) {
    const { model, touchedRow, movedRow } = mending;
    const slacks = levelSlacks(model);
    this.#aims = [
      ...model.levels.map(({ objective, row, step }, index) => ({
        name: objective,
        row,
        step,
        slack: slacks[index] ?? 0,
      })),
      { name: 'touched', row: touchedRow, step: 1, slack: 0 },
      { name: 'moved', row: movedRow, step: 1, slack: 0 },
      { name: 'cost', row: -1, step: 1, slack: roundingSlackCents(model) },
    ];
  }

  /** null: out of time before there was any mending. */
  run(starts: readonly Float64Array[]): { point: Point; aims: MendAim[] } | 'impossible' | null {
    let linear = this.mending.linear;
    const bounds: number[] = [];
    for (const start of starts) if (this.#keepsRules(start)) this.#offer(start);
    for (const [index, aim] of this.#aims.entries()) {
      const bound = this.#solveAim(linear, aim, index);
      if (bound === 'impossible') return 'impossible';
      bounds.push(bound);
      const value = this.#best?.figures[index];
      if (value === undefined) return null;
      if (aim.row >= 0) {
        linear = withRowBounds(linear, aim.row, Number.NEGATIVE_INFINITY, value + aim.slack);
      }
    }
    const point = this.#best;
    if (!point) return null;
    const aims = this.#aims.map(({ name }, index) => {
      const value = point.figures[index] ?? 0;
      return { name, value, bound: Math.min(value, bounds[index] ?? 0) };
    });
    return { point, aims };
  }

  /** Solves for one aim and answers its bound in whole steps. */
  #solveAim(linear: LinearModel, { name, step, slack }: Aim, index: number): number | 'impossible' {
    const isLast = index === this.#aims.length - 1;
    if ((this.#best?.figures[index] ?? 1) === 0 && !isLast) return 0;
    const outcome = this.tools.solve(linear, name, {
      limitSeconds: this.time.seconds() * (isLast ? 1 : aimShare),
      absoluteGap: step * (isLast ? 0.9 : 0.99),
      seed: this.seed,
      ...(this.#best ? { start: this.#best.values } : {}),
      onSolution: (values) => this.#offer(values),
      shouldStop: this.tools.isStopRequested,
    });
    if (outcome.kind === 'infeasible') return 'impossible';
    if ('solution' in outcome && outcome.solution) this.#offer(outcome.solution.values);
    if (!('bound' in outcome)) throw new Error(`A mending ended as ${outcome.kind}.`);
    const trusted = outcome.bound - slack - (isLast ? boundToleranceCents : levelTolerance);
    return Math.max(0, Math.ceil(trusted / step) * step);
  }

  #keepsRules(values: Float64Array): boolean {
    const { linear } = this.mending;
    const whole = completeMending(this.mending, values);
    return linear.rowNames.every((_, row) => {
      let sum = 0;
      for (let at = linear.starts[row] ?? 0; at < (linear.starts[row + 1] ?? 0); at += 1) {
        sum += (linear.values[at] ?? 0) * (whole[linear.indices[at] ?? 0] ?? 0);
      }
      const [lower = 0, upper = 0] = [linear.rowLower[row], linear.rowUpper[row]];
      return sum >= lower - tolerance && sum <= upper + tolerance;
    });
  }

  #offer(values: ArrayLike<number>): void {
    const whole = completeMending(this.mending, values);
    const { levels, costCents } = weighRoster(this.mending.model, whole);
    const { marks, touched } = this.mending;
    const count = (columns: readonly number[]) =>
      columns.reduce((sum, column) => sum + (whole[column] ?? 0), 0);
    const changed = count(marks.map(({ column }) => column));
    const figures = [...levels, count(touched), changed, costCents];
    const best = this.#best?.figures;
    const differs = figures.findIndex((value, index) => value !== best?.[index]);
    if (best && (differs < 0 || (figures[differs] ?? 0) > (best[differs] ?? 0))) return;
    this.#best = { values: whole, figures };
  }
}
