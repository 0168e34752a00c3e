import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { splitByClock } from '@/modules/problem';
import { type LocalDate, toInstant } from '@/modules/units';

const split = (
  [date, startMinute, endMinute]: readonly [LocalDate, number, number],
  {
    zone = 'Europe/Berlin',
    unpaidBreakMinutes = 0,
    night = [1380, 1860],
    holidays = [],
  }: {
    zone?: string;
    unpaidBreakMinutes?: number;
    night?: readonly [number, number];
    holidays?: readonly LocalDate[];
  } = {},
) =>
  splitByClock(
    {
      startsAtUtc: toInstant(date, startMinute, zone),
      endsAtUtc: toInstant(date, endMinute, zone),
      unpaidBreakMinutes,
    },
    {
      zone,
      pay: { nightStartMinute: night[0], nightEndMinute: night[1] },
      isHoliday: (day) => holidays.includes(day),
    },
  );

/**
 * Elapsed hours of a 22:00-06:00 shift on the nights of a clock change, by the IANA zone database
 * (computed with a Temporal polyfill, six of them also with Python's zoneinfo).
 */
describe('a shift from 22:00 to 06:00', () => {
  it.each([
    ['Europe/Berlin', '2026-03-28', 7],
    ['Europe/Berlin', '2026-10-24', 9],
    ['Europe/London', '2026-03-28', 7],
    ['Europe/London', '2026-10-24', 9],
    ['America/New_York', '2026-03-07', 7],
    ['America/New_York', '2026-10-31', 9],
    ['Australia/Sydney', '2026-04-04', 9],
    ['Australia/Sydney', '2026-10-03', 7],
    ['Australia/Lord_Howe', '2026-04-04', 8.5],
    ['Australia/Lord_Howe', '2026-10-03', 7.5],
    ['America/Phoenix', '2026-03-07', 8],
    ['Asia/Kolkata', '2026-10-24', 8],
    ['Europe/Berlin', '2026-06-10', 8],
  ])('%s, night of %s: %f hours', (zone, date, hours) => {
    expect(split([date, 1320, 1800], { zone }).paidMinutes).toBe(hours * 60);
  });
});

/** Mon 1 February 2027; the night runs from 23:00 to 07:00. */
describe('minutes that carry a premium', () => {
  it.each([
    ['a day shift', ['2027-02-01', 540, 1020], { nightMinutes: 0, weekendMinutes: 0 }],
    ['up to the night, touching it', ['2027-02-01', 900, 1380], { nightMinutes: 0 }],
    ['from the end of the night', ['2027-02-01', 420, 900], { nightMinutes: 0 }],
    ['an hour into the night', ['2027-02-01', 960, 1440], { nightMinutes: 60 }],
    ['the morning end of the night before', ['2027-02-01', 360, 840], { nightMinutes: 60 }],
    ['a whole night', ['2027-02-01', 1380, 1860], { nightMinutes: 480 }],
    ['past the night and into the next', ['2027-02-01', 300, 1500], { nightMinutes: 120 + 120 }],
    ['a Friday that ends at 24:00', ['2027-02-05', 960, 1440], { weekendMinutes: 0 }],
    ['a Friday night', ['2027-02-05', 1380, 1860], { weekendMinutes: 420, nightMinutes: 480 }],
    ['a Saturday', ['2027-02-06', 420, 900], { weekendMinutes: 480 }],
    ['a Saturday night', ['2027-02-06', 1380, 1860], { weekendMinutes: 480 }],
    ['a Sunday night', ['2027-02-07', 1380, 1860], { weekendMinutes: 60 }],
  ] as const)('%s', (_, shift, expected) => {
    expect(split(shift)).toMatchObject(expected);
  });

  it.each([
    ['the night before the holiday', ['2027-02-17', 1380, 1860], 420],
    ['the holiday itself', ['2027-02-18', 420, 900], 480],
    ['the night that begins on it', ['2027-02-18', 1380, 1860], 60],
    ['the day after it', ['2027-02-19', 420, 900], 0],
  ] as const)('holiday: %s', (_, shift, expected) => {
    expect(split(shift, { holidays: ['2027-02-18'] }).holidayMinutes).toBe(expected);
  });

  it('one minute may be night, weekend and holiday at once', () => {
    expect(split(['2027-02-06', 1380, 1860], { holidays: ['2027-02-06', '2027-02-07'] })).toEqual({
      paidMinutes: 480,
      nightMinutes: 480,
      weekendMinutes: 480,
      holidayMinutes: 480,
    });
  });

  it('a night window after midnight belongs to its own date', () => {
    expect(split(['2027-02-01', 1320, 1800], { night: [0, 300] }).nightMinutes).toBe(300);
  });

  /** Berlin, 2026-03-29: the clock goes from 02:00 to 03:00; 2026-10-25: from 03:00 back to 02:00. */
  it.each([
    ['2026-03-28', 420],
    ['2026-10-24', 540],
  ])('the night of %s carries the %i minutes that elapsed', (date, minutes) => {
    expect(split([date, 1320, 1800], { night: [1320, 1800] })).toEqual({
      paidMinutes: minutes,
      nightMinutes: minutes,
      weekendMinutes: minutes,
      holidayMinutes: 0,
    });
  });
});

describe('an unpaid break', () => {
  it('shortens the paid time', () => {
    expect(split(['2027-02-01', 420, 900], { unpaidBreakMinutes: 30 }).paidMinutes).toBe(450);
  });

  it('is taken out of the middle of the shift', () => {
    // 20:00 to 04:00 with a break from 23:45 to 00:15: half an hour of the night is not paid.
    const break30 = { unpaidBreakMinutes: 30 };
    expect(split(['2027-02-04', 1200, 1680], break30)).toMatchObject({
      paidMinutes: 450,
      nightMinutes: 270,
      weekendMinutes: 0,
    });
    // The same on a Friday: a quarter of an hour of the break falls into Saturday.
    expect(split(['2027-02-05', 1200, 1680], break30).weekendMinutes).toBe(225);
    // 15:00 to 23:30: the break is over long before the night.
    expect(split(['2027-02-01', 900, 1410], break30).nightMinutes).toBe(30);
  });

  it('of a clock change comes off what elapsed', () => {
    expect(split(['2026-03-28', 1320, 1800], { unpaidBreakMinutes: 30 }).paidMinutes).toBe(390);
  });

  it('as long as the shift leaves nothing to pay', () => {
    expect(split(['2027-02-06', 420, 480], { unpaidBreakMinutes: 90 })).toEqual({
      paidMinutes: 0,
      nightMinutes: 0,
      weekendMinutes: 0,
      holidayMinutes: 0,
    });
  });
});

describe('any shift', () => {
  const shift = fc.record({
    day: fc.integer({ min: 1, max: 28 }),
    month: fc.constantFrom('02', '03', '10'),
    startMinute: fc.nat(1439),
    length: fc.integer({ min: 1, max: 1440 }),
    unpaidBreakMinutes: fc.nat(120),
  });

  it('carries no more premium minutes than it has paid minutes', () => {
    fc.assert(
      fc.property(shift, ({ day, month, startMinute, length, unpaidBreakMinutes }) => {
        const date = `2026-${month}-${String(day).padStart(2, '0')}`;
        const found = split([date, startMinute, startMinute + length], { unpaidBreakMinutes });
        for (const minutes of Object.values(found)) {
          expect(minutes).toBeGreaterThanOrEqual(0);
          expect(minutes).toBeLessThanOrEqual(found.paidMinutes);
        }
      }),
    );
  });

  it('cut in two without a break is split alike', () => {
    fc.assert(
      fc.property(shift, fc.nat(1440), ({ day, month, startMinute, length }, at) => {
        const date = `2026-${month}-${String(day).padStart(2, '0')}`;
        const [from, to] = [startMinute, startMinute + length];
        const cut = Math.min(to, from + at);
        const whole = split([date, from, to], { holidays: [date] });
        const [one, other] = [
          split([date, from, cut], { holidays: [date] }),
          split([date, cut, to], { holidays: [date] }),
        ];
        expect(whole).toEqual({
          paidMinutes: one.paidMinutes + other.paidMinutes,
          nightMinutes: one.nightMinutes + other.nightMinutes,
          weekendMinutes: one.weekendMinutes + other.weekendMinutes,
          holidayMinutes: one.holidayMinutes + other.holidayMinutes,
        });
      }),
    );
  });
});
