import type { Finding, Subject } from './duties';
import type { Breach } from './proof';
import { dateOfDay, dateWords } from './words';

/** Night shifts go to people whose contract has nights. */
export function checkNightPermission({ problem, duties }: Subject): Finding {
  const breaches = duties.flatMap(({ person, shift }): Breach[] => {
    if (!shift.isNight || person.mayWorkNights) return [];
    const date = dateOfDay(problem, shift.dayIndex);
    const sentence = `${person.name}: ${shift.kindName} on ${dateWords(date)} is a night, and the contract has no nights.`;
    return [{ rule: 'nightPermission', personId: person.id, date, sentence }];
  });
  return { rule: 'nightPermission', cases: duties.length, breaches };
}
