import { expect, it } from 'vitest';
import { brickPieces, lineMarks } from '@/app/(supervisor)/shift-kinds/brick-pieces';

it.each([
  ['an early', 420, 900, [{ left: 0, width: 100 / 3 }]],
  [
    'a night, in the column of the day on which it starts',
    1380,
    1860,
    [{ left: 200 / 3, width: 100 / 3 }],
  ],
  [
    'a shift that begins before the day of the team',
    300,
    780,
    [
      { left: 1320 / 14.4, width: 120 / 14.4 },
      { left: 0, width: 360 / 14.4 },
    ],
  ],
  ['a whole day', 420, 1860, [{ left: 0, width: 100 }]],
])('draws %s at its true hours', (_, startMinute, endMinute, pieces) => {
  const drawn = brickPieces({ startMinute, endMinute }, 420);
  expect(drawn).toHaveLength(pieces.length);
  drawn.forEach(({ left, width }, index) => {
    expect(left).toBeCloseTo(pieces[index]?.left ?? Number.NaN);
    expect(width).toBeCloseTo(pieces[index]?.width ?? Number.NaN);
  });
});

it('marks the line every three hours from the start of the day', () => {
  const marks = lineMarks(420);
  expect(marks[0]).toEqual({ minute: 420, left: 0 });
  expect(marks.at(-1)).toEqual({ minute: 1860, left: 100 });
});
