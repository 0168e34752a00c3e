import type { ProblemSketch } from '@/tests/support/problem-builder';

/** Shifts of one person by day of the period and kind; the post is Nurse unless said otherwise. */
export type Plan = readonly (readonly [dayIndex: number, kindId: string, postSkillId?: string])[];

const day = (dayIndex: number) => dayIndex * 1440;
/** A shift before the period; the day index is negative. */
export const past = (
  dayIndex: number,
  startMinute: number,
  endMinute: number,
  isNight = false,
) => ({
  dayIndex,
  startMinute: day(dayIndex) + startMinute,
  endMinute: day(dayIndex) + endMinute,
  isNight,
});

/** One rule, a plan of Ione Baptisto that holds it and one that breaks it, with the sentence that tells. */
export interface RuleCase {
  readonly rule: string;
  readonly title: string;
  readonly sketch?: ProblemSketch;
  readonly held: Plan;
  readonly broken: Plan;
  readonly sentence: string;
}

const away = { startMinute: day(2), endMinute: day(4), reason: 'Leave' };
export const ruleCases: readonly RuleCase[] = [
  {
    rule: 'oneShiftADay',
    title: 'one shift a day',
    sketch: { rules: { restMinutes: 0 } },
    held: [
      [0, 'Early'],
      [1, 'Late'],
    ],
    broken: [
      [0, 'Early'],
      [0, 'Late'],
    ],
    sentence: 'Ione Baptisto: 2 shifts on Mon 1 Feb (Early, Late); the most is 1.',
  },
  {
    rule: 'post',
    title: 'a post in a skill the person holds',
    sketch: { people: [{ skillIds: ['nurse', 'desk'] }] },
    held: [[0, 'Early', 'desk']],
    broken: [[0, 'Early', 'vet']],
    sentence: 'Ione Baptisto: Vet on Early, Mon 1 Feb, but the skills held are Nurse, Desk.',
  },
  {
    rule: 'post',
    title: 'a post that the shift kind admits',
    sketch: {
      people: [{ skillIds: ['nurse', 'desk'] }],
      kinds: [{ id: 'Early', startMinute: 420, endMinute: 900, postSkillIds: ['desk'] }],
    },
    held: [[0, 'Early', 'desk']],
    broken: [[0, 'Early', 'nurse']],
    sentence: 'Ione Baptisto: Nurse on Early, Mon 1 Feb, but the shift has posts for Desk only.',
  },
  {
    rule: 'absence',
    title: 'no shift in time away, on its first day',
    sketch: { people: [{ absences: [away] }] },
    held: [
      [1, 'Late'],
      [4, 'Early'],
    ],
    broken: [[2, 'Early']],
    sentence: 'Ione Baptisto: Early on Wed 3 Feb, 07:00 to 15:00, falls into time away (Leave).',
  },
  {
    rule: 'absence',
    title: 'no night that runs into time away',
    sketch: { people: [{ absences: [away] }] },
    held: [[4, 'Night']],
    broken: [[1, 'Night']],
    sentence: 'Ione Baptisto: Night on Tue 2 Feb, 23:00 to 07:00, falls into time away (Leave).',
  },
  {
    rule: 'nightPermission',
    title: 'no nights for people without them',
    sketch: { people: [{ mayWorkNights: false }] },
    held: [[0, 'Late']],
    broken: [[0, 'Night']],
    sentence: 'Ione Baptisto: Night on Mon 1 Feb is a night, and the contract has no nights.',
  },
  {
    rule: 'longestRunDays',
    title: 'days in a row',
    sketch: { rules: { longestRunDays: 3 } },
    held: [0, 1, 2, 4, 5, 6].map((dayIndex) => [dayIndex, 'Early'] as const),
    broken: [1, 2, 3, 4].map((dayIndex) => [dayIndex, 'Early'] as const),
    sentence: 'Ione Baptisto: 4 days in a row, Tue 2 Feb to Fri 5 Feb; the most is 3.',
  },
  {
    rule: 'longestRunDays',
    title: 'days in a row across the start of the period',
    sketch: {
      rules: { longestRunDays: 3 },
      people: [{ history: [past(-2, 420, 900), past(-1, 420, 900)] }],
    },
    held: [
      [0, 'Early'],
      [2, 'Early'],
    ],
    broken: [
      [0, 'Early'],
      [1, 'Early'],
    ],
    sentence: 'Ione Baptisto: 4 days in a row, Sat 30 Jan to Tue 2 Feb; the most is 3.',
  },
  {
    rule: 'longestRunNights',
    title: 'nights in a row, a day shift does not lengthen them',
    sketch: { rules: { longestRunNights: 2, restMinutes: 0 } },
    held: [
      [0, 'Late'],
      [1, 'Night'],
      [2, 'Night'],
      [3, 'Late'],
      [4, 'Night'],
    ],
    broken: [
      [1, 'Night'],
      [2, 'Night'],
      [3, 'Night'],
    ],
    sentence: 'Ione Baptisto: 3 nights in a row, Tue 2 Feb to Thu 4 Feb; the most is 2.',
  },
  {
    rule: 'longestRunNights',
    title: 'nights in a row across the start of the period',
    sketch: {
      rules: { longestRunNights: 2 },
      people: [{ history: [past(-2, 1380, 1860, true), past(-1, 1380, 1860, true)] }],
    },
    held: [[1, 'Night']],
    broken: [[0, 'Night']],
    sentence: 'Ione Baptisto: 3 nights in a row, Sat 30 Jan to Mon 1 Feb; the most is 2.',
  },
  {
    rule: 'nightsPerPeriod',
    title: 'nights in the period, those before it do not count',
    sketch: {
      rules: { nightsPerPeriod: 2 },
      people: [{ history: [past(-2, 1380, 1860, true)] }],
    },
    held: [
      [0, 'Night'],
      [3, 'Night'],
    ],
    broken: [
      [0, 'Night'],
      [3, 'Night'],
      [5, 'Night'],
    ],
    sentence: 'Ione Baptisto: 3 nights in the period from Mon 1 Feb; the most is 2.',
  },
  {
    rule: 'weekendsPerPeriod',
    title: 'weekends, Saturday and Sunday of one weekend count once',
    sketch: { dayCount: 14, rules: { weekendsPerPeriod: 1 } },
    held: [
      [5, 'Early'],
      [6, 'Early'],
      [11, 'Night'],
    ],
    broken: [
      [6, 'Early'],
      [12, 'Early'],
    ],
    sentence: 'Ione Baptisto: 2 weekends worked (Sat 6 Feb, Sat 13 Feb); the most is 1.',
  },
  {
    rule: 'weekendsPerPeriod',
    title: 'weekends begun by a Friday night, where they count',
    sketch: {
      dayCount: 14,
      rules: { weekendsPerPeriod: 0, weekendCountsFridayNight: true },
    },
    held: [[4, 'Late']],
    broken: [[4, 'Night']],
    sentence: 'Ione Baptisto: 1 weekend worked (Sat 6 Feb); the most is 0.',
  },
  {
    rule: 'contractHours',
    title: 'the least hours, leave counts towards them',
    sketch: { people: [{ minimumMinutes: 1440, creditMinutes: 480 }] },
    held: [
      [0, 'Early'],
      [1, 'Early'],
    ],
    broken: [[0, 'Early']],
    sentence: 'Ione Baptisto: 16 h with leave in the period from Mon 1 Feb; the least is 24 h.',
  },
  {
    rule: 'contractHours',
    title: 'the most hours, unpaid breaks left out',
    sketch: {
      people: [{ maximumMinutes: 900 }],
      kinds: [{ id: 'Early', startMinute: 420, endMinute: 900, unpaidBreakMinutes: 30 }],
    },
    held: [
      [0, 'Early'],
      [1, 'Early'],
    ],
    broken: [
      [0, 'Early'],
      [1, 'Early'],
      [2, 'Early'],
    ],
    sentence: 'Ione Baptisto: 22 h 30 min in the period from Mon 1 Feb; the most is 15 h.',
  },
  {
    rule: 'pins',
    title: 'a pinned shift',
    sketch: { people: [{ pins: [{ dayIndex: 0, shiftIndex: 0, postSkillId: 'nurse' }] }] },
    held: [[0, 'Early']],
    broken: [[0, 'Late']],
    sentence: 'Ione Baptisto: Mon 1 Feb is pinned to Early as Nurse, the roster has Late as Nurse.',
  },
  {
    rule: 'pins',
    title: 'a pinned post',
    sketch: {
      people: [
        {
          skillIds: ['nurse', 'desk'],
          pins: [{ dayIndex: 0, shiftIndex: 0, postSkillId: 'nurse' }],
        },
      ],
    },
    held: [[0, 'Early', 'nurse']],
    broken: [[0, 'Early', 'desk']],
    sentence: 'Ione Baptisto: Mon 1 Feb is pinned to Early as Nurse, the roster has Early as Desk.',
  },
  {
    rule: 'pins',
    title: 'a pinned day off',
    sketch: { people: [{ pins: [{ dayIndex: 1, shiftIndex: null, postSkillId: null }] }] },
    held: [[0, 'Early']],
    broken: [[1, 'Early']],
    sentence: 'Ione Baptisto: Tue 2 Feb is pinned to off, the roster has Early as Nurse.',
  },
];
