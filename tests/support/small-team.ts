import type { ShiftKindInput } from '@/modules/coverage';
import { addFloor, addShiftKind } from '@/modules/coverage/server';
import { openPeriod, startRun, waitForRun } from '@/modules/roster/server';
import type { OrganisationId, Outcome, RosterId, SkillId, TeamId } from '@/modules/units';
import { freshDb } from './fresh-db';
import { addActor, addOrganisation, addTeam } from './organisation';
import { addPerson, addSkill } from './staff-list';

/** The value of an outcome that must be a success. */
export function mustBeOk<T>(outcome: Outcome<T>): T {
  if (outcome.ok) return outcome.value;
  throw new Error(`Refused: ${JSON.stringify(outcome.error)}`);
}

export const codeOf = (outcome: Outcome<unknown>): string =>
  outcome.ok ? 'ok' : outcome.error.code;

const early: ShiftKindInput = {
  name: 'Early',
  letter: 'E',
  startMinute: 420,
  endMinute: 900,
  unpaidBreakMinutes: 0,
  isNight: false,
  skillIds: null,
};
const late: ShiftKindInput = {
  ...early,
  name: 'Late',
  letter: 'L',
  startMinute: 900,
  endMinute: 1380,
};

/** The first day of the small team's period, a Monday. */
export const smallStart = '2027-02-01';

/**
 * What a full week of the small team costs, reckoned by hand: 14 shifts of 8 h at 20.00 are 2240.00;
 * the 4 of the weekend (32 h) carry 20 % more, 128.00. Whoever works them, it is the same.
 */
export const smallCostCents = 236_800;

/** One missing shift of eight hours. */
export const shiftMinutes = 480;

/**
 * A fresh database with one team of nurses, one Early and one Late every day. Each nurse works up to 40
 * paid hours a week, at most five days in a row, with 11 h rest: three hold the 14 shifts of a week, two
 * are 4 shifts short. A second team and a second organisation stand beside it.
 */
export function smallTeam(nurses: readonly string[] = ['Ada', 'Bo', 'Cy']) {
  freshDb();
  const organisationId = addOrganisation();
  const teamId = addTeam(organisationId, { name: 'Ward', periodDays: 7 });
  const otherTeamId = addTeam(organisationId, { name: 'Other ward', periodDays: 7 });
  const nurse = addSkill(teamId, 'Nurse');
  const supervisor = addActor(organisationId, 'supervisor', teamId);
  const people = nurses.map((name, position) =>
    addNurse(organisationId, teamId, nurse, name, position),
  );
  for (const kind of [early, late]) {
    mustBeOk(addShiftKind(supervisor, teamId, kind));
    mustBeOk(
      addFloor(supervisor, teamId, {
        skillId: nurse,
        startMinute: kind.startMinute,
        endMinute: kind.endMinute,
        needs: [1, 1, 1, 1, 1, 1, 1, 1],
        counting: 'seated',
        priceCentsPerHour: null,
        effectiveFrom: smallStart,
        effectiveTo: null,
      }),
    );
  }
  return {
    organisationId,
    teamId,
    otherTeamId,
    nurse,
    supervisor,
    people,
    hr: addActor(organisationId, 'hr'),
    owner: addActor(organisationId, 'owner'),
    otherSupervisor: addActor(organisationId, 'supervisor', otherTeamId),
    stranger: addActor(addOrganisation('Elsewhere'), 'owner'),
  };
}

export type SmallTeam = ReturnType<typeof smallTeam>;

/** A nurse with an account of the staff role. */
export function addNurse(
  organisationId: OrganisationId,
  teamId: TeamId,
  skillId: SkillId,
  name: string,
  position: number,
) {
  const actor = addActor(organisationId, 'staff', teamId);
  const contract = { underMinutes: 2400, paidBy: 'hours' as const };
  const { userId } = actor;
  return { name, actor, id: addPerson(teamId, name, [skillId], { position, userId, contract }) };
}

/** Opens the small team's period. */
export const openSmallPeriod = ({ supervisor, teamId }: SmallTeam): RosterId =>
  mustBeOk(openPeriod(supervisor, teamId, { startsOn: smallStart })).id;

/** Opens the period and lets a run of the real solver fill its draft. */
export async function planSmallPeriod(team: SmallTeam): Promise<RosterId> {
  const rosterId = openSmallPeriod(team);
  const run = mustBeOk(startRun(team.supervisor, rosterId, { limitSeconds: 20 }));
  await waitForRun(run.id);
  return rosterId;
}
