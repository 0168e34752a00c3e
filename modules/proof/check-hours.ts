import type { Duty, Finding, Subject } from './duties';
import type { Breach } from './proof';
import { dateWords, durationWords, firstDate } from './words';

/** Paid minutes of a person's shifts, without leave. */
export const workedMinutes = (duties: readonly Duty[]): number =>
  duties.reduce((sum, { shift }) => sum + shift.paidMinutes, 0);

/** Contract hours: minimum <= worked paid minutes + leave credit <= maximum, for everybody. */
export function checkHours({ problem, dutiesOf }: Subject): Finding {
  const breaches = problem.people.flatMap((person): Breach[] => {
    const minutes = workedMinutes(dutiesOf(person)) + person.creditMinutes;
    const limit =
      minutes < person.minimumMinutes
        ? `the least is ${durationWords(person.minimumMinutes)}`
        : minutes > person.maximumMinutes
          ? `the most is ${durationWords(person.maximumMinutes)}`
          : null;
    if (limit === null) return [];
    const credit = person.creditMinutes > 0 ? ' with leave' : '';
    const sentence = `${person.name}: ${durationWords(minutes)}${credit} in the period from ${dateWords(firstDate(problem))}; ${limit}.`;
    return [{ rule: 'contractHours', personId: person.id, date: firstDate(problem), sentence }];
  });
  return { rule: 'contractHours', cases: problem.people.length, breaches };
}
