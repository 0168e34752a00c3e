import type { GridStep } from './grid-selection';

/** What a key asks of the grid. */
export type GridCommand =
  | { readonly do: 'move'; readonly step: GridStep; readonly isExtending: boolean }
  /** null opens the number that stands there; a text replaces it. */
  | { readonly do: 'edit'; readonly text: string | null }
  | { readonly do: 'clear' | 'undo' | 'redo' | 'collapse' }
  | { readonly do: 'fill'; readonly towards: 'right' | 'down' };

interface Key {
  readonly key: string;
  readonly shiftKey: boolean;
  readonly ctrlKey: boolean;
  readonly metaKey: boolean;
  readonly altKey: boolean;
}

const far = Number.POSITIVE_INFINITY;

const steps: Readonly<Record<string, GridStep>> = {
  ArrowUp: { rows: -1, columns: 0 },
  ArrowDown: { rows: 1, columns: 0 },
  ArrowLeft: { rows: 0, columns: -1 },
  ArrowRight: { rows: 0, columns: 1 },
  Home: { rows: 0, columns: -far },
  End: { rows: 0, columns: far },
};

/**
 * Reads a key pressed on a cell; null leaves it to the browser. Fill keys count only while a range is
 * selected, so that Ctrl+R and Ctrl+D keep their usual meaning otherwise.
 */
export function readKey(pressed: Key, hasRange: boolean): GridCommand | null {
  const { key, shiftKey, altKey } = pressed;
  const isControl = pressed.ctrlKey || pressed.metaKey;
  if (altKey) return null;
  if (isControl) return readControlKey(key, shiftKey, hasRange);
  const step = steps[key];
  if (step) return { do: 'move', step, isExtending: shiftKey };
  if (/^\d$/.test(key)) return { do: 'edit', text: key };
  if (key === 'Enter' || key === 'F2') return { do: 'edit', text: null };
  if (key === 'Delete' || key === 'Backspace') return { do: 'clear' };
  return key === 'Escape' && hasRange ? { do: 'collapse' } : null;
}

/** Where the focus goes when a number is finished with this key; null while it is still typed. */
export function readFinishingKey({ key, shiftKey }: Key): GridStep | null {
  if (key === 'Enter') return { rows: shiftKey ? -1 : 1, columns: 0 };
  return key.startsWith('Arrow') ? (steps[key] ?? null) : null;
}

function readControlKey(key: string, isShift: boolean, hasRange: boolean): GridCommand | null {
  const letter = key.toLowerCase();
  if (letter === 'z') return { do: isShift ? 'redo' : 'undo' };
  if (letter === 'y') return { do: 'redo' };
  if (hasRange && letter === 'r') return { do: 'fill', towards: 'right' };
  if (hasRange && letter === 'd') return { do: 'fill', towards: 'down' };
  if (key === 'Home') return toCorner(-far, isShift);
  return key === 'End' ? toCorner(far, isShift) : null;
}

const toCorner = (distance: number, isExtending: boolean): GridCommand => ({
  do: 'move',
  step: { rows: distance, columns: distance },
  isExtending,
});
