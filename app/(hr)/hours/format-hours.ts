/**
 * How the hours of a column are written: whole where all of them are, else all with two decimals, so
 * that the figures stand under each other. Thousands are set apart: `3,392`.
 */
export function columnFormat(columnMinutes: readonly number[]): (minutes: number) => string {
  const isWhole = columnMinutes.every((minutes) => minutes % 60 === 0);
  const digits = isWhole ? 0 : 2;
  return (minutes) =>
    (minutes / 60).toLocaleString('en-GB', {
      minimumFractionDigits: digits,
      maximumFractionDigits: digits,
    });
}

/** A difference with its sign, `+8` or `−1.50`; the minus sign is the true one. */
export function signed(minutes: number, format: (minutes: number) => string): string {
  const sign = minutes > 0 ? '+' : minutes < 0 ? '−' : '';
  return `${sign}${format(Math.abs(minutes))}`;
}
