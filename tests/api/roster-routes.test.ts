import Papa from 'papaparse';
import { beforeEach, expect, test, vi } from 'vitest';
import * as calendar from '@/app/api/v1/me/calendar/route';
import * as confirmations from '@/app/api/v1/me/confirmations/route';
import * as ownShifts from '@/app/api/v1/me/shifts/route';
import * as publish from '@/app/api/v1/rosters/[rosterId]/publish/route';
import * as board from '@/app/api/v1/rosters/[rosterId]/route';
import * as runsOfRoster from '@/app/api/v1/rosters/[rosterId]/runs/route';
import * as events from '@/app/api/v1/runs/[runId]/events/route';
import * as model from '@/app/api/v1/runs/[runId]/model/route';
import * as run from '@/app/api/v1/runs/[runId]/route';
import * as stop from '@/app/api/v1/runs/[runId]/stop/route';
import * as waysOut from '@/app/api/v1/runs/[runId]/ways-out/route';
import * as teamCalendar from '@/app/api/v1/teams/[teamId]/calendar/route';
import * as footing from '@/app/api/v1/teams/[teamId]/footing/route';
import * as hours from '@/app/api/v1/teams/[teamId]/hours/route';
import * as hoursCsv from '@/app/api/v1/teams/[teamId]/hours.csv/route';
import * as rosters from '@/app/api/v1/teams/[teamId]/rosters/route';
import * as runs from '@/app/api/v1/teams/[teamId]/runs/route';
import type { Actor } from '@/modules/access';
import { waitForRun } from '@/modules/roster/server';
import { type SmallTeam, smallStart, smallTeam } from '@/tests/support/small-team';

const session = vi.hoisted(() => ({ actor: null as Actor | null }));
vi.mock('@/app/_session', () => ({ currentActor: async () => session.actor }));
vi.mock('@/db/clock', () => ({ now: () => Date.parse('2027-01-14T09:00:00Z') }));
vi.mock('@/modules/mail/server', async (original) => ({
  ...(await original<typeof import('@/modules/mail/server')>()),
  nudgeSender: vi.fn(),
}));

type Handler = (
  request: Request,
  context: { params: Promise<Record<string, string>> },
) => Promise<Response>;

interface Call {
  readonly params?: Record<string, string>;
  readonly query?: string;
  readonly body?: unknown;
  readonly headers?: Record<string, string>;
}

function call(handler: Handler, { params = {}, query = '', body, headers = {} }: Call = {}) {
  const request = new Request(`http://localhost/api/v1/x${query}`, {
    headers: { ...(body === undefined ? {} : { 'content-type': 'application/json' }), ...headers },
    ...(body === undefined ? {} : { method: 'POST', body: JSON.stringify(body) }),
  });
  return handler(request, { params: Promise.resolve(params) });
}

let team: SmallTeam;
beforeEach(() => {
  team = smallTeam();
  session.actor = team.supervisor;
});

const asRole = (actor: Actor | undefined) => {
  session.actor = actor ?? null;
};
const ofTeam = () => ({ teamId: team.teamId });
const week = '?from=2027-02-01&to=2027-02-07';

/** Opens a period through the API and waits for a run of it. */
async function openAndRun(): Promise<{ rosterId: string; runId: string }> {
  const opened = await call(rosters.POST, { params: ofTeam(), body: { startsOn: smallStart } });
  expect(opened.status).toBe(201);
  const { id: rosterId } = await opened.json();
  const started = await call(runsOfRoster.POST, { params: { rosterId }, body: {} });
  expect(started.status).toBe(201);
  const { id: runId } = await started.json();
  await waitForRun(runId);
  return { rosterId, runId };
}

test('a supervisor opens, runs, reads and publishes over the API', async () => {
  const { rosterId, runId } = await openAndRun();
  const list = await (await call(rosters.GET, { params: ofTeam() })).json();
  expect(list).toMatchObject([{ id: rosterId, shiftCount: 14 }]);
  expect(await (await call(runs.GET, { params: ofTeam() })).json()).toMatchObject([{ id: runId }]);
  const view = await (await call(run.GET, { params: { runId } })).json();
  expect(view).toMatchObject({ state: 'done', shortageMinutes: 0 });
  expect((await call(board.GET, { params: { rosterId } })).status).toBe(200);
  expect((await call(footing.GET, { params: ofTeam(), query: week })).status).toBe(200);
  const entries = await (await call(teamCalendar.GET, { params: ofTeam(), query: week })).json();
  expect(entries).toHaveLength(14);
  const file = await call(model.GET, { params: { runId } });
  expect(file.headers.get('content-type')).toBe('text/plain; charset=utf-8');
  expect(file.headers.get('content-disposition')).toBe(
    'attachment; filename="roster-2027-02-01-run-1.lp"',
  );
  const other = await call(model.GET, { params: { runId }, query: '?format=mps' });
  expect(other.headers.get('content-disposition')).toBe(
    'attachment; filename="roster-2027-02-01-run-1.mps"',
  );
  const unknown = await call(model.GET, { params: { runId }, query: '?format=xls' });
  expect(unknown.status).toBe(400);
  const published = await call(publish.POST, { params: { rosterId }, body: {} });
  expect(published.status).toBe(200);
  expect(await published.json()).toMatchObject({ state: 'published', versionNumber: 1 });
});

test('the event stream replays what was missed and ends with the summary', async () => {
  const { runId } = await openAndRun();
  const read = async (headers: Record<string, string> = {}) =>
    (await call(events.GET, { params: { runId }, headers })).text();
  const all = await read();
  expect(all.startsWith('id: 1\ndata: {')).toBe(true);
  const [, end] = all.split('event: end\ndata: ');
  expect(JSON.parse(end ?? '')).toMatchObject({ id: runId, state: 'done' });
  expect((await read({ 'last-event-id': '1' })).includes('id: 1\n')).toBe(false);
  expect(await read({ 'last-event-id': 'nonsense' })).toBe(all);
});

test('staff read and confirm their own shifts', async () => {
  const { rosterId } = await openAndRun();
  await call(publish.POST, { params: { rosterId }, body: {} });
  asRole(team.people[0]?.actor);
  const own = await (await call(ownShifts.GET)).json();
  const { versionId } = own.periods[0];
  const confirmed = await call(confirmations.POST, { body: { versionId } });
  expect(confirmed.status).toBe(200);
  expect((await confirmed.json()).periods[0].confirmedAtUtc).not.toBeNull();
  const mine = await (await call(calendar.GET, { query: week })).json();
  expect(mine).toHaveLength(own.periods[0].shifts.length);
});

test('HR reads hours and saves them as CSV that is not kept in between', async () => {
  const { rosterId } = await openAndRun();
  await call(publish.POST, { params: { rosterId }, body: {} });
  asRole(team.hr);
  const view = await (await call(hours.GET, { params: ofTeam(), query: week })).json();
  expect(view.people).toHaveLength(3);
  const file = await call(hoursCsv.GET, { params: ofTeam(), query: week });
  expect(file.headers.get('content-type')).toBe('text/csv; charset=utf-8; header=present');
  expect(file.headers.get('cache-control')).toBe('no-store');
  expect(Papa.parse(await file.text(), { header: true }).data).toHaveLength(14);
});

test('a roster that is short answers 409 with one field error for each shortage', async () => {
  team = smallTeam(['Ada', 'Bo']);
  session.actor = team.supervisor;
  const { rosterId } = await openAndRun();
  const refused = await call(publish.POST, { params: { rosterId }, body: {} });
  expect(refused.status).toBe(409);
  expect(refused.headers.get('content-type')).toBe('application/problem+json');
  const document = await refused.json();
  expect(document.fields).toHaveLength(4);
  expect(document.fields[0].path).toBe('acceptShortage');
});

test('ways out of a knot are worked out over the API', async () => {
  team = smallTeam(['Ada', 'Bo']);
  session.actor = team.supervisor;
  const { runId } = await openAndRun();
  const answer = await call(waysOut.POST, { params: { runId }, body: { knot: 0 } });
  expect(answer.status).toBe(200);
  const [way] = await answer.json();
  expect(way).toMatchObject({
    changes: [{ words: expect.any(String), ask: expect.any(String) }],
    effect: { costChangeCents: { least: expect.any(Number) } },
  });
  const missing = await call(waysOut.POST, { params: { runId }, body: { knot: 99 } });
  expect(missing.status).toBe(404);
  expect((await call(waysOut.POST, { params: { runId }, body: { knot: -1 } })).status).toBe(400);
});

test.each([
  ['no range', '', 'from'],
  ['a date that does not exist', '?from=2027-02-29&to=2027-03-01', 'from'],
  ['a range that ends before it starts', '?from=2027-02-02&to=2027-02-01', 'to'],
  ['a date nobody plans', '?from=9999-12-31&to=9999-12-31', 'from'],
  ['more than 366 days', '?from=2027-01-01&to=2028-01-02', 'to'],
])('%s is answered with 400 and the field', async (_, query, path) => {
  asRole(team.hr);
  const refused = await call(hours.GET, { params: ofTeam(), query });
  expect(refused.status).toBe(400);
  expect((await refused.json()).fields[0].path).toBe(path);
});

test('366 days are read', async () => {
  asRole(team.hr);
  const query = '?from=2027-01-01&to=2028-01-01';
  expect((await call(hours.GET, { params: ofTeam(), query })).status).toBe(200);
});

test.each([
  ['a start that is no date', rosters.POST, { startsOn: 'soon' }],
  ['a start in a year nobody plans', rosters.POST, { startsOn: '9999-12-31' }],
  ['an unknown field', rosters.POST, { startsOn: smallStart, endsOn: smallStart }],
])('%s is answered with 400', async (_, handler, body) => {
  expect((await call(handler, { params: ofTeam(), body })).status).toBe(400);
});

test('strangers get 401, wrong roles 403, and ids that are not theirs 404', async () => {
  const { rosterId, runId } = await openAndRun();
  const requests = (): [Handler, Call][] => [
    [rosters.GET, { params: ofTeam() }],
    [rosters.POST, { params: ofTeam(), body: { startsOn: '2027-02-08' } }],
    [board.GET, { params: { rosterId } }],
    [runsOfRoster.POST, { params: { rosterId }, body: {} }],
    [publish.POST, { params: { rosterId }, body: {} }],
    [runs.GET, { params: ofTeam() }],
    [run.GET, { params: { runId } }],
    [events.GET, { params: { runId } }],
    [model.GET, { params: { runId } }],
    [stop.POST, { params: { runId } }],
    [waysOut.POST, { params: { runId }, body: { knot: 0 } }],
    [teamCalendar.GET, { params: ofTeam(), query: week }],
    [footing.GET, { params: ofTeam(), query: week }],
  ];
  const statuses = async () => {
    const answers = await Promise.all(requests().map(([handler, sent]) => call(handler, sent)));
    return [...new Set(answers.map(({ status }) => status))];
  };
  asRole(undefined);
  expect(await statuses()).toEqual([401]);
  asRole(team.people[0]?.actor);
  expect(await statuses()).toEqual([403]);
  asRole(team.otherSupervisor);
  expect(await statuses()).toEqual([404]);
  asRole(team.stranger);
  expect(await statuses()).toEqual([404]);
  asRole(team.supervisor);
  expect((await call(hours.GET, { params: ofTeam(), query: week })).status).toBe(403);
  expect((await call(ownShifts.GET)).status).toBe(403);
  expect((await call(board.GET, { params: { rosterId: 'run_x' } })).status).toBe(404);
});
