import { expect, test } from 'vitest';
import { sumDay } from '@/modules/hours/sum-day';
import type { ClockRules } from '@/modules/problem';
import { toInstant } from '@/modules/units';

const zone = 'Europe/Berlin';
const clock = (holidays: readonly string[] = []): ClockRules => ({
  zone,
  pay: { nightStartMinute: 1380, nightEndMinute: 1860 },
  isHoliday: (date) => holidays.includes(date),
});

const time = (date: string, startMinute: number, endMinute: number, paidMinutes: number) => ({
  startsAtUtc: toInstant(date, startMinute, zone),
  endsAtUtc: toInstant(date, endMinute, zone),
  paidMinutes,
});
const planned = { ...time('2027-02-12', 1380, 1860, 480), shift: 'Night', post: 'Vet' };

test('a night from Friday to Saturday is split at midnight by the clock', () => {
  expect(sumDay('2027-02-12', [planned], [], clock())).toEqual({
    date: '2027-02-12',
    shift: 'Night',
    post: 'Vet',
    plannedMinutes: 480,
    workedMinutes: null,
    nightMinutes: 480,
    weekendMinutes: 420,
    holidayMinutes: 0,
    reason: '',
  });
});

test('where work is recorded, its own time is split, not the plan', () => {
  const worked = { ...time('2027-02-12', 1380, 1620, 240), reason: 'Sent home at 03:00' };
  expect(sumDay('2027-02-12', [planned], [worked], clock(['2027-02-13']))).toMatchObject({
    plannedMinutes: 480,
    workedMinutes: 240,
    nightMinutes: 240,
    weekendMinutes: 180,
    holidayMinutes: 180,
    reason: 'Sent home at 03:00',
  });
});

test('two stretches of work on one date add up and keep both reasons', () => {
  const day = sumDay(
    '2027-02-10',
    [],
    [
      { ...time('2027-02-10', 420, 660, 240), reason: 'Split shift' },
      { ...time('2027-02-10', 900, 1020, 120), reason: 'Called in' },
    ],
    clock(),
  );
  expect(day).toMatchObject({
    shift: '',
    plannedMinutes: 0,
    workedMinutes: 360,
    reason: 'Split shift; Called in',
  });
});

test('work recorded as none differs from no record', () => {
  const worked = { ...time('2027-02-12', 1380, 1380, 0), reason: 'Sick' };
  expect(sumDay('2027-02-12', [planned], [worked], clock()).workedMinutes).toBe(0);
});

test('the spring night of Berlin has seven hours', () => {
  // Source: IANA zone Europe/Berlin, 28 March 2027: 02:00 becomes 03:00.
  const night = { ...time('2027-03-27', 1380, 1860, 420), shift: 'Night', post: 'Vet' };
  expect(sumDay('2027-03-27', [night], [], clock())).toMatchObject({
    plannedMinutes: 420,
    nightMinutes: 420,
    weekendMinutes: 420,
  });
});
