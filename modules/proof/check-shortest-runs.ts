import { type Problem, type ProblemPerson, rulesOf } from '../problem';
import type { Finding, Subject } from './duties';
import type { Breach } from './proof';
import { lengthOf, type Run, runsOf, spanWords } from './runs';
import { countWords, dateOfDay } from './words';

interface Limit {
  readonly rule: 'shortestRunDays' | 'shortestRunFreeDays';
  readonly wants: 'work' | 'free';
}

/** Fewest days in a row with a shift; a run on the first or the last day of the period is exempt. */
export const checkShortRunOfDays = (subject: Subject): Finding =>
  checkRuns(subject, { rule: 'shortestRunDays', wants: 'work' });

/** Fewest days in a row without a shift, leave included; exempt in the same way. */
export const checkShortRunOfFreeDays = (subject: Subject): Finding =>
  checkRuns(subject, { rule: 'shortestRunFreeDays', wants: 'free' });

function checkRuns({ problem, dutiesOf }: Subject, limit: Limit): Finding {
  const last = problem.days.length - 1;
  let cases = 0;
  const breaches = problem.people.flatMap((person): Breach[] => {
    const least = rulesOf(problem, person)[limit.rule];
    if (least === null) return [];
    const worked = new Set(dutiesOf(person).map(({ shift }) => shift.dayIndex));
    const days = [...problem.days.keys()].filter(
      (day) => worked.has(day) === (limit.wants === 'work'),
    );
    const runs = runsOf(days).filter(({ from, to }) => from > 0 && to < last);
    cases += runs.length;
    return runs
      .filter((run) => lengthOf(run) < least)
      .map((run) => describe(problem, person, run, limit, least));
  });
  return { rule: limit.rule, cases, breaches };
}

function describe(
  problem: Problem,
  person: ProblemPerson,
  run: Run,
  { rule, wants }: Limit,
  least: number,
): Breach {
  const off = wants === 'free' ? ' off' : '';
  const sentence = `${person.name}: ${countWords(lengthOf(run), 'day')}${off} in a row, ${spanWords(problem, run)}; the least is ${least}.`;
  return { rule, personId: person.id, date: dateOfDay(problem, run.from), sentence };
}
