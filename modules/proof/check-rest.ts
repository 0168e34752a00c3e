import { type Problem, type ProblemPerson, rulesOf } from '../problem';
import type { Duty, Finding, Subject } from './duties';
import type { Breach } from './proof';
import { clockWords, dateOfDay, dateWords, durationWords } from './words';

interface Stint {
  readonly dayIndex: number;
  readonly startMinute: number;
  readonly endMinute: number;
  readonly name: string;
  /** Of this roster; the others lie before or after it and stand fast. */
  readonly isPlanned: boolean;
}

/**
 * Rest in minutes that truly elapse between the end of any earlier shift and the start of the next,
 * shifts before and after the period included. Directive 2003/88/EC, Art. 3 asks for 11 hours.
 */
export function checkRest({ problem, dutiesOf }: Subject): Finding {
  let cases = 0;
  const breaches: Breach[] = [];
  for (const person of problem.people) {
    const { restMinutes } = rulesOf(problem, person);
    let latest: Stint | null = null;
    for (const stint of stintsOf(person, dutiesOf(person))) {
      if (latest && (latest.isPlanned || stint.isPlanned)) {
        cases += 1;
        if (stint.startMinute - latest.endMinute < restMinutes) {
          breaches.push(describe(problem, person, latest, stint));
        }
      }
      if (!latest || stint.endMinute > latest.endMinute) latest = stint;
    }
  }
  return { rule: 'restMinutes', cases, breaches };
}

function stintsOf({ history, following }: ProblemPerson, duties: readonly Duty[]): Stint[] {
  const around = [...history, ...following].map((stint) => ({
    ...stint,
    name: 'the shift',
    isPlanned: false,
  }));
  const planned = duties.map(({ shift }) => ({ ...shift, name: shift.kindName, isPlanned: true }));
  return [...around, ...planned].sort((one, other) => one.startMinute - other.startMinute);
}

function describe(problem: Problem, person: ProblemPerson, first: Stint, next: Stint): Breach {
  const { restMinutes } = rulesOf(problem, person);
  const date = dateOfDay(problem, (next.isPlanned ? next : first).dayIndex);
  const on = (stint: Stint): string =>
    `${stint.name} on ${dateWords(dateOfDay(problem, stint.dayIndex))}`;
  const gap = next.startMinute - first.endMinute;
  const apart = gap < 0 ? `an overlap of ${durationWords(-gap)}` : `${durationWords(gap)} apart`;
  const sentence = `${person.name}: ${on(first)} ends ${clockWords(problem, first.endMinute)} and ${on(next)} starts ${clockWords(problem, next.startMinute)}, ${apart}; the least is ${durationWords(restMinutes)}.`;
  return { rule: 'restMinutes', personId: person.id, date, sentence };
}
