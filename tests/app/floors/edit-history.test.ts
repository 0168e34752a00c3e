import { describe, expect, it } from 'vitest';
import {
  emptyHistory,
  forgetOthers,
  record,
  redo,
  undo,
} from '@/app/(supervisor)/floors/edit-history';

const change = (day: number, before: number, after: number) => ({
  floorId: 'flr_1' as const,
  day,
  before,
  after,
});
const cell = (day: number, people: number) => ({ floorId: 'flr_1', day, people });

describe('undo and redo', () => {
  const twice = record(record(emptyHistory, [change(0, 1, 2), change(1, 1, 2)]), [change(0, 2, 3)]);

  it('go back one edit at a time, latest first, and forth again', () => {
    const once = undo(twice);
    expect(once?.cells).toEqual([cell(0, 2)]);
    const back = once && undo(once.history);
    expect(back?.cells).toEqual([cell(0, 1), cell(1, 1)]);
    const forth = back && redo(back.history);
    expect(forth?.cells).toEqual([cell(0, 2), cell(1, 2)]);
    expect(forth && redo(forth.history)?.cells).toEqual([cell(0, 3)]);
  });

  it('end where nothing is left', () => {
    expect(undo(emptyHistory)).toBeNull();
    expect(redo(twice)).toBeNull();
  });

  it('forget what was undone once something new is done', () => {
    const back = undo(twice);
    expect(back && redo(record(back.history, [change(5, 0, 1)]))).toBeNull();
  });

  it('forget floors that are gone', () => {
    const other = { ...change(3, 0, 1), floorId: 'flr_2' as const };
    const mixed = record(record(twice, [other]), [change(4, 0, 1), other]);
    const left = forgetOthers(mixed, new Set(['flr_1']));
    expect(left.done.map((made) => made.length)).toEqual([2, 1, 1]);
    expect(undo(left)?.cells).toEqual([cell(4, 0)]);
  });
});
