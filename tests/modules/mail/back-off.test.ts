import { expect, test } from 'vitest';
import { mostTries, nextTryAt } from '@/modules/mail/back-off';

test('waits grow fourfold from a minute and stop at a day', () => {
  const minutes = Array.from(
    { length: mostTries - 1 },
    (_, index) => nextTryAt(index + 1, 0) / 60_000,
  );
  expect(minutes).toEqual([1, 4, 16, 64, 256, 1024, 1440]);
});
