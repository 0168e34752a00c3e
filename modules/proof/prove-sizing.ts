import type { SizingCap, SizingFloor, SizingPattern, SizingProblem } from '../problem';
import { at } from './minute-counts';
import { findStretches, personMinutes } from './stretches';

/** People on one pattern. */
export interface SizingHeadcount {
  readonly patternId: string;
  readonly count: number;
}

/** What the re-check of a sizing found. */
export interface SizingProof {
  /** People or cents, as the problem's objective says. */
  readonly objective: number;
  readonly shortageMinutes: number;
  readonly shortages: readonly {
    readonly floorId: string;
    readonly weekday: number;
    readonly label: string;
    /** Most people missing at once, and missing person-minutes over the window. */
    readonly people: number;
    readonly minutes: number;
  }[];
  readonly capsHold: boolean;
}

/**
 * Re-checks a sizing from the problem and the people per pattern alone. Each floor of a sizing stands
 * alone: floors that add up reach it as pieces with their sum. Throws on a pattern the problem does not
 * have and on counts that are no whole number of people: no answer may hold one.
 */
export function proveSizing(
  problem: SizingProblem,
  people: readonly SizingHeadcount[],
): SizingProof {
  const staffed = readStaffed(problem, people);
  const covers = new Map<string | null, Int32Array>();
  for (const skillId of new Set(problem.floors.map((floor) => floor.skillId))) {
    covers.set(skillId, coverOnCircle(problem.cycleMinutes, staffed, skillId));
  }
  const shortages = problem.floors
    .map((floor) => shortageOf(floor, problem.cycleMinutes, covers.get(floor.skillId)))
    .filter((shortage) => shortage.minutes > 0);
  return {
    objective: staffed.reduce(
      (sum, { pattern, count }) =>
        sum + count * (problem.objective === 'people' ? 1 : pattern.costCents),
      0,
    ),
    shortageMinutes: shortages.reduce((sum, { minutes }) => sum + minutes, 0),
    shortages,
    capsHold: problem.caps.every((cap) => isWithin(cap, staffed)),
  };
}

interface Staffed {
  readonly pattern: SizingPattern;
  readonly count: number;
}

function readStaffed(problem: SizingProblem, people: readonly SizingHeadcount[]): Staffed[] {
  const patterns = new Map(problem.patterns.map((pattern) => [pattern.id, pattern]));
  return people.map(({ patternId, count }) => {
    const pattern = patterns.get(patternId);
    if (!pattern) throw new Error(`The sizing has no pattern ${patternId}.`);
    if (!Number.isSafeInteger(count) || count < 0) {
      throw new Error(`${count} is no whole number of people on pattern ${patternId}.`);
    }
    return { pattern, count };
  });
}

function isWithin(cap: SizingCap, staffed: readonly Staffed[]): boolean {
  const heads = headsOf(staffed.filter(({ pattern }) => cap.lineIds.includes(pattern.lineId)));
  return 'people' in cap.limit
    ? heads <= cap.limit.people
    : heads * 100 <= cap.limit.percentOfAll * headsOf(staffed);
}

const headsOf = (staffed: readonly Staffed[]): number =>
  staffed.reduce((sum, { count }) => sum + count, 0);

function shortageOf(
  floor: SizingFloor,
  cycle: number,
  onDuty: Int32Array = new Int32Array(cycle),
): SizingProof['shortages'][number] {
  const stretches = findStretches(floor, (minute) =>
    Math.max(0, floor.people - at(onDuty, minute % cycle)),
  );
  return {
    floorId: floor.floorId,
    weekday: floor.weekday,
    label: floor.label,
    people: Math.max(0, ...stretches.map(({ people }) => people)),
    minutes: personMinutes(stretches),
  };
}

/** People who count for a skill at each minute of the circle; a duty beyond its end goes on at its start. */
function coverOnCircle(
  cycle: number,
  staffed: readonly Staffed[],
  skillId: string | null,
): Int32Array {
  const onDuty = new Int32Array(cycle);
  for (const { pattern, count } of staffed) {
    if (skillId !== null && pattern.skillId !== skillId) continue;
    for (const { startMinute, endMinute } of pattern.duties) {
      for (let minute = startMinute; minute < endMinute; minute += 1) {
        onDuty[minute % cycle] = at(onDuty, minute % cycle) + count;
      }
    }
  }
  return onDuty;
}
