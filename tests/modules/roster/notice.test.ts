import { expect, test } from 'vitest';
import { confirmByOf, noticeWarningOf } from '@/modules/roster/notice';

test.each([
  ['far ahead: three days', '2027-02-01', '2027-01-14', '2027-01-17'],
  ['near: the day before the period', '2027-02-01', '2027-01-30', '2027-01-31'],
  ['on the day before: today', '2027-02-01', '2027-01-31', '2027-01-31'],
  ['begun: today, not the past', '2027-02-01', '2027-02-05', '2027-02-05'],
])('people confirm by: %s', (_, startsOn, today, expected) => {
  expect(confirmByOf(startsOn, today)).toBe(expected);
});

test('notice is counted in calendar days: from the 1st to the 15th is 14', () => {
  // Source: the notice test of the state scheduling laws, published 2026-03-01 for 2026-03-15.
  expect(noticeWarningOf({ noticeDays: 14 }, '2026-03-15', '2026-03-01')).toBeNull();
  expect(noticeWarningOf({ noticeDays: 14 }, '2026-03-15', '2026-03-02')).toBe(
    'People get 13 days of notice; this team promises 14 days.',
  );
  expect(noticeWarningOf({ noticeDays: 14 }, '2026-03-15', '2026-03-16')).toBe(
    'The period has begun already; this team promises 14 days.',
  );
});
