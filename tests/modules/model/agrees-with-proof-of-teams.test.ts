import fc from 'fast-check';
import { expect, it } from 'vitest';
import {
  buildRosterModel,
  completeValues,
  levelSlacks,
  objectiveOf,
  placeRoster,
  type RosterModel,
  roundingSlackCents,
  weighRoster,
} from '@/modules/model';
import type { PlannedAssignment, PlannedRoster, Problem } from '@/modules/problem';
import { type Proof, proveRoster } from '@/modules/proof';
import { brokenRows } from '@/tests/support/broken-rows';
import { smallProblem } from '@/tests/support/random-problems';

/*
 * Model and proof again, on problems in which everything a problem can say occurs, and on rosters drawn
 * at random: a number for each person and day chooses one of the shifts of the day or none.
 */

const picks = fc.array(fc.integer({ min: 0, max: 11 }), { minLength: 15, maxLength: 15 });

/** Of twelve numbers the first three choose a shift and post, the others a day off: most lines are lawful. */
function drawRoster({ problem, works }: RosterModel, numbers: readonly number[]): PlannedRoster {
  return works.flatMap(({ person, byDay }, personIndex) =>
    byDay.flatMap((columns, dayIndex): PlannedAssignment[] => {
      const number = numbers[personIndex * problem.days.length + dayIndex] ?? 11;
      if (number > 2) return [];
      const shifts = problem.shifts.filter((shift) => shift.dayIndex === dayIndex);
      const shift = shifts[number % shifts.length];
      const posts = columns.filter((work) => work.shift === shift);
      const work = posts[number % Math.max(1, posts.length)];
      const postSkillId = work?.postSkillId ?? person.skillIds[0] ?? '';
      return shift ? [{ personId: person.id, shiftIndex: shift.index, postSkillId }] : [];
    }),
  );
}

/** What the proof says of each level of the model. */
const provenLevels = (model: RosterModel, proof: Proof): number[] =>
  model.levels.map(({ name, priority }) => {
    if (name === 'teamRules') return proof.teamRuleUnits;
    if (name === 'surplus') return proof.surplusMinutes;
    return proof.shortageByPriority.find((one) => one.priority === priority)?.minutes ?? -1;
  });

/** Values of the model's own objectives at the point that belongs to a roster. */
function objectivesAt(model: RosterModel, values: Float64Array): number[] {
  const whole = completeValues(model, values);
  return [...model.levels.map(({ objective }) => objective), 'cost'].map((name) => {
    const { costs, offset } = objectiveOf(model.linear, name);
    return costs.reduce((sum, cost, column) => sum + cost * (whole[column] ?? 0), offset);
  });
}

function compare(problem: Problem, model: RosterModel, roster: PlannedRoster): boolean {
  const values = placeRoster(model, roster);
  const isPlaced = values.reduce((sum, value) => sum + value, 0) === roster.length;
  const isLawful = isPlaced && brokenRows(model, roster).length === 0;
  const proof = proveRoster(problem, roster);
  const breaches = proof.breaches.filter(({ rule }) => rule !== 'teamRules');
  expect({ roster, isLawful, breaches }).toEqual({
    roster,
    isLawful: breaches.length === 0,
    breaches,
  });
  if (!isLawful) return false;
  const { shortageMinutes, costCents } = proof;
  const levels = provenLevels(model, proof);
  const figures = weighRoster(model, values);
  expect({ roster, ...figures }).toEqual({ roster, levels, shortageMinutes, costCents });
  const slacks = [...levelSlacks(model), roundingSlackCents(model)];
  objectivesAt(model, values).forEach((value, index) => {
    const exact = [...levels, costCents][index] ?? 0;
    expect(Math.abs(value - exact)).toBeLessThanOrEqual((slacks[index] ?? 0) + 1e-6);
  });
  return true;
}

it('agrees with the proof on levels and cost of random rosters of small teams', () => {
  let lawful = 0;
  fc.assert(
    fc.property(
      smallProblem,
      fc.array(picks, { minLength: 12, maxLength: 12 }),
      (problem, drawn) => {
        const model = buildRosterModel(problem);
        for (const numbers of drawn) {
          if (compare(problem, model, drawRoster(model, numbers))) lawful += 1;
        }
      },
    ),
    { numRuns: 250, seed: 11 },
  );
  expect(lawful).toBeGreaterThan(400);
});
