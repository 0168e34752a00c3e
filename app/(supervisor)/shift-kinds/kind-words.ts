import type { ShiftKind } from '@/modules/coverage';
import type { Skill } from '@/modules/people';

/** Paid minutes of a shift on a day without a clock change. */
export const paidMinutes = ({
  startMinute,
  endMinute,
  unpaidBreakMinutes,
}: Pick<ShiftKind, 'startMinute' | 'endMinute' | 'unpaidBreakMinutes'>): number =>
  endMinute - startMinute - unpaidBreakMinutes;

/** The skills that may be posted on a shift kind, in the team's order: `Vet, Nurse` or `all`. */
export const sayPosts = (
  { skillIds }: Pick<ShiftKind, 'skillIds'>,
  skills: readonly Skill[],
): string =>
  skillIds === null
    ? 'all'
    : skills
        .filter(({ id }) => skillIds.includes(id))
        .map(({ name }) => name)
        .join(', ');

/** Shortest and longest paid time among kinds, in minutes; null without any. */
export function paidRange(
  kinds: readonly Pick<ShiftKind, 'startMinute' | 'endMinute' | 'unpaidBreakMinutes'>[],
): { readonly least: number; readonly most: number } | null {
  if (kinds.length === 0) return null;
  const paid = kinds.map(paidMinutes);
  return { least: Math.min(...paid), most: Math.max(...paid) };
}
