import type { CoverLane } from '@/modules/roster';

/** Cover of all lanes together over one stretch of time. `need` is `hold` plus `short`. */
export interface CoverStep {
  readonly startMinute: number;
  readonly endMinute: number;
  readonly need: number;
  readonly hold: number;
  readonly short: number;
  readonly spare: number;
}

/** An unbroken stretch of one lane with the same number of people missing (or spare). */
export interface Stretch {
  readonly skillId: CoverLane['skillId'];
  readonly startMinute: number;
  readonly endMinute: number;
  readonly people: number;
}

/**
 * Sums lanes over time; equal neighbours become one step. Skills are never netted: hold is the sum of
 * min(need, have), short of what is missing, spare of what is over, lane by lane. The lane for anybody
 * counts people whom the others count already, so it only raises the line where it asks for more.
 */
export function coverSteps(lanes: readonly CoverLane[]): CoverStep[] {
  const cursors = lanes.map((lane) => makeCursor(lane));
  const edges = edgesOf(lanes);
  const steps: CoverStep[] = [];
  edges.forEach((startMinute, index) => {
    const endMinute = edges[index + 1];
    if (endMinute === undefined) return;
    const slots = cursors.map((cursor) => cursor(startMinute));
    addStep(steps, { startMinute, endMinute, ...sum(lanes, slots) });
  });
  return steps;
}

/** Sums lanes by day column: person-hours in place of people, for drawings with one tread a day. */
export function dailySteps(lanes: readonly CoverLane[], edges: readonly number[]): CoverStep[] {
  const steps = coverSteps(lanes);
  return edges.slice(0, -1).map((startMinute, index) => {
    const endMinute = edges[index + 1] ?? startMinute;
    const hours = (part: 'need' | 'hold' | 'short' | 'spare') =>
      steps.reduce((total, step) => {
        const overlap =
          Math.min(step.endMinute, endMinute) - Math.max(step.startMinute, startMinute);
        return overlap > 0 ? total + (step[part] * overlap) / 60 : total;
      }, 0);
    const [need, hold, short, spare] = [
      hours('need'),
      hours('hold'),
      hours('short'),
      hours('spare'),
    ];
    return { startMinute, endMinute, need, hold, short, spare };
  });
}

/** Where a lane is short (or has people to spare), each unbroken stretch once. */
export function stretchesOf(lane: CoverLane, kind: 'short' | 'spare'): Stretch[] {
  const stretches: Stretch[] = [];
  for (const { startMinute, endMinute, need, have } of lane.slots) {
    const people = Math.max(0, kind === 'short' ? need - have : have - need);
    if (people === 0) continue;
    const last = stretches.at(-1);
    if (last && last.endMinute === startMinute && last.people === people) {
      stretches[stretches.length - 1] = { ...last, endMinute };
    } else {
      stretches.push({ skillId: lane.skillId, startMinute, endMinute, people });
    }
  }
  return stretches;
}

interface Counts {
  readonly need: number;
  readonly have: number;
}

function sum(lanes: readonly CoverLane[], slots: readonly Counts[]) {
  let hold = 0;
  let short = 0;
  let spare = 0;
  let anybody: Counts | null = null;
  slots.forEach((slot, index) => {
    if (lanes[index]?.skillId === null) {
      anybody = slot;
      return;
    }
    hold += Math.min(slot.need, slot.have);
    short += Math.max(0, slot.need - slot.have);
    spare += Math.max(0, slot.have - slot.need);
  });
  return withAnybody({ need: hold + short, hold, short, spare }, anybody);
}

function withAnybody(
  skills: Omit<CoverStep, 'startMinute' | 'endMinute'>,
  anybody: Counts | null,
): Omit<CoverStep, 'startMinute' | 'endMinute'> {
  if (anybody === null) return skills;
  const need = Math.max(skills.need, anybody.need);
  const short = Math.max(skills.short, anybody.need - anybody.have);
  const hold = need - short;
  return { need, hold, short, spare: Math.max(0, anybody.have - hold) };
}

/** Gives the slot at a minute; ask with minutes that never fall. Outside the slots nothing is needed. */
function makeCursor(lane: CoverLane): (minute: number) => Counts {
  let position = 0;
  return (minute) => {
    while ((lane.slots[position]?.endMinute ?? Number.POSITIVE_INFINITY) <= minute) position += 1;
    const slot = lane.slots[position];
    return slot && slot.startMinute <= minute ? slot : { need: 0, have: 0 };
  };
}

function edgesOf(lanes: readonly CoverLane[]): number[] {
  const all = lanes.flatMap(({ slots }) =>
    slots.flatMap(({ startMinute, endMinute }) => [startMinute, endMinute]),
  );
  return [...new Set(all)].sort((one, other) => one - other);
}

function addStep(steps: CoverStep[], step: CoverStep): void {
  const last = steps.at(-1);
  if (
    last &&
    last.need === step.need &&
    last.hold === step.hold &&
    last.short === step.short &&
    last.spare === step.spare
  ) {
    steps[steps.length - 1] = { ...last, endMinute: step.endMinute };
  } else {
    steps.push(step);
  }
}
