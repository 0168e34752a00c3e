import { type Problem, rulesOf } from '../../problem';
import type { ModelBuilder } from '../model-builder';
import type { PersonWork, WorkColumn } from '../work-columns';

/**
 * Rest: start of the next shift - end of the one before >= restMinutes, in minutes that truly elapse.
 * Rows rest(person, day, end): the shifts of a day that end at `end` or later and those of a later day
 * that start before `end + restMinutes` are all in each other's way, so one row holds the whole clique:
 * sum <= 1. Rest after history and before following shifts is a missing column (`findObstacle`). Directive 2003/88/EC, Art. 3.
 */
export function addRestRows(builder: ModelBuilder, problem: Problem, work: PersonWork): void {
  const { restMinutes } = rulesOf(problem, work.person);
  work.byDay.forEach((earlier, dayIndex) => {
    const latestEnd = Math.max(...earlier.map(({ shift }) => shift.endMinute));
    const reach = latestEnd + restMinutes;
    for (
      let later = dayIndex + 1;
      (problem.days[later]?.startMinute ?? reach) < reach;
      later += 1
    ) {
      addCliques(
        builder,
        restMinutes,
        earlier,
        work.byDay[later] ?? [],
        `p${work.personIndex},d${dayIndex}`,
      );
    }
  });
}

function addCliques(
  builder: ModelBuilder,
  restMinutes: number,
  earlier: readonly WorkColumn[],
  later: readonly WorkColumn[],
  place: string,
): void {
  const ends = [...new Set(earlier.map(({ shift }) => shift.endMinute))].sort((a, b) => b - a);
  const cliques = ends.map((end) => ({
    end,
    before: earlier.filter(({ shift }) => shift.endMinute >= end),
    after: later.filter(({ shift }) => shift.startMinute < end + restMinutes),
  }));
  cliques.forEach(({ end, before, after }, index) => {
    // With the next earlier end the clique only grows on the left: when it loses nothing, it is enough.
    const isWithinNext = cliques[index + 1]?.after.length === after.length;
    if (after.length === 0 || isWithinNext) return;
    builder.addRow({
      name: `rest(${place},${end})`,
      upper: 1,
      entries: [...before, ...after].map(({ column }) => [column, 1]),
    });
  });
}
