import { describe, expect, it } from 'vitest';
import { readInstance } from './read-instance';
import { smallInstance, smallText } from './small-instance';

describe('reading an instance of the open format', () => {
  it('reads kinds, people, requests and cover', () => {
    const instance = smallInstance();
    expect(instance.dayCount).toBe(14);
    expect(instance.kinds).toEqual([
      { id: 'am', minutes: 420, mayNotPrecede: [] },
      { id: 'pm', minutes: 540, mayNotPrecede: ['am'] },
    ]);
    expect(instance.people[1]).toEqual({
      id: 'Vito',
      mostOfKind: new Map([
        ['am', 14],
        ['pm', 3],
      ]),
      mostMinutes: 3600,
      leastMinutes: 1200,
      longestRun: 5,
      shortestRun: 2,
      shortestFreeRun: 2,
      mostWeekends: 1,
      daysOff: [0, 12],
    });
    expect(instance.onRequests).toHaveLength(3);
    expect(instance.offRequests[1]).toEqual({ personId: 'Wen', day: 2, kindId: 'pm', weight: 4 });
    expect(instance.cover).toHaveLength(28);
    expect(instance.cover[11]).toEqual({
      day: 5,
      kindId: 'pm',
      need: 0,
      underWeight: 100,
      overWeight: 7,
    });
  });

  it('reads files with Windows line ends and without sections that are empty', () => {
    const text = smallText.replace(/SECTION_DAYS_OFF[^S]*/, '').replace(/\n/g, '\r\n');
    const instance = readInstance(text, 'small.txt');
    expect(instance.people.every(({ daysOff }) => daysOff.length === 0)).toBe(true);
    expect(instance.cover).toHaveLength(28);
  });

  it('reads -0 as 0, which stands in a published file', () => {
    const text = smallText.replace('5,pm,0,', '5,pm,-0,');
    expect(readInstance(text, 'small.txt')).toEqual(smallInstance());
  });

  it.each([
    ['SECTION_DAYS_OFF', 'SECTION_HOLIDAYS', 'line 15: SECTION_HOLIDAYS is no section'],
    ['SECTION_DAYS_OFF', 'SECTION_STAFF', 'line 15: SECTION_STAFF stands here twice'],
    ['SECTION_HORIZON\n14', 'SECTION_HORIZON', 'SECTION_HORIZON is empty'],
    ['SECTION_HORIZON\n', '', 'line 2: "14" stands before the first section'],
    ['\n14\n', '\ntwo\n', 'line 3, SECTION_HORIZON: The horizon is "two", which is no whole'],
    ['pm,540,am', 'pm,540', 'line 8, SECTION_SHIFTS: 2 fields instead of 3'],
    ['pm,540,am', 'pm,540,xx', 'line 8, SECTION_SHIFTS: shift xx is unknown'],
    ['pm,540,am', 'am,540,am', 'line 8, SECTION_SHIFTS: am stands here twice'],
    ['am=14|pm=3', 'am=14|xx=3', 'line 12, SECTION_STAFF: shift xx is unknown'],
    ['am=14|pm=3', 'am=14|pm=x', 'line 12, SECTION_STAFF: The most of pm is "x"'],
    ['3600,1200,5', '3600,1200,0', 'line 12, SECTION_STAFF: MaxConsecutiveShifts is 0; the least'],
    ['3600,1200,5', '3600,5000,5', 'line 12, SECTION_STAFF: MinTotalMinutes 5000 is above'],
    ['Vito,0,12', 'Vito,0,14', 'line 17, SECTION_DAYS_OFF: day 14 is beyond the last, 13'],
    ['Vito,0,12', 'Xeno,0,12', 'line 17, SECTION_DAYS_OFF: person Xeno is unknown'],
    ['Uma,4,am,2', 'Uma,4,am,-2', 'line 20, SECTION_SHIFT_ON_REQUESTS: The weight is "-2"'],
    ['0,pm,1,', '0,am,1,', 'line 30, SECTION_COVER: shift am of day 0 stands here twice'],
  ])('names file, line and section where "%s" is "%s"', (from, to, message) => {
    expect(() => readInstance(smallText.replace(from, to), 'small.txt')).toThrow(
      message.startsWith('line') ? `small.txt, ${message}` : `small.txt: ${message}`,
    );
  });

  it('names a section that is missing', () => {
    const text = smallText.slice(0, smallText.indexOf('SECTION_COVER'));
    expect(() => readInstance(text, 'small.txt')).toThrow('small.txt: SECTION_COVER is missing.');
  });
});
