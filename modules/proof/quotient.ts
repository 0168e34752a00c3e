/** `above / below` rounded half up to a whole number; both are not negative. `7n / 2n` gives 4. */
export function quotientHalfUp(above: bigint, below: bigint): number {
  return Number((2n * above + below) / (2n * below));
}
