import type { Problem, ProblemFloor, ProblemPerson } from '@/modules/problem';
import { buildFloor, buildPerson, buildProblem, houseKinds } from '@/tests/support/problem-builder';
import { seededFigures, shuffled } from './random';

const hour = 60;
const dayCount = 28;
const dayMinutes = 24 * hour;
const shiftHours = 8;
/** Share of the hours that contracts give which the floors ask for. */
const load = 0.88;
const weeklyHours = [40, 40, 32, 40, 24];

/** How the shifts of a skill fall on the four kinds. */
const shares = [
  { skillId: 'nurse', shares: { Early: 0.32, Day: 0.08, Late: 0.32, Night: 0.28 } },
  { skillId: 'desk', shares: { Early: 0.4, Day: 0.1, Late: 0.38, Night: 0.12 } },
];

/**
 * A team of so many people, the same for the same seed: 28 days and four shift kinds, two skills that some
 * hold both, contracts of 24 to 40 hours a week, leave, people without Nights, and wishes. The floors grow
 * with the people, so that a larger team is no easier than a small one.
 */
export function makeTeam(size: number, seed: number): Problem {
  const figure = seededFigures(seed * 1000 + size);
  const people = Array.from({ length: size }, (_, index) => memberOf(index, figure));
  const problem = buildProblem({
    dayCount,
    kinds: houseKinds.map((kind) => (kind.isNight ? { ...kind, nightMinutes: 480 } : kind)),
    people,
    floors: shares.flatMap((share) => floorsOf(share, people, figure)),
    rules: {
      longestRunDays: 5,
      longestRunNights: 4,
      nightsPerPeriod: 8,
      weekendsPerPeriod: 3,
    },
  });
  return {
    ...problem,
    shifts: problem.shifts.map((shift) => ({ ...shift, weekendMinutes: weekendOf(shift) })),
    people: problem.people.map((person) => ({ ...person, wishes: [wishOf(problem, figure)] })),
  };
}

function memberOf(index: number, figure: () => number): ProblemPerson {
  const weekly = weeklyHours[index % weeklyHours.length] ?? 40;
  const contractMinutes = 4 * weekly * hour;
  const [home, other] = index % 5 < 3 ? ['nurse', 'desk'] : ['desk', 'nurse'];
  const leaveFrom = index % 5 === 2 ? 7 * Math.floor(figure() * 4) : null;
  return buildPerson(
    {
      id: `p${index}`,
      name: `Person ${index + 1}`,
      skillIds: index % 6 === 5 ? [home, other] : [home],
      payCentsPerHour: (home === 'nurse' ? 2400 : 1800) + 50 * Math.floor(figure() * 8),
      contractMinutes,
      creditMinutes: leaveFrom === null ? 0 : weekly * hour,
      minimumMinutes: contractMinutes - 16 * hour,
      maximumMinutes: contractMinutes + 24 * hour,
      mayWorkNights: index % 8 !== 7,
      absences:
        leaveFrom === null
          ? []
          : [
              {
                startMinute: leaveFrom * dayMinutes,
                endMinute: (leaveFrom + 5) * dayMinutes,
                reason: 'leave',
              },
            ],
    },
    index,
  );
}

function floorsOf(
  { skillId, shares: parts }: (typeof shares)[number],
  people: readonly ProblemPerson[],
  figure: () => number,
): ProblemFloor[] {
  const minutes = people
    .filter(({ skillIds }) => skillIds[0] === skillId)
    .reduce((sum, person) => sum + person.contractMinutes - person.creditMinutes, 0);
  const shiftsAsked = (load * minutes) / (shiftHours * hour);
  return Object.entries(parts).flatMap(([kindId, share]) => {
    const kind = houseKinds.find(({ id }) => id === kindId);
    const asked = Math.round(shiftsAsked * share);
    const extra = new Set(shuffled([...Array(dayCount).keys()], figure).slice(0, asked % dayCount));
    return [...Array(dayCount).keys()].flatMap((dayIndex) => {
      const need = Math.floor(asked / dayCount) + (extra.has(dayIndex) ? 1 : 0);
      if (!kind || need === 0) return [];
      return [
        buildFloor({
          floorId: `${skillId} ${kindId}`,
          dayIndex,
          startMinute: dayIndex * dayMinutes + kind.startMinute,
          endMinute: dayIndex * dayMinutes + kind.endMinute,
          skillId,
          people: need,
        }),
      ];
    });
  });
}

/** Minutes on Saturdays and Sundays; the period starts on a Monday and its shifts have no break. */
function weekendOf({ startMinute, endMinute }: Problem['shifts'][number]): number {
  const weeks = [0, 1, 2, 3].map((week) => week * 7 * dayMinutes);
  return weeks.reduce((sum, monday) => {
    const from = Math.max(startMinute, monday + 5 * dayMinutes);
    return sum + Math.max(0, Math.min(endMinute, monday + 7 * dayMinutes) - from);
  }, 0);
}

/** Free of any shift on some day, at 10.00 to 40.00. */
function wishOf({ days }: Problem, figure: () => number): ProblemPerson['wishes'][number] {
  return {
    dayIndex: Math.floor(figure() * days.length),
    shiftIndex: null,
    wants: 'off',
    priceCents: 1000 * (1 + Math.floor(figure() * 4)),
  };
}
