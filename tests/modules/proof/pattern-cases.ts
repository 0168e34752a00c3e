import { buildRules } from '@/tests/support/problem-builder';
import { type Plan, past, type RuleCase } from './rule-cases';

/** Early on each of some days. */
const earlies = (...days: readonly number[]): Plan => days.map((day) => [day, 'Early'] as const);

/** Rules on patterns of days and kinds, those that look beyond the period, and those of one person. */
export const patternCases: readonly RuleCase[] = [
  {
    rule: 'kindsThatMayNotFollow',
    title: 'a kind that may not follow on the next day',
    sketch: {
      rules: {
        restMinutes: 0,
        kindsThatMayNotFollow: [{ kindId: 'Late', nextKindId: 'Early' }],
      },
    },
    held: [
      [0, 'Late'],
      [2, 'Early'],
      [3, 'Late'],
      [4, 'Late'],
    ],
    broken: [
      [0, 'Late'],
      [1, 'Early'],
    ],
    sentence:
      'Ione Baptisto: Early on Tue 2 Feb comes after Late on Mon 1 Feb; the one may not follow the other.',
  },
  {
    rule: 'kindsThatMayNotFollow',
    title: 'a kind that may not follow itself',
    sketch: { rules: { kindsThatMayNotFollow: [{ kindId: 'Night', nextKindId: 'Night' }] } },
    held: [
      [5, 'Early'],
      [6, 'Night'],
    ],
    broken: [
      [5, 'Night'],
      [6, 'Night'],
    ],
    sentence:
      'Ione Baptisto: Night on Sun 7 Feb comes after Night on Sat 6 Feb; the one may not follow the other.',
  },
  {
    rule: 'shortestRunDays',
    title: 'fewest days in a row, those on the first and last day are exempt',
    sketch: { rules: { shortestRunDays: 2 } },
    held: earlies(0, 2, 3, 6),
    broken: earlies(0, 2, 4, 5),
    sentence: 'Ione Baptisto: 1 day in a row, Wed 3 Feb; the least is 2.',
  },
  {
    rule: 'shortestRunDays',
    title: 'fewest days in a row, days around the period do not lengthen a run within it',
    sketch: {
      rules: { shortestRunDays: 3 },
      people: [{ history: [past(-1, 420, 900)], following: [past(7, 420, 900)] }],
    },
    held: earlies(0, 2, 3, 4, 6),
    broken: earlies(1, 2, 6),
    sentence: 'Ione Baptisto: 2 days in a row, Tue 2 Feb to Wed 3 Feb; the least is 3.',
  },
  {
    rule: 'shortestRunFreeDays',
    title: 'fewest days off in a row, those on the first and last day are exempt',
    sketch: { rules: { shortestRunFreeDays: 2 } },
    held: earlies(1, 2, 5),
    broken: earlies(1, 3),
    sentence: 'Ione Baptisto: 1 day off in a row, Wed 3 Feb; the least is 2.',
  },
  {
    rule: 'shortestRunFreeDays',
    title: 'fewest days off in a row, leave counts as days off',
    sketch: {
      rules: { shortestRunFreeDays: 3 },
      people: [{ absences: [{ startMinute: 2 * 1440, endMinute: 4 * 1440, reason: 'Leave' }] }],
    },
    held: earlies(1, 5, 6),
    broken: earlies(1, 4),
    sentence: 'Ione Baptisto: 2 days off in a row, Wed 3 Feb to Thu 4 Feb; the least is 3.',
  },
  {
    rule: 'kindLimits',
    title: 'shifts of a kind, those before the period do not count',
    sketch: {
      people: [{ kindLimits: [{ kindId: 'Late', most: 1 }], history: [past(-1, 900, 1380)] }],
    },
    held: [
      [1, 'Late'],
      [2, 'Night'],
    ],
    broken: [
      [1, 'Late'],
      [3, 'Late'],
      [5, 'Late'],
    ],
    sentence:
      'Ione Baptisto: 3 shifts of the kind Late in the period from Mon 1 Feb; the most is 1.',
  },
  {
    rule: 'kindLimits',
    title: 'no shift of a kind at all',
    sketch: { people: [{ kindLimits: [{ kindId: 'Late', most: 0 }] }] },
    held: earlies(0),
    broken: [[0, 'Late']],
    sentence:
      'Ione Baptisto: 1 shift of the kind Late in the period from Mon 1 Feb; the most is 0.',
  },
  {
    rule: 'restMinutes',
    title: 'rest to a shift that is published after the period',
    sketch: { people: [{ following: [past(7, 420, 900)] }] },
    held: [[6, 'Day']],
    broken: [[6, 'Late']],
    sentence:
      'Ione Baptisto: Late on Sun 7 Feb ends 23:00 and the shift on Mon 8 Feb starts 07:00, 8 h apart; the least is 11 h.',
  },
  {
    rule: 'longestRunDays',
    title: 'days in a row across the end of the period',
    sketch: {
      rules: { longestRunDays: 3 },
      people: [{ following: [past(7, 420, 900), past(8, 420, 900)] }],
    },
    held: earlies(4, 6),
    broken: earlies(5, 6),
    sentence: 'Ione Baptisto: 4 days in a row, Sat 6 Feb to Tue 9 Feb; the most is 3.',
  },
  {
    rule: 'longestRunNights',
    title: 'nights in a row across the end of the period',
    sketch: {
      rules: { longestRunNights: 2 },
      people: [{ following: [past(7, 1380, 1860, true), past(8, 1380, 1860, true)] }],
    },
    held: [[5, 'Night']],
    broken: [[6, 'Night']],
    sentence: 'Ione Baptisto: 3 nights in a row, Sun 7 Feb to Tue 9 Feb; the most is 2.',
  },
  {
    rule: 'longestRunDays',
    title: 'limits of a person that are tighter than those of the team',
    sketch: {
      rules: { longestRunDays: 5 },
      people: [{ rules: buildRules({ longestRunDays: 2 }) }],
    },
    held: earlies(0, 1, 3),
    broken: earlies(0, 1, 2),
    sentence: 'Ione Baptisto: 3 days in a row, Mon 1 Feb to Wed 3 Feb; the most is 2.',
  },
  {
    rule: 'restMinutes',
    title: 'rest of a person that is longer than that of the team',
    sketch: { people: [{ rules: buildRules({ restMinutes: 1020 }) }] },
    held: [
      [0, 'Early'],
      [1, 'Day'],
    ],
    broken: [
      [0, 'Early'],
      [1, 'Early'],
    ],
    sentence:
      'Ione Baptisto: Early on Mon 1 Feb ends 15:00 and Early on Tue 2 Feb starts 07:00, 16 h apart; the least is 17 h.',
  },
  {
    rule: 'weekendsPerPeriod',
    title: 'weekends of a person for whom Friday nights count',
    sketch: {
      people: [{ rules: buildRules({ weekendsPerPeriod: 0, weekendCountsFridayNight: true }) }],
    },
    held: [[4, 'Late']],
    broken: [[4, 'Night']],
    sentence: 'Ione Baptisto: 1 weekend worked (Sat 6 Feb); the most is 0.',
  },
];
