import type { Problem, ProblemFloor } from '../problem';
import { coverOf } from './cover';
import type { Duty } from './duties';
import { at, axisOf, countByMinute, type Interval } from './minute-counts';
import type { PriorityShortage, ProvenShortage } from './proof';
import { quotientHalfUp } from './quotient';
import { findStretches, personMinutes, type Stretch } from './stretches';
import { dateOfDay } from './words';

/** Where floors are not held, and what the wished ones of them cost. */
export interface ShortageFinding {
  readonly shortages: readonly ProvenShortage[];
  readonly shortageMinutes: number;
  readonly shortageByPriority: readonly PriorityShortage[];
  readonly wishedShortageMinutes: number;
  readonly wishedShortageCents: number;
}

/** Missing people over one stretch, on floors of one price or of one priority. */
interface Gap extends Stretch {
  readonly floors: readonly ProblemFloor[];
}

/**
 * Holds cover against the floors minute by minute. Seated floors of one skill add up where their
 * windows overlap and count people in the post of that skill (any post for floors of any skill);
 * shared floors stand alone and count everybody on duty who holds the skill.
 */
export function proveShortage(problem: Problem, duties: readonly Duty[]): ShortageFinding {
  const floors = problem.floors.filter((floor) => floor.people > 0);
  const seated = floors.filter((floor) => floor.counting === 'seated');
  const skillIds = [...new Set(seated.map((floor) => floor.skillId))];
  const gaps = [
    ...skillIds.flatMap((skillId) =>
      seatedGaps(
        seated.filter((floor) => floor.skillId === skillId),
        coverOf(duties, { counting: 'seated', skillId }),
      ),
    ),
    ...floors
      .filter((floor) => floor.counting === 'shared')
      .flatMap((floor) => sharedGaps(floor, coverOf(duties, floor))),
  ].sort((one, other) => one.startMinute - other.startMinute);
  const firm = gaps.filter((gap) => priceOf(gap) === null);
  const wished = gaps.filter((gap) => priceOf(gap) !== null);
  return {
    shortages: gaps.map((gap) => describe(problem, gap)),
    shortageMinutes: personMinutes(firm),
    shortageByPriority: prioritiesOf(floors).map((priority) => ({
      priority,
      minutes: personMinutes(firm.filter((gap) => gap.floors[0]?.priority === priority)),
    })),
    wishedShortageMinutes: personMinutes(wished),
    wishedShortageCents: wished.reduce((sum, gap) => sum + costOf(gap), 0),
  };
}

/** The priorities of the firm ones of some floors, the first to hold first. */
const prioritiesOf = (floors: readonly ProblemFloor[]): number[] =>
  [...new Set(floors.filter(isFirm).map(({ priority }) => priority))].sort(
    (one, other) => one - other,
  );

const isFirm = ({ priceCentsPerHour }: ProblemFloor): boolean => priceCentsPerHour === null;

/** Cover serves firm floors by priority, those of one together, then wished floors, the dearest first. */
function seatedGaps(floors: readonly ProblemFloor[], cover: readonly Interval[]): Gap[] {
  const axis = axisOf(floors);
  const left = countByMinute(axis, cover);
  const gaps = prioritiesOf(floors).flatMap((wanted) =>
    firmGaps(
      axis,
      floors.filter((floor) => isFirm(floor) && floor.priority === wanted),
      left,
    ),
  );
  const wished = floors
    .filter((floor) => !isFirm(floor))
    .sort((one, other) => (other.priceCentsPerHour ?? 0) - (one.priceCentsPerHour ?? 0));
  for (const floor of wished) gaps.push(...wishedGaps(axis, floor, left));
  return gaps;
}

/**
 * Takes what the floors use out of `left`. A stretch goes on from one minute to the next where some
 * floor asks for people in both.
 */
function firmGaps(axis: Interval, firm: readonly ProblemFloor[], left: Int32Array): Gap[] {
  const need = countByMinute(axis, firm, (floor) => floor.people);
  const joints = countByMinute(
    axis,
    firm.map(({ startMinute, endMinute }) => ({ startMinute: startMinute + 1, endMinute })),
  );
  return findStretches(
    axis,
    (minute) => serve(left, minute - axis.startMinute, at(need, minute - axis.startMinute)),
    (minute) => at(joints, minute - axis.startMinute) > 0,
  ).map((stretch) => ({
    ...stretch,
    floors: firm.filter(
      (floor) => floor.startMinute < stretch.endMinute && stretch.startMinute < floor.endMinute,
    ),
  }));
}

/** Takes what the floor uses out of `left`, so that the next floor finds the rest. */
const wishedGaps = (axis: Interval, floor: ProblemFloor, left: Int32Array): Gap[] =>
  findStretches(floor, (minute) => serve(left, minute - axis.startMinute, floor.people)).map(
    (stretch) => ({ ...stretch, floors: [floor] }),
  );

/** Takes people for a need out of those left at a position; how many are missing. */
function serve(left: Int32Array, position: number, need: number): number {
  const served = Math.min(need, at(left, position));
  left[position] = at(left, position) - served;
  return need - served;
}

function sharedGaps(floor: ProblemFloor, cover: readonly Interval[]): Gap[] {
  const have = countByMinute(floor, cover);
  return findStretches(floor, (minute) =>
    Math.max(0, floor.people - at(have, minute - floor.startMinute)),
  ).map((stretch) => ({ ...stretch, floors: [floor] }));
}

const priceOf = (gap: Gap): number | null => gap.floors[0]?.priceCentsPerHour ?? null;

/** Missing person-minutes times the price of an hour, rounded once per stretch. */
const costOf = (gap: Gap): number =>
  quotientHalfUp(BigInt(personMinutes([gap])) * BigInt(priceOf(gap) ?? 0), 60n);

function describe(problem: Problem, gap: Gap): ProvenShortage {
  const days = gap.floors.map((floor) => floor.dayIndex);
  return {
    floorIds: [...new Set(gap.floors.map((floor) => floor.floorId))],
    skillId: gap.floors[0]?.skillId ?? null,
    date: dateOfDay(problem, Math.min(...days)),
    startMinute: gap.startMinute,
    endMinute: gap.endMinute,
    missingPeople: gap.people,
    isFirm: priceOf(gap) === null,
  };
}
