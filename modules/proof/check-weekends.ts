import type { Finding, Subject } from './duties';
import type { Breach } from './proof';
import { workedWeekends } from './weekends';
import { countWords, dateWords } from './words';

/** Most weekends a person works in the period. */
export function checkWeekends({ problem, dutiesOf }: Subject): Finding {
  const most = problem.rules.weekendsPerPeriod;
  if (most === null) return { rule: 'weekendsPerPeriod', cases: 0, breaches: [] };
  const breaches = problem.people.flatMap((person): Breach[] => {
    const saturdays = workedWeekends(problem, dutiesOf(person));
    const tooMany = saturdays[most];
    if (tooMany === undefined) return [];
    const list = saturdays.map(dateWords).join(', ');
    const sentence = `${person.name}: ${countWords(saturdays.length, 'weekend')} worked (${list}); the most is ${most}.`;
    return [{ rule: 'weekendsPerPeriod', personId: person.id, date: tooMany, sentence }];
  });
  return { rule: 'weekendsPerPeriod', cases: problem.people.length, breaches };
}
