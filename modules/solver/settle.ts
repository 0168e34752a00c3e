import type { SolverFailure } from './roster-outcome';
import type { JobEnd } from './run-job';

/** The answer of a job, or that its thread broke, as a sentence. */
export function settle<T>(end: Exclude<JobEnd<T>, { kind: 'killed' }>): T | SolverFailure {
  if (end.kind === 'answered') return end.answer;
  return {
    kind: 'failed',
    message: 'The solver broke off; run again, and with fewer people or days if it happens again.',
    cause: end.cause,
  };
}
