'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { callApi } from '@/app/_api';
import { useAnnounce } from '@/app/_ui/live-region';
import type { Coverage, Floor, FloorNeeds } from '@/modules/coverage';
import { coverageKey } from '../_coverage';
import { withNeeds } from './need-changes';

/** Cells sent together, and the sentence that is read aloud once they are saved. */
interface Edit {
  readonly cells: FloorNeeds;
  readonly sentence: string;
}

/** Cells that could not be saved, with the reason. */
interface Unsaved {
  readonly cells: FloorNeeds;
  readonly problem: unknown;
}

/** How a cell of the table stands with the server. */
export type CellState = 'saved' | 'saving' | 'unsaved';

const nothing: Unsaved = { cells: [], problem: null };

/**
 * Saves cells of the floors table. They show at once, are sent one edit after another, and what the
 * server refuses or a dropped connection swallows is kept until it is sent again or given up.
 */
export function useFloorNeeds(coverage: Coverage) {
  const { id } = coverage.team;
  const client = useQueryClient();
  const announce = useAnnounce();
  const [sent, setSent] = useState<readonly Edit[]>([]);
  const [unsaved, setUnsaved] = useState(nothing);
  const { mutate } = useMutation({
    mutationFn: ({ cells }: Edit) => callApi<Floor[]>('PUT', `teams/${id}/floor-needs`, cells),
    scope: { id: `floor-needs ${id}` },
    networkMode: 'always',
    onSuccess: (saved, { cells, sentence }) => {
      client.setQueryData<Coverage>(
        coverageKey(id),
        (before) => before && withSaved(before, saved),
      );
      setUnsaved((before) => ({ ...before, cells: without(before.cells, cells) }));
      announce(sentence);
    },
    onError: (problem, { cells }) =>
      setUnsaved((before) => ({ cells: [...without(before.cells, cells), ...cells], problem })),
    onSettled: (_, __, edit) => {
      setSent((before) => before.filter((one) => one !== edit));
      void client.invalidateQueries();
    },
  });
  const save = (cells: FloorNeeds, sentence: string) => {
    const edit = { cells, sentence };
    setSent((before) => [...before, edit]);
    setUnsaved((before) => ({ ...before, cells: without(before.cells, cells) }));
    mutate(edit);
  };
  const sending = sent.flatMap(({ cells }) => cells);
  return {
    /** As shown: with what is being sent and what could not be saved. */
    floors: withNeeds(coverage.floors, [...unsaved.cells, ...sending]),
    stateOf: (floorId: string, day: number): CellState => {
      if (hasCell(sending, floorId, day)) return 'saving';
      return hasCell(unsaved.cells, floorId, day) ? 'unsaved' : 'saved';
    },
    problem: unsaved.cells.length > 0 ? unsaved.problem : null,
    save,
    sendAgain: () => save(unsaved.cells, 'Saved.'),
    giveUp: () => setUnsaved(nothing),
  };
}

/** What the table needs to save its cells. */
export type FloorNeedsState = ReturnType<typeof useFloorNeeds>;

const hasCell = (cells: FloorNeeds, floorId: string, day: number): boolean =>
  cells.some((cell) => cell.floorId === floorId && cell.day === day);

const without = (cells: FloorNeeds, others: FloorNeeds): FloorNeeds =>
  cells.filter(({ floorId, day }) => !hasCell(others, floorId, day));

const withSaved = (coverage: Coverage, saved: readonly Floor[]): Coverage => ({
  ...coverage,
  floors: coverage.floors.map((floor) => saved.find(({ id }) => id === floor.id) ?? floor),
});
