import type { FloorNeeds } from '@/modules/coverage';
import { columnNames, type FloorRow, rowName } from './floor-rows';

/** Cells in words: `Vet Night 23:00–07:00, Monday: 2`, or how many when there are more. */
export function sayCells(rows: readonly FloorRow[], cells: FloorNeeds): string {
  const [cell] = cells;
  const row = rows.find(({ floor }) => floor.id === cell?.floorId);
  if (cells.length !== 1 || !cell || !row) return `${cells.length} numbers`;
  return `${rowName(row)}, ${columnNames[cell.day]}: ${cell.people}`;
}
