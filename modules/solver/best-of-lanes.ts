import type { RosterProgress, SolvedRoster } from './roster-outcome';

/** The best roster that either lane has told of. */
export class BestOfLanes {
  solved: SolvedRoster | null = null;

  /** Takes a roster that is better than the best: levels first, then cost. */
  take(found: SolvedRoster): boolean {
    if (this.solved && !isBetter(found, this.solved)) return false;
    this.solved = found;
    return true;
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

function isBetter(one: SolvedRoster, other: SolvedRoster): boolean {
  const level = one.levels.findIndex((value, index) => value !== other.levels[index]);
  if (level < 0) return one.costCents < other.costCents;
  return (one.levels[level] ?? 0) < (other.levels[level] ?? 0);
}
