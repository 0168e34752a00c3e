import { rulesOf } from '../problem';
import type { Duty, Finding, Subject } from './duties';
import type { Breach } from './proof';
import { countWords, dateOfDay, dateWords, firstDate } from './words';

/** Nights a person works in the period, earliest first. */
export const nightDuties = (duties: readonly Duty[]): readonly Duty[] =>
  duties.filter(({ shift }) => shift.isNight);

/** Most Nights of a person in the period; shifts around it do not count. */
export function checkNights({ problem, dutiesOf }: Subject): Finding {
  let cases = 0;
  const breaches = problem.people.flatMap((person): Breach[] => {
    const most = rulesOf(problem, person).nightsPerPeriod;
    if (most === null) return [];
    cases += 1;
    const nights = nightDuties(dutiesOf(person));
    const tooMany = nights[most];
    if (!tooMany) return [];
    const date = dateOfDay(problem, tooMany.shift.dayIndex);
    const sentence = `${person.name}: ${countWords(nights.length, 'night')} in the period from ${dateWords(firstDate(problem))}; the most is ${most}.`;
    return [{ rule: 'nightsPerPeriod', personId: person.id, date, sentence }];
  });
  return { rule: 'nightsPerPeriod', cases, breaches };
}
