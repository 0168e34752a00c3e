import type { OwnPeriod } from '@/modules/roster';
import type { LocalDate } from '@/modules/units';
import { type Week, weeksOf } from './week-lines';

/** Periods that are not over, the running one first. */
export const periodsAhead = (periods: readonly OwnPeriod[], today: LocalDate): OwnPeriod[] =>
  periods
    .filter(({ endsOn }) => endsOn >= today)
    .sort((a, b) => a.startsOn.localeCompare(b.startsOn));

/** The weeks of a period that are over, and those that are not: the week of today stands whole. */
export function splitWeeks(
  period: OwnPeriod,
  today: LocalDate,
): { readonly past: readonly Week[]; readonly ahead: readonly Week[] } {
  const weeks = weeksOf(period);
  return {
    past: weeks.filter(({ to }) => to < today),
    ahead: weeks.filter(({ to }) => to >= today),
  };
}
