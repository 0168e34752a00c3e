import { objectiveOf, type RosterModel, type WorkColumn } from '../../model';

/** Cost of shifts and overtime; fairness and wished floors are weighed later. */
export function roughCost(model: RosterModel, columnsOf: readonly ReadonlySet<number>[]) {
  const { costs } = objectiveOf(model.linear, 'cost');
  const minutesOf = model.works.map(({ columns, personIndex }) =>
    columns
      .filter(({ column }) => columnsOf[personIndex]?.has(column))
      .reduce((sum, { shift }) => sum + shift.paidMinutes, 0),
  );
  const overtimeCents = (personIndex: number, minutes: number): number => {
    const person = model.problem.people[personIndex];
    const over = minutes + (person?.creditMinutes ?? 0) - (person?.contractMinutes ?? 0);
    return (model.overtimes[personIndex] ?? []).reduce((sum, step) => {
      const within = Math.min(step.mostMinutes, Math.max(0, over - step.overMinutes));
      return sum + within * step.centsPerMinute;
    }, 0);
  };
  return (off: readonly WorkColumn[], on: readonly WorkColumn[]): number => {
    const changed = new Map<number, number>();
    let sum = 0;
    for (const [sign, list] of [
      [-1, off],
      [1, on],
    ] as const) {
      for (const { personIndex, shift, column } of list) {
        sum += sign * (costs[column] ?? 0);
        changed.set(personIndex, (changed.get(personIndex) ?? 0) + sign * shift.paidMinutes);
      }
    }
    for (const [personIndex, minutes] of changed) {
      const now = minutesOf[personIndex] ?? 0;
      sum += overtimeCents(personIndex, now + minutes) - overtimeCents(personIndex, now);
    }
    return sum;
  };
}
