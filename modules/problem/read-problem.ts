import { type Outcome, ok, refuse } from '../units';
import { findReferenceFaults } from './find-reference-faults';
import { type Problem, problemSchema } from './problem';
import { nameFault } from './problem-faults';
import { upgradeProblem } from './upgrade-problem';

/**
 * Reads a problem from a file or from a stored run, of this version or an older one. What is not known
 * is refused by its name and never ignored: a rule left out would give rosters that break it. At most
 * 20 faults are told at once.
 */
export function readProblem(document: unknown): Outcome<Problem> {
  const parsed = problemSchema.safeParse(upgradeProblem(document));
  const faults = parsed.success
    ? findReferenceFaults(parsed.data)
    : parsed.error.issues.map((issue) => nameFault(document, issue));
  const [first] = faults;
  if (first) return refuse('invalid', first.message, faults.slice(0, mostFaults));
  return parsed.success ? ok(parsed.data) : refuse('invalid', 'This is no problem document.');
}

const mostFaults = 20;
