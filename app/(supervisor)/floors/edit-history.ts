import type { FloorNeeds } from '@/modules/coverage';
import { type NeedChange, toCells } from './need-changes';

/** What was done to the table since it was opened, and what was undone of it. Latest last. */
export interface EditHistory {
  readonly done: readonly (readonly NeedChange[])[];
  readonly undone: readonly (readonly NeedChange[])[];
}

/** A step back or forth: the history after it, and the cells to save. */
export interface HistoryStep {
  readonly history: EditHistory;
  readonly cells: FloorNeeds;
}

export const emptyHistory: EditHistory = { done: [], undone: [] };

/** Adds changes made together; what was undone before can no longer be done again. */
export const record = ({ done }: EditHistory, made: readonly NeedChange[]): EditHistory => ({
  done: [...done, made],
  undone: [],
});

/** Takes the latest changes back; null when there are none. */
export function undo({ done, undone }: EditHistory): HistoryStep | null {
  const last = done.at(-1);
  if (!last) return null;
  return {
    history: { done: done.slice(0, -1), undone: [...undone, last] },
    cells: last.map(({ floorId, day, before }) => ({ floorId, day, people: before })),
  };
}

/** Makes the changes again that were undone last; null when there are none. */
export function redo({ done, undone }: EditHistory): HistoryStep | null {
  const last = undone.at(-1);
  if (!last) return null;
  return {
    history: { done: [...done, last], undone: undone.slice(0, -1) },
    cells: toCells(last),
  };
}

/** Forgets changes of floors that are gone, so that a step never names one. */
export function forgetOthers(history: EditHistory, floorIds: ReadonlySet<string>): EditHistory {
  const keep = (steps: EditHistory['done']) =>
    steps
      .map((made) => made.filter(({ floorId }) => floorIds.has(floorId)))
      .filter((made) => made.length > 0);
  return { done: keep(history.done), undone: keep(history.undone) };
}
