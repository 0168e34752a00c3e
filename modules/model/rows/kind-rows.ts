import { type Problem, rulesOf } from '../../problem';
import type { ModelBuilder } from '../model-builder';
import type { PersonWork, WorkColumn } from '../work-columns';

/**
 * Most shifts of a kind: sum of work(person, shifts of the kind) <= most. Rows kind(person, number).
 * Source: the supervisor.
 */
export function addKindLimitRows(builder: ModelBuilder, work: PersonWork): void {
  work.person.kindLimits.forEach(({ kindId, most }, index) => {
    const counted = work.columns.filter(({ shift }) => shift.kindId === kindId);
    if (new Set(counted.map(({ shift }) => shift.dayIndex)).size <= most) return;
    builder.addRow({
      name: `kind(p${work.personIndex},${index})`,
      upper: most,
      entries: counted.map(({ column }) => [column, 1]),
    });
  });
}

/**
 * Kinds that may not follow each other on neighbouring days: the shifts of a day after which the same
 * kinds are barred, and these kinds on the next day, are all in each other's way (one shift a day), so
 * one row holds the whole clique: sum <= 1. Rows follow(person, day, number). House rule.
 */
export function addFollowRows(builder: ModelBuilder, problem: Problem, work: PersonWork): void {
  const groups = barredGroups(rulesOf(problem, work.person).kindsThatMayNotFollow);
  work.byDay.forEach((today, dayIndex) => {
    const tomorrow = work.byDay[dayIndex + 1] ?? [];
    groups.forEach(({ before, after }, index) => {
      const first = ofKinds(today, before);
      const next = ofKinds(tomorrow, after);
      if (first.length === 0 || next.length === 0) return;
      builder.addRow({
        name: `follow(p${work.personIndex},d${dayIndex},${index})`,
        upper: 1,
        entries: [...first, ...next].map(({ column }) => [column, 1]),
      });
    });
  });
}

interface BarredGroup {
  readonly before: ReadonlySet<string>;
  readonly after: ReadonlySet<string>;
}

/** For each set of barred next kinds: all kinds that bar at least these. Together they hold every pair. */
function barredGroups(pairs: Problem['rules']['kindsThatMayNotFollow']): BarredGroup[] {
  const barred = new Map<string, Set<string>>();
  for (const { kindId, nextKindId } of pairs) {
    barred.set(kindId, (barred.get(kindId) ?? new Set()).add(nextKindId));
  }
  const groups = new Map<string, BarredGroup>();
  for (const after of barred.values()) {
    const before = [...barred].filter(([, others]) => [...after].every((kind) => others.has(kind)));
    groups.set([...after].sort().join('\n'), {
      before: new Set(before.map(([kindId]) => kindId)),
      after,
    });
  }
  return [...groups.values()];
}

const ofKinds = (works: readonly WorkColumn[], kinds: ReadonlySet<string>): WorkColumn[] =>
  works.filter(({ shift }) => kinds.has(shift.kindId));
