import { formatMoney } from '@/modules/units';

/** People with at most two places, e.g. `22.33`. */
export const formatPeople = (people: number): string =>
  people.toLocaleString('en-GB', { maximumFractionDigits: 2 });

/** An amount; minor units only where there are any. */
export const formatPay = (cents: number, currency: string): string =>
  formatMoney(
    cents,
    currency,
    'en-GB',
    Math.round(cents) % 100 === 0 && Number.isInteger(cents) ? 0 : 2,
  );

/** How the values of a sizing are written: with their unit. */
export const formatValue =
  (objective: 'people' | 'pay', currency: string) =>
  (value: number): string =>
    objective === 'pay' ? formatPay(value, currency) : `${formatPeople(value)} people`;
