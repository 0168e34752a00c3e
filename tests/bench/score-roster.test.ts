import { describe, expect, it } from 'vitest';
import type { RosterTable } from './instance';
import { scoreRoster } from './score-roster';
import { smallInstance, smallTable } from './small-instance';

const score = (table: RosterTable) => scoreRoster(smallInstance(), table);
const withLine = (person: keyof typeof smallTable, line: string): RosterTable => ({
  ...smallTable,
  [person]: line.split(' ').map((entry) => (entry === '-' ? '' : entry)),
});

describe('scoring a roster from the file alone', () => {
  /*
   * By hand. Requests: Vito's pm on day 5 (3) and Wen's am on day 6 (1) are not granted. Mornings: nobody on
   * days 8, 9, 12 and 13 (4 x 30), one too many on day 10 (2). Evenings of weekdays: nobody on days 2 and 11
   * (2 x 100); on Sunday, day 13, nobody is needed but Wen is there (7).
   */
  it('adds up what is not granted and what cover lacks or has too much', () => {
    expect(score(smallTable)).toEqual({ objective: 4 + 120 + 2 + 200 + 7, breaches: [] });
  });

  it.each([
    ['Vito', '- - am am - - pm pm - - - pm pm -', 'Vito: 4 shifts pm; the most is 3.'],
    ['Wen', 'pm pm - pm pm - - am am - - - - -', 'Wen: 2 shifts am; the most is 0.'],
    ['Uma', 'am am - - am - - - - - - - - -', 'Uma: 1260 minutes; allowed are 1800 to 4200.'],
    ['Uma', 'am am - - pm am - pm pm - am - - -', 'Uma: shift am of day 5 may not follow pm.'],
    [
      'Wen',
      'pm pm - pm pm pm pm pm - - - - - -',
      'Wen: 5 shifts in a row from day 3; the most is 4.',
    ],
    [
      'Vito',
      '- - am am - - am - - am am - - -',
      'Vito: 1 shifts in a row from day 6; the least is 2.',
    ],
    [
      'Vito',
      '- - am am - am am - - - - - - -',
      'Vito: 1 days off in a row from day 4; the least is 2.',
    ],
    ['Vito', '- - - - - am am - - - - am - am', 'Vito: 2 weekends; the most is 1.'],
    ['Uma', 'am am - pm pm - - pm pm - pm - - -', 'Uma: day 3 must be off.'],
    ['Uma', 'am am', 'Uma: 2 days instead of 14.'],
    ['Uma', 'am am - - xx - - pm pm - am - - -', 'Uma: shift xx is unknown.'],
  ] as const)('names what %s breaks with %s', (person, line, breach) => {
    expect(score(withLine(person, line)).breaches).toContain(breach);
  });

  it('exempts runs that touch the first or the last day from the shortest runs', () => {
    const table = withLine('Vito', '- am am - - - am am - - - am - am');
    expect(score(table).breaches).toEqual([
      'Vito: 1 shifts in a row from day 11; the least is 2.',
      'Vito: 1 days off in a row from day 12; the least is 2.',
      'Vito: 2 weekends; the most is 1.',
    ]);
  });

  it('names people whom the instance does not have', () => {
    expect(score({ ...smallTable, Xeno: [] }).breaches).toEqual([
      'Xeno is no person of this instance.',
    ]);
  });
});
