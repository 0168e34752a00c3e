import { type Problem, rulesOf } from '../../problem';
import type { ModelBuilder } from '../model-builder';
import type { PersonWork, WorkColumn } from '../work-columns';

/**
 * Longest run of days: in any `longestRunDays + 1` days in a row at least one is free. Rows
 * run(person, first day): sum of work over the window <= longestRunDays - days worked in it before and after
 * the period. A window may begin before the period or end after it.
 * House rule; see `ruleSources`.
 */
export function addDayRunRows(builder: ModelBuilder, problem: Problem, work: PersonWork): void {
  const longest = rulesOf(problem, work.person).longestRunDays;
  if (longest === null) return;
  const worked = new Set(neighboursOf(work).map(({ dayIndex }) => dayIndex));
  addWindowRows(builder, { name: 'run', longest, worked, work, counts: () => true });
}

/** Longest run of Nights, in the same way. Rows nightrun(person, first day). */
export function addNightRunRows(builder: ModelBuilder, problem: Problem, work: PersonWork): void {
  const longest = rulesOf(problem, work.person).longestRunNights;
  if (longest === null) return;
  const nights = neighboursOf(work).filter(({ isNight }) => isNight);
  const worked = new Set(nights.map(({ dayIndex }) => dayIndex));
  const counts = ({ shift }: WorkColumn) => shift.isNight;
  addWindowRows(builder, { name: 'nightrun', longest, worked, work, counts });
}

const neighboursOf = ({ person }: PersonWork) => [...person.history, ...person.following];

interface Run {
  readonly name: string;
  readonly longest: number;
  /** Days before (negative) and after the period that belong to the run. */
  readonly worked: ReadonlySet<number>;
  readonly work: PersonWork;
  readonly counts: (work: WorkColumn) => boolean;
}

function addWindowRows(builder: ModelBuilder, run: Run): void {
  const { byDay, personIndex } = run.work;
  const counted = byDay.map((works) => works.filter(run.counts));
  for (let first = -run.longest; first < byDay.length; first += 1) {
    const days = Array.from({ length: run.longest + 1 }, (_, index) => first + index);
    const room = run.longest - days.filter((day) => run.worked.has(day)).length;
    const workable = days.flatMap((day) => (counted[day]?.length ? [counted[day]] : []));
    if (workable.length <= room) continue;
    builder.addRow({
      name: `${run.name}(p${personIndex},d${first})`,
      upper: room,
      entries: workable.flatMap((works) => works.map(({ column }) => [column, 1] as const)),
    });
  }
}
