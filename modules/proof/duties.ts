import type { PlannedRoster, Problem, ProblemPerson, ProblemShift } from '../problem';
import type { Breach } from './proof';
import type { ProofRule } from './proof-rules';

/** One assignment with everything it refers to. */
export interface Duty {
  readonly person: ProblemPerson;
  readonly shift: ProblemShift;
  readonly postSkillId: string;
}

/** What the checks read: the problem and, by person, what the roster gives them, earliest first. */
export interface Subject {
  readonly problem: Problem;
  readonly duties: readonly Duty[];
  readonly dutiesOf: (person: ProblemPerson) => readonly Duty[];
}

/** What one check found: how many cases it looked at, and those that break the rule. */
export interface Finding {
  readonly rule: ProofRule;
  readonly cases: number;
  readonly breaches: readonly Breach[];
}

/** Resolves a roster; assignments that refer to nothing are left out, check-references names them. */
export function readSubject(problem: Problem, roster: PlannedRoster): Subject {
  const people = new Map(problem.people.map((person) => [person.id, person]));
  const shifts = new Map(problem.shifts.map((shift) => [shift.index, shift]));
  const skillIds = new Set(problem.skills.map((skill) => skill.id));
  const duties = roster.flatMap(({ personId, shiftIndex, postSkillId }): Duty[] => {
    const person = people.get(personId);
    const shift = shifts.get(shiftIndex);
    return person && shift && skillIds.has(postSkillId) ? [{ person, shift, postSkillId }] : [];
  });
  const byPerson = new Map<string, Duty[]>();
  for (const duty of duties) {
    byPerson.set(duty.person.id, [...(byPerson.get(duty.person.id) ?? []), duty]);
  }
  for (const own of byPerson.values()) {
    own.sort((one, other) => one.shift.startMinute - other.shift.startMinute);
  }
  return { problem, duties, dutiesOf: (person) => byPerson.get(person.id) ?? [] };
}
