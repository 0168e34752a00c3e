import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  continuedTo,
  type Floor,
  findDuplicate,
  isInForce,
  labelFloor,
  sayDates,
} from '@/modules/coverage';
import { addDays } from '@/modules/units';

const floor: Floor = {
  id: 'flr_1',
  teamId: 'tea_1',
  skillId: 'ski_vet',
  startMinute: 1380,
  endMinute: 1860,
  needs: [1, 1, 1, 1, 1, 1, 1, 1],
  counting: 'seated',
  priceCentsPerHour: null,
  effectiveFrom: '2027-02-01',
  effectiveTo: '2027-02-28',
  dates: [],
};

describe('floors that ask for the same cover', () => {
  it.each<[string, Partial<Floor>, boolean]>([
    ['the same in every way', {}, true],
    ['other numbers of people', { needs: [3, 3, 3, 3, 3, 3, 3, 3] }, true],
    ['touching on one day', { effectiveFrom: '2027-02-28', effectiveTo: '2027-03-28' }, true],
    ['open from a day within', { effectiveFrom: '2027-02-15', effectiveTo: null }, true],
    ['from the day after', { effectiveFrom: '2027-03-01', effectiveTo: null }, false],
    ['until the day before', { effectiveFrom: '2027-01-01', effectiveTo: '2027-01-31' }, false],
    ['another skill', { skillId: 'ski_nurse' }, false],
    ['anybody', { skillId: null }, false],
    ['another start', { startMinute: 1320 }, false],
    ['another end', { endMinute: 1800 }, false],
    ['counted otherwise', { counting: 'shared' }, false],
    ['wished beside firm', { priceCentsPerHour: 5000 }, false],
  ])('%s', (_, changes, isDuplicate) => {
    const other = { ...floor, id: 'flr_2' as const, ...changes };
    expect(findDuplicate(other, [floor])).toBe(isDuplicate ? floor : null);
    expect(findDuplicate(floor, [other])).toBe(isDuplicate ? other : null);
  });

  it('have a name and dates in sentences', () => {
    expect(labelFloor(floor, [{ id: 'ski_vet', name: 'Vet' }])).toBe('Vet 23:00–07:00');
    expect(labelFloor({ ...floor, skillId: null }, [])).toBe('Anybody 23:00–07:00');
    expect(sayDates(floor)).toBe('from Mon 1 Feb to Sun 28 Feb');
    expect(sayDates({ ...floor, effectiveTo: null })).toBe('from Mon 1 Feb on');
  });
});

describe('continuing a floor', () => {
  const later = (from: string): Floor => ({
    ...floor,
    id: 'flr_2',
    effectiveFrom: from,
    effectiveTo: null,
  });

  it.each<[string, Floor[], string, string | null]>([
    ['alone, it holds through the new day', [], '2027-03-28', '2027-03-28'],
    ['it never gets shorter', [], '2027-02-20', null],
    ['its own last day changes nothing', [], '2027-02-28', null],
    [
      'it stops before the same cover begins anew',
      [later('2027-03-15')],
      '2027-03-28',
      '2027-03-14',
    ],
    ['nothing changes when that is the next day', [later('2027-03-01')], '2027-03-28', null],
    [
      'other cover does not stop it',
      [{ ...later('2027-03-15'), startMinute: 0 }],
      '2027-03-28',
      '2027-03-28',
    ],
  ])('%s', (_, others, to, expected) => {
    expect(continuedTo(floor, [floor, ...others], to)).toBe(expected);
  });

  it('leaves an open floor as it is', () => {
    expect(continuedTo({ ...floor, effectiveTo: null }, [], '2027-03-28')).toBeNull();
  });

  it('never makes two floors that ask for the same cover on one day', () => {
    const offset = fc.integer({ min: 1, max: 90 });
    fc.assert(
      fc.property(fc.array(offset, { maxLength: 4 }), offset, (starts, through) => {
        const others = starts.map((days) => later(addDays('2027-02-28', days)));
        const last = continuedTo(floor, [floor, ...others], addDays('2027-02-28', through));
        const continued = { ...floor, effectiveTo: last ?? floor.effectiveTo };
        expect(findDuplicate(continued, others)).toBeNull();
        expect(isInForce(continued, '2027-02-28')).toBe(true);
      }),
    );
  });
});
