import { expect, it } from 'vitest';
import { sayCells } from '@/app/(supervisor)/floors/say-cells';
import { rowsOf, sampleFloor } from './sample-floors';

const rows = rowsOf(sampleFloor());

it('names a single cell in full and counts several', () => {
  const cell = { floorId: 'flr_1', day: 0, people: 2 };
  expect(sayCells(rows, [cell])).toBe('Vet Early 07:00–15:00, Monday: 2');
  expect(sayCells(rows, [cell, { ...cell, day: 1 }])).toBe('2 numbers');
});
