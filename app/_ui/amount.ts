import type { Cents } from '@/modules/units';

/** Cents of `184`, `184.5` or `184,50`; NaN for anything else. */
export function readAmount(text: string): Cents {
  const match = /^(-?\d{1,9})(?:[.,](\d{1,2}))?$/.exec(text.trim());
  if (!match) return Number.NaN;
  const minor = Number((match[2] ?? '').padEnd(2, '0'));
  const whole = Number(match[1]) * 100;
  return text.trim().startsWith('-') ? whole - minor : whole + minor;
}

/** What stands in a field for an amount, with minor units: `184.50`; empty for none. */
export const writeAmount = (cents: Cents | null): string =>
  cents === null ? '' : (cents / 100).toFixed(2);
