import { rulesOf } from '../problem';
import type { Finding, Subject } from './duties';
import type { Breach } from './proof';
import { workedWeekends } from './weekends';
import { countWords, dateWords } from './words';

/** Most weekends a person works in the period. */
export function checkWeekends({ problem, dutiesOf }: Subject): Finding {
  let cases = 0;
  const breaches = problem.people.flatMap((person): Breach[] => {
    const most = rulesOf(problem, person).weekendsPerPeriod;
    if (most === null) return [];
    cases += 1;
    const saturdays = workedWeekends(problem, person, dutiesOf(person));
    const tooMany = saturdays[most];
    if (tooMany === undefined) return [];
    const list = saturdays.map(dateWords).join(', ');
    const sentence = `${person.name}: ${countWords(saturdays.length, 'weekend')} worked (${list}); the most is ${most}.`;
    return [{ rule: 'weekendsPerPeriod', personId: person.id, date: tooMany, sentence }];
  });
  return { rule: 'weekendsPerPeriod', cases, breaches };
}
