import type { Problem, ProblemFloor } from '../problem';
import type { Duty } from './duties';
import { at, axisOf, countByMinute, type Interval } from './minute-counts';
import { missingMinutes, missingStretches, type Stretch } from './missing-stretches';
import type { ProvenShortage } from './proof';
import { quotientHalfUp } from './quotient';
import { dateOfDay } from './words';

/** Where floors are not held, and what the wished ones of them cost. */
export interface ShortageFinding {
  readonly shortages: readonly ProvenShortage[];
  readonly shortageMinutes: number;
  readonly wishedShortageMinutes: number;
  readonly wishedShortageCents: number;
}

/** Missing people on some floors over one stretch. */
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
        dutiesInPost(duties, skillId),
      ),
    ),
    ...floors
      .filter((floor) => floor.counting === 'shared')
      .flatMap((floor) => sharedGaps(floor, dutiesOfHolders(duties, floor.skillId))),
  ].sort((one, other) => one.startMinute - other.startMinute);
  const firm = gaps.filter((gap) => priceOf(gap) === null);
  const wished = gaps.filter((gap) => priceOf(gap) !== null);
  return {
    shortages: gaps.map((gap) => describe(problem, gap)),
    shortageMinutes: missingMinutes(firm),
    wishedShortageMinutes: missingMinutes(wished),
    wishedShortageCents: wished.reduce((sum, gap) => sum + costOf(gap), 0),
  };
}

const dutiesInPost = (duties: readonly Duty[], skillId: string | null): Interval[] =>
  duties
    .filter((duty) => skillId === null || duty.postSkillId === skillId)
    .map(({ shift }) => shift);

const dutiesOfHolders = (duties: readonly Duty[], skillId: string | null): Interval[] =>
  duties
    .filter(({ person }) => skillId === null || person.skillIds.includes(skillId))
    .map(({ shift }) => shift);

/** Cover serves the firm floors together first, then wished floors, the dearest first. */
function seatedGaps(floors: readonly ProblemFloor[], cover: readonly Interval[]): Gap[] {
  const axis = axisOf(floors);
  const firm = floors.filter((floor) => floor.priceCentsPerHour === null);
  const need = countByMinute(axis, firm, (floor) => floor.people);
  const left = countByMinute(axis, cover).map((have, minute) => have - at(need, minute));
  const gaps = firmGaps(axis, firm, left);
  const wished = floors
    .filter((floor) => floor.priceCentsPerHour !== null)
    .sort((one, other) => (other.priceCentsPerHour ?? 0) - (one.priceCentsPerHour ?? 0));
  for (const floor of wished) gaps.push(...wishedGaps(axis, floor, left));
  return gaps;
}

/** A stretch goes on from one minute to the next where some floor asks for people in both. */
function firmGaps(axis: Interval, firm: readonly ProblemFloor[], left: Int32Array): Gap[] {
  const joints = countByMinute(
    axis,
    firm.map(({ startMinute, endMinute }) => ({ startMinute: startMinute + 1, endMinute })),
  );
  return missingStretches(
    axis,
    (minute) => Math.max(0, -at(left, minute - axis.startMinute)),
    (minute) => at(joints, minute - axis.startMinute) > 0,
  ).map((stretch) => ({
    ...stretch,
    floors: firm.filter(
      (floor) => floor.startMinute < stretch.endMinute && stretch.startMinute < floor.endMinute,
    ),
  }));
}

/** Takes what the floor uses out of `left`, so that the next floor finds the rest. */
function wishedGaps(axis: Interval, floor: ProblemFloor, left: Int32Array): Gap[] {
  return missingStretches(floor, (minute) => {
    const position = minute - axis.startMinute;
    const served = Math.min(floor.people, Math.max(0, at(left, position)));
    left[position] = at(left, position) - served;
    return floor.people - served;
  }).map((stretch) => ({ ...stretch, floors: [floor] }));
}

function sharedGaps(floor: ProblemFloor, cover: readonly Interval[]): Gap[] {
  const have = countByMinute(floor, cover);
  return missingStretches(floor, (minute) =>
    Math.max(0, floor.people - at(have, minute - floor.startMinute)),
  ).map((stretch) => ({ ...stretch, floors: [floor] }));
}

const priceOf = (gap: Gap): number | null => gap.floors[0]?.priceCentsPerHour ?? null;

/** Missing person-minutes times the price of an hour, rounded once per stretch. */
const costOf = (gap: Gap): number =>
  quotientHalfUp(BigInt(missingMinutes([gap])) * BigInt(priceOf(gap) ?? 0), 60n);

function describe(problem: Problem, gap: Gap): ProvenShortage {
  const days = gap.floors.map((floor) => floor.dayIndex);
  return {
    floorIds: [...new Set(gap.floors.map((floor) => floor.floorId))],
    skillId: gap.floors[0]?.skillId ?? null,
    date: dateOfDay(problem, Math.min(...days)),
    startMinute: gap.startMinute,
    endMinute: gap.endMinute,
    missingPeople: gap.missingPeople,
    isFirm: priceOf(gap) === null,
  };
}
