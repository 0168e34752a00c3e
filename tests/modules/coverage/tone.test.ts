import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { toneOf } from '@/modules/coverage';

const kind = (hour: number, isNight = false) => ({ startMinute: hour * 60, isNight });

describe('the tone of a shift kind', () => {
  it.each([
    ['Early, Day, Late, Night', [kind(7), kind(9), kind(15), kind(23, true)], [0, 1, 2, 3]],
    ['two kinds of the day', [kind(8), kind(12)], [0, 2]],
    ['a kind alone', [kind(12)], [0]],
    ['nights only', [kind(20, true), kind(22, true)], [3, 3]],
    ['five kinds of the day', [6, 8, 10, 12, 14].map((hour) => kind(hour)), [0, 1, 1, 2, 2]],
    ['two kinds that start together', [kind(7), kind(7), kind(15)], [0, 0, 2]],
  ])('follows the start: %s', (_, kinds, tones) => {
    expect(kinds.map((one) => toneOf(one, kinds))).toEqual(tones);
  });

  it('exists for a retired kind that is not among the others', () => {
    expect(toneOf(kind(15), [kind(7), kind(9)])).toBe(2);
    expect(toneOf(kind(6), [])).toBe(0);
  });

  it('never grows lighter with a later start', () => {
    const kinds = fc.array(
      fc.record({ startMinute: fc.integer({ min: 0, max: 1439 }), isNight: fc.constant(false) }),
    );
    fc.assert(
      fc.property(kinds, (day) => {
        const sorted = [...day].sort((one, other) => one.startMinute - other.startMinute);
        const tones = sorted.map((one) => toneOf(one, day));
        expect(tones).toEqual([...tones].sort());
      }),
    );
  });
});
