import { z } from 'zod';

/** Whole minor units of a currency (euro cents). Never a float. */
export type Cents = number;

const amountMessage = 'Write an amount of money from 0 to 10,000,000.';

/** Zod type of an amount that is not negative. */
export const centsSchema = z
  .int(amountMessage)
  .min(0, amountMessage)
  .max(1_000_000_000, amountMessage);

/**
 * Pay for some minutes at an hourly rate and a percentage of it, rounded once, half up, to a whole
 * minor unit. The one place where money is rounded. `payFor(2500, 480, 25)` is 5000.
 */
export function payFor(centsPerHour: Cents, minutes: number, percent = 100): Cents {
  return Math.floor((centsPerHour * minutes * percent) / 6000 + 0.5);
}

/** Money for people, e.g. `€103,420` or, with minor units, `€103,420.50`. */
export function formatMoney(
  cents: Cents,
  currency: string,
  locale = 'en-GB',
  digits: 0 | 2 = 0,
): string {
  return new Intl.NumberFormat(locale, {
    style: 'currency',
    currency,
    minimumFractionDigits: digits,
    maximumFractionDigits: digits,
  }).format(cents / 100);
}
