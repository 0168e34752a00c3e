/** Seconds that a team of so many people took. */
export interface GrowthPoint {
  readonly people: number;
  readonly seconds: number;
}

/**
 * The exponent b of seconds = a x people^b that fits best: least squares of the logarithms. Null for fewer
 * than two different sizes.
 */
export function fittedExponent(points: readonly GrowthPoint[]): number | null {
  const logs = points.map(({ people, seconds }) => [Math.log(people), Math.log(seconds)] as const);
  const mean = (position: 0 | 1) => logs.reduce((sum, log) => sum + log[position], 0) / logs.length;
  const [meanX, meanY] = [mean(0), mean(1)];
  const spread = logs.reduce((sum, [x]) => sum + (x - meanX) ** 2, 0);
  if (points.length < 2 || spread === 0) return null;
  return logs.reduce((sum, [x, y]) => sum + (x - meanX) * (y - meanY), 0) / spread;
}
