import { Button } from '@/app/_ui/button';
import { type FloorGrid, hasRange } from './use-floor-grid';

/** Undo, redo and filling, for hands that use no keys. */
export function GridToolbar({ grid }: { readonly grid: FloorGrid }) {
  const { edits, drawsRange } = grid;
  return (
    <fieldset aria-label="Change the table" className="flex flex-wrap gap-2" data-print="off">
      <Button disabled={!edits.canUndo} onClick={edits.undo}>
        Undo
      </Button>
      <Button disabled={!edits.canRedo} onClick={edits.redo}>
        Redo
      </Button>
      <Button
        aria-pressed={drawsRange}
        onClick={() => grid.setDrawsRange(!drawsRange)}
        className="aria-pressed:bg-act-wash"
      >
        Select several
      </Button>
      <Button disabled={!hasRange(grid)} onClick={() => grid.fill('right')}>
        Fill right
      </Button>
      <Button disabled={!hasRange(grid)} onClick={() => grid.fill('down')}>
        Fill down
      </Button>
    </fieldset>
  );
}
