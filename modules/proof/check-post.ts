import type { Duty, Finding, Subject } from './duties';
import type { Breach } from './proof';
import { dateOfDay, dateWords } from './words';

/** A post is a skill that the person holds and that the kind of the shift admits. */
export function checkPost({ problem, duties }: Subject): Finding {
  const names = new Map(problem.skills.map((skill) => [skill.id, skill.name]));
  const nameOf = (skillId: string): string => names.get(skillId) ?? skillId;
  const breaches = duties.flatMap((duty): Breach[] => {
    const date = dateOfDay(problem, duty.shift.dayIndex);
    const start = `${duty.person.name}: ${nameOf(duty.postSkillId)} on ${duty.shift.kindName}, ${dateWords(date)}`;
    return reasonsAgainst(duty, nameOf).map((reason) => ({
      rule: 'post',
      personId: duty.person.id,
      date,
      sentence: `${start}, but ${reason}.`,
    }));
  });
  return { rule: 'post', cases: duties.length, breaches };
}

function reasonsAgainst(
  { person, shift, postSkillId }: Duty,
  nameOf: (skillId: string) => string,
): string[] {
  const list = (skillIds: readonly string[]): string => skillIds.map(nameOf).join(', ');
  const reasons: string[] = [];
  if (!person.skillIds.includes(postSkillId)) {
    reasons.push(`the skills held are ${list(person.skillIds)}`);
  }
  if (shift.postSkillIds && !shift.postSkillIds.includes(postSkillId)) {
    reasons.push(`the shift has posts for ${list(shift.postSkillIds)} only`);
  }
  return reasons;
}
