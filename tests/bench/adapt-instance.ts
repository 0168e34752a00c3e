import {
  type PlannedRoster,
  type Problem,
  type ProblemCeiling,
  type ProblemFloor,
  type ProblemPerson,
  type ProblemRules,
  type ProblemShift,
  problemVersion,
} from '@/modules/problem';
import { addDays } from '@/modules/units';
import { type Instance, type InstancePerson, mostOf, type RosterTable } from './instance';

/** A Monday, as the format asks. */
const firstDate = '2027-02-01';
const dayMinutes = 1440;
/** Cover is asked for over the first hour of a day: a weight is then the price of that hour. */
const coverMinutes = 60;
/** One point of the objective in cents. */
export const centsPerPoint = 100;
/** Held by people who may have no shift at all, since everybody in a problem holds a skill. */
const idleSkill = { id: 'no post', name: 'No post' };

/**
 * An instance as a problem, with nothing that the product does not know. Each kind is a post of its own,
 * starts at 00:00 (so that no shift reaches into the next day) and goes to those who may have it; need is
 * a wished floor and a priced ceiling, requests are wishes, the other rules are each person's own.
 * The cost of a roster is its objective in cents.
 */
export function problemOf(instance: Instance): Problem {
  const { dayCount, kinds } = instance;
  return {
    version: problemVersion,
    teamName: 'Open benchmark',
    zone: 'UTC',
    currency: 'EUR',
    days: Array.from({ length: dayCount }, (_, index) => ({
      date: addDays(firstDate, index),
      startMinute: index * dayMinutes,
      isHoliday: false,
    })),
    skills: [...kinds.map(({ id }) => ({ id, name: id })), idleSkill],
    shifts: shiftsOf(instance),
    floors: instance.cover.flatMap(floorOf),
    ceilings: instance.cover.flatMap(ceilingOf),
    people: instance.people.map((person) => personOf(instance, person)),
    rules: noLimits,
    teamRules: [],
    pay: {
      nightPercent: 0,
      weekendPercent: 0,
      holidayPercent: 0,
      overtimeSteps: [{ overMinutes: 0, percent: 100 }],
    },
    fairness: [],
  };
}

/** A roster in the words of the instance. */
export function tableOf(instance: Instance, roster: PlannedRoster): RosterTable {
  const table = Object.fromEntries(
    instance.people.map(({ id }) => [id, Array<string>(instance.dayCount).fill('')]),
  );
  for (const { personId, shiftIndex } of roster) {
    const line = table[personId];
    const kind = instance.kinds[shiftIndex % instance.kinds.length];
    if (line && kind) line[Math.floor(shiftIndex / instance.kinds.length)] = kind.id;
  }
  return table;
}

/** A table as a roster of `problemOf(instance)`; entries that are no kind are left out. */
export const rosterOf = (instance: Instance, table: RosterTable): PlannedRoster =>
  instance.people.flatMap(({ id: personId }) =>
    (table[personId] ?? []).flatMap((kindId, day) => {
      const shiftIndex = shiftIndexOf(instance, day, kindId);
      return shiftIndex === null ? [] : [{ personId, shiftIndex, postSkillId: kindId }];
    }),
  );

const noLimits: ProblemRules = {
  restMinutes: 0,
  longestRunDays: null,
  longestRunNights: null,
  nightsPerPeriod: null,
  weekendsPerPeriod: null,
  weekendCountsFridayNight: false,
  shortestRunDays: null,
  shortestRunFreeDays: null,
  kindsThatMayNotFollow: [],
};

/** Shifts stand day by day, each day in the order of the kinds. */
function shiftIndexOf({ kinds }: Instance, day: number, kindId: string): number | null {
  const position = kinds.findIndex(({ id }) => id === kindId);
  return position < 0 ? null : day * kinds.length + position;
}

function shiftsOf({ dayCount, kinds }: Instance): ProblemShift[] {
  return Array.from({ length: dayCount }, (_, dayIndex) =>
    kinds.map(({ id, minutes }, position) => ({
      index: dayIndex * kinds.length + position,
      kindId: id,
      kindName: id,
      dayIndex,
      startMinute: dayIndex * dayMinutes,
      endMinute: dayIndex * dayMinutes + minutes,
      paidMinutes: minutes,
      nightMinutes: 0,
      weekendMinutes: 0,
      holidayMinutes: 0,
      isNight: false,
      postSkillIds: [id],
    })),
  ).flat();
}

const stretchOf = (day: number) => ({
  dayIndex: day,
  startMinute: day * dayMinutes,
  endMinute: day * dayMinutes + coverMinutes,
});

function floorOf({ day, kindId, need, underWeight }: Instance['cover'][number]): ProblemFloor[] {
  if (need === 0 || underWeight === 0) return [];
  return [
    {
      floorId: `at least ${kindId}`,
      ...stretchOf(day),
      skillId: kindId,
      people: need,
      counting: 'seated',
      priceCentsPerHour: underWeight * centsPerPoint,
      priority: 1,
    },
  ];
}

function ceilingOf({ day, kindId, need, overWeight }: Instance['cover'][number]): ProblemCeiling[] {
  if (overWeight === 0) return [];
  return [
    {
      ceilingId: `at most ${kindId}`,
      ...stretchOf(day),
      skillId: kindId,
      people: need,
      counting: 'seated',
      priceCentsPerHour: overWeight * centsPerPoint,
    },
  ];
}

function personOf(instance: Instance, person: InstancePerson): ProblemPerson {
  const allowed = instance.kinds.filter(({ id }) => mostOf(instance, person, id) > 0);
  return {
    id: person.id,
    name: person.id,
    skillIds: allowed.length > 0 ? allowed.map(({ id }) => id) : [idleSkill.id],
    payCentsPerHour: 0,
    paidBy: 'hours',
    contractMinutes: person.mostMinutes,
    creditMinutes: 0,
    minimumMinutes: person.leastMinutes,
    maximumMinutes: person.mostMinutes,
    mayWorkNights: true,
    absences: person.daysOff.map((day) => ({
      startMinute: day * dayMinutes,
      endMinute: (day + 1) * dayMinutes,
      reason: 'day off',
    })),
    history: [],
    following: [],
    pins: [],
    rules: rulesFor(instance, person),
    kindLimits: allowed.flatMap(({ id: kindId }) => {
      const most = mostOf(instance, person, kindId);
      return most < instance.dayCount ? [{ kindId, most }] : [];
    }),
    wishes: wishesOf(instance, person),
    isOutside: false,
  };
}

function rulesFor({ kinds }: Instance, person: InstancePerson): ProblemRules {
  return {
    ...noLimits,
    longestRunDays: person.longestRun,
    shortestRunDays: person.shortestRun,
    shortestRunFreeDays: person.shortestFreeRun,
    weekendsPerPeriod: person.mostWeekends,
    kindsThatMayNotFollow: kinds.flatMap(({ id: kindId, mayNotPrecede }) =>
      mayNotPrecede.map((nextKindId) => ({ kindId, nextKindId })),
    ),
  };
}

function wishesOf(instance: Instance, { id }: InstancePerson): ProblemPerson['wishes'] {
  const wishesIn = (requests: Instance['onRequests'], wants: 'on' | 'off') =>
    requests
      .filter(({ personId }) => personId === id)
      .map(({ day, kindId, weight }) => ({
        dayIndex: day,
        shiftIndex: shiftIndexOf(instance, day, kindId),
        wants,
        priceCents: weight * centsPerPoint,
      }));
  return [...wishesIn(instance.onRequests, 'on'), ...wishesIn(instance.offRequests, 'off')];
}
