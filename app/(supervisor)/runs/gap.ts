/** Best cost and proven bound of a run, in minor units; null where there is none yet. */
export interface CostFigures {
  readonly bestCostCents: number | null;
  readonly boundCents: number | null;
}

/** How far the best roster may be from the cheapest, as a share of its cost; null without both figures. */
export function gapOf({ bestCostCents, boundCents }: CostFigures): number | null {
  if (bestCostCents === null || boundCents === null || bestCostCents <= 0) return null;
  return Math.max(0, bestCostCents - boundCents) / bestCostCents;
}

/** `0.36 %`; a gap that is not nothing never reads as 0. */
export function gapText(gap: number): string {
  const percent = gap * 100;
  if (percent > 0 && percent < 0.01) return 'under 0.01 %';
  return `${percent.toLocaleString('en-GB', { maximumFractionDigits: 2 })} %`;
}
