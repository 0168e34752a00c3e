import {
  type PlannedAssignment,
  type Problem,
  type ProblemCeiling,
  type ProblemFloor,
  type ProblemPerson,
  type ProblemRules,
  type ProblemShift,
  problemVersion,
} from '@/modules/problem';
import { addDays, elapsedMinutes, toInstant } from '@/modules/units';

/** A shift kind of a test problem; minutes of the local day, an end beyond 1440 is past midnight. */
export interface KindSketch {
  readonly id: string;
  readonly startMinute: number;
  readonly endMinute: number;
  readonly unpaidBreakMinutes?: number;
  readonly isNight?: boolean;
  readonly nightMinutes?: number;
  readonly weekendMinutes?: number;
  readonly holidayMinutes?: number;
  readonly postSkillIds?: string[];
}

/** What a test says of its problem; everything else is plain: one week of 2027 in UTC, no limits. */
export interface ProblemSketch {
  readonly startsOn?: string;
  readonly dayCount?: number;
  readonly zone?: string;
  readonly kinds?: readonly KindSketch[];
  readonly people?: readonly Partial<ProblemPerson>[];
  readonly floors?: readonly Partial<ProblemFloor>[];
  readonly ceilings?: readonly Partial<ProblemCeiling>[];
  readonly rules?: Partial<ProblemRules>;
  readonly teamRules?: Problem['teamRules'];
  readonly fairness?: Problem['fairness'];
  readonly pay?: Partial<Problem['pay']>;
}

/** Eight-hour shifts of an open house: Early 07-15, Day 09-17, Late 15-23, Night 23-07. */
export const houseKinds: readonly KindSketch[] = [
  { id: 'Early', startMinute: 420, endMinute: 900 },
  { id: 'Day', startMinute: 540, endMinute: 1020 },
  { id: 'Late', startMinute: 900, endMinute: 1380 },
  { id: 'Night', startMinute: 1380, endMinute: 1860, isNight: true },
];

export const skills = [
  { id: 'nurse', name: 'Nurse' },
  { id: 'vet', name: 'Vet' },
  { id: 'desk', name: 'Desk' },
];

/** Makes a problem of a sketch. Its first person is `ione` unless the sketch says otherwise. */
export function buildProblem(sketch: ProblemSketch = {}): Problem {
  const { startsOn = '2027-02-01', dayCount = 7, zone = 'UTC', kinds = houseKinds } = sketch;
  const origin = toInstant(startsOn, 0, zone);
  const minuteOf = (dayIndex: number, minute: number): number =>
    elapsedMinutes(origin, toInstant(addDays(startsOn, dayIndex), minute, zone));
  const days = Array.from({ length: dayCount }, (_, dayIndex) => dayIndex);
  return {
    version: problemVersion,
    teamName: 'Ravelmere',
    zone,
    currency: 'EUR',
    days: days.map((dayIndex) => ({
      date: addDays(startsOn, dayIndex),
      startMinute: minuteOf(dayIndex, 0),
      isHoliday: false,
    })),
    skills,
    shifts: days
      .flatMap((dayIndex) => kinds.map((kind) => buildShift(kind, dayIndex, minuteOf)))
      .map((shift, index) => ({ ...shift, index })),
    floors: (sketch.floors ?? []).map(buildFloor),
    ceilings: (sketch.ceilings ?? []).map(buildCeiling),
    people: (sketch.people ?? [{}]).map(buildPerson),
    rules: buildRules(sketch.rules),
    teamRules: sketch.teamRules ?? [],
    pay: {
      nightPercent: 25,
      weekendPercent: 20,
      holidayPercent: 100,
      overtimeSteps: [{ overMinutes: 0, percent: 150 }],
      ...sketch.pay,
    },
    fairness: sketch.fairness ?? [],
  };
}

function buildShift(
  kind: KindSketch,
  dayIndex: number,
  minuteOf: (dayIndex: number, minute: number) => number,
): ProblemShift {
  const startMinute = minuteOf(dayIndex, kind.startMinute);
  const endMinute = minuteOf(dayIndex, kind.endMinute);
  return {
    index: 0,
    kindId: kind.id,
    kindName: kind.id,
    dayIndex,
    startMinute,
    endMinute,
    paidMinutes: endMinute - startMinute - (kind.unpaidBreakMinutes ?? 0),
    nightMinutes: kind.nightMinutes ?? 0,
    weekendMinutes: kind.weekendMinutes ?? 0,
    holidayMinutes: kind.holidayMinutes ?? 0,
    isNight: kind.isNight ?? false,
    postSkillIds: kind.postSkillIds ?? null,
  };
}

/** A floor of a test; unless said otherwise a firm, seated one for a nurse from 07:00 to 15:00. */
export function buildFloor(floor: Partial<ProblemFloor> = {}, position = 0): ProblemFloor {
  return {
    floorId: `floor-${position + 1}`,
    dayIndex: 0,
    startMinute: 420,
    endMinute: 900,
    skillId: 'nurse',
    people: 1,
    counting: 'seated',
    priceCentsPerHour: null,
    priority: 1,
    ...floor,
  };
}

/** A ceiling of a test; unless said otherwise a firm, seated one of one nurse from 07:00 to 15:00. */
export function buildCeiling(ceiling: Partial<ProblemCeiling> = {}, position = 0): ProblemCeiling {
  return {
    ceilingId: `ceiling-${position + 1}`,
    dayIndex: 0,
    startMinute: 420,
    endMinute: 900,
    skillId: 'nurse',
    people: 1,
    counting: 'seated',
    priceCentsPerHour: null,
    ...ceiling,
  };
}

/** Limits of a test: 11 hours of rest and nothing else. */
export const buildRules = (rules: Partial<ProblemRules> = {}): ProblemRules => ({
  restMinutes: 660,
  longestRunDays: null,
  longestRunNights: null,
  nightsPerPeriod: null,
  weekendsPerPeriod: null,
  weekendCountsFridayNight: false,
  shortestRunDays: null,
  shortestRunFreeDays: null,
  kindsThatMayNotFollow: [],
  ...rules,
});

/** A person of a test: a nurse at 25.00 an hour whose hours are free. */
export function buildPerson(person: Partial<ProblemPerson> = {}, position = 0): ProblemPerson {
  return {
    id: position === 0 ? 'ione' : `person-${position + 1}`,
    name: position === 0 ? 'Ione Baptisto' : `Person ${position + 1}`,
    skillIds: ['nurse'],
    payCentsPerHour: 2500,
    paidBy: 'contract',
    contractMinutes: 2400,
    creditMinutes: 0,
    minimumMinutes: 0,
    maximumMinutes: 10080,
    mayWorkNights: true,
    absences: [],
    history: [],
    following: [],
    pins: [],
    rules: null,
    kindLimits: [],
    wishes: [],
    isOutside: false,
    ...person,
  };
}

/** One assignment by kind and day, e.g. `assign(problem, 'ione', 0, 'Early')`. */
export function assign(
  problem: Problem,
  personId: string,
  dayIndex: number,
  kindId: string,
  postSkillId = 'nurse',
): PlannedAssignment {
  const shift = problem.shifts.find((one) => one.dayIndex === dayIndex && one.kindId === kindId);
  if (!shift) throw new Error(`No ${kindId} on day ${dayIndex}.`);
  return { personId, shiftIndex: shift.index, postSkillId };
}
