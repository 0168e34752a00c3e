import type { ProblemFloor } from './problem';

/** A person who is still on duty, from the period before, when this one begins. */
export interface HeldOver {
  readonly startMinute: number;
  readonly endMinute: number;
  readonly postSkillId: string;
  readonly skillIds: readonly string[];
}

/**
 * What is left of the first day's floors once the shifts that run into the period are counted: a floor
 * from midnight would otherwise look short while the last night of the period before is still on duty.
 * Floors of the day before (`prior`) that reach past midnight are served first; then firm floors,
 * then wished ones, the dearest first. A floor may come back in pieces.
 */
export function floorsLeft(
  floors: readonly ProblemFloor[],
  prior: readonly ProblemFloor[],
  heldOver: readonly HeldOver[],
): ProblemFloor[] {
  const reach = Math.max(0, ...heldOver.map(({ endMinute }) => endMinute));
  const served = [...floors].sort((one, other) => rankOf(one) - rankOf(other));
  const edges = [...floors, ...prior, ...heldOver]
    .flatMap(({ startMinute, endMinute }) => [startMinute, endMinute])
    .sort((one, other) => one - other);
  return floors.flatMap((floor) => {
    if (floor.startMinute >= reach) return [floor];
    const before = [...prior, ...served.slice(0, served.indexOf(floor))];
    const cuts = edges.filter((edge) => edge > floor.startMinute && edge < floor.endMinute);
    return mergePieces(floor, [floor.startMinute, ...cuts, floor.endMinute], (minute) =>
      peopleLeft(floor, minute, before, heldOver),
    );
  });
}

/** Firm floors come first, then the dearest wished ones. */
const rankOf = ({ priceCentsPerHour }: ProblemFloor): number =>
  priceCentsPerHour === null ? Number.NEGATIVE_INFINITY : -priceCentsPerHour;

function peopleLeft(
  floor: ProblemFloor,
  minute: number,
  before: readonly ProblemFloor[],
  heldOver: readonly HeldOver[],
): number {
  const holds = (window: { startMinute: number; endMinute: number }): boolean =>
    window.startMinute <= minute && minute < window.endMinute;
  const { skillId } = floor;
  const counts = (person: HeldOver): boolean =>
    skillId === null ||
    (floor.counting === 'seated'
      ? person.postSkillId === skillId
      : person.skillIds.includes(skillId));
  const have = heldOver.filter((person) => holds(person) && counts(person)).length;
  const taken = before
    .filter((other) => isSameSeat(floor, other) && holds(other))
    .reduce((sum, other) => sum + other.people, 0);
  return floor.people - Math.min(floor.people, Math.max(0, have - taken));
}

/** Seated floors of one skill share their people; shared floors stand alone. */
const isSameSeat = (floor: ProblemFloor, other: ProblemFloor): boolean =>
  floor.counting === 'seated' && other.counting === 'seated' && floor.skillId === other.skillId;

function mergePieces(
  floor: ProblemFloor,
  cuts: readonly number[],
  peopleAt: (minute: number) => number,
): ProblemFloor[] {
  const pieces: { startMinute: number; endMinute: number; people: number }[] = [];
  cuts.slice(0, -1).forEach((startMinute, position) => {
    const endMinute = cuts[position + 1] ?? startMinute;
    const people = peopleAt(startMinute);
    const last = pieces.at(-1);
    if (last?.people === people) last.endMinute = endMinute;
    else pieces.push({ startMinute, endMinute, people });
  });
  return pieces.filter(({ people }) => people > 0).map((piece) => ({ ...floor, ...piece }));
}
