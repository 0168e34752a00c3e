import { describe, expect, it } from 'vitest';
import { coverOfDay } from '@/app/_ui/people-grid/day-cover';
import { proofWith, smallBoard } from './board-fixture';

const monday = '2027-02-01';

describe('a day by shift', () => {
  it('lists who is on by shift and skill', () => {
    const { shifts, others } = coverOfDay(smallBoard(), monday);
    expect(shifts.map(({ kind, lines }) => [kind.name, lines])).toEqual([
      ['Early', [{ skillName: 'Vet', names: ['Noor Haldane'], short: 0 }]],
    ]);
    expect(others).toEqual([]);
  });

  it('puts a shortage on its own shift, and one that fits no shift apart', () => {
    const board = smallBoard({
      proof: proofWith([]),
      lanes: [
        {
          skillId: 'ski_vet',
          slots: [
            { startMinute: 420, endMinute: 900, need: 2, have: 1 },
            { startMinute: 900, endMinute: 960, need: 1, have: 0 },
          ],
        },
        { skillId: null, slots: [{ startMinute: 1380, endMinute: 1860, need: 1, have: 0 }] },
      ],
    });
    const { shifts, others } = coverOfDay(board, monday);
    expect(shifts.map(({ kind, short }) => [kind.name, short])).toEqual([
      ['Early', 1],
      ['Night', 1],
    ]);
    expect(shifts[1]?.lines).toEqual([{ skillName: 'Anybody', names: [], short: 1 }]);
    expect(others.map(({ shiftName }) => shiftName)).toEqual(['15:00 to 16:00']);
  });

  it('calls nothing short before there is a roster', () => {
    const lanes = [
      { skillId: null, slots: [{ startMinute: 420, endMinute: 900, need: 1, have: 0 }] },
    ];
    expect(coverOfDay(smallBoard({ lanes, cells: [] }), monday)).toEqual({
      shifts: [],
      others: [],
    });
  });
});
