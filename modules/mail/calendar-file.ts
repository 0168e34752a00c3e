import { toDate } from 'date-fns';
import { ICalCalendar, ICalCalendarMethod, ICalEventStatus } from 'ical-generator';
import {
  formatClock,
  type LocalDate,
  type PersonId,
  type RosterId,
  toLocal,
  type UtcMilliseconds,
  type Zone,
} from '../units';
import { shortDay } from './date-words';
import { foldLines, unfoldLines } from './fold-lines';

export interface CalendarShift {
  readonly uid: string;
  readonly startsAtUtc: UtcMilliseconds;
  readonly endsAtUtc: UtcMilliseconds;
  readonly title: string;
  readonly post: string;
  readonly teamName: string;
  /** True for a shift that was given before and is taken back: the program strikes it out. */
  readonly isCancelled?: boolean;
}

export interface CalendarInput {
  readonly organisationName: string;
  readonly personName: string;
  /** Address of the sender: a published event must name its organizer (RFC 5546, 3.2.1). */
  readonly organizerAddress: string;
  readonly zone: Zone;
  readonly stampUtc: UtcMilliseconds;
  /** 0 for version 1, one more for each later version. */
  readonly sequence: number;
  /** At least one: a calendar without components is not allowed (RFC 5545, 3.6). */
  readonly shifts: readonly CalendarShift[];
}

/**
 * The UID of a person's shift on a date of a roster, the same in every version, so that a program
 * replaces the shift it knows. Ids are random, so it is never used for anything else.
 */
export const shiftUid = (rosterId: RosterId, personId: PersonId, date: LocalDate): string =>
  `${rosterId}.${personId}.${date}`;

/** Name of the attached file. `shifts-2027-02-01.ics` for a period that starts on that date. */
export const calendarFileName = (startsOn: LocalDate): string => `shifts-${startsOn}.ics`;

/**
 * A calendar file (RFC 5545, METHOD:PUBLISH of RFC 5546) with one event per shift, in UTC, so that it
 * needs no time zone definition. Lines end in CRLF and are folded at 75 octets.
 */
export function calendarOf(input: CalendarInput): string {
  const calendar = new ICalCalendar({
    prodId: { company: 'Floorwright', product: 'Roster', language: 'EN' },
    method: ICalCalendarMethod.PUBLISH,
  });
  for (const shift of input.shifts) {
    calendar.createEvent({
      id: shift.uid,
      sequence: input.sequence,
      stamp: toDate(input.stampUtc),
      start: toDate(shift.startsAtUtc),
      end: toDate(shift.endsAtUtc),
      summary: withoutControls(shift.title),
      description: withoutControls(descriptionOf(shift, input)),
      location: withoutControls(input.organisationName),
      organizer: {
        name: withoutQuotes(input.organisationName),
        email: input.organizerAddress,
      },
      status: shift.isCancelled ? ICalEventStatus.CANCELLED : ICalEventStatus.CONFIRMED,
    });
  }
  // The library folds at 74 octets and leaves out the last line break: folded again by the standard.
  return foldLines(unfoldLines(calendar.toString()).split('\r\n'));
}

function descriptionOf(shift: CalendarShift, { personName, zone }: CalendarInput): string {
  const [start, end] = [toLocal(shift.startsAtUtc, zone), toLocal(shift.endsAtUtc, zone)];
  return [
    `${personName}, ${shift.post} in ${shift.teamName}`,
    `${shortDay(start.date)} ${formatClock(start.minute)} to ${shortDay(end.date)} ${formatClock(end.minute)}, ${zone} time`,
  ].join('\n');
}

/** RFC 5545, 3.3.11: TEXT holds no control characters but tab; line breaks are escaped later. */
const withoutControls = (text: string): string => text.replace(/[^\P{Cc}\t\r\n]/gu, '');

/** RFC 5545, 3.2: a quoted parameter value holds neither double quotes nor control characters. */
const withoutQuotes = (text: string): string =>
  text
    .replace(/"/g, "'")
    .replace(/\\/g, '/')
    .replace(/\p{Cc}/gu, ' ');
