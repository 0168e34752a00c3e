import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { GET as readLatest } from '@/app/api/v1/teams/[teamId]/sizings/latest/route';
import { POST as size } from '@/app/api/v1/teams/[teamId]/sizings/route';
import type { ShiftKind } from '@/modules/coverage';
import type { SizingInput } from '@/modules/sizing';
import { line, monday, openTeam, type SizedTeam } from '../modules/sizing/sized-team';
import { addActor, addOrganisation } from '../support/organisation';

const asking = vi.hoisted(() => ({ actor: null as unknown }));
vi.mock('@/app/_session', () => ({ currentActor: async () => asking.actor }));

let team: SizedTeam;
let day: ShiftKind;

beforeAll(() => {
  team = openTeam();
  day = team.addKind('Day', 8, 16);
  team.addFloor(8, 16, [2, 2, 2, 2, 2, 1, 1]);
});

beforeEach(() => {
  asking.actor = team.actor;
});

const input = (changes: Partial<SizingInput> = {}): SizingInput => ({
  weekOf: monday,
  span: 'week',
  objective: 'people',
  lines: [line(day)],
  mostPeople: null,
  ...changes,
});

async function call(route: typeof size, body?: unknown) {
  const request = new Request('http://localhost/api/v1/teams/x/sizings', {
    method: body === undefined ? 'GET' : 'POST',
    headers: { 'content-type': 'application/json' },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
  });
  const response = await route(request, { params: Promise.resolve({ teamId: team.teamId }) });
  return { status: response.status, document: await response.json() };
}

describe('sizing over HTTP', () => {
  it('reads nothing before the first sizing, then the newest', async () => {
    expect(await call(readLatest)).toEqual({ status: 200, document: null });
    const sized = await call(size, input());
    expect(sized.status).toBe(201);
    expect(sized.document.answer).toMatchObject({ floorsHold: true, objective: 3 });
    expect(await call(readLatest)).toEqual({ status: 200, document: sized.document });
  });

  it('names the fields of bad input, whether the schema or the team refuses them', async () => {
    const wrong = await call(size, input({ lines: [line(day, { daysOn: 9, startWeekdays: [] })] }));
    expect(wrong).toMatchObject({
      status: 400,
      document: {
        fields: [
          { path: 'lines.0.daysOn', message: 'At most 7 days.' },
          { path: 'lines.0.startWeekdays', message: 'Choose at least one first day.' },
        ],
      },
    });
    const foreign = await call(size, input({ lines: [line({ ...day, id: 'knd_other' })] }));
    expect(foreign).toMatchObject({
      status: 400,
      document: { fields: [{ path: 'lines.0.shiftKindId' }] },
    });
    expect((await call(size, input({ lines: [] }))).document.fields).toEqual([
      { path: 'lines', message: 'Add at least one pattern.' },
    ]);
  });

  it('is for those who size this team only', async () => {
    const { organisationId } = team.actor;
    const statuses: number[] = [];
    for (const actor of [
      null,
      addActor(organisationId, 'staff', team.teamId),
      addActor(organisationId, 'hr'),
      addActor(addOrganisation(), 'owner'),
    ]) {
      asking.actor = actor;
      statuses.push((await call(size, input())).status, (await call(readLatest)).status);
    }
    expect(statuses).toEqual([401, 401, 403, 403, 403, 403, 404, 404]);
  });
});
