import type { Person, Skill } from '../people';
import type { LocalDate } from '../units';

/** The skills a person can be posted in through a whole period, home skill first. */
export interface UsableSkills {
  readonly skillIds: readonly string[];
  readonly notes: readonly string[];
}

/**
 * Skills that are valid on every date of the period. A problem cannot say that a skill ends halfway, so
 * one that expires by the last date is not used at all, and a note says so.
 */
export function usableSkills(
  person: Person,
  skills: readonly Skill[],
  endsOn: LocalDate,
): UsableSkills {
  const notes: string[] = [];
  const skillIds: string[] = [];
  for (const held of [...person.skills].sort((one, other) => one.position - other.position)) {
    const skill = skills.find(({ id }) => id === held.skillId);
    if (!skill) continue;
    if (held.expiresOn === null || held.expiresOn > endsOn) skillIds.push(skill.id);
    else {
      notes.push(
        `${person.name}: the skill ${skill.name} expires on ${held.expiresOn}, so it is not used in this period.`,
      );
    }
  }
  return { skillIds, notes };
}
