/** Figures from 0 up to 1, the same for the same seed: a linear congruence with the constants of Knuth's MMIX. */
export function seededFigures(seed: number): () => number {
  let state = BigInt(seed);
  return () => {
    state = (state * 6364136223846793005n + 1442695040888963407n) & 0xffff_ffff_ffff_ffffn;
    return Number(state >> 32n) / 2 ** 32;
  };
}

/** A copy in an order that the figures decide (Fisher and Yates). */
export function shuffled<T>(items: readonly T[], figure: () => number): T[] {
  const rest = [...items];
  const order: T[] = [];
  while (rest.length > 0) order.push(...rest.splice(Math.floor(figure() * rest.length), 1));
  return order;
}
