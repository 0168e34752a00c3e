import ICAL from 'ical.js';
import { expect, test } from 'vitest';
import {
  type CalendarInput,
  type CalendarShift,
  calendarOf,
  shiftUid,
} from '@/modules/mail/calendar-file';
import { unfoldLines } from '@/modules/mail/fold-lines';
import { toInstant } from '@/modules/units';

const zone = 'Europe/Berlin';
const night = (date: string, changes: Partial<CalendarShift> = {}): CalendarShift => ({
  uid: shiftUid('ros_a', 'per_b', date),
  startsAtUtc: toInstant(date, 1320, zone),
  endsAtUtc: toInstant(date, 1800, zone),
  title: 'Night, Nurse',
  post: 'Nurse',
  teamName: 'Ward staff',
  ...changes,
});
const fileOf = (shifts: CalendarShift[], changes: Partial<CalendarInput> = {}): string =>
  calendarOf({
    organisationName: 'Ravelmere Animal Hospital',
    personName: 'Sunniva Adeyo',
    organizerAddress: 'rosters@floorwright.example',
    zone,
    stampUtc: Date.parse('2026-03-01T09:05:00Z'),
    sequence: 0,
    shifts,
    ...changes,
  });
const linesOf = (file: string): string[] => unfoldLines(file).split('\r\n');
const eventsOf = (file: string) =>
  new ICAL.Component(ICAL.parse(file))
    .getAllSubcomponents('vevent')
    .map((component) => new ICAL.Event(component));

test('the file has what RFC 5545 and RFC 5546 ask of a published calendar', () => {
  const lines = linesOf(fileOf([night('2026-02-01')]));
  expect(lines.slice(0, 4)).toEqual([
    'BEGIN:VCALENDAR',
    'VERSION:2.0',
    'PRODID:-//Floorwright//Roster//EN',
    'METHOD:PUBLISH',
  ]);
  expect(lines).toContain('UID:ros_a.per_b.2026-02-01');
  expect(lines).toContain('SEQUENCE:0');
  expect(lines).toContain('DTSTAMP:20260301T090500Z');
  expect(lines).toContain('DTSTART:20260201T210000Z');
  expect(lines).toContain('DTEND:20260202T050000Z');
  expect(lines).toContain('STATUS:CONFIRMED');
  expect(lines).toContain(
    'ORGANIZER;CN="Ravelmere Animal Hospital":mailto:rosters@floorwright.example',
  );
  expect(lines.slice(-2)).toEqual(['END:VCALENDAR', '']);
  expect(lines.filter((line) => line.startsWith('ATTENDEE'))).toEqual([]);
});

test('every line ends in CRLF and keeps within 75 octets', () => {
  const file = fileOf([night('2026-02-01', { title: 'é'.repeat(60), post: 'ü'.repeat(200) })]);
  const lines = file.split('\r\n');
  expect(lines.filter((line) => /[\r\n]/.test(line))).toEqual([]);
  expect(Math.max(...lines.map((line) => Buffer.byteLength(line)))).toBeLessThanOrEqual(75);
  const summary = lines.findIndex((line) => line.startsWith('SUMMARY:'));
  expect(lines.slice(summary, summary + 2).map((line) => Buffer.byteLength(line))).toEqual([
    74, 55,
  ]);
});

// RFC 5545, 3.3.11: backslash, semicolon, comma and line break are escaped, a colon is not.
test('text is escaped as the standard says and read back as it was', () => {
  const title = 'Ward A, bay 1; bring key\\badge\nNote: 7:30';
  const file = fileOf([night('2026-02-01', { title })]);
  expect(linesOf(file)).toContain('SUMMARY:Ward A\\, bay 1\\; bring key\\\\badge\\nNote: 7:30');
  expect(eventsOf(file)[0]?.summary).toBe(title);
});

test('a name cannot bring in properties of its own', () => {
  const file = fileOf([night('2026-02-01', { title: 'Night\r\nATTACH:x\u0007' })], {
    organisationName: 'The "Grey" Clinic\r\nX-EVIL:1',
  });
  const names = linesOf(file).map((line) => line.split(/[:;]/)[0]);
  expect(names).not.toContain('ATTACH');
  expect(names).not.toContain('X-EVIL');
  expect(file).not.toContain('\u0007');
  expect(linesOf(file)).toContain(
    'ORGANIZER;CN="The \'Grey\' Clinic  X-EVIL:1":mailto:rosters@floorwright.example',
  );
});

// 22:00-06:00 in Berlin: 7 h on 28 March 2026 and 9 h on 24 October 2026 (the clocks change at 01:00Z).
test.each([
  ['2026-02-01', '20260201T210000Z', '20260202T050000Z', 8],
  ['2026-03-28', '20260328T210000Z', '20260329T040000Z', 7],
  ['2026-10-24', '20261024T200000Z', '20261025T050000Z', 9],
])('a night that starts on %s has the right instants', (date, start, end, hours) => {
  const file = fileOf([night(date)]);
  expect(linesOf(file)).toContain(`DTSTART:${start}`);
  expect(linesOf(file)).toContain(`DTEND:${end}`);
  expect(eventsOf(file)[0]?.duration.toSeconds()).toBe(hours * 3600);
});

test('a later version keeps the UID, raises SEQUENCE and cancels what was taken back', () => {
  const first = eventsOf(fileOf([night('2026-02-01'), night('2026-02-02')]));
  const second = eventsOf(
    fileOf([night('2026-02-01'), night('2026-02-02', { isCancelled: true })], { sequence: 1 }),
  );
  expect(second.map(({ uid }) => uid)).toEqual(first.map(({ uid }) => uid));
  expect(second.map(({ sequence }) => sequence)).toEqual([1, 1]);
  expect(second.map(({ component }) => component.getFirstPropertyValue('status'))).toEqual([
    'CONFIRMED',
    'CANCELLED',
  ]);
});

test('each person, date and roster has a UID of its own', () => {
  const uids = [
    shiftUid('ros_a', 'per_b', '2026-02-01'),
    shiftUid('ros_a', 'per_b', '2026-02-02'),
    shiftUid('ros_a', 'per_c', '2026-02-01'),
    shiftUid('ros_d', 'per_b', '2026-02-01'),
  ];
  expect(new Set(uids).size).toBe(4);
});
