import type { PlannedRoster, Problem } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import type { KnotsAnswer, RosterOutcome, SolvedRoster } from '@/modules/solver';
import type { AnalysisOutcome } from '@/modules/solver/server';

type Solve = (
  problem: Problem,
  options: { stop: AbortSignal; onRoster: (roster: PlannedRoster) => void },
) => Promise<RosterOutcome>;
type Look = (
  problem: Problem,
  options: { stop: AbortSignal; shortAtMinutes: readonly number[] },
) => Promise<AnalysisOutcome<KnotsAnswer>>;

/** What stands in for the solver where its answers are what is under test. */
export const solver: { solve: Solve; knots: Look } = {
  solve: () => Promise.reject(),
  knots: () => Promise.reject(),
};

/** In place of the same exports of the solver's server door. */
export const standIns = {
  solveRoster: (...call: Parameters<Solve>) => solver.solve(...call),
  solveKnots: (...call: Parameters<Look>) => solver.knots(...call),
};

/** Ada takes the Early of Monday and nobody anything else: lawful, and 13 shifts short. */
export const onlyMonday = (problem: Problem, nurse = 0): PlannedRoster => [
  {
    personId: problem.people[nurse]?.id ?? '',
    shiftIndex: 0,
    postSkillId: problem.skills[0]?.id ?? '',
  },
];

/** What the solver says of a roster: what the re-check finds, but for some claims. */
export function solved(
  problem: Problem,
  roster: PlannedRoster,
  claims: Partial<SolvedRoster> = {},
): SolvedRoster {
  const { shortageMinutes, shortageByPriority, costCents } = proveRoster(problem, roster);
  return {
    roster,
    shortageMinutes,
    shortageBoundMinutes: shortageMinutes,
    costCents,
    boundCents: costCents,
    gap: 0,
    levels: shortageByPriority.map(({ minutes }) => minutes),
    boundRecord: null,
    recordedBoundCents: null,
    ...claims,
  };
}

export const optimal = (...found: Parameters<typeof solved>): RosterOutcome => ({
  kind: 'optimal',
  ...solved(...found),
});
