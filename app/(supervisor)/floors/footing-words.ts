import { hours } from '@/app/_ui/clock';
import type { Footing } from '@/modules/problem';
import { assertNever } from '@/modules/units';

/** How the hours stand: contracts suffice, overtime is needed, or even overtime does not suffice. */
export type FootingState = 'enough' | 'overtime' | 'lack';

export function footingState({ overtimeNeededMinutes, lackMinutes }: Footing): FootingState {
  if (lackMinutes > 0) return 'lack';
  return overtimeNeededMinutes > 0 ? 'overtime' : 'enough';
}

/** The headline. Enough hours are necessary, not sufficient: it never says that floors can be met. */
export function footingHeadline(footing: Footing): string {
  const state = footingState(footing);
  switch (state) {
    case 'enough':
      return 'Enough hours';
    case 'overtime':
      return 'Enough hours, with overtime';
    case 'lack':
      return `${hours(footing.overtimeNeededMinutes)} more than contracts give`;
    default:
      return assertNever(state);
  }
}

/** What follows from the sums, in one or two sentences. */
export function footingLead(footing: Footing): string {
  const { overtimeNeededMinutes: overtime, lackMinutes: lack } = footing;
  const state = footingState(footing);
  switch (state) {
    case 'enough':
      return '';
    case 'overtime':
      return `At least ${hours(overtime)} can only be overtime.`;
    case 'lack':
      return `Of these, overtime cannot give ${hours(lack)}: the floors of this period cannot all hold.`;
    default:
      return assertNever(state);
  }
}

/** One skill's line: `832 h needed`, and how that stands to the contracts of its own people. */
export function skillBalance(line: Footing['bySkill'][number]): {
  readonly needed: string;
  readonly balance: string;
  readonly isOver: boolean;
} {
  const left = line.ownMinutes - line.neededMinutes;
  const needed = `${hours(line.neededMinutes)} needed`;
  if (line.skillId === null)
    return { needed, balance: 'beyond the floors of skills', isOver: false };
  if (left < 0) return { needed, balance: `${hours(-left)} more than own contracts`, isOver: true };
  return {
    needed,
    balance: left > 0 ? `${hours(left)} left for other skills` : 'own contracts give just that',
    isOver: false,
  };
}

/** Shares of a bar, in percent of the scale: held by contracts, missing, and left over. */
export function barShares(neededMinutes: number, givenMinutes: number, scaleMinutes: number) {
  const percent = (minutes: number) => (Math.max(0, minutes) * 100) / Math.max(1, scaleMinutes);
  return {
    held: percent(Math.min(neededMinutes, givenMinutes)),
    missing: percent(neededMinutes - givenMinutes),
    left: percent(givenMinutes - neededMinutes),
  };
}
