import type { Problem } from '../../problem';
import { payFor } from '../../units';
import type { ModelBuilder } from '../model-builder';
import { centsPerMinute } from '../pay';
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

/**
 * Overtime: overtime(person) >= paid worked minutes + creditMinutes - contractMinutes. Row
 * overtime(person); the column costs overtimePercent of the rate a minute for people paid by contract,
 * and what it adds to ordinary pay for people paid by hours. Answers the column, or null when the
 * contract leaves no room for overtime or it costs nothing. Source: the pay rules.
 */
export function addOvertime(
  builder: ModelBuilder,
  problem: Problem,
  { person, personIndex, columns }: PersonWork,
): number | null {
  const room = person.maximumMinutes - person.contractMinutes;
  const ordinaryPercent = person.paidBy === 'contract' ? 0 : 100;
  const percent = problem.pay.overtimePercent - ordinaryPercent;
  if (room <= 0 || percent === 0) return null;
  const column = builder.addColumn({
    name: `overtime(p${personIndex})`,
    upper: room,
    costs: { cost: centsPerMinute(person.payCentsPerHour, percent) },
  });
  builder.addRow({
    name: `overtime(p${personIndex})`,
    upper: person.contractMinutes - person.creditMinutes,
    entries: [
      ...columns.map(({ column: worked, shift }) => [worked, shift.paidMinutes] as const),
      [column, -1],
    ],
  });
  return column;
}

/**
 * Ordinary pay that is the same for every roster is a constant of the cost: the contract of people paid
 * by contract, the credited leave of people paid by hours, whose worked minutes stand on their columns.
 * Only the first is a sum by itself, and rounded.
 */
export function addConstantPay(builder: ModelBuilder, { person }: PersonWork): void {
  const { payCentsPerHour, contractMinutes, creditMinutes } = person;
  builder.addOffset(
    'cost',
    person.paidBy === 'contract'
      ? payFor(payCentsPerHour, contractMinutes)
      : centsPerMinute(payCentsPerHour) * creditMinutes,
  );
}
