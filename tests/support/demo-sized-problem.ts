import {
  type Problem,
  type ProblemFloor,
  type ProblemPerson,
  type ProblemShift,
  problemVersion,
} from '@/modules/problem';
import { addDays, weekdayOf } from '@/modules/units';

/*
 * A problem of the size of the demonstration organisation: an animal hospital with 24 people, 28 days of
 * February 2027, four shift kinds and 424 shifts to fill. Built straight as a problem, so that solver
 * tests need no database.
 */

const firstDate = '2027-02-01';
const holidayIndex = 17;
const dayMinutes = 1440;
const hour = 60;
const kinds = [
  { id: 'early', name: 'Early', start: 7 * hour, isNight: false },
  { id: 'day', name: 'Day', start: 9 * hour, isNight: false },
  { id: 'late', name: 'Late', start: 15 * hour, isNight: false },
  { id: 'night', name: 'Night', start: 23 * hour, isNight: true },
];
const shiftMinutes = 8 * hour;

/** People needed on Early, Day, Late and Night of a weekday; weekends and holidays have no Day. */
const needs: Record<string, readonly number[]> = {
  Vet: [1, 1, 1, 1],
  Nurse: [2, 1, 2, 1],
  Ward: [1, 0, 1, 1],
  Desk: [1, 1, 1, 0],
};
const needsThatDiffer: Record<string, number> = {
  '16 Nurse night': 2,
  '17 Nurse late': 3,
  '17 Vet late': 2,
};
const payCents: Record<string, number> = { Vet: 3800, Nurse: 2500, Ward: 1900, Desk: 1800 };

type Leave = readonly [firstDay: number, lastDay: number, hours: number];
const people: readonly (readonly [string, string, number, Leave?])[] = [
  ['Maren Oduya', 'Vet', 40, [15, 19, 40]],
  ['Tobias Lindrao', 'Vet', 40],
  ['Ysolde Amankar', 'Vet', 40],
  ['Pavel Dristan', 'Vet', 32],
  ['Noor Haldane', 'Vet', 40],
  ['Ciaran Vought', 'Vet, no Nights', 24],
  ['Ione Baptisto', 'Nurse', 40],
  ['Kwabena Tull', 'Nurse', 40],
  ['Lucja Mirov', 'Nurse', 40, [26, 28, 24]],
  ['Hana Quill', 'Nurse', 40, [8, 12, 40]],
  ['Desmond Ferlow', 'Nurse', 40],
  ['Anouk Tessaly', 'Nurse, no Nights', 24],
  ['Ravi Thornby', 'Nurse, Desk', 40],
  ['Sunniva Adeyo', 'Nurse, Ward', 40],
  ['Bram Okell', 'Ward', 40],
  ['Petra Vanholt', 'Ward, Nurse', 40],
  ['Jun Marisco', 'Ward, Nurse', 32],
  ['Elspeth Nakano', 'Ward, no Nights', 40],
  ['Mateo Grindle', 'Ward', 32, [22, 24, 24]],
  ['Farah Wexcombe', 'Desk, Ward, no Nights', 40],
  ['Odile Brandosei', 'Desk', 32],
  ['Timur Ashgrove', 'Desk', 40, [1, 3, 24]],
  ['Gwen Palliato', 'Desk', 24],
  ['Zuri Hallam', 'Desk', 24],
];

/** Nights of the last three days of January, by name: rest and runs cross into the period. */
const nightsBefore: Record<string, readonly number[]> = {
  'Tobias Lindrao': [-3, -2, -1],
  'Desmond Ferlow': [-2, -1],
  'Bram Okell': [-1],
};

/** The whole problem; `change` may replace parts of it. */
export function demoSizedProblem(change: Partial<Problem> = {}): Problem {
  const days = Array.from({ length: 28 }, (_, index) => ({
    date: addDays(firstDate, index),
    startMinute: index * dayMinutes,
    isHoliday: index === holidayIndex,
  }));
  return {
    version: problemVersion,
    teamName: 'Ravelmere',
    zone: 'Europe/Berlin',
    currency: 'EUR',
    days,
    skills: Object.keys(needs).map((name) => ({ id: name.toLowerCase(), name })),
    shifts: days.flatMap((_, dayIndex) => kinds.map((_kind, kind) => makeShift(dayIndex, kind))),
    floors: days.flatMap((_, dayIndex) => makeFloors(dayIndex)),
    ceilings: [],
    people: people.map((line, index) => makePerson(index, line)),
    rules: {
      restMinutes: 11 * hour,
      longestRunDays: 5,
      longestRunNights: 4,
      nightsPerPeriod: 8,
      weekendsPerPeriod: 3,
      weekendCountsFridayNight: false,
      shortestRunDays: null,
      shortestRunFreeDays: null,
      kindsThatMayNotFollow: [],
    },
    teamRules: [],
    pay: {
      nightPercent: 25,
      weekendPercent: 20,
      holidayPercent: 100,
      overtimeSteps: [{ overMinutes: 0, percent: 150 }],
    },
    fairness: [],
    ...change,
  };
}

function makeShift(dayIndex: number, kindIndex: number): ProblemShift {
  const kind = kinds[kindIndex] ?? { id: '', name: '', start: 0, isNight: false };
  const startMinute = dayIndex * dayMinutes + kind.start;
  const endMinute = startMinute + shiftMinutes;
  return {
    index: dayIndex * kinds.length + kindIndex,
    kindId: kind.id,
    kindName: kind.name,
    dayIndex,
    startMinute,
    endMinute,
    paidMinutes: shiftMinutes,
    nightMinutes: kind.isNight ? shiftMinutes : 0,
    weekendMinutes: minutesOnDays(startMinute, endMinute, (day) => weekday(day) >= 5),
    holidayMinutes: minutesOnDays(startMinute, endMinute, (day) => day === holidayIndex),
    isNight: kind.isNight,
    postSkillIds: null,
  };
}

const weekday = (dayIndex: number): number => weekdayOf(addDays(firstDate, dayIndex));

/** February has no clock change: every day has 1440 minutes. */
function minutesOnDays(start: number, end: number, counts: (day: number) => boolean): number {
  const first = Math.floor(start / dayMinutes);
  return [first, first + 1]
    .filter(counts)
    .map((day) => Math.min(end, (day + 1) * dayMinutes) - Math.max(start, day * dayMinutes))
    .reduce((sum, minutes) => sum + Math.max(0, minutes), 0);
}

function makeFloors(dayIndex: number): ProblemFloor[] {
  const hasDay = weekday(dayIndex) < 5 && dayIndex !== holidayIndex;
  return Object.entries(needs).flatMap(([skill, numbers]) =>
    kinds.map((kind, kindIndex) => {
      const usual = kind.id === 'day' && !hasDay ? 0 : (numbers[kindIndex] ?? 0);
      const startMinute = dayIndex * dayMinutes + kind.start;
      return {
        floorId: `${skill} ${kind.name}`,
        dayIndex,
        startMinute,
        endMinute: startMinute + shiftMinutes,
        skillId: skill.toLowerCase(),
        people: needsThatDiffer[`${dayIndex} ${skill} ${kind.id}`] ?? usual,
        counting: 'seated',
        priceCentsPerHour: null,
        priority: 1,
      };
    }),
  );
}

function makePerson(
  index: number,
  [name, limits, weeklyHours, leave]: (typeof people)[number],
): ProblemPerson {
  const terms = limits.split(', ');
  const skills = terms.filter((term) => term !== 'no Nights');
  const contractMinutes = weeklyHours * 4 * hour;
  return {
    id: `person-${index}`,
    name,
    skillIds: skills.map((skill) => skill.toLowerCase()),
    payCentsPerHour: payCents[skills[0] ?? ''] ?? 0,
    paidBy: 'contract',
    contractMinutes,
    creditMinutes: (leave?.[2] ?? 0) * hour,
    minimumMinutes: contractMinutes,
    maximumMinutes: contractMinutes + 24 * hour,
    mayWorkNights: !terms.includes('no Nights'),
    absences: leave
      ? [
          {
            startMinute: (leave[0] - 1) * dayMinutes,
            endMinute: leave[1] * dayMinutes,
            reason: 'leave',
          },
        ]
      : [],
    history: (nightsBefore[name] ?? []).map((dayIndex) => ({
      dayIndex,
      startMinute: dayIndex * dayMinutes + 23 * hour,
      endMinute: (dayIndex + 1) * dayMinutes + 7 * hour,
      isNight: true,
    })),
    following: [],
    pins: [],
    rules: null,
    kindLimits: [],
    wishes: [],
    isOutside: false,
  };
}
