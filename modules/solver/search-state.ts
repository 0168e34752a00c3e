import {
  completeValues,
  objectiveOf,
  type RosterFigures,
  type RosterModel,
  readRoster,
  roundingSlackCents,
  shortageStepMinutes,
  weighRoster,
} from '../model';
import type { PlannedRoster } from '../problem';
import type { RosterProgress, SolvedRoster } from './roster-outcome';

/** Where a search tells what it finds, and asks whether it shall stop. */
export interface SearchHooks {
  readonly onProgress: (progress: RosterProgress) => void;
  readonly onRoster: (solved: SolvedRoster) => void;
  readonly isStopRequested: () => boolean;
  /** Milliseconds on a clock that only runs forward. */
  readonly clock: () => number;
}

interface Incumbent extends RosterFigures {
  readonly values: Float64Array;
  readonly roster: PlannedRoster;
}

/** At most five reports a second. */
const reportEveryMs = 200;
/** Solver bounds are trusted to a hundredth of a cent. */
const boundToleranceCents = 0.01;
/** And shortage bounds to a thousandth of a minute. */
const boundToleranceMinutes = 1e-3;
const relativeTolerance = 1e-7;

/** The best roster so far and the proven bounds of one search. */
export class SearchState {
  #stage: 1 | 2 = 1;
  #best: Incumbent | null = null;
  #shortageBoundMinutes = 0;
  /** Bound of the cost of rosters that are short of at most `mostMinutes`. */
  #costBound: { cents: number; readonly mostMinutes: number };
  #lastReport = Number.NEGATIVE_INFINITY;
  readonly #model: RosterModel;
  readonly #hooks: SearchHooks;
  readonly #startedAt: number;
  readonly #endsAt: number;
  readonly #slackCents: number;
  readonly #stepMinutes: number;

  constructor(model: RosterModel, limitSeconds: number, hooks: SearchHooks) {
    this.#model = model;
    this.#hooks = hooks;
    this.#startedAt = hooks.clock();
    this.#endsAt = this.#startedAt + limitSeconds * 1000;
    this.#slackCents = roundingSlackCents(model);
    this.#stepMinutes = shortageStepMinutes(model);
    this.#costBound = { cents: this.#leastCents, mostMinutes: Number.POSITIVE_INFINITY };
  }

  get best(): (RosterFigures & { readonly values: Float64Array }) | null {
    return this.#best;
  }

  get shortageBoundMinutes(): number {
    return this.#shortageBoundMinutes;
  }

  /** Shortage is a multiple of this many minutes. */
  get stepMinutes(): number {
    return this.#stepMinutes;
  }

  get isStopRequested(): boolean {
    return this.#hooks.isStopRequested();
  }

  get isShortageProven(): boolean {
    return this.#best !== null && this.#best.shortageMinutes <= this.#shortageBoundMinutes;
  }

  /** Cents between cost and bound that only the rounding of pay explains. */
  get roundingCents(): number {
    return this.#slackCents === 0 ? 0 : Math.ceil(2 * this.#slackCents) + 1;
  }

  remainingSeconds(): number {
    return (this.#endsAt - this.#hooks.clock()) / 1000;
  }

  /** Takes a solution of the model when it is better than the best: less shortage first, then less cost. */
  offer(values: ArrayLike<number>): void {
    const figures = weighRoster(this.#model, values);
    if (this.#best && !isBetter(figures, this.#best)) return;
    const roster = readRoster(this.#model, values);
    this.#best = { ...figures, roster, values: completeValues(this.#model, values) };
    const solved = this.solved();
    if (solved) this.#hooks.onRoster(solved);
    this.report();
  }

  raiseShortageBound(minutes: number): void {
    const trusted = minutes - boundToleranceMinutes - Math.abs(minutes) * relativeTolerance;
    const whole = Math.ceil(trusted / this.#stepMinutes) * this.#stepMinutes;
    this.#shortageBoundMinutes = Math.max(this.#shortageBoundMinutes, whole);
    this.report();
  }

  /** Begins a bound of the cost of rosters that are short of at most so many minutes. */
  beginCostBound(mostMinutes: number): void {
    this.#costBound = { cents: this.#leastCents, mostMinutes };
  }

  /** `cents` is a bound of the model's cost, which lies within the slack of the cost in whole cents. */
  raiseCostBound(cents: number): void {
    this.#costBound.cents = Math.max(this.#costBound.cents, this.#wholeCents(cents));
    this.report();
  }

  /** Ends stage one with the shortage of the best roster, proven or not. */
  beginStageTwo(): void {
    this.#stage = 2;
  }

  solved(): SolvedRoster | null {
    if (!this.#best) return null;
    const { roster, shortageMinutes, costCents } = this.#best;
    // A bound for less shortage than the roster has says nothing about it.
    const isBound = shortageMinutes <= this.#costBound.mostMinutes;
    const boundCents = Math.min(isBound ? this.#costBound.cents : this.#leastCents, costCents);
    return {
      roster,
      shortageMinutes,
      shortageBoundMinutes: Math.min(this.#shortageBoundMinutes, shortageMinutes),
      costCents,
      boundCents,
      gap: costCents === 0 ? 0 : (costCents - boundCents) / costCents,
    };
  }

  report(isForced = false): void {
    const now = this.#hooks.clock();
    if (!isForced && now - this.#lastReport < reportEveryMs) return;
    this.#lastReport = now;
    const solved = this.solved();
    this.#hooks.onProgress({
      stage: this.isShortageProven ? 2 : this.#stage,
      elapsedMs: Math.round(now - this.#startedAt),
      shortageMinutes: solved?.shortageMinutes ?? null,
      shortageBoundMinutes: solved?.shortageBoundMinutes ?? this.#shortageBoundMinutes,
      bestCostCents: solved?.costCents ?? null,
      boundCents: solved?.boundCents ?? null,
    });
  }

  /** No roster costs less than the constant of the objective: every other cost is 0 or more. */
  get #leastCents(): number {
    return this.#wholeCents(objectiveOf(this.#model.linear, 'cost').offset);
  }

  #wholeCents(bound: number): number {
    return Math.ceil(bound - this.#slackCents - boundToleranceCents);
  }
}

const isBetter = (one: RosterFigures, other: RosterFigures): boolean =>
  one.shortageMinutes < other.shortageMinutes ||
  (one.shortageMinutes === other.shortageMinutes && one.costCents < other.costCents);
