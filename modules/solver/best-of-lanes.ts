import type { RosterOutcome, RosterProgress, SolvedRoster } from './roster-outcome';

/** The best roster that either lane has told of. */
export class BestOfLanes {
  solved: SolvedRoster | null = null;

  /** Takes a roster that is better than the best: levels first, then cost. */
  take(found: SolvedRoster): boolean {
    if (this.solved && !isBetter(found, this.solved)) return false;
    this.solved = found;
    return true;
  }

  /** The outcome of one lane with the best roster of both: the other may have told of a better one last. */
  complete(outcome: RosterOutcome): RosterOutcome {
    const { solved } = this;
    if (!solved) return outcome;
    switch (outcome.kind) {
      case 'stopped':
        if (outcome.best && !isBetter(solved, outcome.best)) return outcome;
        return { ...outcome, best: outcome.best ? withBoundsOf(solved, outcome.best) : solved };
      case 'optimal':
      case 'good-enough':
      case 'out-of-time':
        if (!isBetter(solved, outcome)) return outcome;
        return { ...withBoundsOf(solved, outcome), kind: outcome.kind };
      default:
        return outcome;
    }
  }

  /** A lane's report with the best figures of both. */
  tell(progress: RosterProgress): RosterProgress {
    if (!this.solved) return progress;
    const { shortageMinutes, costCents } = this.solved;
    const { boundCents } = progress;
    return {
      ...progress,
      shortageMinutes,
      bestCostCents: costCents,
      boundCents: boundCents === null ? null : Math.min(boundCents, costCents),
    };
  }
}

/** A roster with the bounds of another run where they hold for it: for the same levels. */
function withBoundsOf(solved: SolvedRoster, other: SolvedRoster): SolvedRoster {
  if (solved.levels.some((value, level) => value !== other.levels[level])) return solved;
  const { roster, costCents } = solved;
  const boundCents = Math.min(other.boundCents, costCents);
  const gap = costCents === 0 ? 0 : (costCents - boundCents) / Math.abs(costCents);
  return { ...other, roster, costCents, boundCents, gap };
}

function isBetter(one: SolvedRoster, other: SolvedRoster): boolean {
  const level = one.levels.findIndex((value, index) => value !== other.levels[index]);
  if (level < 0) return one.costCents < other.costCents;
  return (one.levels[level] ?? 0) < (other.levels[level] ?? 0);
}
