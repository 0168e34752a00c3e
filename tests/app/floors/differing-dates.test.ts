import { describe, expect, it } from 'vitest';
import { differenceName, differingDates } from '@/app/(supervisor)/floors/differing-dates';
import { period, rowsOf, sampleFloor } from './sample-floors';

const holidays = [
  { date: '2027-02-18', name: 'Lantern Day' },
  { date: '2027-03-17', name: 'Later' },
];
const rows = rowsOf(
  sampleFloor({
    id: 'flr_1',
    needs: [1, 1, 1, 1, 1, 0, 0, 5],
    dates: [
      { date: '2027-02-17', people: 2, reason: 'Kennels full' },
      { date: '2027-02-18', people: 6, reason: '' },
    ],
  }),
  sampleFloor({ id: 'flr_2', dates: [{ date: '2027-01-20', people: 3, reason: 'Earlier' }] }),
);

describe('the dates that differ', () => {
  const dates = differingDates(rows, holidays, period);

  it('are those of the period, earliest first, holidays among them', () => {
    expect(dates.map(({ date, holidayName }) => [date, holidayName])).toEqual([
      ['2027-02-17', null],
      ['2027-02-18', 'Lantern Day'],
    ]);
  });

  it('tell what the pattern would ask for: on a holiday the holiday column', () => {
    expect(dates.flatMap(({ differences }) => differences.map(({ usual }) => usual))).toEqual([
      1, 5,
    ]);
  });

  it('have names for their buttons', () => {
    const [difference] = dates[0]?.differences ?? [];
    expect(difference && differenceName(difference)).toBe('Vet Early 07:00–15:00, Wed 17 Feb');
  });

  it('list a holiday on which no floor differs', () => {
    const [only] = differingDates(rowsOf(sampleFloor()), holidays, period);
    expect(only).toEqual({ date: '2027-02-18', holidayName: 'Lantern Day', differences: [] });
  });
});
