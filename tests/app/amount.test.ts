import { expect, it } from 'vitest';
import { readAmount, writeAmount } from '@/app/_ui/amount';

it.each([
  ['184', 18_400],
  ['184.5', 18_450],
  ['184,50', 18_450],
  [' 0.05 ', 5],
  ['-1.50', -150],
])('reads %j as whole minor units', (text, cents) => {
  expect(readAmount(text)).toBe(cents);
});

it.each(['', 'a lot', '1.234', '1,000.00', '1e3'])('does not guess at %j', (text) => {
  expect(readAmount(text)).toBeNaN();
});

it('writes minor units, and nothing for no amount', () => {
  expect(writeAmount(4050)).toBe('40.50');
  expect(writeAmount(null)).toBe('');
});
