import { afterAll, beforeAll, expect, test } from 'vitest';
import type { BoundRecord, Problem } from '@/modules/problem';
import { judgeOutcome } from '@/modules/roster/judge-outcome';
import { recheckBound } from '@/modules/roster/recheck-bound';
import type { RosterOutcome, SolvedRoster } from '@/modules/solver';
import { closeSolver, solveRoster } from '@/modules/solver/server';
import { buildFloor, buildProblem } from '@/tests/support/problem-builder';

/*
 * Records as the solver writes them, reckoned anew in a real thread: a week of Early and Late for three
 * nurses who are paid differently by the hour.
 */
const problem: Problem = buildProblem({
  people: [
    { paidBy: 'hours', payCentsPerHour: 2001 },
    { paidBy: 'hours', payCentsPerHour: 2507 },
    { paidBy: 'hours', payCentsPerHour: 3013 },
  ],
  floors: [0, 1, 2, 3, 4, 5, 6].flatMap((dayIndex) =>
    [420, 900].map((minute) => ({
      ...buildFloor(),
      floorId: `floor-${minute}`,
      dayIndex,
      startMinute: dayIndex * 1440 + minute,
      endMinute: dayIndex * 1440 + minute + 480,
    })),
  ),
  rules: { longestRunDays: 5 },
});

let outcome: RosterOutcome;
let solved: SolvedRoster;
beforeAll(async () => {
  outcome = await solveRoster(problem, { limitSeconds: 20 });
  if (outcome.kind !== 'optimal') throw new Error(outcome.kind);
  solved = outcome;
});
afterAll(closeSolver);

const recheck = (claims: Partial<SolvedRoster> = {}) => {
  const claimed: RosterOutcome = { kind: 'good-enough', ...solved, ...claims };
  const { signal } = new AbortController();
  return recheckBound(problem, claimed, judgeOutcome(problem, claimed), signal);
};

const record = (): BoundRecord => {
  if (!solved.boundRecord) throw new Error('no record');
  return solved.boundRecord;
};

test('the record of a solved roster is confirmed, and the proof keeps both figures', async () => {
  const verdict = await recheck();
  expect(verdict).toMatchObject({
    kind: 'adopt',
    proof: {
      bound: {
        solverCents: solved.boundCents,
        sentence: expect.stringMatching(
          /^No roster can cost less than €[\d,]+\.\d\d: reckoned anew/,
        ),
      },
    },
  });
  const rechecked = verdict.kind === 'adopt' ? verdict.proof.bound?.recheckedCents : null;
  expect(rechecked).toBeLessThanOrEqual(solved.costCents);
  expect(rechecked).toBeGreaterThanOrEqual((solved.recordedBoundCents ?? 0) - 100);
});

test('a record in which a price was changed does not give the bound any more', async () => {
  const slices = record().slices.map((slice) => ({ ...slice, cents: slice.cents * 0.5 }));
  const verdict = await recheck({ boundRecord: { ...record(), slices } });
  expect(verdict).toMatchObject({
    kind: 'refuse',
    sentence: expect.stringMatching(
      /^The independent re-check refused the bound: The solver reckons/,
    ),
    proof: { costCents: solved.costCents, bound: { solverCents: solved.boundCents } },
  });
});

test('a record that prices what the problem does not have is refused', async () => {
  const slices = record().slices.map((slice) => ({ ...slice, skillId: 'vet' }));
  expect(await recheck({ boundRecord: { ...record(), slices } })).toMatchObject({
    kind: 'refuse',
    sentence: expect.stringContaining('where the problem asks for nothing'),
  });
});

test('a bound that is higher than its record gives is refused', async () => {
  const recordedBoundCents = (solved.recordedBoundCents ?? 0) + 1000;
  expect(await recheck({ recordedBoundCents })).toMatchObject({
    kind: 'refuse',
    sentence: expect.stringContaining(`The solver reckons ${recordedBoundCents} minor units`),
  });
});

test('without a record the roster is adopted and the proof says that its bound was not re-checked', async () => {
  expect(await recheck({ boundRecord: null, recordedBoundCents: null })).toMatchObject({
    kind: 'adopt',
    boundCents: solved.boundCents,
    proof: { bound: { recheckedCents: null, sentence: expect.stringContaining('no record') } },
  });
});

test('what was refused already stays refused', async () => {
  expect(await recheck({ costCents: solved.costCents + 1 })).toMatchObject({
    kind: 'refuse',
    sentence: expect.stringContaining('minor units of cost'),
  });
});
