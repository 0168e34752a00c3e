import { describe, expect, it } from 'vitest';
import { frameDocument } from '@/app/(supervisor)/mail/frame-document';
import { sentWords, sizeWords, spanWords, textLink } from '@/app/(supervisor)/mail/mail-words';
import { toInstant } from '@/modules/units';

const zone = 'Europe/Dublin';

describe('words about a mail', () => {
  it('tell when it was sent by the clock of the team', () => {
    expect(sentWords(Date.parse('2027-07-15T09:05:00Z'), zone)).toBe('Thu 15 Jul, 10:05');
    expect(sentWords(null, zone)).toBe('no date');
  });

  it('tell how large a file is', () => {
    expect([532, 1000, 6249].map(sizeWords)).toEqual(['532 bytes', '1.0 KB', '6.2 KB']);
  });

  it('name the second day of a shift only where there is one', () => {
    const at = (minute: number) => toInstant('2027-02-05', minute, zone);
    expect(spanWords(at(420), at(900), zone)).toBe('Fri 5 Feb, 07:00 to 15:00');
    expect(spanWords(at(1380), at(1860), zone)).toBe('Fri 5 Feb, 23:00 to Sat 6 Feb, 07:00');
  });

  it('make a link that holds the whole text', () => {
    const link = textLink('text/calendar; method=PUBLISH', 'BEGIN:VCALENDAR\r\nSUMMARY:ö#%\r\n');
    expect(link).toMatch(/^data:text\/calendar;charset=utf-8,/);
    expect(decodeURIComponent(link.slice(link.indexOf(',') + 1))).toBe(
      'BEGIN:VCALENDAR\r\nSUMMARY:ö#%\r\n',
    );
  });
});

describe('the frame of a mail', () => {
  it('puts its policy before anything the mail says', () => {
    const mail = '<!-- <head> --><!doctype html><html><head><title>x</title></head></html>';
    const page = frameDocument(mail);
    expect(page.indexOf("default-src 'none'")).toBeLessThan(page.indexOf('<!-- <head> -->'));
    expect(page.indexOf('<base target="_blank">')).toBeLessThan(page.indexOf('<!-- <head> -->'));
    expect(page.endsWith(mail)).toBe(true);
  });
});
