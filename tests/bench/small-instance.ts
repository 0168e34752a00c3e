import { readInstance } from './read-instance';

/** Two weeks, a morning and a longer evening kind, three people with different limits. */
export const smallText = `# Written by hand
SECTION_HORIZON
14

SECTION_SHIFTS
# id, minutes, kinds that may not follow
am,420,
pm,540,am

SECTION_STAFF
Uma,am=14|pm=14,4200,1800,4,1,1,2
Vito,am=14|pm=3,3600,1200,5,2,2,1
Wen,am=0|pm=14,4320,2160,4,2,1,2

SECTION_DAYS_OFF
Uma,3
Vito,0,12

SECTION_SHIFT_ON_REQUESTS
Uma,4,am,2
Vito,5,pm,3
Wen,6,am,1

SECTION_SHIFT_OFF_REQUESTS
Uma,9,pm,5
Wen,2,pm,4

SECTION_COVER
${Array.from({ length: 14 }, (_, day) => `${day},am,1,30,2\n${day},pm,${day % 7 < 5 ? 1 : 0},100,7`).join('\n')}
`;

export const smallInstance = () => readInstance(smallText, 'small.txt');

/** A lawful roster of it. */
export const smallTable = {
  Uma: ['am', 'am', '', '', 'am', 'am', '', 'pm', 'pm', '', 'am', '', '', ''],
  Vito: ['', '', 'am', 'am', '', '', 'am', 'am', '', '', 'am', 'am', '', ''],
  Wen: ['pm', 'pm', '', 'pm', 'pm', '', '', '', '', 'pm', 'pm', '', '', 'pm'],
};
