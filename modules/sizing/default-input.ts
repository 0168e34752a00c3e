import type { Floor, ShiftKind } from '../coverage';
import { findContract, type Person, type Skill } from '../people';
import type { SizingFloor } from '../problem';
import type { PayRules } from '../rules';
import type { LocalDate, SkillId } from '../units';
import { arcsOverlap, placeOnCircle } from './circle';
import { dayPay } from './day-pay';
import { expandFloors } from './expand-floors';
import type { SizingInput, SizingLine } from './sizing-input';

/** What a first table is made from. */
export interface SizingSetting {
  readonly kinds: readonly ShiftKind[];
  readonly skills: readonly Skill[];
  readonly floors: readonly Floor[];
  readonly people: readonly Person[];
  readonly pay: PayRules;
}

/**
 * A table to begin with: five days on and two off for each skill and shift kind that can help to hold a
 * floor of the week. A day is paid at the lowest hourly rate among the contracts of the skill's people
 * in that week (0 where nobody has the skill), see `dayPay`. Without any floor or kind it has no lines.
 */
export function defaultInput(weekOf: LocalDate, setting: SizingSetting): SizingInput {
  const floors = expandFloors({ span: 'week', weekOf }, setting);
  const pairs = [...setting.skills, null].flatMap((skill) =>
    setting.kinds
      .filter((kind) => isAskedFor(kind, skill, floors, setting.skills))
      .map((kind) => ({ kind, skill })),
  );
  const lines = pairs.map(({ kind, skill }, index): SizingLine => {
    const rate = lowestRate(setting.people, skill?.id ?? null, weekOf);
    return {
      id: `line-${index + 1}`,
      name: skill ? `${skill.name} ${kind.name}` : kind.name,
      shiftKindId: kind.id,
      skillId: skill?.id ?? null,
      daysOn: 5,
      startWeekdays: [0, 1, 2, 3, 4, 5, 6],
      weekdayCents: dayPay(kind, rate, setting.pay, 'weekday'),
      saturdayCents: dayPay(kind, rate, setting.pay, 'saturday'),
      sundayCents: dayPay(kind, rate, setting.pay, 'sunday'),
      extraDayCents: null,
      mostPeople: null,
      mostPercent: null,
    };
  });
  return { weekOf, span: 'week', objective: 'people', lines, mostPeople: null };
}

/** Without a skill: only where floors of any skill would otherwise find no line on the kind. */
function isAskedFor(
  kind: ShiftKind,
  skill: Skill | null,
  floors: readonly SizingFloor[],
  skills: readonly Skill[],
): boolean {
  if (skill) {
    const mayPost = kind.skillIds === null || kind.skillIds.includes(skill.id);
    return mayPost && overlapsFloor(kind, skill.id, floors);
  }
  const hasLine = skills.some((one) => isAskedFor(kind, one, floors, []));
  return !hasLine && overlapsFloor(kind, null, floors);
}

const overlapsFloor = (
  kind: ShiftKind,
  skillId: SkillId | null,
  floors: readonly SizingFloor[],
): boolean =>
  [0, 1440, 2880, 4320, 5760, 7200, 8640].some((midnight) => {
    const duty = placeOnCircle(midnight + kind.startMinute, midnight + kind.endMinute, 10080);
    return floors.some((floor) => floor.skillId === skillId && arcsOverlap(duty, floor, 10080));
  });

/** Lowest cents per hour among the contracts that hold on the date; a null skill takes everybody. */
function lowestRate(people: readonly Person[], skillId: SkillId | null, date: LocalDate): number {
  const rates = people
    .filter(({ isActive }) => isActive)
    .filter(({ skills }) => skillId === null || skills.some((held) => held.skillId === skillId))
    .flatMap((person) => findContract(person, date)?.payCentsPerHour ?? []);
  return rates.length > 0 ? Math.min(...rates) : 0;
}
