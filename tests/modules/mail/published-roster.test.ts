import { expect, test } from 'vitest';
import { publishedRosterMail } from '@/emails/published-roster';
import type { PublishedRosterProps } from '@/emails/roster-facts';
import { datesOf, toInstant } from '@/modules/units';
import { shiftOn, zone } from './publication-samples';

const props: PublishedRosterProps = {
  organisationName: 'Ravelmere Animal Hospital',
  teamName: 'Animal care',
  personName: 'Sunniva Adeyo',
  versionNumber: 1,
  startsOn: '2027-02-01',
  endsOn: '2027-02-28',
  zone,
  confirmBy: '2027-01-18',
  publishedAtUtc: toInstant('2027-01-15', 605, zone),
  publishedByName: 'Ingrid Solane',
  shifts: [shiftOn('2027-02-10', 'Early'), shiftOn('2027-02-13', 'Night', 'Ward')],
  removedShifts: [],
  nights: 1,
  weekends: 1,
  holidays: [{ date: '2027-02-18', name: 'Lantern Day' }],
  shiftsUrl: 'https://floorwright.example/shifts',
  calendarName: 'shifts-2027-02-01.ics',
};
const wordsOf = (html: string): string =>
  html
    .replace(/<(title|style)[^>]*>.*?<\/\1>/gs, ' ')
    .replace(/<[^>]+>/g, ' ')
    .replace(/&nbsp;|\s+/g, ' ');

test('the subject says dates, number of shifts and hours', async () => {
  expect((await publishedRosterMail(props)).subject).toBe(
    'Your shifts 1 to 28 February 2027, published: 2 shifts, 16 h',
  );
});

test.each([
  ['Hello Sunniva Adeyo,'],
  ['2 shifts, 16 h, 1 night shift, 1 weekend'],
  ['Wed 10 Feb'],
  ['Early 07:00–15:00'],
  ['Night 23:00–07:00'],
  ['Ends Sun 14 Feb'],
  ['Holidays: Thu 18 Feb, Lantern Day'],
  ['Confirm by Mon 18 January 2027.'],
  ['Confirm = I have seen them.'],
  ['The attached file shifts-2027-02-01.ics'],
  ['Published by Ingrid Solane, version 1, Fri 15 January 2027, 10:05 (Europe/Berlin).'],
  ['See and confirm my shifts'],
])('both forms say: %s', async (fact) => {
  const mail = await publishedRosterMail(props);
  expect(wordsOf(mail.html)).toContain(fact);
  expect(mail.text.replace(/\s+/g, ' ')).toContain(fact);
});

test('each day of the grid carries its date, and a holiday its name', async () => {
  const { html } = await publishedRosterMail(props);
  const cells = [...html.matchAll(/<td[^>]*><div[^>]*>([^<]+)<\/div>(.*?)<\/td>/gs)];
  expect(cells.map(([, label]) => label)).toEqual(
    datesOf('2027-02-01', '2027-02-28').map((date, index) =>
      index === 0 ? '1 Feb' : String(Number(date.slice(8))),
    ),
  );
  expect(wordsOf(cells[9]?.[2] ?? '')).toContain('E');
  expect(wordsOf(cells[17]?.[2] ?? '')).toContain('Lantern Day');
});

test('a period that begins within a week leaves the days before it empty', async () => {
  const { html } = await publishedRosterMail({ ...props, startsOn: '2027-02-03' });
  const labels = [...html.matchAll(/<td[^>]*><div[^>]*>([^<]+)<\/div>/g)].map(([, label]) => label);
  expect(labels[0]).toBe('3 Feb');
  expect(labels).toHaveLength(26);
});

test('there is one link, to the page on which shifts are confirmed', async () => {
  const mail = await publishedRosterMail(props);
  expect([...mail.html.matchAll(/href="([^"]+)"/g)].map(([, url]) => url)).toEqual([
    props.shiftsUrl,
  ]);
  expect(mail.text.match(/https?:\S+/g)).toEqual([props.shiftsUrl]);
});

test('a night on which the clocks change says how long it lasts', async () => {
  const mail = await publishedRosterMail({
    ...{ ...props, startsOn: '2027-03-01', endsOn: '2027-03-28' },
    shifts: [shiftOn('2027-03-27', 'Night')],
  });
  expect(mail.text).toContain('The clocks change: 7 h from start to end');
  expect(wordsOf(mail.html)).toContain('The clocks change: 7 h from start to end');
});

test('a later version names what was taken back', async () => {
  const mail = await publishedRosterMail({
    ...props,
    versionNumber: 2,
    removedShifts: [shiftOn('2027-02-20', 'Late')],
  });
  expect(mail.subject).toContain('changed, version 2');
  for (const words of [mail.text, wordsOf(mail.html)]) {
    expect(words).toContain('has changed, this is version 2');
    expect(words).toContain('No longer yours');
    expect(words).toContain('Sat 20 Feb');
  }
});

test('a person without shifts is told so and gets no calendar file', async () => {
  const mail = await publishedRosterMail({ ...props, shifts: [], calendarName: null });
  expect(mail.subject).toBe('No shifts for you 1 to 28 February 2027, published');
  expect(mail.text).toContain('You have no shifts in it.');
  expect(mail.text).not.toContain('attached');
});

test('names cannot bring in markup', async () => {
  const { html } = await publishedRosterMail({
    ...props,
    personName: '<img src=x onerror=alert(1)>',
  });
  expect(html).not.toContain('<img');
});

// Some mail programs cut off the rest of a page beyond about 100 kB.
test('a year of daily shifts of one person still has a mail, and four weeks stay under 100 kB', async () => {
  const daily = (from: string, to: string) =>
    datesOf(from, to).map((date) => shiftOn(date, 'Late'));
  const four = await publishedRosterMail({ ...props, shifts: daily('2027-02-01', '2027-02-28') });
  expect(Buffer.byteLength(four.html)).toBeLessThan(100_000);
  const year = { startsOn: '2027-01-01', endsOn: '2027-12-31' };
  const mail = await publishedRosterMail({
    ...{ ...props, ...year },
    shifts: daily(year.startsOn, year.endsOn),
  });
  expect(mail.text.match(/Late 15:00/g)).toHaveLength(365);
});
