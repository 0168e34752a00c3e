import { afterAll, describe, expect, it } from 'vitest';
import type { ProblemPerson } from '@/modules/problem';
import { closeSolver, solveRoster } from '@/modules/solver/server';
import { buildFloor, buildProblem, type ProblemSketch } from '@/tests/support/problem-builder';

afterAll(closeSolver);

/** The outcome for a person with these terms beside one without any trouble. */
async function run(person: Partial<ProblemPerson>, sketch: ProblemSketch = {}) {
  const problem = buildProblem({ floors: [buildFloor()], ...sketch, people: [person, {}] });
  return solveRoster(problem, { limitSeconds: 20 });
}

const pin = (dayIndex: number, kind: number) => ({
  dayIndex,
  shiftIndex: dayIndex * 4 + kind,
  postSkillId: null,
});

describe('a person whose own rules clash', () => {
  it.each<[string, Partial<ProblemPerson>, ProblemSketch, string]>([
    [
      'leave without enough credit',
      {
        minimumMinutes: 2400,
        creditMinutes: 480,
        absences: [{ startMinute: 0, endMinute: 5760, reason: 'leave' }],
      },
      {},
      'Ione Baptisto can reach at most 32 h, 8 h of leave included, but the contract asks for at least 40 h; allow fewer hours in the contract, credit more leave or relax a rule.',
    ],
    [
      'a rule that leaves too few days',
      { minimumMinutes: 2400 },
      { rules: { longestRunDays: 1 } },
      'Ione Baptisto can reach at most 32 h, but the contract asks for at least 40 h; allow fewer hours in the contract, credit more leave or relax a rule.',
    ],
    [
      'hours that shifts cannot add up to',
      { minimumMinutes: 1000, maximumMinutes: 1400 },
      {},
      'No choice of shifts gives Ione Baptisto between 16.67 h and 23.33 h; allow a wider range of hours in the contract.',
    ],
    [
      'more pinned hours than the contract allows',
      { maximumMinutes: 480, pins: [pin(0, 0), pin(1, 0)] },
      {},
      'Ione Baptisto has at least 16 h by leave and pins, but the contract allows at most 8 h; remove a pin or allow more hours in the contract.',
    ],
    [
      'a pin in time away',
      { pins: [pin(0, 0)], absences: [{ startMinute: 0, endMinute: 1440, reason: 'leave' }] },
      {},
      'Ione Baptisto is pinned to Early on 2027-02-01 but is away then (leave); move or remove the pin.',
    ],
    [
      'a pinned Night without Nights in the contract',
      { pins: [pin(1, 3)], mayWorkNights: false },
      {},
      'Ione Baptisto is pinned to Night on 2027-02-02 but works no Nights by contract; move or remove the pin.',
    ],
    [
      'a pin too soon after the period before',
      {
        pins: [pin(0, 0)],
        history: [{ dayIndex: -1, startMinute: -60, endMinute: 420, isNight: true }],
      },
      {},
      'Ione Baptisto is pinned to Early on 2027-02-01 but has too little rest after the last shift before the period; move or remove the pin.',
    ],
    [
      'pins that break a rule together',
      { pins: [pin(0, 2), pin(1, 0)] },
      {},
      'The pins of Ione Baptisto cannot all be kept: together they break a rule on rest, days or Nights in a row, Nights or weekends; move or remove one of them.',
    ],
  ])('is named: %s', async (_, person, sketch, sentence) => {
    expect(await run(person, sketch)).toEqual({
      kind: 'impossible',
      clashes: [{ personId: 'ione', sentence }],
    });
  });

  it('is named beside every other one', async () => {
    const problem = buildProblem({
      people: [{ minimumMinutes: 10_000 }, {}, { minimumMinutes: 10_000 }],
    });
    const outcome = await solveRoster(problem, { limitSeconds: 20 });
    expect(outcome).toMatchObject({
      kind: 'impossible',
      clashes: [{ personId: 'ione' }, { personId: 'person-3' }],
    });
  });
});
