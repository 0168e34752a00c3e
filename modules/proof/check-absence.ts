import type { Finding, Subject } from './duties';
import type { Breach } from './proof';
import { clockWords, dateOfDay, dateWords } from './words';

/** No shift overlaps an absence; a shift may end at the minute an absence begins. */
export function checkAbsence({ problem, duties }: Subject): Finding {
  let cases = 0;
  const breaches = duties.flatMap(({ person, shift }): Breach[] => {
    cases += person.absences.length;
    const absence = person.absences.find(
      (away) => away.startMinute < shift.endMinute && shift.startMinute < away.endMinute,
    );
    if (!absence) return [];
    const date = dateOfDay(problem, shift.dayIndex);
    const times = `${clockWords(problem, shift.startMinute)} to ${clockWords(problem, shift.endMinute)}`;
    const sentence = `${person.name}: ${shift.kindName} on ${dateWords(date)}, ${times}, falls into time away (${absence.reason}).`;
    return [{ rule: 'absence', personId: person.id, date, sentence }];
  });
  return { rule: 'absence', cases, breaches };
}
