import type { Duty, Finding, Subject } from './duties';
import type { Breach } from './proof';
import { dateOfDay, dateWords } from './words';

/** At most one shift for each person and day; a shift belongs to the day on which it starts. */
export function checkOneShift({ problem, dutiesOf }: Subject): Finding {
  const breaches: Breach[] = [];
  for (const person of problem.people) {
    for (const [dayIndex, duties] of groupByDay(dutiesOf(person))) {
      if (duties.length < 2) continue;
      const date = dateOfDay(problem, dayIndex);
      const kinds = duties.map((duty) => duty.shift.kindName).join(', ');
      breaches.push({
        rule: 'oneShiftADay',
        personId: person.id,
        date,
        sentence: `${person.name}: ${duties.length} shifts on ${dateWords(date)} (${kinds}); the most is 1.`,
      });
    }
  }
  return { rule: 'oneShiftADay', cases: problem.people.length * problem.days.length, breaches };
}

function groupByDay(duties: readonly Duty[]): Map<number, Duty[]> {
  const days = new Map<number, Duty[]>();
  for (const duty of duties) {
    days.set(duty.shift.dayIndex, [...(days.get(duty.shift.dayIndex) ?? []), duty]);
  }
  return days;
}
