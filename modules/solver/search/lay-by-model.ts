import { blendObjective, restrictModel } from '../../model';
import type { LinearSolver } from '../linear-solver';
import { dayOff } from '../lines/roster-lines';
import { freeColumns } from './choose-part';
import type { Ground } from './first-roster';
import type { Pace } from './pace';

/**
 * Lays one person's line by the compact model, everybody else's kept: for lines that the net alone does
 * not find because it leaves a limit uncounted. `impossible`: no lawful line exists.
 */
export function layByModel(
  ground: Ground,
  person: number,
  solve: LinearSolver,
  pace: Pace,
): 'laid' | 'impossible' | 'unfinished' {
  const { model, lines } = ground;
  const values = new Float64Array(model.linear.columnNames.length);
  for (const column of lines.cells) if (column !== dayOff) values[column] = 1;
  const part = restrictModel(
    model.linear,
    values,
    freeColumns(model, { people: new Set([person]), days: null }),
  );
  const outcome = solve(part.linear, blendObjective, {
    limitSeconds: pace.isCounted ? Number.POSITIVE_INFINITY : pace.remaining(),
    targetGap: 0.05,
  });
  if (outcome.kind === 'infeasible') return 'impossible';
  if (!('solution' in outcome) || !outcome.solution) return 'unfinished';
  const found = outcome.solution.values;
  lines.cells.fill(dayOff, person * lines.days, (person + 1) * lines.days);
  const days = new Map(
    model.works[person]?.columns.map(({ column, shift }) => [column, shift.dayIndex]),
  );
  part.columns.forEach((column, place) => {
    const day = days.get(column);
    if (day !== undefined && (found[place] ?? 0) > 0.5) {
      lines.cells[person * lines.days + day] = column;
    }
  });
  if (!lines.trace(person)) throw new Error('Net and compact model disagree on what is lawful.');
  lines.countDays(person, 0, lines.days, 1);
  lines.countEnd(person, 1);
  return 'laid';
}
