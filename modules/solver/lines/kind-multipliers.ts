import type { PersonLines } from '../../model';

/** Share of the largest cost with which a multiplier begins. */
const firstShare = 1 / 16;

/**
 * Prices on kinds whose limit a net does not count: raised while the cheapest line works too many of a
 * kind, then halved towards the least price that stops it. Any prices of 0 or more give a lower bound,
 * line price - price x limit.
 */
export class KindMultipliers {
  readonly #limits: PersonLines['sideLimits'];
  /** What the kept days leave of each limit. */
  readonly #room: readonly number[];
  readonly #price: number[];
  /** The highest price that was too low, and the lowest that was enough. */
  readonly #low: number[];
  readonly #high: number[];

  constructor({ sideLimits }: PersonLines, kept: readonly number[]) {
    this.#limits = sideLimits;
    this.#room = sideLimits.map(({ most }, index) => most - (kept[index] ?? 0));
    this.#price = sideLimits.map(() => 0);
    this.#low = sideLimits.map(() => 0);
    this.#high = sideLimits.map(() => Number.POSITIVE_INFINITY);
  }

  /** What the prices take off a line that works as much as the limits allow. */
  get constant(): number {
    return this.priceOf(this.#room);
  }

  /** What some counts of the limited kinds pay. */
  priceOf(counts: readonly number[]): number {
    return counts.reduce((sum, count, index) => sum + count * (this.#price[index] ?? 0), 0);
  }

  /**
   * The next change of a price, given what the cheapest line works; null when there is nothing to learn.
   * `scale` is the size of the costs.
   */
  next(
    counts: readonly number[],
    scale: number,
  ): { readonly group: number; readonly extra: number } | null {
    const isOver = (index: number) => (counts[index] ?? 0) > (this.#room[index] ?? 0);
    const over = this.#limits.findIndex((_, index) => isOver(index));
    const index = over >= 0 ? over : this.#limits.findIndex((_, at) => this.#isTooHigh(at, counts));
    if (index < 0) return null;
    const before = this.#price[index] ?? 0;
    if (over >= 0) this.#low[index] = before;
    else this.#high[index] = before;
    const [low, high] = [this.#low[index] ?? 0, this.#high[index] ?? Number.POSITIVE_INFINITY];
    const after = Number.isFinite(high)
      ? (low + high) / 2
      : Math.max(before * 3, scale * firstShare);
    if (Math.abs(after - before) <= scale * 1e-9) return null;
    this.#price[index] = after;
    return { group: this.#limits[index]?.group ?? 0, extra: after - before };
  }

  /** A priced kind of which less than the limit is worked. */
  #isTooHigh(index: number, counts: readonly number[]): boolean {
    return (this.#price[index] ?? 0) > 0 && (counts[index] ?? 0) < (this.#room[index] ?? 0);
  }
}
