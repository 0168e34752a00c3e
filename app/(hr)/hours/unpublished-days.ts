import { addDays, type DateRange, type LocalDate } from '@/modules/units';

interface Period {
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
}

/** Stretches of a range on which no published period lies. Periods come earliest first, none overlap. */
export function unpublishedDays({ from, to }: DateRange, periods: readonly Period[]): DateRange[] {
  const gaps: DateRange[] = [];
  let next = from;
  for (const { startsOn, endsOn } of periods) {
    if (startsOn > next) gaps.push({ from: next, to: addDays(startsOn, -1) });
    if (endsOn >= next) next = addDays(endsOn, 1);
  }
  return next <= to ? [...gaps, { from: next, to }] : gaps;
}
