import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Floor } from '@/modules/coverage';
import { expandLines } from '@/modules/sizing';
import { nurse, sampleFloor, sampleInput, sampleKind, skills } from './coverage-samples';

const kinds = [sampleKind('early')];
const onlyMonday = [1, 0, 0, 0, 0, 0, 0, 0];
const onlySunday = [0, 0, 0, 0, 0, 0, 1, 0];

function expand(floors: readonly Floor[]) {
  const outcome = expandLines(sampleInput(), { kinds, skills, floors });
  return outcome.ok ? outcome.value.floors : [];
}

describe('the floors of a normal week', () => {
  it('are taken weekday by weekday, holidays and dates that differ left out', () => {
    const dates = [{ date: '2027-02-01', people: 9, reason: 'fair' }];
    const floors = expand([
      sampleFloor('day', { skillId: nurse.id, needs: [3, 0, 0, 0, 2, 0, 0, 7], dates }),
    ]);
    expect(floors).toEqual([
      {
        floorId: 'flr_day',
        weekday: 0,
        label: 'Mon, Nurse 07:00–15:00',
        skillId: nurse.id,
        startMinute: 420,
        endMinute: 900,
        people: 3,
      },
      {
        floorId: 'flr_day',
        weekday: 4,
        label: 'Fri, Nurse 07:00–15:00',
        skillId: nurse.id,
        startMinute: 4 * 1440 + 420,
        endMinute: 4 * 1440 + 900,
        people: 2,
      },
    ]);
  });

  it('count only on the weekdays on which they are in force', () => {
    const floors = expand([
      sampleFloor('old', { effectiveTo: '2027-02-02' }),
      sampleFloor('new', { effectiveFrom: '2027-02-07' }),
    ]);
    expect(floors.map(({ floorId, weekday }) => [floorId, weekday])).toEqual([
      ['flr_old', 0],
      ['flr_old', 1],
      ['flr_new', 6],
    ]);
  });

  it('go on past Sunday midnight at the start of the circle', () => {
    const floors = expand([
      sampleFloor('night', { startMinute: 1320, endMinute: 1860, needs: onlySunday }),
    ]);
    expect(floors[0]).toMatchObject({ startMinute: 9960, endMinute: 10500 });
  });
});

describe('seated floors of one skill that overlap', () => {
  const morning = sampleFloor('a', { needs: onlyMonday });
  const noon = sampleFloor('b', { startMinute: 540, endMinute: 1020, needs: onlyMonday });

  it('add up in the stretch they share and stand alone beside it', () => {
    const floors = expand([morning, noon]);
    expect(floors.map(({ floorId, label, people }) => [floorId, label, people])).toEqual([
      ['flr_a', 'Mon, Anybody 07:00–09:00', 1],
      ['flr_a+flr_b', 'Mon, Anybody 09:00–15:00', 2],
      ['flr_b', 'Mon, Anybody 15:00–17:00', 1],
    ]);
  });

  it('stay whole when they only touch, differ in skill or are shared', () => {
    const touching = sampleFloor('b', { startMinute: 900, endMinute: 960, needs: onlyMonday });
    const other = { ...noon, skillId: nurse.id };
    const shared = { ...noon, counting: 'shared' as const };
    for (const second of [touching, other, shared]) {
      expect(expand([morning, second]).map(({ people }) => people)).toEqual([1, 1]);
    }
  });

  it('add up across Sunday midnight too', () => {
    const night = sampleFloor('n', { startMinute: 1320, endMinute: 1900, needs: onlySunday });
    const floors = expand([morning, night]);
    expect(floors.map(({ label, people }) => [label, people])).toEqual([
      ['Mon, Anybody 07:00–07:40', 2],
      ['Mon, Anybody 07:40–15:00', 1],
      ['Sun, Anybody 22:00–07:00', 1],
    ]);
  });

  it('ask in every minute for exactly the sum of what each asks for', () => {
    const window = fc
      .record({ start: fc.nat(23), hours: fc.integer({ min: 1, max: 24 }), people: fc.nat(3) })
      .map(({ start, hours, people }) =>
        sampleFloor('window', {
          startMinute: start * 60,
          endMinute: (start + hours) * 60,
          needs: [people, 0, people, 0, 0, 0, people, 0],
        }),
      );
    fc.assert(
      fc.property(fc.array(window, { minLength: 1, maxLength: 5 }), (floors) => {
        const pieces = expand(floors);
        for (let hour = 0; hour < 168; hour++) {
          const asked = floors.flatMap((floor) =>
            [0, 2, 6].map((day) => ({
              start: day * 24 + floor.startMinute / 60,
              hours: (floor.endMinute - floor.startMinute) / 60,
              people: floor.needs[day] ?? 0,
            })),
          );
          const expected = asked
            .filter(({ start, hours }) => (hour - start + 168) % 168 < hours)
            .reduce((sum, { people }) => sum + people, 0);
          const found = pieces
            .filter(
              ({ startMinute, endMinute }) =>
                (hour - startMinute / 60 + 168) % 168 < (endMinute - startMinute) / 60,
            )
            .reduce((sum, { people }) => sum + people, 0);
          expect(found).toBe(expected);
        }
      }),
    );
  });
});
