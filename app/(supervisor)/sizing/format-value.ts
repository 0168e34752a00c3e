import { formatMoney } from '@/modules/units';

/** People with at most two places, e.g. `22.33`; the solver's rounding leaves no "-0". */
export const formatPeople = (people: number): string =>
  (Math.round(people * 100) / 100 + 0).toLocaleString('en-GB');

/** An amount to the nearest cent; minor units only where there are any. */
export function formatPay(cents: number, currency: string): string {
  const whole = Math.round(cents) + 0;
  return formatMoney(whole, currency, 'en-GB', whole % 100 === 0 ? 0 : 2);
}

/** How the values of a sizing are written: with their unit. */
export const formatValue =
  (objective: 'people' | 'pay', currency: string) =>
  (value: number): string =>
    objective === 'pay' ? formatPay(value, currency) : `${formatPeople(value)} people`;
