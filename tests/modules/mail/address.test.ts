import { expect, test } from 'vitest';
import { isMailAddress, readSender } from '@/modules/mail/address';

// RFC 5321, 4.5.3.1: local part at most 64, path with its brackets at most 256.
test.each([
  ['ingrid.solane@ravelmere.example', true],
  [`${'a'.repeat(64)}@x.example`, true],
  [`${'a'.repeat(65)}@x.example`, false],
  [`a@${'b'.repeat(60)}.${'c'.repeat(60)}.${'d'.repeat(60)}.${'e'.repeat(65)}.example`, false],
  ['', false],
  ['nobody', false],
  ['a@b.example\r\nBcc: everyone@b.example', false],
  ['a@b.example, c@d.example', false],
  ['Ingrid <ingrid@b.example>', false],
])('%j is an address to send to: %s', (text, isOne) => {
  expect(isMailAddress(text)).toBe(isOne);
});

test('the sender is read with and without a name', () => {
  const address = 'rosters@floorwright.example';
  expect(readSender(`Floorwright <${address}>`)).toEqual({ name: 'Floorwright', address });
  expect(readSender(`"Rosters, all" <${address}>`)).toEqual({ name: 'Rosters, all', address });
  expect(readSender(address)).toEqual({ name: '', address });
});

test('a sender without a usable address is refused by name of the setting', () => {
  expect(() => readSender('Floorwright')).toThrow(/MAIL_FROM/);
});
