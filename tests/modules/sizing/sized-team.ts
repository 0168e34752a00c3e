import type { Actor } from '@/modules/access';
import type { Floor, FloorInput, ShiftKind, ShiftKindInput } from '@/modules/coverage';
import { addFloor, addShiftKind, setFloorNeeds } from '@/modules/coverage/server';
import type { Sizing, SizingInput, SizingLine } from '@/modules/sizing';
import { sizeTeam } from '@/modules/sizing/server';
import type { Outcome, TeamId } from '@/modules/units';
import { freshDb } from '../../support/fresh-db';
import { addActor, addOrganisation, addTeam } from '../../support/organisation';

/** Monday 1 February 2027: the floors of these tests are in force from here on. */
export const monday = '2027-02-01';
export const everyDay = [0, 1, 2, 3, 4, 5, 6];

/** The value of an outcome; a refusal ends the test with its sentence. */
export function must<T>(outcome: Outcome<T>): T {
  if (!outcome.ok) throw new Error(outcome.error.detail);
  return outcome.value;
}

/** A team in a database of its own, with what its supervisor does on the floors, kinds and sizing pages. */
export interface SizedTeam {
  readonly actor: Actor;
  readonly teamId: TeamId;
  addKind(name: string, fromHour: number, toHour: number): ShiftKind;
  /** A floor of any skill; needs for Monday to Sunday. */
  addFloor(fromHour: number, toHour: number, needs: readonly number[]): Floor;
  setNeeds(floor: Floor, needs: readonly number[]): void;
  size(lines: readonly SizingLine[], changes?: Partial<SizingInput>): Promise<Sizing>;
}

export function openTeam(): SizedTeam {
  freshDb();
  const organisationId = addOrganisation();
  const teamId = addTeam(organisationId);
  const actor = addActor(organisationId, 'supervisor', teamId);
  let kinds = 0;
  return {
    actor,
    teamId,
    addKind(name, fromHour, toHour) {
      kinds += 1;
      return must(addShiftKind(actor, teamId, kindInput(name, `K${kinds}`, fromHour, toHour)));
    },
    addFloor: (fromHour, toHour, needs) =>
      must(addFloor(actor, teamId, floorInput(fromHour, toHour, needs))),
    setNeeds(floor, needs) {
      const cells = needs.map((people, day) => ({ floorId: floor.id, day, people }));
      must(setFloorNeeds(actor, teamId, cells));
    },
    async size(lines, changes = {}) {
      const input: SizingInput = {
        weekOf: monday,
        span: 'week',
        objective: 'people',
        lines: [...lines],
        mostPeople: null,
        ...changes,
      };
      return must(await sizeTeam(actor, teamId, input));
    },
  };
}

const kindInput = (
  name: string,
  letter: string,
  fromHour: number,
  toHour: number,
): ShiftKindInput => ({
  name,
  letter,
  startMinute: fromHour * 60,
  endMinute: toHour * 60,
  unpaidBreakMinutes: 0,
  isNight: false,
  skillIds: null,
});

const floorInput = (fromHour: number, toHour: number, needs: readonly number[]): FloorInput => ({
  skillId: null,
  startMinute: fromHour * 60,
  endMinute: toHour * 60,
  needs: [...needs, 0],
  counting: 'seated',
  priceCentsPerHour: null,
  effectiveFrom: monday,
  effectiveTo: null,
});

/** A line of the table; five days on at no pay unless told otherwise. */
export function line(kind: ShiftKind, changes: Partial<SizingLine> = {}): SizingLine {
  return {
    id: changes.name ?? kind.name,
    name: kind.name,
    shiftKindId: kind.id,
    skillId: null,
    daysOn: 5,
    startWeekdays: everyDay,
    weekdayCents: 0,
    saturdayCents: 0,
    sundayCents: 0,
    extraDayCents: null,
    mostPeople: null,
    mostPercent: null,
    ...changes,
  };
}

/** The same pay on every day of the week. */
export const paid = (cents: number) => ({
  weekdayCents: cents,
  saturdayCents: cents,
  sundayCents: cents,
});

/** People on duty on each weekday, counted from the answer: for whole-day shifts that start on their day. */
export function peopleByDay({ problem, answer }: Sizing): number[] {
  const days = everyDay.map(() => 0);
  for (const { patternId, count } of answer.people) {
    const pattern = problem.patterns.find(({ id }) => id === patternId);
    for (const { startMinute } of pattern?.duties ?? []) {
      const day = Math.floor(startMinute / 1440);
      days[day] = (days[day] ?? 0) + count;
    }
  }
  return days;
}

export const countPeople = ({ answer }: Sizing): number =>
  answer.people.reduce((sum, { count }) => sum + count, 0);
