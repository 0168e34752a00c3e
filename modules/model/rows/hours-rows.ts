import type { Problem } from '../../problem';
import type { ModelBuilder } from '../model-builder';
import { centsFor, type OvertimeStep, overtimeSteps } from '../pay';
import type { PersonWork } from '../work-columns';

/**
 * Contract hours: minimumMinutes <= paid worked minutes + creditMinutes <= maximumMinutes; an equality
 * where the two are equal. Row hours(person), in minutes. Source: the contract.
 */
export function addHoursRow(
  builder: ModelBuilder,
  { person, personIndex, columns }: PersonWork,
): void {
  builder.addRow({
    name: `hours(p${personIndex})`,
    lower: person.minimumMinutes - person.creditMinutes,
    upper: person.maximumMinutes - person.creditMinutes,
    entries: columns.map(({ column, shift }) => [column, shift.paidMinutes]),
  });
}

/** Overtime minutes of one person within one step, as a column. */
export interface OvertimeColumn extends OvertimeStep {
  readonly column: number;
  /** What a minute adds to the pay that stands on shifts and contract. */
  readonly centsPerMinute: number;
}

/**
 * Overtime: sum of overtime(person, step) >= paid worked minutes + creditMinutes - contractMinutes, each
 * column at most as long as its step. Row overtime(person). A minute costs the percentage of its step
 * for people paid by contract, and what it adds to ordinary pay for people paid by hours. Percentages
 * rise from step to step, so the cheaper step fills first and no whole-number columns are needed: a
 * convex cost in pieces (Dantzig, Linear Programming and Extensions, 1963, section 24-3). No columns
 * where the contract leaves no room for overtime or it costs nothing. Source: the pay rules.
 */
export function addOvertime(
  builder: ModelBuilder,
  problem: Problem,
  { person, personIndex, columns }: PersonWork,
): OvertimeColumn[] {
  const room = person.maximumMinutes - person.contractMinutes;
  const ordinaryPercent = person.paidBy === 'contract' ? 0 : 100;
  const steps = overtimeSteps(problem.pay).filter(({ overMinutes }) => overMinutes < room);
  if (steps.every(({ percent }) => percent === ordinaryPercent)) return [];
  const overtimes = steps.map((step, index) => {
    const cost = centsFor(person.payCentsPerHour, 1, step.percent - ordinaryPercent);
    const mostMinutes = Math.min(step.mostMinutes, room - step.overMinutes);
    const name = `overtime(p${personIndex},${index})`;
    const column = builder.addColumn({ name, upper: mostMinutes, costs: { cost } });
    return { ...step, mostMinutes, column, centsPerMinute: cost };
  });
  builder.addRow({
    name: `overtime(p${personIndex})`,
    upper: person.contractMinutes - person.creditMinutes,
    entries: [
      ...columns.map(({ column, shift }) => [column, shift.paidMinutes] as const),
      ...overtimes.map(({ column }) => [column, -1] as const),
    ],
  });
  return overtimes;
}
