import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { db } from '@/db/client';
import { auditEvents, sessions } from '@/db/schema';
import type { Actor } from '@/modules/access';
import { can } from '@/modules/access';
import {
  changeMember,
  findActor,
  hashPassword,
  listMembers,
  requireTeam,
  signIn,
  signOut,
} from '@/modules/access/server';
import type { OrganisationId, TeamId } from '@/modules/units';
import { freshDb } from '../../support/fresh-db';
import { addActor, addOrganisation, addTeam } from '../../support/organisation';

let organisationId: OrganisationId;
let teamId: TeamId;
let otherTeamId: TeamId;
let owner: Actor;
let supervisor: Actor;

beforeAll(async () => {
  freshDb();
  organisationId = addOrganisation();
  teamId = addTeam(organisationId);
  otherTeamId = addTeam(organisationId);
  owner = addActor(organisationId, 'owner');
  supervisor = addActor(organisationId, 'supervisor', teamId, {
    email: 'sue@test.example',
    passwordHash: await hashPassword('a long password'),
  });
});

async function openSession() {
  const outcome = await signIn('Sue@Test.example', 'a long password');
  if (!outcome.ok) throw new Error(outcome.error.detail);
  return outcome.value;
}

describe('signing in', () => {
  it('opens a session for the right password, whatever the case of the e-mail', async () => {
    const actor = findActor(await openSession());
    expect(actor).toMatchObject({ userId: supervisor.userId, organisationId });
  });

  it('refuses a wrong password and an unknown e-mail with the same words', async () => {
    const wrong = await signIn('sue@test.example', 'a wrong password');
    const unknown = await signIn('nobody@test.example', 'a long password');
    expect(wrong.ok).toBe(false);
    expect(unknown).toEqual(wrong);
  });

  it('makes an e-mail wait when many passwords are tried at once', async () => {
    const tries = Array.from({ length: 15 }, () => signIn('many@test.example', 'x'));
    const codes = (await Promise.all(tries)).map((one) => (one.ok ? 'ok' : one.error.code));
    expect(codes.filter((code) => code === 'too-many')).toHaveLength(5);
  });

  it('makes an e-mail wait after ten failures', async () => {
    for (let tries = 0; tries < 10; tries++) await signIn('guess@test.example', 'x');
    const outcome = await signIn('guess@test.example', 'x');
    expect(outcome).toMatchObject({ ok: false, error: { code: 'too-many' } });
  });
});

describe('a session', () => {
  it('opens nothing after signing out', async () => {
    const id = await openSession();
    signOut(id);
    expect(findActor(id)).toBeNull();
  });

  it('ends when unused for twelve hours', async () => {
    const id = await openSession();
    const longAgo = Date.now() - 13 * 3_600_000;
    db().update(sessions).set({ lastSeenAtUtc: longAgo }).where(eq(sessions.id, id)).run();
    expect(findActor(id)).toBeNull();
  });

  it('ends after a week even when used', async () => {
    const id = await openSession();
    const longAgo = Date.now() - 8 * 24 * 3_600_000;
    db().update(sessions).set({ createdAtUtc: longAgo }).where(eq(sessions.id, id)).run();
    expect(findActor(id)).toBeNull();
  });

  it('carries a changed role on the very next request', async () => {
    const id = await openSession();
    changeMember(owner, supervisor.userId, { memberships: [{ role: 'staff', teamId }] });
    const actor = findActor(id);
    expect(actor && can(actor, 'floors.write')).toBe(false);
    changeMember(owner, supervisor.userId, { memberships: [{ role: 'supervisor', teamId }] });
    expect(can(findActor(id) as Actor, 'floors.write')).toBe(true);
  });

  it('dies at once when the account is disabled, and sign-in is refused', async () => {
    const id = await openSession();
    changeMember(owner, supervisor.userId, { isDisabled: true });
    expect(findActor(id)).toBeNull();
    expect((await signIn('sue@test.example', 'a long password')).ok).toBe(false);
    changeMember(owner, supervisor.userId, { isDisabled: false });
    expect(findActor(id)).toBeNull();
    expect((await signIn('sue@test.example', 'a long password')).ok).toBe(true);
  });
});

describe('members', () => {
  it('are seen and changed by owners alone', () => {
    expect(listMembers(supervisor)).toMatchObject({ ok: false, error: { code: 'not-allowed' } });
    expect(changeMember(supervisor, owner.userId, { isDisabled: true })).toMatchObject({
      ok: false,
      error: { code: 'not-allowed' },
    });
  });

  it('of another organisation do not exist for an owner', () => {
    const stranger = addActor(addOrganisation('Elsewhere'), 'hr');
    expect(changeMember(owner, stranger.userId, { isDisabled: true })).toMatchObject({
      ok: false,
      error: { code: 'not-found' },
    });
  });

  it('keep at least one active owner', () => {
    const before = db().select().from(auditEvents).all().length;
    expect(changeMember(owner, owner.userId, { isDisabled: true })).toMatchObject({
      ok: false,
      error: { code: 'conflict' },
    });
    expect(findActor(owner.sessionId)).not.toBeNull();
    expect(db().select().from(auditEvents).all()).toHaveLength(before);
  });

  it('cannot be given a team of another organisation', () => {
    const foreign = addTeam(addOrganisation('Elsewhere'));
    const outcome = changeMember(owner, supervisor.userId, {
      memberships: [{ role: 'supervisor', teamId: foreign }],
    });
    expect(outcome).toMatchObject({
      ok: false,
      error: { fields: [{ path: 'memberships.0.teamId' }] },
    });
  });
});

describe('a team', () => {
  it.each([
    ['its supervisor', () => supervisor, () => teamId, 'ok'],
    ['a supervisor of another team', () => supervisor, () => otherTeamId, 'not-found'],
    [
      'HR, who may not write floors',
      () => addActor(organisationId, 'hr'),
      () => teamId,
      'not-allowed',
    ],
    [
      'staff of the team',
      () => addActor(organisationId, 'staff', teamId),
      () => teamId,
      'not-allowed',
    ],
    ['an owner', () => owner, () => otherTeamId, 'ok'],
    [
      'an owner of another organisation',
      () => addActor(addOrganisation(), 'owner'),
      () => teamId,
      'not-found',
    ],
  ])('answers %s', (_, actor, team, expected) => {
    const outcome = requireTeam(actor(), 'floors.write', team());
    expect(outcome.ok ? 'ok' : outcome.error.code).toBe(expected);
  });
});
