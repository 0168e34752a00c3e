/** Writes minutes as hours. */
export type FormatHours = (minutes: number) => string;

/**
 * How the hours of a column are written: whole where all of them are, else all with two decimals, so
 * that the figures stand under each other. Thousands are set apart, `3,392`; nothing is `0`.
 */
export function columnFormat(columnMinutes: readonly number[]): FormatHours {
  const isWhole = columnMinutes.every((minutes) => minutes % 60 === 0);
  const digits = isWhole ? 0 : 2;
  return (minutes) =>
    minutes === 0
      ? '0'
      : (minutes / 60).toLocaleString('en-GB', {
          minimumFractionDigits: digits,
          maximumFractionDigits: digits,
        });
}

/** The formats of several columns by their names; a value that is not there counts as nothing. */
export function columnFormats<K extends string>(
  columns: readonly K[],
  rows: readonly Readonly<Record<K, number | null>>[],
): Readonly<Record<K, FormatHours>> {
  const entries = columns.map((column) => [
    column,
    columnFormat(rows.map((row) => row[column] ?? 0)),
  ]);
  return Object.fromEntries(entries) as Record<K, FormatHours>;
}

/** A difference with its sign, `+8` or `−1.50`; the minus sign is the true one. */
export function signed(minutes: number, format: FormatHours): string {
  const sign = minutes > 0 ? '+' : minutes < 0 ? '−' : '';
  return `${sign}${format(Math.abs(minutes))}`;
}
