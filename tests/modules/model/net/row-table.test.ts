import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { RowTable } from '@/modules/model/net/row-table';

const place = (table: RowTable, row: readonly number[]): number =>
  table.place(Int32Array.from(row), 0);

describe('a table of rows', () => {
  it('gives equal rows the same place and different ones places of their own, as a Map would', () => {
    const row = fc.array(fc.integer({ min: -2, max: 2 }), { minLength: 3, maxLength: 3 });
    fc.assert(
      fc.property(fc.array(row, { maxLength: 400 }), (rows) => {
        const table = new RowTable(3);
        const places = new Map<string, number>();
        for (const one of rows) {
          const expected = places.get(one.join()) ?? places.size;
          places.set(one.join(), expected);
          expect(place(table, one)).toBe(expected);
        }
        expect(table.count).toBe(places.size);
      }),
    );
  });

  it('keeps all rows when it grows, in the order in which they came', () => {
    const table = new RowTable(2);
    const count = 5000;
    for (let index = 0; index < count; index += 1) place(table, [index, -index * 65_537]);
    expect(table.count).toBe(count);
    for (let index = 0; index < count; index += 1) {
      expect(Array.from(table.rows.subarray(2 * index, 2 * index + 2))).toEqual([
        index,
        (-index * 65_537) | 0,
      ]);
      expect(place(table, [index, -index * 65_537])).toBe(index);
    }
    expect(table.count).toBe(count);
  });

  it('reads a row from anywhere in its source', () => {
    const table = new RowTable(2);
    const source = Int32Array.from([9, 1, 2, 1, 2]);
    expect(table.place(source, 1)).toBe(0);
    expect(table.place(source, 3)).toBe(0);
    expect(table.place(source, 0)).toBe(1);
  });
});
