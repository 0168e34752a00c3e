import { blendObjective, buildRosterModel, readRoster, withLevelBlend } from '@/modules/model';
import type { RosterOutcome, SolvedRoster } from '@/modules/solver';
import { closeSolver, solveLinear, solveRoster } from '@/modules/solver/server';
import { BestSoFar } from './best-so-far';
import { type CaseAnswer, type CaseOrder, timedGaps } from './case-messages';
import { boundFigureOf, figureOf } from './figure';
import { watchMemory } from './watch-memory';

/*
 * The body of a process of its own: takes one order, answers it and ends.
 */
process.once('message', async (order: CaseOrder) => {
  const answer = await (order.method === 'engine' ? runEngine(order) : runHighs(order));
  await closeSolver();
  process.send?.(answer, () => process.disconnect());
});
// Also when whoever asked is gone: nothing may go on computing for nobody.
process.once('disconnect', () => process.exit());

async function runEngine(order: CaseOrder): Promise<CaseAnswer> {
  const { problem, scale, limitSeconds, seed } = order;
  const elapsed = stopwatch();
  const peak = watchMemory();
  const best = new BestSoFar();
  let secondsToFirst: number | null = null;
  const see = (seen: SeenFigures) => {
    const seconds = elapsed();
    if (seen.shortageMinutes === 0) secondsToFirst ??= seconds;
    best.see({
      seconds,
      objective: figureOf(seen.costCents, seen.shortageMinutes, scale),
      bound: boundFigureOf(seen.boundCents, seen.shortageBoundMinutes, scale),
    });
  };
  const outcome = await solveRoster(problem, {
    limitSeconds,
    seed,
    onProgress: (progress) => see({ ...progress, costCents: progress.bestCostCents }),
  });
  const seconds = elapsed();
  const solved = solvedOf(outcome);
  if (solved) see(solved);
  return {
    roster: solved?.roster ?? null,
    costCents: solved?.costCents ?? null,
    bound: solved ? boundFigureOf(solved.boundCents, solved.shortageBoundMinutes, scale) : null,
    seconds,
    at: best.readings(limitSeconds),
    secondsToFirst,
    secondsToGap: Object.fromEntries(timedGaps.map((gap) => [gap, best.secondsToGap(gap)])),
    peakMegabytes: peak(),
    failure: solved ? null : failureOf(outcome),
  };
}

interface SeenFigures {
  readonly costCents: number | null;
  readonly boundCents: number | null;
  readonly shortageMinutes: number | null;
  readonly shortageBoundMinutes: number | null;
}

async function runHighs(order: CaseOrder): Promise<CaseAnswer> {
  const { problem, scale, limitSeconds, seed } = order;
  const elapsed = stopwatch();
  const peak = watchMemory();
  const model = withLevelBlend(buildRosterModel(problem));
  const outcome = await solveLinear(model.linear, blendObjective, { limitSeconds, seed });
  const solution = 'solution' in outcome ? outcome.solution : null;
  const bound = 'bound' in outcome && Number.isFinite(outcome.bound) ? outcome.bound : null;
  return {
    roster: solution ? readRoster(model, solution.values) : null,
    costCents: null,
    bound: boundFigureOf(bound, 0, scale),
    seconds: elapsed(),
    at: {},
    secondsToFirst: null,
    secondsToGap: {},
    peakMegabytes: peak(),
    failure: solution ? null : outcome.kind,
  };
}

function stopwatch(): () => number {
  const startedAt = performance.now();
  return () => (performance.now() - startedAt) / 1000;
}

function solvedOf(outcome: RosterOutcome): SolvedRoster | null {
  if (outcome.kind === 'stopped') return outcome.best;
  return outcome.kind === 'impossible' || outcome.kind === 'failed' ? null : outcome;
}

function failureOf(outcome: RosterOutcome): string {
  if (outcome.kind === 'impossible') return outcome.clashes.map((one) => one.sentence).join(' ');
  return outcome.kind === 'failed'
    ? `${outcome.message} ${outcome.cause ?? ''}`.trim()
    : outcome.kind;
}
