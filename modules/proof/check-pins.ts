import type { Problem, ProblemPerson } from '../problem';
import type { Duty, Finding, Subject } from './duties';
import type { Breach } from './proof';
import { dateOfDay, dateWords } from './words';

type Pin = ProblemPerson['pins'][number];

/** Pinned shifts stay with their person (and post, where pinned), pinned days off stay free. */
export function checkPins({ problem, dutiesOf }: Subject): Finding {
  let cases = 0;
  const breaches = problem.people.flatMap((person): Breach[] =>
    person.pins.flatMap((pin): Breach[] => {
      cases += 1;
      const duties = dutiesOf(person).filter(({ shift }) => shift.dayIndex === pin.dayIndex);
      return isKept(pin, duties) ? [] : [describe(problem, person, pin, duties)];
    }),
  );
  return { rule: 'pins', cases, breaches };
}

function isKept(pin: Pin, duties: readonly Duty[]): boolean {
  if (pin.shiftIndex === null) return duties.length === 0;
  return duties.some(
    (duty) =>
      duty.shift.index === pin.shiftIndex &&
      (pin.postSkillId === null || duty.postSkillId === pin.postSkillId),
  );
}

function describe(
  problem: Problem,
  person: ProblemPerson,
  pin: Pin,
  duties: readonly Duty[],
): Breach {
  const skillName = (id: string): string =>
    problem.skills.find((skill) => skill.id === id)?.name ?? id;
  const pinned = problem.shifts.find((shift) => shift.index === pin.shiftIndex);
  const post = pin.postSkillId === null ? '' : ` as ${skillName(pin.postSkillId)}`;
  const wanted = pin.shiftIndex === null ? 'off' : `${pinned?.kindName ?? 'a shift'}${post}`;
  const found = duties.map((duty) => `${duty.shift.kindName} as ${skillName(duty.postSkillId)}`);
  const date = dateOfDay(problem, pin.dayIndex);
  const sentence = `${person.name}: ${dateWords(date)} is pinned to ${wanted}, the roster has ${found.join(', ') || 'no shift'}.`;
  return { rule: 'pins', personId: person.id, date, sentence };
}
