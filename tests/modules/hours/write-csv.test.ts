import Papa from 'papaparse';
import { expect, test } from 'vitest';
import type { HoursDay, HoursPerson } from '@/modules/hours';
import { csvColumns, writeHoursCsv } from '@/modules/hours/write-csv';

const day = (changes: Partial<HoursDay> = {}): HoursDay => ({
  date: '2027-02-12',
  shift: 'Night',
  post: 'Vet',
  plannedMinutes: 480,
  workedMinutes: 450,
  nightMinutes: 450,
  weekendMinutes: 390,
  holidayMinutes: 0,
  reason: '',
  ...changes,
});

const person = (changes: Partial<HoursPerson> = {}): HoursPerson => ({
  personId: 'per_1',
  name: 'Maren Oduya',
  staffNumber: 'R-01',
  homeSkill: 'Vet',
  contractMinutes: 9600,
  leaveMinutes: 0,
  plannedMinutes: 480,
  workedMinutes: 450,
  differenceMinutes: -30,
  nightMinutes: 450,
  weekendMinutes: 390,
  holidayMinutes: 0,
  days: [day()],
  ...changes,
});

const read = (csv: string) => Papa.parse<Record<string, string>>(csv, { header: true }).data;

test('one line for each person and day, hours with a dot and two decimals', () => {
  const csv = writeHoursCsv([person()]);
  expect(csv).toBe(
    [
      'staff number,name,home skill,date,shift,post,planned hours,worked hours,difference,night,weekend,holiday,reason',
      'R-01,Maren Oduya,Vet,2027-02-12,Night,Vet,8.00,7.50,-0.50,7.50,6.50,0.00,',
    ].join('\r\n'),
  );
});

test('without a record, worked hours and the difference are empty', () => {
  const [line] = read(writeHoursCsv([person({ days: [day({ workedMinutes: null })] })]));
  expect(line).toMatchObject({ 'planned hours': '8.00', 'worked hours': '', difference: '' });
});

test('nobody and nothing still gives the header line', () => {
  expect(writeHoursCsv([])).toBe(csvColumns.join(','));
});

// Source: OWASP, CSV Injection: = + - @ tab, carriage return, line feed (the last added in August 2025).
test.each(['=1+1', '+1', '-2+3', '@SUM(A1)', '\tx', '\rx', '\nx'])(
  'text that a spreadsheet would run as a formula is defused: %j',
  (name) => {
    const csv = writeHoursCsv([person({ name })]);
    expect(read(csv)[0]?.name).toBe(`'${name}`);
    expect(csv).toContain(`"'${name}"`);
  },
);

test('true numbers stay numbers, negative ones too', () => {
  const [line] = read(writeHoursCsv([person({ days: [day({ workedMinutes: 390 })] })]));
  expect(line?.difference).toBe('-1.50');
});

// Source: RFC 4180, section 2, rules 5 to 7.
test('commas, quotes and line breaks in a reason come back as they were', () => {
  const reason = 'Late train, "signal"\r\nthen a long handover';
  const csv = writeHoursCsv([person({ days: [day({ reason })] })]);
  expect(csv).toContain('"Late train, ""signal""\r\nthen a long handover"');
  expect(read(csv)[0]?.reason).toBe(reason);
});

test.each([
  [1, '0.02'],
  [-1, '-0.02'],
  [20, '0.33'],
  [0, '0.00'],
  [-15, '-0.25'],
])('a difference of %i minutes reads %s', (minutes, expected) => {
  const days = [day({ plannedMinutes: 100, workedMinutes: 100 + minutes })];
  expect(read(writeHoursCsv([person({ days })]))[0]?.difference).toBe(expected);
});
