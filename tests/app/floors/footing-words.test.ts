import { describe, expect, it } from 'vitest';
import {
  barShares,
  footingHeadline,
  footingLead,
  skillBalance,
} from '@/app/(supervisor)/floors/footing-words';
import type { Footing } from '@/modules/problem';

const footing = (overtimeNeededMinutes: number, lackMinutes: number): Footing => ({
  neededMinutes: 3392 * 60,
  availableMinutes: 3304 * 60,
  bySkill: [],
  overtimeNeededMinutes,
  lackMinutes,
});
const line = (neededMinutes: number, ownMinutes: number, skillId: string | null = 'ski_vet') =>
  skillBalance({ skillId, name: 'Vet', neededMinutes, ownMinutes });

describe('the headline over the hours', () => {
  it.each([
    ['contracts suffice', 0, 0, 'Enough hours'],
    ['overtime is needed and allowed', 88 * 60, 0, 'Enough hours, with overtime'],
    ['even overtime is too little', 88 * 60, 8 * 60, '88 h more than contracts give'],
  ])('%s', (_, overtime, lack, headline) => {
    expect(footingHeadline(footing(overtime, lack))).toBe(headline);
  });

  it('never promises that the floors hold', () => {
    for (const [overtime, lack] of [
      [0, 0],
      [60, 0],
      [60, 30],
    ] as const) {
      const sums = footing(overtime, lack);
      expect(`${footingHeadline(sums)} ${footingLead(sums)}`).not.toMatch(/can be|will hold|met/);
    }
  });

  it('says how much overtime cannot give', () => {
    expect(footingLead(footing(88 * 60, 8 * 60))).toContain('overtime cannot give 8 h');
  });
});

describe('a skill', () => {
  it.each([
    [
      'needs more than its own people have',
      832 * 60,
      824 * 60,
      '8 h more than own contracts',
      true,
    ],
    ['leaves hours to others', 672 * 60, 712 * 60, '40 h left for other skills', false],
    ['needs just what it has', 480, 480, 'own contracts give just that', false],
  ])('%s', (_, needed, own, balance, isOver) => {
    expect(line(needed, own)).toMatchObject({ balance, isOver });
  });

  it('has no contracts of its own when anybody counts', () => {
    expect(line(480, 0, null).isOver).toBe(false);
  });
});

it('cuts a bar into what is held, missing and left', () => {
  expect(barShares(80, 60, 100)).toEqual({ held: 60, missing: 20, left: 0 });
  expect(barShares(60, 80, 100)).toEqual({ held: 60, missing: 0, left: 20 });
  expect(barShares(0, 0, 0)).toEqual({ held: 0, missing: 0, left: 0 });
});
