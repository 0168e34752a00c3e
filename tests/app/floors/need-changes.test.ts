import { describe, expect, it } from 'vitest';
import { extendTo, selectOne } from '@/app/(supervisor)/floors/grid-selection';
import {
  fill,
  readPeople,
  setPeople,
  toCells,
  withNeeds,
} from '@/app/(supervisor)/floors/need-changes';
import { sampleFloor } from './sample-floors';

const floors = [
  sampleFloor({ id: 'flr_1', needs: [3, 1, 1, 1, 1, 0, 0, 0] }),
  sampleFloor({ id: 'flr_2', needs: [2, 2, 2, 2, 2, 2, 2, 2] }),
];
const range = (top: number, left: number, bottom: number, right: number) =>
  extendTo(selectOne({ row: top, column: left }), { row: bottom, column: right });
const needsAfter = (changes: ReturnType<typeof fill>) =>
  withNeeds(floors, toCells(changes)).map(({ needs }) => needs.join(' '));

describe('changes of the table', () => {
  it('set one cell, and remember what stood there', () => {
    expect(setPeople(floors, selectOne({ row: 1, column: 7 }), 12)).toEqual([
      { floorId: 'flr_2', day: 7, before: 2, after: 12 },
    ]);
  });

  it('leave out cells that have the number already', () => {
    expect(setPeople(floors, range(0, 4, 1, 5), 0)).toHaveLength(3);
    expect(setPeople(floors, selectOne({ row: 0, column: 0 }), 3)).toEqual([]);
  });

  it('fill right from the first selected number of each row, whichever corner was first', () => {
    expect(needsAfter(fill(floors, range(1, 4, 0, 0), 'right'))).toEqual([
      '3 3 3 3 3 0 0 0',
      '2 2 2 2 2 2 2 2',
    ]);
  });

  it('fill down from the first selected row', () => {
    expect(needsAfter(fill(floors, range(0, 0, 1, 1), 'down'))).toEqual([
      '3 1 1 1 1 0 0 0',
      '3 1 2 2 2 2 2 2',
    ]);
  });

  it('have no number behind the last column', () => {
    expect(setPeople(floors, selectOne({ row: 0, column: 8 }), 5)).toEqual([]);
  });

  it('leave floors that they do not name untouched', () => {
    const [first, second] = withNeeds(floors, [{ floorId: 'flr_2', day: 0, people: 9 }]);
    expect(first).toBe(floors[0]);
    expect(second?.needs[0]).toBe(9);
    expect(floors[1]?.needs[0]).toBe(2);
  });
});

describe('a typed number', () => {
  it.each([
    ['0', 0],
    ['12', 12],
    [' 007 ', 7],
    ['999', 999],
  ])('%j is read', (text, people) => {
    expect(readPeople(text)).toEqual({ people });
  });

  it.each([
    ['1000', 'A floor can be at most 999 people.'],
    ['1.5', 'Write a whole number of people.'],
    ['-1', 'Write a whole number of people.'],
    ['', 'Write a whole number of people.'],
    ['two', 'Write a whole number of people.'],
  ])('%j is refused with a reason', (text, problem) => {
    expect(readPeople(text)).toEqual({ problem });
  });
});
