import type { Problem } from '../problem';
import { type Proof, proveRoster } from '../proof';
import { matchShifts } from './match-shifts';
import type { KeptShift, Version } from './stored';
import type { TeamWords } from './team-words';

/**
 * The proof of a version: as it was stored for a published one; for a draft made anew from today's
 * data, so that a changed floor, leave or rule shows at once. null while nothing is planned.
 */
export function proofOf(
  version: Version,
  shifts: readonly KeptShift[],
  words: TeamWords,
  problem: () => Problem,
): Proof | null {
  if (shifts.length === 0) return null;
  if (version.publishedAtUtc !== null) return version.proof;
  return proveShifts(problem(), shifts, words);
}

/** Re-checks kept shifts against a problem; what no longer fits today's data is a breach. */
export function proveShifts(
  problem: Problem,
  shifts: readonly KeptShift[],
  words: TeamWords,
): Proof {
  const matched = matchShifts(problem, shifts, {
    person: words.person,
    kind: (id) => words.kind(id).name,
  });
  const proof = proveRoster(problem, matched.roster);
  return { ...proof, breaches: [...matched.breaches, ...proof.breaches] };
}
