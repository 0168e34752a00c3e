import type { Problem, ProblemPerson } from '../problem';
import type { Finding, Subject } from './duties';
import type { Breach } from './proof';
import type { ProofRule } from './proof-rules';
import { dateOfDay, dateWords } from './words';

interface Run {
  readonly from: number;
  readonly to: number;
}

/** Longest run of days with a shift; days before the period count on into it. */
export function checkRunOfDays(subject: Subject): Finding {
  const most = subject.problem.rules.longestRunDays;
  return checkRuns(subject, 'longestRunDays', most, 'days', () => true);
}

/** Longest run of nights: days in a row on which a night begins, history included. */
export function checkRunOfNights(subject: Subject): Finding {
  const most = subject.problem.rules.longestRunNights;
  return checkRuns(subject, 'longestRunNights', most, 'nights', (stint) => stint.isNight);
}

function checkRuns(
  { problem, dutiesOf }: Subject,
  rule: ProofRule,
  most: number | null,
  noun: string,
  counts: (stint: { readonly isNight: boolean }) => boolean,
): Finding {
  if (most === null) return { rule, cases: 0, breaches: [] };
  let cases = 0;
  const breaches: Breach[] = [];
  for (const person of problem.people) {
    const stints = [...person.history, ...dutiesOf(person).map(({ shift }) => shift)];
    const runs = runsOf(stints.filter(counts).map(({ dayIndex }) => dayIndex));
    // A run that ended before the period is past: nobody can change it now.
    for (const run of runs.filter(({ to }) => to >= 0)) {
      cases += 1;
      if (run.to - run.from + 1 > most) {
        breaches.push(describe(problem, person, run, rule, `${noun} in a row`, most));
      }
    }
  }
  return { rule, cases, breaches };
}

function describe(
  problem: Problem,
  person: ProblemPerson,
  { from, to }: Run,
  rule: ProofRule,
  noun: string,
  most: number,
): Breach {
  // The first day that is too many; when history alone is too long, the first day of the period.
  const date = dateOfDay(problem, Math.max(0, from + most));
  const span = `${dateWords(dateOfDay(problem, from))} to ${dateWords(dateOfDay(problem, to))}`;
  const sentence = `${person.name}: ${to - from + 1} ${noun}, ${span}; the most is ${most}.`;
  return { rule, personId: person.id, date, sentence };
}

function runsOf(dayIndexes: readonly number[]): Run[] {
  const days = [...new Set(dayIndexes)].sort((one, other) => one - other);
  const runs: { from: number; to: number }[] = [];
  for (const day of days) {
    const last = runs.at(-1);
    if (last && last.to === day - 1) last.to = day;
    else runs.push({ from: day, to: day });
  }
  return runs;
}
