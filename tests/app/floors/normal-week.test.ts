import { describe, expect, it } from 'vitest';
import { normalWeek, weekInWords, weekLines } from '@/app/(supervisor)/floors/normal-week';
import type { Floor } from '@/modules/coverage';
import { sampleFloor, skills } from './sample-floors';

const ids = skills.map(({ id }) => id);
const weekOf = (...floors: Floor[]) => normalWeek(floors, ids, 420, '2027-02-01');
const everyDay = [1, 1, 1, 1, 1, 1, 1, 9];

describe('a normal week', () => {
  it('adds up skills, leaves the holiday column out and counts every day column', () => {
    const steps = weekOf(
      sampleFloor({ needs: [2, 2, 2, 2, 2, 1, 1, 9] }),
      sampleFloor({ id: 'flr_2', skillId: 'ski_nurse', endMinute: 1860, needs: everyDay }),
    );
    expect(weekInWords(steps)).toBe('Monday to Friday 1 to 3, Saturday and Sunday 1 to 2');
    expect(weekLines(steps, 420)).toEqual([
      { days: 'Monday to Friday', times: '07:00–15:00', people: 3 },
      { days: 'Monday to Friday', times: '15:00–07:00', people: 1 },
      { days: 'Saturday and Sunday', times: '07:00–15:00', people: 2 },
      { days: 'Saturday and Sunday', times: '15:00–07:00', people: 1 },
    ]);
  });

  it('draws what is asked for as held', () => {
    const steps = weekOf(sampleFloor({ needs: everyDay }));
    expect(steps.every(({ short, spare }) => short === 0 && spare === 0)).toBe(true);
    expect(steps.at(-1)?.endMinute).toBe(7 * 1440);
  });

  it('keeps a night in the column of the day on which it starts', () => {
    const night = { startMinute: 1380, endMinute: 1860, needs: [0, 0, 0, 0, 0, 0, 1, 0] };
    expect(weekInWords(weekOf(sampleFloor(night)))).toBe('Monday to Saturday 0, Sunday 0 to 1');
  });

  it('takes early hours of Monday in at the end of the Sunday column', () => {
    const early = { startMinute: 300, endMinute: 540, needs: [1, 0, 0, 0, 0, 0, 0, 0] };
    expect(weekLines(weekOf(sampleFloor(early)), 420).filter(({ people }) => people > 0)).toEqual([
      { days: 'Monday', times: '07:00–09:00', people: 1 },
      { days: 'Sunday', times: '05:00–07:00', people: 1 },
    ]);
  });

  it('takes a floor that follows another in the middle of the period only once', () => {
    const first = sampleFloor({ needs: everyDay, effectiveTo: '2027-02-14' });
    const second = sampleFloor({ id: 'flr_2', needs: everyDay, effectiveFrom: '2027-02-15' });
    expect(weekInWords(weekOf(first, second))).toBe('Monday to Sunday 0 to 1');
  });

  it('is flat without floors', () => {
    expect(weekInWords(weekOf())).toBe('Monday to Sunday 0');
  });
});
