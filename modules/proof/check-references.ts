import type { PlannedRoster, Problem } from '../problem';
import type { Finding } from './duties';
import type { Breach } from './proof';
import { firstDate } from './words';

/** Every assignment names a person, a shift and a skill that the problem has. */
export function checkReferences(problem: Problem, roster: PlannedRoster): Finding {
  const people = new Set(problem.people.map((person) => person.id));
  const shifts = new Map(problem.shifts.map((shift) => [shift.index, shift]));
  const skills = new Set(problem.skills.map((skill) => skill.id));
  const breaches = roster.flatMap(({ personId, shiftIndex, postSkillId }): Breach[] => {
    const shift = shifts.get(shiftIndex);
    const unknown = [
      people.has(personId) ? null : `the person ${personId}`,
      shift ? null : `the shift ${shiftIndex}`,
      skills.has(postSkillId) ? null : `the post ${postSkillId}`,
    ].filter((part) => part !== null);
    if (unknown.length === 0) return [];
    const date = problem.days[shift?.dayIndex ?? 0]?.date ?? firstDate(problem);
    const sentence = `An assignment names ${unknown.join(' and ')}, unknown in this period.`;
    return [{ rule: 'references', personId, date, sentence }];
  });
  return { rule: 'references', cases: roster.length, breaches };
}
