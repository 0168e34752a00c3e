import type { Problem, ProblemFloor, ProblemPerson } from '@/modules/problem';
import { weekdayOf } from '@/modules/units';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';

const hour = 60;
const dayMinutes = 24 * hour;

/** Every day: so many who hold the skill on duty over a window, whatever their post. */
const sharedFloors = [
  { name: 'Two who know nursing', skillId: 'nurse', from: 15, to: 23, people: 2 },
  { name: 'One who knows nursing', skillId: 'nurse', from: 23, to: 31, people: 1 },
  { name: 'Two who know the ward', skillId: 'ward', from: 9, to: 15, people: 2, isWeekday: true },
  { name: 'One who knows the ward', skillId: 'ward', from: 9, to: 15, people: 1, isWeekday: false },
];

const wishCount = 36;

/**
 * The demonstration's period with everything that may cost: overtime at 150 % for 16 h, then 200 %; hours
 * up to 16 h short of the contract; floors that people share by skill; 36 wishes; Nights and weekends
 * spread evenly at a price.
 */
export function demoProblem(): Problem {
  const problem = demoSizedProblem();
  return {
    ...problem,
    floors: [...problem.floors, ...problem.days.flatMap((_, day) => sharedFloorsOn(problem, day))],
    people: problem.people.map((person, index) => ({
      ...person,
      minimumMinutes: Math.max(0, person.contractMinutes - 16 * hour),
      wishes: wishesOf(problem, index),
    })),
    pay: {
      ...problem.pay,
      overtimeSteps: [
        { overMinutes: 0, percent: 150 },
        { overMinutes: 16 * hour, percent: 200 },
      ],
    },
    fairness: [
      { kind: 'spread', measure: 'nights', priceCents: 2000 },
      { kind: 'spread', measure: 'weekends', priceCents: 4000 },
    ],
  };
}

function sharedFloorsOn({ days }: Problem, dayIndex: number): ProblemFloor[] {
  const day = days[dayIndex];
  if (!day) return [];
  const isWeekday = weekdayOf(day.date) < 5 && !day.isHoliday;
  return sharedFloors
    .filter((floor) => floor.isWeekday === undefined || floor.isWeekday === isWeekday)
    .map(({ name, skillId, from, to, people }) => ({
      floorId: name,
      dayIndex,
      startMinute: dayIndex * dayMinutes + from * hour,
      endMinute: dayIndex * dayMinutes + to * hour,
      skillId,
      people,
      counting: 'shared',
      priceCentsPerHour: null,
      priority: 1,
    }));
}

/** Wish by wish to the next person, to work a shift or to be free of any, at 20.00 to 50.00. */
function wishesOf({ people, days, shifts }: Problem, personIndex: number): ProblemPerson['wishes'] {
  return Array.from({ length: wishCount }, (_, wish) => wish)
    .filter((wish) => wish % people.length === personIndex)
    .map((wish) => {
      const dayIndex = (wish * 11 + 3) % days.length;
      const ofDay = shifts.filter((shift) => shift.dayIndex === dayIndex && !shift.isNight);
      const wantsOn = wish % 3 === 0;
      return {
        dayIndex,
        shiftIndex: wantsOn ? (ofDay[wish % ofDay.length]?.index ?? null) : null,
        wants: wantsOn ? ('on' as const) : ('off' as const),
        priceCents: 2000 + (wish % 4) * 1000,
      };
    });
}
