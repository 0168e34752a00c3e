import { beforeEach, expect, it } from 'vitest';
import { db } from '@/db/client';
import { holidays } from '@/db/schema';
import {
  addShiftKind,
  listHolidays,
  readCoverage,
  retireShiftKind,
} from '@/modules/coverage/server';
import { codeOf, expectOk, kindInput, teamWithFloors } from './team-with-floors';

let given: ReturnType<typeof teamWithFloors>;

beforeEach(() => {
  given = teamWithFloors();
  const { teamId, otherTeamId } = given;
  db()
    .insert(holidays)
    .values([
      { teamId, date: '2027-03-17', name: 'Second' },
      { teamId, date: '2027-02-18', name: 'First' },
      { teamId: otherTeamId, date: '2027-02-19', name: 'Elsewhere' },
    ])
    .run();
});

it('gives everything of the team and nothing of others, retired kinds left out', () => {
  const { supervisor, teamId, floor, vet, nurse } = given;
  const old = expectOk(addShiftKind(supervisor, teamId, kindInput()));
  expectOk(retireShiftKind(supervisor, old.id));
  const kind = expectOk(addShiftKind(supervisor, teamId, kindInput()));
  const coverage = expectOk(readCoverage(supervisor, teamId));
  expect(coverage).toMatchObject({ team: { id: teamId }, floors: [floor], kinds: [kind] });
  expect(coverage.skills.map(({ id }) => id)).toEqual([vet, nurse]);
  expect(coverage.holidays.map(({ name }) => name)).toEqual(['First', 'Second']);
});

it('is refused to those who may not read floors, and hidden from the rest', () => {
  const { refused, owner, teamId } = given;
  for (const [actor, code] of refused) expect(codeOf(readCoverage(actor, teamId))).toBe(code);
  expect(codeOf(readCoverage(owner, teamId))).toBe('ok');
  expect(codeOf(readCoverage(owner, 'tea_none'))).toBe('not-found');
});

it('lists holidays of a range, both ends included', () => {
  const names = (from: string, to: string) =>
    listHolidays(given.teamId, from, to).map(({ name }) => name);
  expect(names('2027-02-18', '2027-03-17')).toEqual(['First', 'Second']);
  expect(names('2027-02-19', '2027-03-16')).toEqual([]);
});
