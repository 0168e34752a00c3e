import { describe, expect, it } from 'vitest';
import { countNeed, standingFigures } from '@/app/(supervisor)/floors/standing-figures';
import type { TeamInfo } from '@/modules/access';
import type { Coverage } from '@/modules/coverage';
import { period, rowsOf, sampleFloor, skills } from './sample-floors';

const dublin = 'Europe/Dublin';
const none = new Set<string>();

describe('what the floors of a period ask for', () => {
  it('counts shifts and hours, with dates that differ and the holiday column', () => {
    const dates = [{ date: '2027-02-01', people: 3, reason: '' }];
    const rows = rowsOf(sampleFloor({ dates, needs: [1, 1, 1, 1, 1, 0, 0, 0] }));
    // 20 working days, two more people on the first, none on the holiday.
    expect(countNeed(rows, period, new Set(['2027-02-18']), dublin)).toEqual({
      shifts: 21,
      windows: 0,
      minutes: 21 * 480,
    });
  });

  it('keeps windows apart that no shift kind has, and leaves out wished and shared floors', () => {
    const rows = rowsOf(
      sampleFloor({ id: 'flr_1', endMinute: 960 }),
      sampleFloor({ id: 'flr_2', counting: 'shared' }),
      sampleFloor({ id: 'flr_3', priceCentsPerHour: 100 }),
    );
    expect(countNeed(rows, period, none, dublin)).toMatchObject({ shifts: 0, windows: 20 });
  });

  it('counts the hours that truly pass on the night of a clock change', () => {
    const rows = rowsOf(
      sampleFloor({
        startMinute: 1380,
        endMinute: 1860,
        needs: [1, 1, 1, 1, 1, 1, 1, 1],
        effectiveTo: null,
      }),
    );
    const night = { startsOn: '2027-03-27', endsOn: '2027-03-27' };
    expect(countNeed(rows, night, none, dublin).minutes).toBe(7 * 60);
  });
});

it('stands at the foot of the sheet with the public holidays', () => {
  const coverage: Coverage = {
    team: { zone: dublin } as TeamInfo,
    skills,
    kinds: [],
    floors: [],
    holidays: [{ date: '2027-02-18', name: 'Lantern Day' }],
  };
  const figures = standingFigures(coverage, rowsOf(sampleFloor()), period);
  expect(figures.map(({ value }) => value)).toEqual([
    '19 shifts, 152 h on duty',
    'Thu 18 Feb, Lantern Day',
  ]);
});
