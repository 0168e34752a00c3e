import { beforeAll, describe, expect, it } from 'vitest';
import { loadDemo } from '@/db/demo';
import { demoAccounts } from '@/db/demo/accounts.mjs';
import type { Actor } from '@/modules/access';
import { findActor, listTeams, signIn } from '@/modules/access/server';
import { readHours } from '@/modules/hours/server';
import type { Board, RosterSummary } from '@/modules/roster';
import { listRosters, readBoard } from '@/modules/roster/server';
import { freshDb } from '../support/fresh-db';

async function actorOf(label: string): Promise<Actor> {
  const account = demoAccounts.find((one) => one.label === label);
  const session = account && (await signIn(account.email, account.password));
  const actor = session?.ok ? findActor(session.value) : null;
  if (!actor) throw new Error(`${label} cannot sign in`);
  return actor;
}

// The second day lies in the period that ends with the autumn clock change of Europe/Dublin.
describe.each(['2027-01-14T09:00:00Z', '2027-10-22T09:00:00Z'])('the demo on %s', (today) => {
  let supervisor: Actor;
  let rosters: RosterSummary[];
  let boards: Board[];

  beforeAll(async () => {
    freshDb();
    await loadDemo(Date.parse(today));
    supervisor = await actorOf('Supervisor');
    const [team] = listTeams(supervisor, 'rosters.read');
    const listed = team && listRosters(supervisor, team.id);
    if (!listed?.ok) throw new Error('no rosters');
    rosters = listed.value;
    boards = rosters.map(({ id }) => {
      const board = readBoard(supervisor, id);
      if (!board.ok) throw new Error(board.error.detail);
      return board.value;
    });
  });

  it('has a published period, a draft and one without floors', () => {
    expect(rosters.map(({ state, hasFloors }) => [state, hasFloors])).toEqual([
      ['published', true],
      ['draft', true],
      ['draft', false],
    ]);
  });

  it('has a published roster that the independent re-check finds whole', () => {
    expect(boards[0]?.proof).toMatchObject({ breaches: [], shortageMinutes: 0 });
  });

  it('has a draft that is short of a vet on two shifts, and breaks no rule', () => {
    expect(boards[1]?.proof).toMatchObject({ breaches: [], shortageMinutes: 960 });
    expect(boards[1]?.proof?.shortages.map(({ missingPeople }) => missingPeople)).toEqual([1, 1]);
  });

  it('has three people who have not confirmed yet', () => {
    expect(rosters[0]).toMatchObject({ peopleCount: 24, confirmedCount: 21 });
  });

  it('has worked time behind it, with two shifts that differ from the plan', async () => {
    const hr = await actorOf('HR');
    const running = rosters[0];
    if (!running) throw new Error('no running period');
    const hours = readHours(hr, running.teamId, { from: running.startsOn, to: running.endsOn });
    if (!hours.ok) throw new Error(hours.error.detail);
    const days = hours.value.people.flatMap((person) => person.days);
    const worked = days.filter(({ workedMinutes }) => workedMinutes !== null);
    expect(worked.length).toBeGreaterThan(100);
    expect(days.filter(({ workedMinutes }) => workedMinutes === null).length).toBeGreaterThan(10);
    expect(worked.filter(({ reason }) => reason !== '')).toHaveLength(2);
  });
});
