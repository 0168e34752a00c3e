import type { KeyboardEvent } from 'react';
import { buttonClass } from '@/app/_ui/button';
import { type FloorRow, rowName } from './floor-rows';
import { readKey } from './grid-keys';
import type { GridPlace } from './grid-selection';
import { topLine } from './top-line';
import { type FloorGrid, runCommand } from './use-floor-grid';

interface Props {
  readonly grid: FloorGrid;
  readonly row: FloorRow;
  readonly place: GridPlace;
  readonly onPress: () => void;
}

/** The last cell of a row. Its button is reached by arrow keys, so that the grid stays one tab stop. */
export function RowButton({ grid, row, place, onPress }: Props) {
  const { active } = grid.selection;
  const isActive = active.row === place.row && active.column === place.column;
  const onKeyDown = (event: KeyboardEvent) => {
    const command = readKey(event, false);
    if (command?.do !== 'move' && command?.do !== 'undo' && command?.do !== 'redo') return;
    event.preventDefault();
    runCommand(grid, command);
  };
  return (
    <td className={`p-0 text-right ${topLine(row)}`}>
      <button
        type="button"
        data-place={`${place.row} ${place.column}`}
        tabIndex={isActive ? 0 : -1}
        aria-label={`Change ${rowName(row)}`}
        className={buttonClass('quiet', 'text-second! outline-offset-0!')}
        onFocus={() => isActive || grid.select(place, false)}
        onKeyDown={onKeyDown}
        onClick={onPress}
      >
        Change…
      </button>
    </td>
  );
}
