import { expect, it } from 'vitest';
import { paidMinutes, paidRange, sayPosts } from '@/app/(supervisor)/shift-kinds/kind-words';
import { skills } from '../floors/sample-floors';

const early = { startMinute: 420, endMinute: 900, unpaidBreakMinutes: 30 };
const long = { startMinute: 420, endMinute: 1140, unpaidBreakMinutes: 60 };

it('pays a shift without its break', () => {
  expect(paidMinutes(early)).toBe(450);
  expect(paidRange([early, long])).toEqual({ least: 450, most: 660 });
  expect(paidRange([])).toBeNull();
});

it('names the skills in the order of the team', () => {
  expect(sayPosts({ skillIds: ['ski_nurse', 'ski_vet'] }, skills)).toBe('Vet, Nurse');
  expect(sayPosts({ skillIds: null }, skills)).toBe('all');
});
