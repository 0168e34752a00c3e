import type { Finding, Subject } from './duties';
import type { Breach } from './proof';
import { countWords, dateOfDay, dateWords, firstDate } from './words';

/** Most shifts of a kind that a person has in the period. */
export function checkKindLimits({ problem, dutiesOf }: Subject): Finding {
  let cases = 0;
  const breaches = problem.people.flatMap((person): Breach[] =>
    person.kindLimits.flatMap(({ kindId, most }): Breach[] => {
      cases += 1;
      const ofKind = dutiesOf(person).filter(({ shift }) => shift.kindId === kindId);
      const tooMany = ofKind[most];
      if (!tooMany) return [];
      const date = dateOfDay(problem, tooMany.shift.dayIndex);
      const sentence = `${person.name}: ${countWords(ofKind.length, 'shift')} of the kind ${tooMany.shift.kindName} in the period from ${dateWords(firstDate(problem))}; the most is ${most}.`;
      return [{ rule: 'kindLimits', personId: person.id, date, sentence }];
    }),
  );
  return { rule: 'kindLimits', cases, breaches };
}
