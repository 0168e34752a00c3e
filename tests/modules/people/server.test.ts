import { beforeEach, describe, expect, it } from 'vitest';
import { db } from '@/db/client';
import { contracts, personSkills } from '@/db/schema';
import { findContract } from '@/modules/people';
import { findPersonOfUser, listLeave, listPeople, listSkills } from '@/modules/people/server';
import type { OrganisationId, TeamId } from '@/modules/units';
import { newId } from '@/modules/units/server';
import { freshDb } from '../../support/fresh-db';
import { addActor, addOrganisation, addTeam } from '../../support/organisation';
import { addLeave, addPerson, addSkill } from '../../support/staff-list';

let organisationId: OrganisationId;
let teamId: TeamId;
let otherTeamId: TeamId;

beforeEach(() => {
  freshDb();
  organisationId = addOrganisation();
  teamId = addTeam(organisationId);
  otherTeamId = addTeam(organisationId);
});

describe('the staff list', () => {
  it('is empty for a team without people', () => {
    expect(listPeople(teamId)).toEqual([]);
    expect(listSkills(teamId)).toEqual([]);
  });

  it('stands in its own order, with the home skill first and every contract', () => {
    const nurse = addSkill(teamId, 'Nurse', 1);
    const vet = addSkill(teamId, 'Vet', 0);
    addPerson(teamId, 'Second', [vet], { position: 1 });
    const first = addPerson(teamId, 'First', [nurse, vet], {
      position: 0,
      contract: { endsOn: '2027-01-31' },
    });
    const later = { startsOn: '2027-02-01', weeklyMinutes: 1200 };
    const common = { underMinutes: 0, overtimeMinutes: 0, payCentsPerHour: 2000 };
    db()
      .insert(contracts)
      .values({
        id: newId('con'),
        personId: first,
        ...later,
        ...common,
        paidBy: 'hours',
        mayWorkNights: false,
      })
      .run();

    const list = listPeople(teamId);
    expect(list.map(({ name }) => name)).toEqual(['First', 'Second']);
    expect(list[0]?.skills.map(({ skillId }) => skillId)).toEqual([nurse, vet]);
    expect(list[0]?.contracts.map(({ startsOn }) => startsOn)).toEqual([
      '2027-01-04',
      '2027-02-01',
    ]);
    expect(list[0] && findContract(list[0], '2027-02-01')).toMatchObject(later);
    expect(list[0] && findContract(list[0], '2027-01-31')?.weeklyMinutes).toBe(2400);
    expect(list[0] && findContract(list[0], '2027-01-03')).toBeNull();
    expect(listSkills(teamId).map(({ name }) => name)).toEqual(['Vet', 'Nurse']);
  });

  it('says on which day a skill runs out', () => {
    const vet = addSkill(teamId, 'Vet');
    addPerson(teamId, 'Ann', [vet]);
    db().update(personSkills).set({ expiresOn: '2027-02-15' }).run();
    expect(listPeople(teamId)[0]?.skills).toEqual([
      { skillId: vet, position: 0, expiresOn: '2027-02-15' },
    ]);
  });

  it('keeps people who left, marked, and never shows another team', () => {
    addPerson(teamId, 'Gone', [addSkill(teamId, 'Vet')], { isActive: false });
    addPerson(otherTeamId, 'Elsewhere', [addSkill(otherTeamId, 'Vet')]);
    expect(listPeople(teamId).map(({ name, isActive }) => [name, isActive])).toEqual([
      ['Gone', false],
    ]);
  });
});

describe('leave', () => {
  it.each([
    ['before the dates', '2027-01-20', '2027-01-31', 0],
    ['ending on the first date', '2027-01-28', '2027-02-01', 1],
    ['within the dates', '2027-02-10', '2027-02-10', 1],
    ['around the dates', '2027-01-01', '2027-12-31', 1],
    ['starting on the last date', '2027-02-28', '2027-03-03', 1],
    ['after the dates', '2027-03-01', '2027-03-03', 0],
  ])('%s counts %#', (_, startsOn, endsOn, count) => {
    addLeave(addPerson(teamId, 'Ann', []), startsOn, endsOn);
    addLeave(addPerson(otherTeamId, 'Elsewhere', []), startsOn, endsOn);
    expect(listLeave(teamId, '2027-02-01', '2027-02-28')).toHaveLength(count);
  });

  it('comes earliest first and says what it counts', () => {
    const ann = addPerson(teamId, 'Ann', []);
    addLeave(ann, '2027-02-20', '2027-02-21', 960);
    addLeave(ann, '2027-02-02', '2027-02-02', 300);
    expect(
      listLeave(teamId, '2027-02-01', '2027-02-28').map((leave) => [
        leave.startsOn,
        leave.creditMinutes,
      ]),
    ).toEqual([
      ['2027-02-02', 300],
      ['2027-02-20', 960],
    ]);
  });
});

describe('the person that a user is', () => {
  it('is found by the user, and is nobody for users outside the staff lists', () => {
    const { userId } = addActor(organisationId, 'staff', teamId);
    const ann = addPerson(teamId, 'Ann', [addSkill(teamId, 'Vet')], { userId });
    addPerson(teamId, 'Ben', []);
    expect(findPersonOfUser(userId)).toMatchObject({ id: ann, teamId, userId, name: 'Ann' });
    expect(findPersonOfUser(addActor(organisationId, 'hr').userId)).toBeNull();
  });
});
