import { type Floor, isInForce, labelFloor } from '../coverage';
import type { Skill } from '../people';
import type { SizingFloor } from '../problem';
import { addDays, type LocalDate, mondayOf, type SkillId, weekdayNames } from '../units';
import {
  type Arc,
  arcsOverlap,
  type CycleMinutes,
  cutCircle,
  holdsMinute,
  placeOnCircle,
} from './circle';
import type { SizingInput } from './sizing-input';

/** What the floors of a sizing are taken from. */
export interface FloorSource {
  readonly floors: readonly Floor[];
  readonly skills: readonly Skill[];
}

/** One floor on one weekday, on the circle. */
interface Ask extends Arc {
  readonly floor: Floor;
  readonly weekday: number;
  readonly people: number;
}

/** The circle of a span: a week, or a day that repeats. */
export const cycleOf = (span: SizingInput['span']): CycleMinutes =>
  span === 'week' ? 10080 : 1440;

/**
 * The floors of a normal week, or of one weekday that repeats, on the circle. A floor counts on a
 * weekday when it is in force on that date of the week. Public holidays and dates that differ are left
 * out, because sizing is about a normal week; so are floors that ask for nobody. Wished floors count
 * like firm ones. Minutes are those of the wall clock: a clock change is no part of a normal week.
 *
 * Seated floors of one skill that overlap add up: the stretch is cut into pieces with the sum of the
 * people in each. A piece stands in its own window and carries the ids of its floors joined by `+`.
 */
export function expandFloors(
  { span, weekOf }: Pick<SizingInput, 'span' | 'weekOf'>,
  { floors, skills }: FloorSource,
): SizingFloor[] {
  const cycle = cycleOf(span);
  const weekdays = span === 'week' ? [0, 1, 2, 3, 4, 5, 6] : [span];
  const asks = weekdays.flatMap((weekday) =>
    asksOf(floors, addDays(mondayOf(weekOf), weekday), weekday, cycle),
  );
  const overlapping = new Set(
    asks.filter((ask) => asks.some((other) => addsUp(ask, other, cycle))),
  );
  const whole = asks.filter((ask) => !overlapping.has(ask)).map((ask) => wholeFloor(ask, skills));
  const pieces = groupBySkill([...overlapping]).flatMap((group) =>
    piecesOf(group, cycle, span, skills),
  );
  return [...whole, ...pieces].sort(
    (one, other) => one.weekday - other.weekday || one.startMinute - other.startMinute,
  );
}

function asksOf(
  floors: readonly Floor[],
  date: LocalDate,
  weekday: number,
  cycle: CycleMinutes,
): Ask[] {
  return floors
    .filter((floor) => isInForce(floor, date) && (floor.needs[weekday] ?? 0) > 0)
    .map((floor) => ({
      floor,
      weekday,
      people: floor.needs[weekday] ?? 0,
      ...placeOnCircle(weekday * 1440 + floor.startMinute, weekday * 1440 + floor.endMinute, cycle),
    }));
}

const addsUp = (one: Ask, other: Ask, cycle: CycleMinutes): boolean =>
  one !== other &&
  one.floor.counting === 'seated' &&
  other.floor.counting === 'seated' &&
  one.floor.skillId === other.floor.skillId &&
  arcsOverlap(one, other, cycle);

function groupBySkill(asks: readonly Ask[]): Ask[][] {
  const skillIds = [...new Set(asks.map((ask) => ask.floor.skillId))];
  return skillIds.map((skillId) => asks.filter((ask) => ask.floor.skillId === skillId));
}

function wholeFloor(ask: Ask, skills: readonly Skill[]): SizingFloor {
  const { floor, weekday, people, startMinute, endMinute } = ask;
  const window = { startMinute, endMinute };
  const label = labelOf(floor.skillId, weekday, window, skills);
  return { floorId: floor.id, weekday, label, skillId: floor.skillId, ...window, people };
}

/** The pieces of one skill's overlapping seated floors; stretches that no floor asks for fall out. */
function piecesOf(
  asks: readonly Ask[],
  cycle: CycleMinutes,
  span: SizingInput['span'],
  skills: readonly Skill[],
): SizingFloor[] {
  return cutCircle(asks, cycle).flatMap((piece) => {
    const asking = asks.filter((ask) => holdsMinute(ask, piece.startMinute, cycle));
    const [first] = asking;
    if (!first) return [];
    const weekday = span === 'week' ? Math.floor(piece.startMinute / 1440) : span;
    const skillId = first.floor.skillId;
    return {
      floorId: asking.map((ask) => ask.floor.id).join('+'),
      weekday,
      label: labelOf(skillId, weekday, piece, skills),
      skillId,
      ...piece,
      people: asking.reduce((sum, ask) => sum + ask.people, 0),
    };
  });
}

const labelOf = (
  skillId: SkillId | null,
  weekday: number,
  window: Arc,
  skills: readonly Skill[],
): string => `${weekdayNames[weekday]}, ${labelFloor({ skillId, ...window }, skills)}`;
