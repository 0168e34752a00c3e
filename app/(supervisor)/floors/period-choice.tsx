'use client';

import { dateRange } from '@/app/_ui/clock';
import { SelectField } from '@/app/_ui/field';
import type { LocalDate } from '@/modules/units';
import type { Period } from './period';

interface Props {
  readonly periods: readonly Period[];
  readonly period: Period;
  readonly onChoose: (period: Period) => void;
}

/** Chooses the period that the sheet shows, and keeps the choice in the address. */
export function PeriodChoice({ periods, period, onChoose }: Props) {
  const choose = (startsOn: LocalDate) => {
    const chosen = periods.find((one) => one.startsOn === startsOn);
    if (!chosen) return;
    const address = new URL(window.location.href);
    address.searchParams.set('period', startsOn);
    window.history.replaceState(null, '', address);
    onChoose(chosen);
  };
  return (
    <SelectField
      label="Period shown"
      value={period.startsOn}
      onChange={(event) => choose(event.target.value)}
      className="min-w-60"
    >
      {periods.map(({ startsOn, endsOn, isOpen }) => (
        <option key={startsOn} value={startsOn}>
          {dateRange(startsOn, endsOn)} {endsOn.slice(0, 4)}
          {isOpen ? '' : ', not opened yet'}
        </option>
      ))}
    </SelectField>
  );
}
