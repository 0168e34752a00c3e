'use client';

import { useState } from 'react';
import { emptyHistory, forgetOthers, type HistoryStep, record, redo, undo } from './edit-history';
import type { FloorRow } from './floor-rows';
import { type NeedChange, toCells } from './need-changes';
import { sayCells } from './say-cells';
import type { FloorNeedsState } from './use-floor-needs';

/** Makes changes of the table and takes them back; every step is saved like any other change. */
export function useNeedEdits(rows: readonly FloorRow[], save: FloorNeedsState['save']) {
  const [kept, setHistory] = useState(emptyHistory);
  const history = forgetOthers(kept, new Set(rows.map(({ floor }) => floor.id)));
  const step = (to: HistoryStep | null, word: string) => {
    if (!to) return;
    setHistory(to.history);
    save(to.cells, `${word}: ${sayCells(rows, to.cells)}.`);
  };
  return {
    /** `word` begins the sentence that is read aloud, e.g. "Saved". */
    make: (made: readonly NeedChange[], word = 'Saved') => {
      if (made.length === 0) return;
      setHistory(record(history, made));
      save(toCells(made), `${word}: ${sayCells(rows, toCells(made))}.`);
    },
    undo: () => step(undo(history), 'Undone'),
    redo: () => step(redo(history), 'Done again'),
    canUndo: history.done.length > 0,
    canRedo: history.undone.length > 0,
  };
}
