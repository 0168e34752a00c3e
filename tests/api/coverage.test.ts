import { beforeEach, describe, expect, it, vi } from 'vitest';
import {
  DELETE as clearDate,
  PUT as setDate,
} from '@/app/api/v1/floors/[floorId]/dates/[date]/route';
import { PUT as changeFloor, DELETE as removeFloor } from '@/app/api/v1/floors/[floorId]/route';
import { PUT as changeKind, DELETE as retireKind } from '@/app/api/v1/shift-kinds/[kindId]/route';
import { GET as readCoverage } from '@/app/api/v1/teams/[teamId]/coverage/route';
import { PUT as setNeeds } from '@/app/api/v1/teams/[teamId]/floor-needs/route';
import { POST as continueFloors } from '@/app/api/v1/teams/[teamId]/floors/continue/route';
import { POST as addFloor } from '@/app/api/v1/teams/[teamId]/floors/route';
import { POST as addKind } from '@/app/api/v1/teams/[teamId]/shift-kinds/route';
import { floorInput, kindInput, teamWithFloors } from '../modules/coverage/team-with-floors';

const asking = vi.hoisted(() => ({ actor: null as unknown }));
vi.mock('@/app/_session', () => ({ currentActor: async () => asking.actor }));

let given: ReturnType<typeof teamWithFloors>;

beforeEach(() => {
  given = teamWithFloors();
  asking.actor = given.supervisor;
});

type Route = typeof addFloor;

/** Status and document of a call; the document is null where there is no content. */
async function call(route: Route, params: Record<string, string>, body?: unknown) {
  const request = new Request('http://localhost/api/v1/x', {
    method: body === undefined ? 'GET' : 'PUT',
    headers: { 'content-type': 'application/json' },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
  });
  const response = await route(request, { params: Promise.resolve(params) });
  return {
    status: response.status,
    document: response.status === 204 ? null : await response.json(),
  };
}

describe('floors over HTTP', () => {
  it('are added, changed, given dates, continued, read and removed', async () => {
    const { teamId, nurse } = given;
    const input = floorInput({ skillId: nurse });
    const added = await call(addFloor, { teamId }, input);
    expect(added).toMatchObject({ status: 201, document: { ...input, dates: [] } });
    const floorId: string = added.document.id;
    const at = { floorId, date: '2027-02-17' };

    const wider = { ...input, endMinute: 960 };
    expect(await call(changeFloor, { floorId }, wider)).toMatchObject({ status: 200 });
    expect(await call(setDate, at, { people: 3, reason: 'fair' })).toMatchObject({
      document: { dates: [{ date: '2027-02-17', people: 3, reason: 'fair' }] },
    });
    expect(await call(clearDate, at)).toMatchObject({ status: 200, document: { dates: [] } });
    const cells = [{ floorId, day: 6, people: 2 }];
    expect((await call(setNeeds, { teamId }, cells)).document[0].needs[6]).toBe(2);
    const days = { from: '2027-02-28', to: '2027-03-28' };
    expect((await call(continueFloors, { teamId }, days)).document).toHaveLength(2);

    const { document } = await call(readCoverage, { teamId });
    expect(document.floors).toHaveLength(2);
    expect(document.floors[1]).toMatchObject({ endMinute: 960, effectiveTo: '2027-03-28' });
    expect(await call(removeFloor, { floorId })).toEqual({ status: 204, document: null });
    expect((await call(removeFloor, { floorId })).status).toBe(404);
  });

  it('answer bad input with the field and how to mend it', async () => {
    const { teamId, floor } = given;
    const bad = { ...floorInput(), needs: [1, 1, -1, 1, 1, 1, 1, 1], endMinute: 400 };
    const { status, document } = await call(addFloor, { teamId }, bad);
    expect(status).toBe(400);
    expect(document.fields).toEqual([
      { path: 'needs.2', message: 'A floor cannot be below 0 people.' },
      { path: 'endMinute', message: 'A window ends after it starts and lasts at most 24 hours.' },
    ]);
    const foreign = await call(addFloor, { teamId }, floorInput({ skillId: 'ski_none' }));
    expect(foreign).toMatchObject({ status: 400, document: { fields: [{ path: 'skillId' }] } });
    const { id: _, teamId: __, dates: ___, ...same } = floor;
    expect((await call(addFloor, { teamId }, same)).status).toBe(409);
  });

  it.each([
    ['an id of another kind', { floorId: 'knd_1', date: '2027-02-17' }],
    ['a date that does not exist', { floorId: 'flr_1', date: '2027-02-30' }],
    ['an unknown floor', { floorId: 'flr_1', date: '2027-02-17' }],
  ])('find nothing under %s', async (_, params) => {
    expect((await call(setDate, params, { people: 1, reason: '' })).status).toBe(404);
  });
});

describe('shift kinds over HTTP', () => {
  it('are added, changed and retired', async () => {
    const { teamId } = given;
    const added = await call(addKind, { teamId }, kindInput());
    expect(added.status).toBe(201);
    const kindId: string = added.document.id;
    const longer = kindInput({ endMinute: 960 });
    expect(await call(changeKind, { kindId }, longer)).toMatchObject({
      status: 200,
      document: { id: kindId, endMinute: 960 },
    });
    expect((await call(addKind, { teamId }, kindInput())).document.fields).toHaveLength(2);
    expect((await call(retireKind, { kindId })).status).toBe(204);
    expect((await call(retireKind, { kindId })).status).toBe(409);
  });
});

describe('every address of coverage', () => {
  it('is closed to strangers, to other roles and to other teams', async () => {
    const { teamId, floor, refused } = given;
    const days = { from: '2027-02-28', to: '2027-03-28' };
    const calls = () => [
      call(readCoverage, { teamId }),
      call(addFloor, { teamId }, floorInput()),
      call(setNeeds, { teamId }, [{ floorId: floor.id, day: 0, people: 1 }]),
      call(continueFloors, { teamId }, days),
      call(changeFloor, { floorId: floor.id }, floorInput()),
      call(removeFloor, { floorId: floor.id }),
      call(setDate, { floorId: floor.id, date: '2027-02-17' }, { people: 1, reason: '' }),
      call(clearDate, { floorId: floor.id, date: '2027-02-17' }),
      call(addKind, { teamId }, kindInput()),
    ];
    const statuses = async () => new Set((await Promise.all(calls())).map(({ status }) => status));
    asking.actor = null;
    expect(await statuses()).toEqual(new Set([401]));
    for (const [actor, code] of refused) {
      asking.actor = actor;
      expect(await statuses()).toEqual(new Set([code === 'not-allowed' ? 403 : 404]));
    }
  });
});
