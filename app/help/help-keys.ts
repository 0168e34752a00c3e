interface KeyLine {
  readonly keys: readonly string[];
  readonly does: string;
}

interface KeyTable {
  readonly place: string;
  readonly lines: readonly KeyLine[];
}

/** Keys by the place in which they work; none of them works outside it. */
export const keyTables: readonly KeyTable[] = [
  {
    place: 'Everywhere',
    lines: [
      { keys: ['Tab', 'Shift Tab'], does: 'forward and back through what can be used' },
      { keys: ['Esc'], does: 'closes a question or a menu and changes nothing' },
    ],
  },
  {
    place: 'Roster board',
    lines: [
      { keys: ['←', '↑', '↓', '→'], does: 'from day to day and person to person' },
      { keys: ['Home', 'End'], does: 'to the first and last day' },
      { keys: ['Page Up', 'Page Down'], does: 'back and forward by a week' },
      { keys: ['Ctrl Home', 'Ctrl End'], does: 'to the first and last person' },
    ],
  },
  {
    place: 'Table of floors',
    lines: [
      { keys: ['←', '↑', '↓', '→', 'Home', 'End'], does: 'from number to number' },
      { keys: ['0–9', 'Enter'], does: 'type a number, keep it' },
      { keys: ['Esc'], does: 'leaves the number as it was' },
      { keys: ['Delete'], does: 'sets 0' },
      { keys: ['Shift + arrows'], does: 'selects several numbers' },
      { keys: ['Ctrl R', 'Ctrl D'], does: 'fills right and down while several are selected' },
      { keys: ['Ctrl Z', 'Ctrl Y'], does: 'undoes and does again' },
    ],
  },
  {
    place: 'Names on the Hours sheet',
    lines: [
      { keys: ['↑', '↓', 'Home', 'End'], does: 'from person to person' },
      { keys: ['Enter'], does: 'opens the days of the person' },
      { keys: ['Esc'], does: 'closes them' },
    ],
  },
  {
    place: 'Calendar',
    lines: [{ keys: ['T'], does: 'shows the same shifts as a table, and back' }],
  },
];
