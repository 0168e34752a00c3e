import { afterAll, describe, expect, it } from 'vitest';
import { buildRosterModel, withRowBounds, writeLp } from '@/modules/model';
import type { Problem } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { closeSolver, solveRoster } from '@/modules/solver/server';
import { solveWithCbc, solveWithGlpk } from '@/tests/support/outside-solvers';
import { randomTeams } from '@/tests/support/random-teams';

/*
 * Least shortage and least cost of whole roster runs, confirmed by solvers that share nothing with ours
 * on the LP files of both stages, and by the proof.
 */

afterAll(closeSolver);

async function solve(problem: Problem) {
  const outcome = await solveRoster(problem, { limitSeconds: 60 });
  if (outcome.kind !== 'optimal') throw new Error(`ended as ${JSON.stringify(outcome)}`);
  return outcome;
}

const stageFiles = (problem: Problem, shortageMinutes: number) => {
  const { linear, levels } = buildRosterModel(problem);
  const [shortage] = levels;
  const none = Number.NEGATIVE_INFINITY;
  return {
    one: shortage ? writeLp(linear, shortage.objective) : null,
    two: writeLp(
      shortage ? withRowBounds(linear, shortage.row, none, shortageMinutes) : linear,
      'cost',
    ),
  };
};

const teams = randomTeams(10, 2027).map((problem, index) => ({ number: index + 1, problem }));

describe('runs of small random teams', () => {
  const shortages: number[] = [];

  it.each(teams)(
    'team $number: CBC, GLPK and the proof confirm both stages',
    async ({ problem }) => {
      const { roster, shortageMinutes, costCents, boundCents } = await solve(problem);
      shortages.push(shortageMinutes);
      const files = stageFiles(problem, shortageMinutes);
      for (const outside of [solveWithCbc, solveWithGlpk]) {
        if (files.one) expect(outside(files.one)).toBeCloseTo(shortageMinutes, 4);
        expect(outside(files.two)).toBeCloseTo(costCents, 4);
      }
      expect(boundCents).toBe(costCents);
      expect(proveRoster(problem, roster)).toMatchObject({
        breaches: [],
        shortageMinutes,
        costCents,
      });
    },
  );

  it('include teams that hold their floors and teams that cannot', () => {
    expect(shortages.some((minutes) => minutes === 0)).toBe(true);
    expect(shortages.some((minutes) => minutes > 0)).toBe(true);
  });
});
