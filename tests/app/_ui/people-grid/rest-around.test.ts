import { describe, expect, it } from 'vitest';
import { restAround } from '@/app/_ui/people-grid/rest-around';
import type { BoardCell } from '@/modules/roster';

function shift(startMinute: number, endMinute: number): BoardCell {
  return {
    personId: 'per_1',
    date: '2027-02-01',
    kindId: 'knd_1',
    postSkillId: 'ski_1',
    startMinute,
    endMinute,
    paidMinutes: endMinute - startMinute,
    isPinned: false,
  };
}

describe('rest around a shift', () => {
  const late = shift(900, 1380);

  it('is the time to the shifts before and after it, in any order', () => {
    const others = [shift(3300, 3780), shift(-540, -60), shift(1860, 2340), late];
    expect(restAround(others, late)).toEqual({ beforeMinutes: 960, afterMinutes: 480 });
  });

  it('is not known where no other shift is', () => {
    expect(restAround([late], late)).toEqual({ beforeMinutes: null, afterMinutes: null });
  });
});
