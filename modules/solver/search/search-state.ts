import {
  type CostGrid,
  completeValues,
  costGrid,
  leastCostCents,
  levelSlacks,
  type RosterFigures,
  readRoster,
  roundingSlackCents,
  weighRoster,
} from '../../model';
import type { BoundRecord, PlannedRoster } from '../../problem';
import type { RosterProgress, SolvedRoster } from '../roster-outcome';
import type { Ground } from './first-roster';
import type { Pace } from './pace';
import type { PeerLink } from './peer-link';

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

interface CostBound {
  readonly cents: number;
  /** It holds for rosters with at most these values of the levels. */
  readonly most: readonly number[];
  /** What it can be reckoned anew from; null for a bound of a search tree. */
  readonly record: BoundRecord | null;
}

/** At most five reports a second. */
const reportEveryMs = 200;
/** Solver bounds are trusted to a hundredth of a cent. */
const boundToleranceCents = 0.01;
/** And bounds of levels to a thousandth of a unit or minute. */
const levelTolerance = 1e-3;
const relativeTolerance = 1e-7;

/** The best roster so far and the proven bounds of one search, shared with the other lane. */
export class SearchState {
  #best: Incumbent | null = null;
  /** By level; each holds for rosters that are as good on the levels before it as the best one. */
  readonly #levelBounds: number[];
  #costBound: CostBound;
  /** The best bound that comes with a record; may be below the one above. */
  #recorded: CostBound | null = null;
  /** What one unit more of each row of the space is worth in the relaxation, once known. */
  worth: Float64Array | null = null;
  #lastReport = Number.NEGATIVE_INFINITY;
  readonly #ground: Ground;
  readonly #pace: Pace;
  readonly #peer: PeerLink;
  readonly #hooks: SearchHooks;
  readonly #targetGap: number;
  readonly #startedAt: number;
  readonly #slackCents: number;
  readonly #grid: CostGrid;
  readonly #levelSlacks: readonly number[];

  constructor(
    ground: Ground,
    pace: Pace,
    peer: PeerLink,
    hooks: SearchHooks,
    given: { readonly targetGap: number; readonly startedAt: number },
  ) {
    this.#ground = ground;
    this.#pace = pace;
    this.#peer = peer;
    this.#hooks = hooks;
    this.#targetGap = given.targetGap;
    this.#startedAt = given.startedAt;
    this.#slackCents = roundingSlackCents(ground.model);
    this.#grid = costGrid(ground.model);
    this.#levelSlacks = levelSlacks(ground.model);
    this.#levelBounds = ground.model.levels.map(() => 0);
    const cents = this.#wholeCents(leastCostCents(ground.model));
    this.#costBound = { cents, most: [], record: null };
  }

  get best(): (RosterFigures & Pick<Incumbent, 'values' | 'roster'>) | null {
    return this.#best;
  }

  levelBound(level: number): number {
    return this.#levelBounds[level] ?? 0;
  }

  /** How far the model may lie from the whole figures of a level. */
  levelSlack(level: number): number {
    return this.#levelSlacks[level] ?? 0;
  }

  get isStopRequested(): boolean {
    return this.#hooks.isStopRequested();
  }

  /** Whether there is nothing more to do: stopped, out of time, or solved as well as was asked for. */
  get isOver(): boolean {
    return this.isStopRequested || this.#pace.remaining() <= 0 || this.isSolved;
  }

  /** Whether the best roster is proven best on all levels, or on those before one and on that one. */
  isProven(level = this.#levelBounds.length - 1): boolean {
    const best = this.#best?.levels;
    return (
      best !== undefined &&
      this.#levelBounds.every((bound, index) => index > level || (best[index] ?? 0) <= bound)
    );
  }

  /** Proven on all levels, and the cost within rounding or within the gap that was asked for. */
  get isSolved(): boolean {
    const solved = this.isProven() ? this.solved() : null;
    return solved !== null && (this.isOptimal(solved) || solved.gap <= this.#targetGap);
  }

  /** Cost and bound differ by nothing but the rounding of pay. */
  isOptimal({ costCents, boundCents }: SolvedRoster): boolean {
    return costCents - boundCents <= this.#roundingCents;
  }

  /** Cents between cost and bound that only the rounding of pay explains. */
  get #roundingCents(): number {
    return this.#slackCents === 0 ? 0 : Math.ceil(2 * this.#slackCents) + 1;
  }

  /** Takes a solution of the model when it is better than the best: levels first, then cost. */
  offer(values: ArrayLike<number>): void {
    if (this.#take(values)) {
      const columns = this.#ground.model.works.flatMap((work) =>
        work.columns.filter(({ column }) => (values[column] ?? 0) > 0.5).map((one) => one.column),
      );
      this.#peer.tell({ kind: 'roster', columns: Int32Array.from(columns) });
    }
  }

  /** Takes the lines of the ground, when everybody is in. */
  offerLines({ lines }: Ground): void {
    if (lines.isIn.every((isIn) => isIn === 1)) this.offerCells(lines.cells);
  }

  /** Takes a roster by its worked columns, -1 for days off. */
  offerCells(cells: Int32Array): void {
    this.offer(this.#valuesOf(cells));
  }

  /** Takes in what the other lane has found. */
  fetchFromPeer(): void {
    for (const message of this.#peer.fetch()) {
      switch (message.kind) {
        case 'roster':
          this.#take(this.#valuesOf(message.columns));
          break;
        case 'worth':
          this.worth = message.worth;
          break;
        case 'level-bound':
          this.#raiseLevel(message.level, message.value);
          break;
        case 'cost-bound':
          this.#raiseCost(message.bound);
          break;
      }
    }
  }

  /** What guides the insertion of lines, for both lanes. */
  shareWorth(worth: Float64Array): void {
    this.worth = worth;
    this.#peer.tell({ kind: 'worth', worth });
  }

  /**
   * `isLeast`: the model has nothing below `value`. The best roster is then the least one but for the
   * rounding of pay that a firm budget is held against.
   */
  raiseLevelBound(level: number, value: number, isLeast = false): void {
    const step = this.#ground.model.levels[level]?.step ?? 1;
    const slack = this.levelSlack(level);
    const trusted = value - slack - levelTolerance - Math.abs(value) * relativeTolerance;
    const whole = Math.ceil(trusted / step) * step;
    const reached = this.#best?.levels[level] ?? Number.POSITIVE_INFINITY;
    const isRounding = isLeast && reached - whole <= Math.ceil(2 * slack);
    const bound = isRounding ? Math.max(whole, reached) : whole;
    if (this.#raiseLevel(level, bound)) {
      this.#peer.tell({ kind: 'level-bound', level, value: bound });
    }
  }

  /**
   * `cents` is a bound of the model's cost, which lies within the slack of the cost in whole cents, for
   * rosters with at most these values of the levels.
   */
  raiseCostBound(cents: number, most: readonly number[], record: BoundRecord | null = null): void {
    const bound = { cents: this.#wholeCents(cents), most, record };
    if (this.#raiseCost(bound)) this.#peer.tell({ kind: 'cost-bound', bound });
  }

  solved(): SolvedRoster | null {
    if (!this.#best) return null;
    const { roster, levels, shortageMinutes, costCents } = this.#best;
    const found = this.#holds(this.#costBound) ? this.#costBound.cents : Number.NEGATIVE_INFINITY;
    const bound = Math.max(found, this.#wholeCents(leastCostCents(this.#ground.model)));
    // Rounding may lift a bound over the cost; more than that is a fault, which the judge must see.
    const boundCents =
      bound - costCents <= this.#roundingCents ? Math.min(bound, costCents) : bound;
    const recorded = this.#recorded && this.#holds(this.#recorded) ? this.#recorded : null;
    return {
      roster,
      shortageMinutes,
      shortageBoundMinutes: Math.min(this.#shortageBound, shortageMinutes),
      costCents,
      boundCents,
      gap: costCents === 0 ? 0 : (costCents - boundCents) / Math.abs(costCents),
      levels,
      boundRecord: recorded?.record ?? null,
      recordedBoundCents: recorded?.cents ?? null,
    };
  }

  report(isForced = false): void {
    const now = this.#hooks.clock();
    if (!isForced && now - this.#lastReport < reportEveryMs) return;
    this.#lastReport = now;
    const solved = this.solved();
    this.#hooks.onProgress({
      stage: this.isProven() ? 2 : 1,
      elapsedMs: Math.round(now - this.#startedAt),
      shortageMinutes: solved?.shortageMinutes ?? null,
      shortageBoundMinutes: solved?.shortageBoundMinutes ?? this.#shortageBound,
      bestCostCents: solved?.costCents ?? null,
      boundCents: solved?.boundCents ?? null,
    });
  }

  #take(values: ArrayLike<number>): boolean {
    const { model } = this.#ground;
    const figures = weighRoster(model, values);
    if (this.#best && !isBetter(figures, this.#best)) return false;
    this.#dropLevelBounds(figures.levels);
    const roster = readRoster(model, values);
    this.#best = { ...figures, roster, values: completeValues(model, values) };
    const solved = this.solved();
    if (solved) this.#hooks.onRoster(solved);
    this.report();
    return true;
  }

  /** Bounds of levels after the first that gets better were proven for what the levels before had been. */
  #dropLevelBounds(levels: readonly number[]): void {
    const before = this.#best?.levels;
    if (!before) return;
    const better = levels.findIndex((value, index) => value < (before[index] ?? 0));
    if (better >= 0) this.#levelBounds.fill(0, better + 1);
  }

  #raiseLevel(level: number, whole: number): boolean {
    if (whole <= this.levelBound(level)) return false;
    this.#levelBounds[level] = whole;
    this.report();
    return true;
  }

  /** A bound that holds for the best roster stands before one that does not. */
  #raiseCost(bound: CostBound): boolean {
    if (this.#best && !this.#holds(bound)) return false;
    const isCloser = (held: CostBound | null) =>
      held === null || !this.#holds(held) || bound.cents > held.cents;
    const isNewRecord = bound.record !== null && isCloser(this.#recorded);
    const isNewBound = isCloser(this.#costBound);
    if (isNewRecord) this.#recorded = bound;
    if (isNewBound) this.#costBound = bound;
    if (isNewBound) this.report();
    return isNewRecord || isNewBound;
  }

  /** A bound for less shortage than the roster has says nothing about it. */
  #holds({ most }: CostBound): boolean {
    return most.every((value, index) => (this.#best?.levels[index] ?? 0) <= value);
  }

  #valuesOf(columns: Int32Array): Float64Array {
    const values = new Float64Array(this.#ground.model.linear.columnNames.length);
    for (const column of columns) if (column >= 0) values[column] = 1;
    return values;
  }

  /** Of firm floors of every priority. */
  get #shortageBound(): number {
    return this.#ground.model.levels.reduce(
      (sum, { name }, index) => sum + (name === 'shortage' ? this.levelBound(index) : 0),
      0,
    );
  }

  /** The least cost there can be at or above a bound of the model. */
  #wholeCents(bound: number): number {
    const { baseCents, stepCents } = this.#grid;
    const steps = (bound - this.#slackCents - boundToleranceCents - baseCents) / stepCents;
    return baseCents + Math.ceil(steps) * stepCents;
  }
}

/** Levels first, one after the other, then cost. */
function isBetter(one: RosterFigures, other: RosterFigures): boolean {
  const level = one.levels.findIndex((value, index) => value !== other.levels[index]);
  if (level < 0) return one.costCents < other.costCents;
  return (one.levels[level] ?? 0) < (other.levels[level] ?? 0);
}
