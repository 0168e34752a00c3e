import { beforeAll, describe, expect, it } from 'vitest';
import { db } from '@/db/client';
import { loadDemo } from '@/db/demo';
import { demoAccounts } from '@/db/demo/accounts.mjs';
import { dayOf, demoDates } from '@/db/demo/dates';
import { organisations, teams, users } from '@/db/schema';
import { can } from '@/modules/access';
import { findActor, listTeams, signIn } from '@/modules/access/server';
import { isInForce, needOn } from '@/modules/coverage';
import { listFloors, listHolidays, listShiftKinds, readCoverage } from '@/modules/coverage/server';
import { findContract } from '@/modules/people';
import { listLeave, listPeople, listSkills } from '@/modules/people/server';
import { datesOf, type TeamId, weekdayOf } from '@/modules/units';
import { freshDb } from '../support/fresh-db';

/** Thu 14 Jan 2027, 10:00 in Dublin. */
const now = Date.parse('2027-01-14T10:00:00Z');
const { running, draft, next } = demoDates('2027-01-14');

let teamId: TeamId;
let riversideId: TeamId;

beforeAll(async () => {
  freshDb();
  await loadDemo(now);
  const idOf = (name: string) => {
    const team = db()
      .select()
      .from(teams)
      .all()
      .find((candidate) => candidate.name === name);
    if (!team) throw new Error(`The demo has no team ${name}.`);
    return team.id;
  };
  teamId = idOf('Main Hospital');
  riversideId = idOf('Riverside Clinic');
});

async function actorOf(email: string) {
  const session = await signIn(email, 'lantern-day-2027');
  const actor = session.ok ? findActor(session.value) : null;
  if (!actor) throw new Error(`${email} cannot sign in.`);
  return actor;
}

/** Shifts and hours the floors ask for from one day to another, by skill name. */
function needed(from: string, to: string) {
  const holidays = new Set(listHolidays(teamId, from, to).map(({ date }) => date));
  const names = new Map<string, string>(listSkills(teamId).map(({ id, name }) => [id, name]));
  const totals = { shifts: 0, hours: 0, bySkill: {} as Record<string, number> };
  for (const floor of listFloors(teamId)) {
    const name = names.get(floor.skillId ?? '') ?? '';
    for (const date of datesOf(from, to)) {
      const people = needOn(floor, date, holidays.has(date));
      totals.shifts += people;
      totals.hours += (people * (floor.endMinute - floor.startMinute)) / 60;
      totals.bySkill[name] = (totals.bySkill[name] ?? 0) + people;
    }
  }
  return totals;
}

describe('the periods of the demo', () => {
  it.each([
    ['2027-01-14', '2027-01-04', '2027-02-01', '2027-03-01'],
    ['2027-01-31', '2027-01-04', '2027-02-01', '2027-03-01'],
    ['2027-02-01', '2027-02-01', '2027-03-01', '2027-03-29'],
    ['2026-12-07', '2026-12-07', '2027-01-04', '2027-02-01'],
    ['2025-10-26', '2025-10-13', '2025-11-10', '2025-12-08'],
  ])('lie around %s', (today, ...starts) => {
    const dates = demoDates(today);
    const periods = [dates.running, dates.draft, dates.next];
    expect(periods.map(({ startsOn }) => startsOn)).toEqual(starts);
    for (const { startsOn, endsOn } of periods) {
      expect([weekdayOf(startsOn), weekdayOf(endsOn)]).toEqual([0, 6]);
      expect(datesOf(startsOn, endsOn)).toHaveLength(28);
    }
    expect(datesOf(dates.running.startsOn, dates.running.endsOn)).toContain(today);
  });
});

describe('the floors of the demo', () => {
  it('ask for 424 shifts and 3,392 hours in the draft period', () => {
    expect(needed(draft.startsOn, draft.endsOn)).toEqual({
      shifts: 424,
      hours: 3392,
      bySkill: { Vet: 104, Nurse: 161, Ward: 84, Desk: 75 },
    });
  });

  it('hold in the running period too, where no date differs, and not after the draft', () => {
    expect(needed(running.startsOn, running.endsOn).shifts).toBe(424);
    expect(needed(next.startsOn, next.endsOn).shifts).toBe(0);
    const differing = listFloors(teamId).flatMap(({ dates }) => dates.map(({ date }) => date));
    expect(differing.sort()).toEqual([dayOf(draft, 17), dayOf(draft, 18), dayOf(draft, 18)]);
    expect(listFloors(teamId).every((floor) => isInForce(floor, draft.endsOn))).toBe(true);
  });

  it('each fit a shift kind', () => {
    const windows = listShiftKinds(teamId).map((kind) => `${kind.startMinute} ${kind.endMinute}`);
    expect(listShiftKinds(teamId).map(({ letter }) => letter)).toEqual(['E', 'D', 'L', 'N']);
    for (const floor of listFloors(teamId)) {
      expect(windows).toContain(`${floor.startMinute} ${floor.endMinute}`);
    }
  });

  it('know Lantern Day on the eighteenth day, a Thursday', () => {
    expect(listHolidays(teamId, draft.startsOn, draft.endsOn)).toEqual([
      { date: '2027-02-18', name: 'Lantern Day' },
    ]);
  });
});

describe('the people of the demo', () => {
  /** Contract hours of the draft period less leave, by home skill, as far as `counts` says. */
  function given(counts: (name: string) => boolean) {
    const names = new Map<string, string>(listSkills(teamId).map(({ id, name }) => [id, name]));
    const leave = listLeave(teamId, draft.startsOn, draft.endsOn);
    const totals: Record<string, number> = {};
    for (const person of listPeople(teamId)) {
      const skill = names.get(person.skills[0]?.skillId ?? '') ?? '';
      const weekly = findContract(person, draft.startsOn)?.weeklyMinutes ?? 0;
      const away = leave
        .filter(({ personId }) => personId === person.id && counts(person.name))
        .reduce((sum, { creditMinutes }) => sum + creditMinutes, 0);
      totals[skill] = (totals[skill] ?? 0) + (weekly * 4 - away) / 60;
    }
    return totals;
  }
  const sum = (totals: Record<string, number>) =>
    Object.values(totals).reduce((total, hours) => total + hours, 0);

  it('are 24 whose contracts give 3,304 hours before the leave of Tobias Lindrao, 3,288 after', () => {
    expect(listPeople(teamId)).toHaveLength(24);
    const before = given((name) => name !== 'Tobias Lindrao');
    expect(before).toEqual({ Vet: 824, Nurse: 1152, Ward: 712, Desk: 616 });
    expect(sum(before)).toBe(3304);
    expect(sum(given(() => true))).toBe(3288);
  });

  it('have leave in the running period too, and nobody more than a contract gives', () => {
    const leave = listLeave(teamId, running.startsOn, running.endsOn);
    expect(leave.map(({ creditMinutes }) => creditMinutes / 60)).toEqual([24, 32]);
  });

  it('hold a skill, a contract and an account each', () => {
    for (const person of listPeople(teamId)) {
      expect(person.userId).not.toBeNull();
      expect(person.skills.length).toBeGreaterThan(0);
      expect(findContract(person, running.startsOn)).toMatchObject({ paidBy: 'contract' });
    }
    const noNights = listPeople(teamId)
      .filter((person) => findContract(person, draft.startsOn)?.mayWorkNights === false)
      .map(({ name }) => name);
    expect(noNights).toEqual([
      'Ciaran Vought',
      'Anouk Tessaly',
      'Elspeth Nakano',
      'Farah Wexcombe',
    ]);
  });
});

describe('the accounts of the demo', () => {
  it.each(demoAccounts)('let $label sign in', async ({ email, password }) => {
    expect((await signIn(email, password)).ok).toBe(true);
  });

  it('show each supervisor their own team only, the owner both', async () => {
    const ingrid = await actorOf('ingrid.solane@ravelmere.example');
    const edda = await actorOf('edda.marlowe@ravelmere.example');
    const rowan = await actorOf('rowan.keele@ravelmere.example');
    expect(readCoverage(ingrid, teamId).ok).toBe(true);
    expect(readCoverage(ingrid, riversideId)).toMatchObject({ error: { code: 'not-found' } });
    expect(readCoverage(edda, teamId)).toMatchObject({ error: { code: 'not-found' } });
    expect(listTeams(rowan, 'floors.write').map(({ id }) => id)).toEqual([teamId, riversideId]);
  });

  it('let staff and HR see what is theirs', async () => {
    const sunniva = await actorOf('sunniva.adeyo@ravelmere.example');
    const marcus = await actorOf('marcus.tealby@ravelmere.example');
    expect([can(sunniva, 'own-shifts.read'), can(sunniva, 'floors.read')]).toEqual([true, false]);
    expect([can(marcus, 'hours.read'), can(marcus, 'floors.write')]).toEqual([true, false]);
    expect(sunniva.personId).not.toBeNull();
  });
});

describe('loading the demo', () => {
  it('happens once: a database with an organisation stays as it is', async () => {
    const count = db().select().from(users).all().length;
    await loadDemo(now);
    await Promise.all([loadDemo(now), loadDemo(now)]);
    expect(db().select().from(organisations).all()).toHaveLength(1);
    expect(db().select().from(users).all()).toHaveLength(count);
  });

  it('moves with the calendar, over a clock change too', async () => {
    freshDb();
    await loadDemo(Date.parse('2026-10-25T00:30:00Z'));
    await loadDemo(now);
    const team = db()
      .select()
      .from(teams)
      .all()
      .find(({ name }) => name === 'Main Hospital');
    const dates = demoDates('2026-10-25');
    expect(db().select().from(organisations).all()).toHaveLength(1);
    expect(team && listHolidays(team.id, dates.draft.startsOn, dates.draft.endsOn)).toHaveLength(1);
  });
});
