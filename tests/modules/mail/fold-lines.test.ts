import fc from 'fast-check';
import { expect, test } from 'vitest';
import { foldLines, unfoldLines } from '@/modules/mail/fold-lines';

const octetsOf = (text: string): number[] =>
  text.split('\r\n').map((line) => Buffer.byteLength(line));

// RFC 5545, 3.1: 128 octets fold into 74 and 55, the second with its leading space.
test('a line of two-octet characters is folded between characters', () => {
  const folded = foldLines([`SUMMARY:${'é'.repeat(60)}`]);
  expect(octetsOf(folded)).toEqual([74, 55, 0]);
  expect(folded).toContain('\r\n é');
});

test('a line of 75 octets stays whole, one of 76 is folded once', () => {
  expect(octetsOf(foldLines(['x'.repeat(75)]))).toEqual([75, 0]);
  expect(octetsOf(foldLines(['x'.repeat(76)]))).toEqual([75, 2, 0]);
});

test('characters outside the basic plane are never split', () => {
  const folded = foldLines([`${'x'.repeat(73)}🐕🐈`]);
  expect(octetsOf(folded)).toEqual([73, 9, 0]);
});

test('any text keeps within 75 octets a line and comes back by unfolding', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'grapheme', maxLength: 400 }), (text) => {
      const line = `X${text.replace(/\p{Cc}/gu, '')}`;
      const folded = foldLines([line]);
      expect(Math.max(...octetsOf(folded))).toBeLessThanOrEqual(75);
      expect(unfoldLines(folded)).toBe(`${line}\r\n`);
    }),
  );
});
