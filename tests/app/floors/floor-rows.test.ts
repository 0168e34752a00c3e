import { describe, expect, it } from 'vitest';
import { cellName, floorsIn, rowName } from '@/app/(supervisor)/floors/floor-rows';
import { period, rowsOf, sampleFloor } from './sample-floors';

const nameOf = (changes: Parameters<typeof sampleFloor>[0]) =>
  rowsOf(sampleFloor(changes)).map(rowName)[0];

describe('the rows of the floors table', () => {
  it('stand by skill in the order of the team, floors for anybody last', () => {
    const rows = rowsOf(
      sampleFloor({ id: 'flr_any', skillId: null }),
      sampleFloor({ id: 'flr_nurse', skillId: 'ski_nurse' }),
      sampleFloor({ id: 'flr_vet', skillId: 'ski_vet' }),
      sampleFloor({ id: 'flr_vet_2', skillId: 'ski_vet', startMinute: 540, endMinute: 1020 }),
    );
    expect(rows.map(({ skillName, isFirstOfSkill }) => [skillName, isFirstOfSkill])).toEqual([
      ['Vet', true],
      ['Vet', false],
      ['Nurse', true],
      ['Anybody', true],
    ]);
  });

  it('are named by a shift kind only when it has exactly the same hours', () => {
    expect(nameOf({})).toBe('Vet Early 07:00–15:00');
    expect(nameOf({ endMinute: 930 })).toBe('Vet 07:00–15:30');
    expect(nameOf({ startMinute: 1380, endMinute: 1860 })).toBe('Vet 23:00–07:00');
  });

  it('say what sets a floor apart', () => {
    expect(nameOf({ priceCentsPerHour: 4000 })).toBe('Vet Early 07:00–15:00, wished, €40 an hour');
    expect(nameOf({ priceCentsPerHour: 4050 })).toContain('€40.50 an hour');
    expect(nameOf({ counting: 'shared' })).toBe('Vet Early 07:00–15:00, shared');
    expect(nameOf({ effectiveFrom: '2027-02-08', effectiveTo: '2027-02-21' })).toBe(
      'Vet Early 07:00–15:00, from Mon 8 Feb, to Sun 21 Feb',
    );
    expect(nameOf({ effectiveFrom: '2027-01-04', effectiveTo: null })).toBe(
      'Vet Early 07:00–15:00',
    );
  });

  it('name each cell in full', () => {
    const [row] = rowsOf(sampleFloor());
    expect(row && cellName(row, 0, 1)).toBe('Vet, Early 07:00–15:00, Monday, 1');
    expect(row && cellName(row, 7, 12)).toBe('Vet, Early 07:00–15:00, Holiday, 12');
  });
});

it('shows the floors that hold on any day of the period', () => {
  const floors = [
    sampleFloor({ id: 'flr_before', effectiveFrom: '2027-01-04', effectiveTo: '2027-01-31' }),
    sampleFloor({ id: 'flr_first_day', effectiveFrom: '2027-01-04', effectiveTo: '2027-02-01' }),
    sampleFloor({ id: 'flr_open', effectiveFrom: '2027-01-04', effectiveTo: null }),
    sampleFloor({ id: 'flr_last_day', effectiveFrom: '2027-02-28', effectiveTo: null }),
    sampleFloor({ id: 'flr_after', effectiveFrom: '2027-03-01', effectiveTo: null }),
  ];
  expect(floorsIn(floors, period).map(({ id }) => id)).toEqual([
    'flr_first_day',
    'flr_open',
    'flr_last_day',
  ]);
});
