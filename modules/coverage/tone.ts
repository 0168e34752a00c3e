/** Darkness of a brick by lateness: 0 early, 1 day, 2 late, 3 night. */
export type Tone = 0 | 1 | 2 | 3;

interface TonedKind {
  readonly startMinute: number;
  readonly isNight: boolean;
}

/**
 * The tone of a shift kind among the kinds of its team. Nights are 3; the others spread over 0 to 2 by
 * their start time, so that the earliest is 0 and the latest is 2. A kind alone is 0; it need not be
 * among `kinds`, so that a retired one still has its tone.
 */
export function toneOf(kind: TonedKind, kinds: readonly TonedKind[]): Tone {
  if (kind.isNight) return 3;
  const starts = new Set(
    [kind, ...kinds].filter(({ isNight }) => !isNight).map(({ startMinute }) => startMinute),
  );
  const earlier = [...starts].filter((startMinute) => startMinute < kind.startMinute).length;
  const share = starts.size > 1 ? earlier / (starts.size - 1) : 0;
  if (share < 0.25) return 0;
  return share < 0.75 ? 1 : 2;
}
