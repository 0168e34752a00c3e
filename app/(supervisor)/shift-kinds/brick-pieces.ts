import type { ShiftKind } from '@/modules/coverage';

const minutesPerDay = 1440;

/** A part of a shift on the line of one day, in percent of the line. */
export interface BrickPiece {
  readonly left: number;
  readonly width: number;
}

/**
 * Where a shift lies on a line that runs from the start of the team's day to the same time next day. A
 * shift that crosses the end of the line goes on at its beginning, so it comes in two pieces.
 */
export function brickPieces(
  { startMinute, endMinute }: Pick<ShiftKind, 'startMinute' | 'endMinute'>,
  dayStartsAtMinute: number,
): BrickPiece[] {
  const start = (startMinute - dayStartsAtMinute + minutesPerDay) % minutesPerDay;
  const end = start + endMinute - startMinute;
  const piece = (from: number, to: number) => ({ left: percent(from), width: percent(to - from) });
  return end <= minutesPerDay
    ? [piece(start, end)]
    : [piece(start, minutesPerDay), piece(0, end - minutesPerDay)];
}

/** Minutes of the local day at which the line has a mark: every three hours. */
export const lineMarks = (dayStartsAtMinute: number): { minute: number; left: number }[] =>
  Array.from({ length: 9 }, (_, index) => ({
    minute: dayStartsAtMinute + index * 180,
    left: percent(index * 180),
  }));

const percent = (minutes: number): number => (minutes * 100) / minutesPerDay;
