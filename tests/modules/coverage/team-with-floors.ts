import { db } from '@/db/client';
import { auditEvents } from '@/db/schema';
import type { FloorInput, ShiftKindInput } from '@/modules/coverage';
import { addFloor } from '@/modules/coverage/server';
import type { Outcome } from '@/modules/units';
import { freshDb } from '../../support/fresh-db';
import { addActor, addOrganisation, addTeam } from '../../support/organisation';
import { addSkill } from '../../support/staff-list';

export const floorInput = (changes: Partial<FloorInput> = {}): FloorInput => ({
  skillId: null,
  startMinute: 420,
  endMinute: 900,
  needs: [1, 1, 1, 1, 1, 0, 0, 0],
  counting: 'seated',
  priceCentsPerHour: null,
  effectiveFrom: '2027-02-01',
  effectiveTo: '2027-02-28',
  ...changes,
});

export const kindInput = (changes: Partial<ShiftKindInput> = {}): ShiftKindInput => ({
  name: 'Early',
  letter: 'E',
  startMinute: 420,
  endMinute: 900,
  unpaidBreakMinutes: 30,
  isNight: false,
  skillIds: null,
  ...changes,
});

/** The value of an outcome that must be a success. */
export function expectOk<T>(outcome: Outcome<T>): T {
  if (outcome.ok) return outcome.value;
  throw new Error(`Refused: ${JSON.stringify(outcome.error)}`);
}

export const codeOf = (outcome: Outcome<unknown>): string =>
  outcome.ok ? 'ok' : outcome.error.code;

export const fieldsOf = (outcome: Outcome<unknown>): string[] =>
  outcome.ok ? [] : (outcome.error.fields ?? []).map(({ path }) => path);

export const auditActions = (): string[] =>
  db()
    .select()
    .from(auditEvents)
    .all()
    .map(({ action }) => action);

/**
 * A fresh database: one organisation with two teams and actors of every kind, a vet floor, and a
 * second organisation with a supervisor of its own.
 */
export function teamWithFloors() {
  freshDb();
  const organisationId = addOrganisation();
  const teamId = addTeam(organisationId);
  const otherTeamId = addTeam(organisationId);
  const elsewhere = addOrganisation('Elsewhere');
  const vet = addSkill(teamId, 'Vet', 0);
  const nurse = addSkill(teamId, 'Nurse', 1);
  const foreignSkill = addSkill(otherTeamId, 'Vet', 0);
  const supervisor = addActor(organisationId, 'supervisor', teamId);
  const floor = expectOk(addFloor(supervisor, teamId, floorInput({ skillId: vet })));
  return {
    teamId,
    otherTeamId,
    vet,
    nurse,
    foreignSkill,
    floor,
    supervisor,
    owner: addActor(organisationId, 'owner'),
    /** Each with the code that every write of the team's floors must answer. */
    refused: [
      [addActor(organisationId, 'staff', teamId), 'not-allowed'],
      [addActor(organisationId, 'hr'), 'not-allowed'],
      [addActor(organisationId, 'supervisor', otherTeamId), 'not-found'],
      [addActor(elsewhere, 'owner'), 'not-found'],
    ] as const,
  };
}
