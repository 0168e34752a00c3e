import { hours } from '@/app/_ui/clock';
import type { RunEvent } from '@/modules/roster';
import { formatMoney } from '@/modules/units';
import { gapOf, gapText } from '../gap';

/** One report of a run in words, to be read aloud. */
export function progressSentence(event: RunEvent, currency: string): string {
  const { stage, shortageMinutes, bestCostCents } = event;
  if (stage === 1) {
    return shortageMinutes === null
      ? 'Stage 1: looking whether the floors can be held.'
      : `Stage 1: short ${hours(shortageMinutes)} so far.`;
  }
  if (bestCostCents === null) return 'Stage 2: looking for the cheapest roster.';
  const gap = gapOf(event);
  const cost = `Stage 2: best roster so far ${formatMoney(bestCostCents, currency)}`;
  return gap === null ? `${cost}.` : `${cost}, at most ${gapText(gap)} above the cheapest.`;
}
