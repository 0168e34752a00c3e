import type { Skill } from '@/modules/people';

/** The name of a skill, or the word for no skill. */
export const skillName = (
  skillId: string | null,
  skills: readonly Skill[],
  otherwise: string,
): string => skills.find(({ id }) => id === skillId)?.name ?? otherwise;
