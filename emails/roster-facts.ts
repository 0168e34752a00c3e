import { longDay, type MailShift, shortDay, spanOfDates } from '../modules/mail';
import {
  addDays,
  datesOf,
  daysBetween,
  elapsedMinutes,
  formatClock,
  formatHours,
  type LocalDate,
  mondayOf,
  toLocal,
} from '../modules/units';

/** What the mail about a published roster needs to know. */
export interface PublishedRosterProps {
  readonly organisationName: string;
  readonly teamName: string;
  readonly personName: string;
  readonly versionNumber: number;
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
  readonly zone: string;
  readonly confirmBy: LocalDate;
  readonly publishedAtUtc: number;
  readonly publishedByName: string;
  readonly shifts: readonly MailShift[];
  readonly removedShifts: readonly MailShift[];
  readonly nights: number;
  readonly weekends: number;
  readonly holidays: readonly { readonly date: LocalDate; readonly name: string }[];
  /** Absolute address of the page on which the shifts are confirmed. */
  readonly shiftsUrl: string;
  /** Name of the attached calendar file, null when none is attached. */
  readonly calendarName: string | null;
}

export interface DayFacts {
  readonly date: LocalDate;
  /** `8`, or `1 Mar` where a month begins. */
  readonly label: string;
  readonly isInPeriod: boolean;
  readonly isWeekend: boolean;
  readonly holidayName: string | null;
  readonly shift: MailShift | null;
}

export interface WeekFacts {
  readonly days: readonly DayFacts[];
  readonly hours: string;
}

export interface ShiftFacts {
  readonly date: LocalDate;
  readonly day: string;
  readonly name: string;
  readonly time: string;
  readonly post: string;
  /** `Ends Sun 14 Feb`, a change of the clocks, a holiday; empty for an ordinary shift. */
  readonly notes: readonly string[];
  readonly hours: string;
}

const count = (many: number, one: string): string => `${many} ${one}${many === 1 ? '' : 's'}`;
const paidMinutes = (shifts: readonly MailShift[]): number =>
  shifts.reduce((sum, shift) => sum + shift.paidMinutes, 0);
const timeOf = (shift: MailShift): string =>
  `${formatClock(shift.startMinute)}–${formatClock(shift.endMinute)}`;

/** `20 shifts, 160 h, 5 night shifts, 2 weekends`. */
export const totalsOf = (props: PublishedRosterProps): string =>
  [
    count(props.shifts.length, 'shift'),
    `${formatHours(paidMinutes(props.shifts))} h`,
    count(props.nights, 'night shift'),
    count(props.weekends, 'weekend'),
  ].join(', ');

/** The sentences around the drawing, in the order in which they are read. */
export function sentencesOf(props: PublishedRosterProps) {
  const span = spanOfDates(props.startsOn, props.endsOn);
  const isFirst = props.versionNumber === 1;
  const news = isFirst ? 'published' : `changed, version ${props.versionNumber}`;
  const verdict = isFirst ? 'is published' : `has changed, this is version ${props.versionNumber}`;
  const published = toLocal(props.publishedAtUtc, props.zone);
  return {
    subject: props.shifts.length
      ? `Your shifts ${span}, ${news}: ${count(props.shifts.length, 'shift')}, ${formatHours(paidMinutes(props.shifts))} h`
      : `No shifts for you ${span}, ${news}`,
    title: `Your shifts, ${span}`,
    greeting: `Hello ${props.personName},`,
    summary: props.shifts.length
      ? `the roster of ${props.teamName} ${verdict}. You have ${totalsOf(props)}.`
      : `the roster of ${props.teamName} ${verdict}. You have no shifts in it.`,
    confirm: `Confirm by ${longDay(props.confirmBy)}.`,
    meaning: `Confirm = I have seen them. You can still ask ${props.publishedByName} for a change. The shifts stand whether or not you confirm.`,
    calendar: props.calendarName
      ? `The attached file ${props.calendarName} puts these shifts into your calendar program.`
      : null,
    footer: `Published by ${props.publishedByName}, version ${props.versionNumber}, ${longDay(published.date)}, ${formatClock(published.minute)} (${props.zone}). You get this mail because you work at ${props.organisationName}.`,
  };
}

/** The period as whole weeks, Monday to Sunday; hours stand in the week in which a shift starts. */
export function weeksOf(props: PublishedRosterProps): WeekFacts[] {
  const first = mondayOf(props.startsOn);
  const weekCount = Math.floor(daysBetween(first, props.endsOn) / 7) + 1;
  const shiftOn = new Map(props.shifts.map((shift) => [shift.date, shift]));
  const holidayOn = new Map(props.holidays.map(({ date, name }) => [date, name]));
  return Array.from({ length: weekCount }, (_, week) => {
    const monday = addDays(first, week * 7);
    const days = datesOf(monday, addDays(monday, 6)).map((date, weekday) => ({
      date,
      label:
        date === props.startsOn || date.endsWith('-01')
          ? shortDay(date).slice(4)
          : String(Number(date.slice(8))),
      isInPeriod: props.startsOn <= date && date <= props.endsOn,
      isWeekend: weekday >= 5,
      holidayName: holidayOn.get(date) ?? null,
      shift: shiftOn.get(date) ?? null,
    }));
    const worked = days.flatMap(({ shift }) => shift ?? []);
    return { days, hours: `${formatHours(paidMinutes(worked))} h` };
  });
}

/** `E Early 07:00–15:00`, one for each shift kind that occurs. */
export function legendOf(props: PublishedRosterProps): string[] {
  const lines = [...props.shifts]
    .sort((a, b) => a.startMinute - b.startMinute)
    .map((shift) => `${shift.letter} ${shift.kindName} ${timeOf(shift)}`);
  return [...new Set(lines)];
}

/** One shift in words. */
export function shiftFacts(
  shift: MailShift,
  holidays: PublishedRosterProps['holidays'],
): ShiftFacts {
  const holiday = holidays.find(({ date }) => date === shift.date);
  const onTheClock = shift.endMinute - shift.startMinute;
  const elapsed = elapsedMinutes(shift.startsAtUtc, shift.endsAtUtc);
  const notes = [
    ...(shift.endMinute > 1440 ? [`Ends ${shortDay(addDays(shift.date, 1))}`] : []),
    ...(elapsed === onTheClock
      ? []
      : [`The clocks change: ${formatHours(elapsed)} h from start to end`]),
    ...(holiday ? [`Holiday: ${holiday.name}`] : []),
  ];
  return {
    date: shift.date,
    day: shortDay(shift.date),
    name: shift.kindName,
    time: timeOf(shift),
    post: shift.skillName,
    notes,
    hours: `${formatHours(shift.paidMinutes)} h`,
  };
}

/** `Thu 18 Feb, Lantern Day`, whether or not the person works then. */
export const holidayLines = (props: PublishedRosterProps): string[] =>
  props.holidays
    .filter(({ date }) => props.startsOn <= date && date <= props.endsOn)
    .map(({ date, name }) => `${shortDay(date)}, ${name}`);
