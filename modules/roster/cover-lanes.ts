import type { ProblemFloor } from '../problem';
import type { SkillId } from '../units';
import type { CoverLane, CoverSlot } from './views';

/** One person on duty over [startMinute, endMinute), the post they hold and all their skills. */
export interface Duty {
  readonly startMinute: number;
  readonly endMinute: number;
  readonly postSkillId: string;
  readonly skillIds: readonly string[];
}

/** A floor without its rank among firm ones, which changes no cover. */
type CoverFloor = Omit<ProblemFloor, 'priority'>;

interface Interval {
  readonly startMinute: number;
  readonly endMinute: number;
}

/**
 * Need and cover of each skill over [0, axisMinutes): one lane for each skill that is asked for or
 * posted, in the order given, and a last one (null) when floors ask for anybody. Slots touch, cover the
 * whole axis, and neighbours differ. Seated floors add up and count posts; a shared floor stands alone
 * and counts everybody who holds the skill. Where both ask, the slot shows the one with more missing.
 */
export function coverLanes(
  floors: readonly CoverFloor[],
  duties: readonly Duty[],
  skillIds: readonly SkillId[],
  axisMinutes: number,
): CoverLane[] {
  const lanes: CoverLane[] = [];
  for (const skillId of [...skillIds, null]) {
    const asked = floors.filter((floor) => floor.skillId === skillId);
    const isPosted = duties.some(({ postSkillId }) => postSkillId === skillId);
    if (asked.length > 0 || isPosted) {
      lanes.push({ skillId, slots: slotsOf(asked, duties, skillId, axisMinutes) });
    }
  }
  return lanes;
}

/** Minutes of the axis that floors, duties and the days of a period need together. */
export function axisMinutesOf(
  floors: readonly Interval[],
  duties: readonly Interval[],
  periodMinutes: number,
): number {
  return [...floors, ...duties].reduce(
    (most, { endMinute }) => Math.max(most, endMinute),
    periodMinutes,
  );
}

function slotsOf(
  floors: readonly CoverFloor[],
  duties: readonly Duty[],
  skillId: SkillId | null,
  axisMinutes: number,
): CoverSlot[] {
  const holders = duties.filter((duty) => skillId === null || duty.skillIds.includes(skillId));
  const posted = duties.filter((duty) => skillId === null || duty.postSkillId === skillId);
  const seated = floors.filter(({ counting }) => counting === 'seated');
  const shared = floors.filter(({ counting }) => counting === 'shared');
  const needSteps = steps(seated, (floor) => floor.people);
  const postedSteps = steps(posted, () => 1);
  const holderSteps = steps(holders, () => 1);
  const edges = edgesOf([...floors, ...posted, ...(shared.length > 0 ? holders : [])], axisMinutes);
  const slots: CoverSlot[] = [];
  edges.forEach((startMinute, position) => {
    const endMinute = edges[position + 1];
    if (endMinute === undefined) return;
    let claim = { need: needSteps(startMinute), have: postedSteps(startMinute) };
    const held = holderSteps(startMinute);
    for (const floor of shared) {
      if (floor.startMinute > startMinute || floor.endMinute <= startMinute) continue;
      if (floor.people - held > claim.need - claim.have || claim.need === 0) {
        claim = { need: floor.people, have: held };
      }
    }
    addSlot(slots, { startMinute, endMinute, ...claim });
  });
  return slots;
}

/** The sum of a weight over the intervals that hold at a minute; ask with minutes that never fall. */
function steps<T extends Interval>(
  intervals: readonly T[],
  weight: (interval: T) => number,
): (minute: number) => number {
  const changes = intervals
    .flatMap((interval) => [
      { minute: interval.startMinute, change: weight(interval) },
      { minute: interval.endMinute, change: -weight(interval) },
    ])
    .sort((one, other) => one.minute - other.minute);
  let next = 0;
  let sum = 0;
  return (minute) => {
    for (let step = changes[next]; step && step.minute <= minute; step = changes[next]) {
      sum += step.change;
      next += 1;
    }
    return sum;
  };
}

function edgesOf(intervals: readonly Interval[], axisMinutes: number): number[] {
  const inside = intervals
    .flatMap(({ startMinute, endMinute }) => [startMinute, endMinute])
    .filter((minute) => minute > 0 && minute < axisMinutes);
  return [...new Set([0, ...inside, axisMinutes])].sort((one, other) => one - other);
}

function addSlot(slots: CoverSlot[], slot: CoverSlot): void {
  const last = slots.at(-1);
  if (last && last.need === slot.need && last.have === slot.have) {
    slots[slots.length - 1] = { ...last, endMinute: slot.endMinute };
  } else {
    slots.push(slot);
  }
}
