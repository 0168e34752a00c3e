import type { Problem, ProblemPerson } from '../problem';
import type { Duty, Finding, Subject } from './duties';
import type { Breach } from './proof';
import { clockWords, dateOfDay, dateWords, durationWords } from './words';

interface Stint {
  readonly dayIndex: number;
  readonly startMinute: number;
  readonly endMinute: number;
  readonly name: string;
}

/**
 * Rest in minutes that truly elapse between the end of any earlier shift and the start of the next,
 * shifts before the period included. Directive 2003/88/EC, Art. 3 asks for 11 hours.
 */
export function checkRest({ problem, dutiesOf }: Subject): Finding {
  let cases = 0;
  const breaches: Breach[] = [];
  for (const person of problem.people) {
    const stints = stintsOf(person, dutiesOf(person));
    let latest: Stint | null = null;
    for (const stint of stints) {
      if (latest && stint.dayIndex >= 0) {
        cases += 1;
        const rest = stint.startMinute - latest.endMinute;
        if (rest < problem.rules.restMinutes) {
          breaches.push(describe(problem, person, latest, stint));
        }
      }
      if (!latest || stint.endMinute > latest.endMinute) latest = stint;
    }
  }
  return { rule: 'restMinutes', cases, breaches };
}

function stintsOf(person: ProblemPerson, duties: readonly Duty[]): Stint[] {
  const before = person.history.map((past) => ({ ...past, name: 'the shift' }));
  const planned = duties.map(({ shift }) => ({ ...shift, name: shift.kindName }));
  return [...before, ...planned].sort((one, other) => one.startMinute - other.startMinute);
}

function describe(problem: Problem, person: ProblemPerson, first: Stint, next: Stint): Breach {
  const date = dateOfDay(problem, next.dayIndex);
  const on = (stint: Stint): string =>
    `${stint.name} on ${dateWords(dateOfDay(problem, stint.dayIndex))}`;
  const gap = next.startMinute - first.endMinute;
  const apart = gap < 0 ? `an overlap of ${durationWords(-gap)}` : `${durationWords(gap)} apart`;
  const sentence = `${person.name}: ${on(first)} ends ${clockWords(problem, first.endMinute)} and ${on(next)} starts ${clockWords(problem, next.startMinute)}, ${apart}; the least is ${durationWords(problem.rules.restMinutes)}.`;
  return { rule: 'restMinutes', personId: person.id, date, sentence };
}
