import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { db } from '@/db/client';
import { auditEvents, sizings } from '@/db/schema';
import type { Actor } from '@/modules/access';
import type { ShiftKind } from '@/modules/coverage';
import { addShiftKind, retireShiftKind } from '@/modules/coverage/server';
import type { SizingInput } from '@/modules/sizing';
import { readLatestSizing, readSizingSheet, sizeTeam } from '@/modules/sizing/server';
import type { TeamId } from '@/modules/units';
import { addActor, addOrganisation, addTeam } from '../../support/organisation';
import { line, monday, must, openTeam, type SizedTeam } from './sized-team';

let team: SizedTeam;
let day: ShiftKind;
let otherTeamId: TeamId;
let otherSupervisor: Actor;

beforeAll(() => {
  team = openTeam();
  day = team.addKind('Day', 8, 16);
  team.addFloor(8, 16, [2, 2, 2, 2, 2, 1, 1]);
  otherTeamId = addTeam(team.actor.organisationId);
  otherSupervisor = addActor(team.actor.organisationId, 'supervisor', otherTeamId);
});

const inputOf = (kind: ShiftKind, changes: Partial<SizingInput> = {}): SizingInput => ({
  weekOf: monday,
  span: 'week',
  objective: 'people',
  lines: [line(kind)],
  mostPeople: null,
  ...changes,
});

describe('sizing a team', () => {
  it('stores what was asked with its answer, and writes it into the record', async () => {
    const sizing = must(await sizeTeam(team.actor, team.teamId, inputOf(day)));
    expect(must(readLatestSizing(team.actor, team.teamId))).toEqual(sizing);
    const events = db()
      .select()
      .from(auditEvents)
      .where(eq(auditEvents.subjectId, sizing.id))
      .all();
    expect(events).toMatchObject([{ action: 'sizing.run', userId: team.actor.userId }]);
  });

  it('reads the newest sizing first', async () => {
    await team.size([line(day)]);
    const last = await team.size([line(day)], { objective: 'pay' });
    expect(must(readLatestSizing(team.actor, team.teamId))?.id).toBe(last.id);
  });

  it('refuses people who may not size, and teams that are not theirs, without a trace', async () => {
    const before = await db().$count(sizings);
    const staff = addActor(team.actor.organisationId, 'staff', team.teamId);
    const stranger = addActor(addOrganisation(), 'owner');
    const refusals = [
      await sizeTeam(staff, team.teamId, inputOf(day)),
      await sizeTeam(otherSupervisor, team.teamId, inputOf(day)),
      await sizeTeam(stranger, team.teamId, inputOf(day)),
      readLatestSizing(staff, team.teamId),
      readSizingSheet(otherSupervisor, team.teamId),
    ];
    const codes = refusals.map((outcome) => (outcome.ok ? 'ok' : outcome.error.code));
    expect(codes).toEqual(['not-allowed', 'not-found', 'not-found', 'not-allowed', 'not-found']);
    expect(await db().$count(sizings)).toBe(before);
  });

  it('refuses shift kinds of another team and retired ones, naming the line', async () => {
    const { id: _, teamId: __, isRetired: ___, ...input } = day;
    const foreign = must(addShiftKind(otherSupervisor, otherTeamId, input));
    const retired = team.addKind('Old', 8, 16);
    must(retireShiftKind(team.actor, retired.id));
    for (const kind of [foreign, retired]) {
      const outcome = await sizeTeam(team.actor, team.teamId, inputOf(kind));
      expect(outcome).toMatchObject({
        ok: false,
        error: { code: 'invalid', fields: [{ path: 'lines.0.shiftKindId' }] },
      });
    }
  });

  it('names the window when no pattern can hold a floor', async () => {
    const early = team.addKind('Early', 4, 8);
    const { answer } = await team.size([line(early)]);
    expect(answer.floorsHold).toBe(false);
    expect(answer.shortages).toHaveLength(7);
    expect(answer.shortages[0]).toMatchObject({
      label: 'Mon, Anybody 08:00–16:00',
      people: 2,
      minutes: 960,
    });
  });

  it('keeps a share of everybody: at most a quarter on one-day help', async () => {
    const help = line(day, { name: 'Help', daysOn: 1, mostPercent: 25 });
    const sizing = await team.size([line(day), help]);
    const helpers = sizing.answer.people
      .filter(({ patternId }) => patternId.startsWith('Help/'))
      .reduce((sum, { count }) => sum + count, 0);
    expect(sizing.answer.floorsHold).toBe(true);
    expect(helpers * 4).toBeLessThanOrEqual(sizing.answer.objective);
  });
});

describe('the sizing sheet', () => {
  it('offers a table made from the floors of the running week, and the latest sizing', async () => {
    const last = await team.size([line(day)]);
    const sheet = must(readSizingSheet(team.actor, team.teamId));
    expect(sheet.latest?.id).toBe(last.id);
    expect(sheet.kinds.map(({ name }) => name)).toContain('Day');
    expect(sheet.beginning).toMatchObject({ span: 'week', objective: 'people' });
  });
});
