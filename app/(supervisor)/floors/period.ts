import type { RosterSummary } from '@/modules/roster';
import { addDays, type LocalDate } from '@/modules/units';

/** A period that the sheet can show. */
export interface Period {
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
  /** Whether a roster was opened for it. */
  readonly isOpen: boolean;
}

type Opened = Pick<RosterSummary, 'startsOn' | 'endsOn' | 'state'>;

/** The opened periods, earliest first, and the one that follows them. */
export function listPeriods(
  rosters: readonly Opened[],
  nextStart: LocalDate,
  periodDays: number,
): Period[] {
  return [
    ...rosters.map(({ startsOn, endsOn }) => ({ startsOn, endsOn, isOpen: true })),
    { ...periodFrom(nextStart, periodDays), isOpen: false },
  ];
}

/** The period to show at first: the one that starts on `asked`, else the earliest draft, else the last. */
export function choosePeriod(
  periods: readonly Period[],
  rosters: readonly Opened[],
  asked: unknown,
): Period | undefined {
  const startingOn = (date: unknown) => periods.find(({ startsOn }) => startsOn === date);
  const draft = rosters.find(({ state }) => state === 'draft');
  return startingOn(asked) ?? startingOn(draft?.startsOn) ?? periods.at(-1);
}

/** The period after this one. */
export function nextPeriod({ endsOn }: Period, periodDays: number): Omit<Period, 'isOpen'> {
  return periodFrom(addDays(endsOn, 1), periodDays);
}

const periodFrom = (startsOn: LocalDate, periodDays: number) => ({
  startsOn,
  endsOn: addDays(startsOn, periodDays - 1),
});
