import { describe, expect, it } from 'vitest';
import { addDays, elapsedMinutes, isZone, toInstant, toLocal } from '@/modules/units';

const utc = (text: string) => Date.parse(text);

describe('the length of a 22:00-06:00 night', () => {
  // Source: Temporal polyfill 0.5.1 and Python zoneinfo (tzdata 2025b), computed for this product.
  it.each([
    ['Europe/Berlin', '2026-03-28', 420, '2026-03-28T21:00Z', '2026-03-29T04:00Z'],
    ['Europe/Berlin', '2026-10-24', 540, '2026-10-24T20:00Z', '2026-10-25T05:00Z'],
    ['Europe/London', '2026-03-28', 420, '2026-03-28T22:00Z', '2026-03-29T05:00Z'],
    ['Europe/London', '2026-10-24', 540, '2026-10-24T21:00Z', '2026-10-25T06:00Z'],
    ['America/New_York', '2026-03-07', 420, '2026-03-08T03:00Z', '2026-03-08T10:00Z'],
    ['America/New_York', '2026-10-31', 540, '2026-11-01T02:00Z', '2026-11-01T11:00Z'],
  ])('in %s from %s takes %i minutes', (zone, date, minutes, startsAt, endsAt) => {
    const start = toInstant(date, 1320, zone);
    const end = toInstant(date, 1800, zone);
    expect(start).toBe(utc(startsAt));
    expect(end).toBe(utc(endsAt));
    expect(elapsedMinutes(start, end)).toBe(minutes);
  });

  it.each([
    ['Australia/Sydney', '2026-04-04', 540],
    ['Australia/Sydney', '2026-10-03', 420],
    ['Australia/Lord_Howe', '2026-04-04', 510],
    ['Australia/Lord_Howe', '2026-10-03', 450],
    ['America/Phoenix', '2026-03-28', 480],
    ['Asia/Kolkata', '2026-10-24', 480],
  ])('in %s from %s takes %i minutes (same source)', (zone, date, minutes) => {
    expect(elapsedMinutes(toInstant(date, 1320, zone), toInstant(date, 1800, zone))).toBe(minutes);
  });
});

describe('a wall clock that does not exist or exists twice', () => {
  // Source: Temporal's "compatible" disambiguation.
  it.each([
    [
      'in the gap of spring the later reading',
      'Europe/Berlin',
      '2026-03-29',
      150,
      '2026-03-29T01:30Z',
    ],
    ['in the overlap of autumn the first', 'Europe/Berlin', '2026-10-25', 150, '2026-10-25T00:30Z'],
    [
      'in the overlap of New York the first',
      'America/New_York',
      '2026-11-01',
      90,
      '2026-11-01T05:30Z',
    ],
  ])('means %s', (_, zone, date, minute, instant) => {
    expect(toInstant(date, minute, zone)).toBe(utc(instant));
  });
});

describe('local days', () => {
  it.each([
    ['Europe/Berlin', '2026-03-29', 23],
    ['Europe/Berlin', '2026-10-25', 25],
    ['America/New_York', '2026-03-08', 23],
    ['America/New_York', '2026-11-01', 25],
    ['Europe/Berlin', '2026-06-01', 24],
  ])('of %s on %s have %i hours', (zone, date, hours) => {
    const length = elapsedMinutes(toInstant(date, 0, zone), toInstant(addDays(date, 1), 0, zone));
    expect(length).toBe(hours * 60);
  });

  it('come back from the instant they became', () => {
    const instant = toInstant('2027-02-28', 1439, 'Asia/Kolkata');
    expect(toLocal(instant, 'Asia/Kolkata')).toEqual({ date: '2027-02-28', minute: 1439 });
  });

  it('know real zones from invented ones', () => {
    expect(isZone('Europe/Dublin')).toBe(true);
    expect(isZone('Europe/Ravelmere')).toBe(false);
  });
});
