import { writeFileSync } from 'node:fs';
import type { RosterOutcome, SolvedRoster } from '@/modules/solver';
import { closeSolver, solveRoster } from '@/modules/solver/server';
import { centsPerPoint, problemOf, tableOf } from './adapt-instance';
import { agreedObjective } from './agreed-objective';
import { BestSoFar } from './best-so-far';
import {
  CommandError,
  callersPath,
  numberOption,
  readOptions,
  secondsOption,
  seedOption,
  threadsOption,
} from './command-line';
import { loadInstance } from './load-instance';
import { scoreRoster } from './score-roster';

/** Times at which the answer tells the best objective. */
const readings = [3, 10, 30];

/** Solves one instance of the open format and prints one line of JSON. */
export async function main(args: readonly string[]): Promise<void> {
  const startedAt = performance.now();
  const elapsed = () => (performance.now() - startedAt) / 1000;
  const options = readOptions(args, ['file', 'seconds', 'threads', 'seed', 'out']);
  const limitSeconds = numberOption(options, 'seconds', secondsOption);
  const seed = numberOption(options, 'seed', seedOption);
  process.env.SOLVER_THREADS = String(numberOption(options, 'threads', threadsOption));
  if (options.file === undefined) throw new CommandError('--file names the instance to solve.');
  const instance = loadInstance(options.file);
  const problem = problemOf(instance);
  const best = new BestSoFar();
  try {
    const outcome = await solveRoster(problem, {
      limitSeconds,
      seed,
      onRoster: (roster) => {
        const { objective, breaches } = scoreRoster(instance, tableOf(instance, roster));
        if (breaches.length === 0) best.see({ seconds: elapsed(), objective, bound: null });
      },
    });
    const seconds = elapsed();
    const solved = solvedOf(outcome);
    const objective = agreedObjective(instance, solved);
    best.see({ seconds, objective, bound: null });
    const answer = {
      objective,
      // Every weight is whole, so a bound of 606.2 says 607.
      bound: Math.ceil(solved.boundCents / centsPerPoint),
      seconds: Math.round(seconds * 100) / 100,
      at: best.readings(limitSeconds, readings),
      roster: tableOf(instance, solved.roster),
    };
    const line = `${JSON.stringify(answer)}\n`;
    if (options.out !== undefined) writeFileSync(callersPath(options.out), line);
    process.stdout.write(line);
  } finally {
    await closeSolver();
  }
}

function solvedOf(outcome: RosterOutcome): SolvedRoster {
  switch (outcome.kind) {
    case 'optimal':
    case 'good-enough':
    case 'out-of-time':
      return outcome;
    case 'stopped':
      if (outcome.best) return outcome.best;
      throw new CommandError('The run was stopped before a first roster.');
    case 'impossible':
      throw new CommandError(outcome.clashes.map(({ sentence }) => sentence).join('\n'));
    case 'failed':
      throw new CommandError(`${outcome.message} ${outcome.cause ?? ''}`.trim());
  }
}
