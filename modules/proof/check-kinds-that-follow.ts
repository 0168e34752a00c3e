import { rulesOf } from '../problem';
import type { Finding, Subject } from './duties';
import type { Breach } from './proof';
import { dateOfDay, dateWords } from './words';

/** No kind on a day that may not follow the kind of the day before; only inside the period. */
export function checkKindsThatFollow({ problem, dutiesOf }: Subject): Finding {
  let cases = 0;
  const breaches: Breach[] = [];
  for (const person of problem.people) {
    const barred = rulesOf(problem, person).kindsThatMayNotFollow;
    if (barred.length === 0) continue;
    for (const { shift: first } of dutiesOf(person)) {
      for (const { shift: next } of dutiesOf(person)) {
        if (next.dayIndex !== first.dayIndex + 1) continue;
        cases += 1;
        const isBarred = barred.some(
          ({ kindId, nextKindId }) => kindId === first.kindId && nextKindId === next.kindId,
        );
        if (!isBarred) continue;
        const date = dateOfDay(problem, next.dayIndex);
        const before = dateWords(dateOfDay(problem, first.dayIndex));
        const sentence = `${person.name}: ${next.kindName} on ${dateWords(date)} comes after ${first.kindName} on ${before}; the one may not follow the other.`;
        breaches.push({ rule: 'kindsThatMayNotFollow', personId: person.id, date, sentence });
      }
    }
  }
  return { rule: 'kindsThatMayNotFollow', cases, breaches };
}
