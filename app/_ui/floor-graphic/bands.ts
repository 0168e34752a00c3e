import type { CoverDay } from './day-axis';

/** Bands behind weekends, neighbours joined, for days drawn at equal width. */
export function weekendBands(
  days: readonly Pick<CoverDay, 'isWeekend'>[],
  width: number,
): { readonly x: number; readonly width: number }[] {
  const dayWidth = width / Math.max(1, days.length);
  const bands: { x: number; width: number }[] = [];
  days.forEach(({ isWeekend }, index) => {
    if (!isWeekend) return;
    const last = bands.at(-1);
    if (last && days[index - 1]?.isWeekend) last.width += dayWidth;
    else bands.push({ x: index * dayWidth, width: dayWidth });
  });
  return bands;
}
