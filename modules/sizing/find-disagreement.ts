import type { SizingAnswer, SizingProblem } from '../problem';
import { proveSizing } from '../proof';

/**
 * Compares an answer with its independent re-check: objective, missing minutes and limits. Answers
 * what differs in one line for the log, or null. Both sides are whole numbers and must be equal.
 */
export function findDisagreement(problem: SizingProblem, answer: SizingAnswer): string | null {
  const proof = proveSizing(problem, answer.people);
  if (!proof.capsHold) return 'a limit on people is exceeded';
  if (proof.shortageMinutes !== answer.shortageMinutes) {
    return `missing minutes: answered ${answer.shortageMinutes}, re-checked ${proof.shortageMinutes}`;
  }
  if (answer.floorsHold !== (proof.shortageMinutes === 0)) return 'whether the floors hold';
  if (proof.objective !== answer.objective) {
    return `objective: answered ${answer.objective}, re-checked ${proof.objective}`;
  }
  return answer.provenBound > answer.objective + Math.max(1, answer.objective) * 1e-6
    ? `the bound ${answer.provenBound} is above the objective ${answer.objective}`
    : null;
}
