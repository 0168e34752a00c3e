import { expect, test } from 'vitest';
import type { Problem } from '@/modules/problem';
import { matchShifts } from '@/modules/roster/match-shifts';
import type { KeptShift } from '@/modules/roster/stored';
import { toInstant } from '@/modules/units';
import { buildPerson, buildProblem } from '../../support/problem-builder';

const names = { person: (id: string) => id.slice(4), kind: (id: string) => id.slice(4) };
const ione = 'per_Ione';

function problem(changes: Parameters<typeof buildProblem>[0] = {}): Problem {
  return buildProblem({
    people: [buildPerson({ id: ione })],
    kinds: [{ id: 'knd_Early', startMinute: 420, endMinute: 900 }],
    ...changes,
  });
}

const kept = (changes: Partial<KeptShift> = {}): KeptShift => ({
  id: 'asg_1',
  personId: ione,
  date: '2027-02-02',
  shiftKindId: 'knd_Early',
  skillId: 'ski_nurse',
  startsAtUtc: toInstant('2027-02-02', 420, 'UTC'),
  endsAtUtc: toInstant('2027-02-02', 900, 'UTC'),
  paidMinutes: 480,
  isPinned: false,
  ...changes,
});

test('shifts that fit the data of today become assignments', () => {
  expect(matchShifts(problem(), [kept()], names)).toEqual({
    roster: [{ personId: ione, shiftIndex: 1, postSkillId: 'ski_nurse' }],
    breaches: [],
  });
});

test('a shift of a person who can no longer be planned is left out and named', () => {
  const { roster, breaches } = matchShifts(problem(), [kept({ personId: 'per_Gone' })], names);
  expect(roster).toEqual([]);
  expect(breaches.map(({ sentence }) => sentence)).toEqual([
    'Gone cannot be planned in this period any more (no contract or skill), but has Early on Tue 2 Feb. Run again.',
  ]);
});

test('a shift of a retired kind is left out and named', () => {
  const { roster, breaches } = matchShifts(problem(), [kept({ shiftKindId: 'knd_Old' })], names);
  expect(roster).toEqual([]);
  expect(breaches.map(({ sentence }) => sentence)).toEqual([
    'Old is retired, but Ione has it on Tue 2 Feb. Run again.',
  ]);
});

test('a shift whose kind changed its times is counted with the new ones and named', () => {
  const { roster, breaches } = matchShifts(problem(), [kept({ paidMinutes: 450 })], names);
  expect(roster).toHaveLength(1);
  expect(breaches.map(({ rule, sentence }) => [rule, sentence])).toEqual([
    [
      'changed times',
      'Early has other times or breaks now than when Ione got it on Tue 2 Feb. Run again.',
    ],
  ]);
});
