import type { ReactNode } from 'react';
import { Button } from '@/app/_ui/button';
import { type FloorGrid, hasRange } from './use-floor-grid';

/** Undo, redo and filling, for hands that use no keys. */
export function GridToolbar({ grid }: { readonly grid: FloorGrid }) {
  const { edits, drawing } = grid;
  const isRange = hasRange(grid);
  const isDrawing = drawing !== 'off';
  return (
    <fieldset aria-label="Change the table" className="flex flex-wrap gap-2" data-print="off">
      <Tool isReady={edits.canUndo} onPress={edits.undo}>
        Undo
      </Tool>
      <Tool isReady={edits.canRedo} onPress={edits.redo}>
        Redo
      </Tool>
      <Button
        aria-pressed={isDrawing}
        onClick={() => grid.setDrawing(isDrawing ? 'off' : 'begins')}
        className="aria-pressed:bg-act-wash"
      >
        Select several
      </Button>
      <Tool isReady={isRange} onPress={() => grid.fill('right')}>
        Fill right
      </Tool>
      <Tool isReady={isRange} onPress={() => grid.fill('down')}>
        Fill down
      </Tool>
    </fieldset>
  );
}

interface ToolProps {
  readonly isReady: boolean;
  readonly onPress: () => void;
  readonly children: ReactNode;
}

/** A button that keeps the keyboard when there is nothing more for it to do. */
function Tool({ isReady, onPress, children }: ToolProps) {
  return (
    <Button
      aria-disabled={!isReady}
      onClick={() => isReady && onPress()}
      className="aria-disabled:cursor-not-allowed! aria-disabled:border-edge aria-disabled:bg-transparent aria-disabled:text-ink3"
    >
      {children}
    </Button>
  );
}
