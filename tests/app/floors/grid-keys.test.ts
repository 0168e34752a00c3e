import { describe, expect, it } from 'vitest';
import { readFinishingKey, readKey } from '@/app/(supervisor)/floors/grid-keys';

const press = (key: string, held: 'shift' | 'ctrl' | 'meta' | 'alt' | '' = '') => ({
  key,
  shiftKey: held === 'shift',
  ctrlKey: held === 'ctrl',
  metaKey: held === 'meta',
  altKey: held === 'alt',
});
const far = Number.POSITIVE_INFINITY;

describe('keys on a cell', () => {
  it.each([
    ['ArrowLeft', '', { do: 'move', step: { rows: 0, columns: -1 }, isExtending: false }],
    ['ArrowDown', 'shift', { do: 'move', step: { rows: 1, columns: 0 }, isExtending: true }],
    ['End', '', { do: 'move', step: { rows: 0, columns: far }, isExtending: false }],
    ['Home', 'ctrl', { do: 'move', step: { rows: -far, columns: -far }, isExtending: false }],
    ['7', '', { do: 'edit', text: '7' }],
    ['Enter', '', { do: 'edit', text: null }],
    ['F2', '', { do: 'edit', text: null }],
    ['Delete', '', { do: 'clear' }],
    ['Backspace', '', { do: 'clear' }],
    ['z', 'ctrl', { do: 'undo' }],
    ['z', 'meta', { do: 'undo' }],
    ['y', 'ctrl', { do: 'redo' }],
  ] as const)('%s %s', (key, held, command) => {
    expect(readKey(press(key, held), false)).toEqual(command);
  });

  it('leave the rest to the browser', () => {
    for (const [key, held] of [
      ['Tab', ''],
      ['a', ''],
      ['r', 'ctrl'],
      ['d', 'ctrl'],
      ['ArrowLeft', 'alt'],
      ['Escape', ''],
    ] as const) {
      expect(readKey(press(key, held), false)).toBeNull();
    }
  });

  it('fill and collapse only while a range is selected', () => {
    expect(readKey(press('r', 'ctrl'), true)).toEqual({ do: 'fill', towards: 'right' });
    expect(readKey(press('d', 'ctrl'), true)).toEqual({ do: 'fill', towards: 'down' });
    expect(readKey(press('Escape'), true)).toEqual({ do: 'collapse' });
  });

  it('redo with Shift, whose letter is a capital', () => {
    const pressed = { ...press('Z', 'ctrl'), shiftKey: true };
    expect(readKey(pressed, false)).toEqual({ do: 'redo' });
  });
});

describe('keys while a number is typed', () => {
  it('finish it and say where to go', () => {
    expect(readFinishingKey(press('Enter'))).toEqual({ rows: 1, columns: 0 });
    expect(readFinishingKey(press('Enter', 'shift'))).toEqual({ rows: -1, columns: 0 });
    expect(readFinishingKey(press('ArrowRight'))).toEqual({ rows: 0, columns: 1 });
  });

  it('go on typing otherwise', () => {
    for (const key of ['2', 'Backspace', 'Home', 'Tab']) {
      expect(readFinishingKey(press(key))).toBeNull();
    }
  });
});
