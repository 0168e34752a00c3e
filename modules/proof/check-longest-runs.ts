import { type Problem, type ProblemPerson, rulesOf } from '../problem';
import type { Finding, Subject } from './duties';
import type { Breach } from './proof';
import { lengthOf, type Run, runsOf, spanWords } from './runs';
import { dateOfDay } from './words';

interface Limit {
  readonly rule: 'longestRunDays' | 'longestRunNights';
  readonly noun: string;
  readonly counts: (stint: { readonly isNight: boolean }) => boolean;
}

/** Longest run of days with a shift; days before and after the period lengthen it. */
export const checkRunOfDays = (subject: Subject): Finding =>
  checkRuns(subject, { rule: 'longestRunDays', noun: 'days', counts: () => true });

/** Longest run of Nights: days in a row on which a Night begins, those around the period included. */
export const checkRunOfNights = (subject: Subject): Finding =>
  checkRuns(subject, {
    rule: 'longestRunNights',
    noun: 'nights',
    counts: ({ isNight }) => isNight,
  });

function checkRuns({ problem, dutiesOf }: Subject, limit: Limit): Finding {
  let cases = 0;
  const breaches = problem.people.flatMap((person): Breach[] => {
    const most = rulesOf(problem, person)[limit.rule];
    if (most === null) return [];
    const planned = dutiesOf(person).map(({ shift }) => shift);
    const stints = [...person.history, ...planned, ...person.following].filter(limit.counts);
    const runs = runsOf(stints.map(({ dayIndex }) => dayIndex)).filter((run) =>
      touches(problem, run),
    );
    cases += runs.length;
    return runs
      .filter((run) => lengthOf(run) > most)
      .map((run) => describe(problem, person, run, limit, most));
  });
  return { rule: limit.rule, cases, breaches };
}

/** A run that lies before or after the period altogether stands fast: this roster cannot change it. */
const touches = ({ days }: Problem, { from, to }: Run): boolean => to >= 0 && from < days.length;

function describe(
  problem: Problem,
  person: ProblemPerson,
  run: Run,
  { rule, noun }: Limit,
  most: number,
): Breach {
  // The first day that is too many, or the day of the period next to it.
  const tooMany = Math.min(Math.max(0, run.from + most), problem.days.length - 1);
  const sentence = `${person.name}: ${lengthOf(run)} ${noun} in a row, ${spanWords(problem, run)}; the most is ${most}.`;
  return { rule, personId: person.id, date: dateOfDay(problem, tooMany), sentence };
}
