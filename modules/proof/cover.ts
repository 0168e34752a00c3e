import type { ProblemFloor } from '../problem';
import type { Duty } from './duties';
import type { Interval } from './minute-counts';

/**
 * Shifts of everybody who counts for a window. Seated: those in the post of the skill, or in any post.
 * Shared: everybody who holds the skill, or everybody.
 */
export const coverOf = (
  duties: readonly Duty[],
  { counting, skillId }: Pick<ProblemFloor, 'counting' | 'skillId'>,
): Interval[] =>
  duties
    .filter(
      ({ person, postSkillId }) =>
        skillId === null ||
        (counting === 'seated' ? postSkillId === skillId : person.skillIds.includes(skillId)),
    )
    .map(({ shift }) => shift);
