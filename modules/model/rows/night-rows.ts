import { type Problem, rulesOf } from '../../problem';
import type { ModelBuilder } from '../model-builder';
import type { PersonWork } from '../work-columns';

/**
 * Nights of the period: sum of work over Nights <= nightsPerPeriod. Row nights(person). House rule; see
 * `ruleSources`.
 */
export function addNightRow(builder: ModelBuilder, problem: Problem, work: PersonWork): void {
  const most = rulesOf(problem, work.person).nightsPerPeriod;
  if (most === null) return;
  const nights = work.columns.filter(({ shift }) => shift.isNight);
  if (nights.length === 0) return;
  builder.addRow({
    name: `nights(p${work.personIndex})`,
    upper: most,
    entries: nights.map(({ column }) => [column, 1]),
  });
}
