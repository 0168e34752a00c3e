import Papa from 'papaparse';
import type { HoursDay, HoursPerson } from './views';

/** The header line of the export, in the order of its columns. */
export const csvColumns = [
  'staff number',
  'name',
  'home skill',
  'date',
  'shift',
  'post',
  'planned hours',
  'worked hours',
  'difference',
  'night',
  'weekend',
  'holiday',
  'reason',
] as const;

/**
 * Text that a spreadsheet would read as a formula gets an apostrophe in front (OWASP, CSV Injection:
 * = + - @, tab, carriage return, line feed). A true number such as -1.50 stays as it is.
 */
const formulaStart = /^(?!-?\d+(?:\.\d+)?$)[=+\-@\t\r\n]/;

/**
 * One line for each person and day (RFC 4180: CRLF, header, quotes doubled). Hours have a dot and two
 * decimals; worked hours and the difference are empty where no work is recorded.
 */
export function writeHoursCsv(people: readonly HoursPerson[]): string {
  const lines = people.flatMap((person) => person.days.map((day) => lineOf(person, day)));
  return Papa.unparse([[...csvColumns], ...lines], {
    newline: '\r\n',
    escapeFormulae: formulaStart,
  });
}

function lineOf(person: HoursPerson, day: HoursDay): string[] {
  const { plannedMinutes, workedMinutes } = day;
  return [
    person.staffNumber,
    person.name,
    person.homeSkill,
    day.date,
    day.shift,
    day.post,
    hours(plannedMinutes),
    workedMinutes === null ? '' : hours(workedMinutes),
    workedMinutes === null ? '' : hours(workedMinutes - plannedMinutes),
    hours(day.nightMinutes),
    hours(day.weekendMinutes),
    hours(day.holidayMinutes),
    day.reason,
  ];
}

/** `7.50` of 450 minutes, `-0.25` of -15. Whole hundredths, half away from zero; never `-0.00`. */
function hours(minutes: number): string {
  const hundredths = Math.round((Math.abs(minutes) * 100) / 60);
  const text = (hundredths / 100).toFixed(2);
  return minutes < 0 && hundredths > 0 ? `-${text}` : text;
}
