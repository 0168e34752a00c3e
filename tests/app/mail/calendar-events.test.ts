import ICAL from 'ical.js';
import { describe, expect, it } from 'vitest';
import { listEvents } from '@/app/(supervisor)/mail/calendar-events';
import { type CalendarShift, calendarOf } from '@/modules/mail/calendar-file';
import { toInstant } from '@/modules/units';

const zone = 'Europe/Dublin';
const shift = (date: string, changes: Partial<CalendarShift> = {}): CalendarShift => ({
  uid: `ros_1.per_1.${date}`,
  startsAtUtc: toInstant(date, 1380, zone),
  endsAtUtc: toInstant(date, 1860, zone),
  title: 'Night, Nurse',
  post: 'Nurse',
  teamName: 'Animal care',
  ...changes,
});
const fileOf = (shifts: readonly CalendarShift[]): string =>
  calendarOf({
    organisationName: 'Ravelmere Animal Hospital',
    personName: 'Sunniva Adeyo',
    organizerAddress: 'rosters@floorwright.example',
    zone,
    stampUtc: Date.parse('2027-01-15T10:05:00Z'),
    sequence: 0,
    shifts,
  });

describe('the events of a calendar file', () => {
  it('are those that ical.js reads', () => {
    const shifts = [
      shift('2027-02-05'),
      shift('2027-03-27', { title: 'Nachtdienst; Tiere, groß\\klein und klein'.repeat(3) }),
      shift('2027-02-01', { isCancelled: true }),
    ];
    const file = fileOf(shifts);
    const expected = new ICAL.Component(ICAL.parse(file))
      .getAllSubcomponents('vevent')
      .map((component) => ({ component, event: new ICAL.Event(component) }))
      .map(({ component, event }) => ({
        uid: event.uid,
        title: event.summary,
        startsAtUtc: event.startDate.toJSDate().getTime(),
        endsAtUtc: event.endDate.toJSDate().getTime(),
        isCancelled: component.getFirstPropertyValue('status') === 'CANCELLED',
      }))
      .sort((one, other) => one.startsAtUtc - other.startsAtUtc);
    expect(listEvents(file)).toEqual(expected);
    expect(expected.map(({ isCancelled }) => isCancelled)).toEqual([true, false, false]);
  });

  it('leave out what has no UTC time, and nothing else', () => {
    const file = [
      'BEGIN:VCALENDAR',
      'BEGIN:VEVENT',
      'UID:a',
      'DTSTART;TZID="Europe/Dublin":20270201T070000',
      'DTEND;TZID="Europe/Dublin":20270201T150000',
      'END:VEVENT',
      'BEGIN:VEVENT',
      'UID:b',
      'SUMMARY;LANGUAGE="en:GB":Early: with a colon',
      'DTSTART:20270202T070000Z',
      'DTEND:20270202T150000Z',
      'END:VEVENT',
      'END:VCALENDAR',
    ].join('\r\n');
    expect(listEvents(file).map(({ uid, title }) => [uid, title])).toEqual([
      ['b', 'Early: with a colon'],
    ]);
  });

  it('are none in a text that is no calendar', () => {
    expect(listEvents('hello')).toEqual([]);
    expect(listEvents('')).toEqual([]);
  });
});
