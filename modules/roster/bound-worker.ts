import { buildRosterModel, costGrid, roundingSlackCents } from '../model';
import type { BoundRecord, Problem } from '../problem';
import { type BoundProof, type Proof, proveBound } from '../proof';
import type { ThreadTask } from '../solver';

/** A record of the solver, and what the roster that it was given with is short and in surplus by. */
export interface BoundJob {
  readonly problem: Problem;
  readonly record: BoundRecord;
  readonly figures: Pick<Proof, 'shortageByPriority' | 'surplusMinutes'>;
}

export interface BoundAnswer {
  readonly proof: BoundProof;
  /** What holds without any prices: everybody by themselves at their cheapest. */
  readonly plainCents: number;
  /** How far the solver's bound by the same record may lie above: it rounds other sums. */
  readonly roundingCents: number;
}

const noPrices: BoundRecord = {
  shortage: [],
  surplusCentsPerMinute: 0,
  slices: [],
  teamRules: [],
  spreads: [],
};

/** The body of a thread that reckons a bound anew; only the rounding is asked of the model. */
export default function work({ job, port }: ThreadTask<BoundJob>): BoundAnswer {
  try {
    port.postMessage({ kind: 'started' });
    const proof = proveBound(job.problem, job.record, job.figures);
    const plain = proveBound(job.problem, noPrices, job.figures);
    const plainCents = plain.kind === 'bound' ? plain.boundCents : 0;
    return { proof, plainCents, roundingCents: roundingOf(job) };
  } finally {
    port.close();
  }
}

/**
 * Pay of the model and pay in whole cents differ by the slack, once on each side; the solver rounds up to
 * the next cost that there can be; and sums of floating-point numbers err in proportion to their size.
 */
function roundingOf({ problem, record, figures }: BoundJob): number {
  const model = buildRosterModel(problem);
  const charged = figures.shortageByPriority.reduce((sum, { priority, minutes }) => {
    const price = record.shortage.find((one) => one.priority === priority)?.centsPerMinute ?? 0;
    return sum + price * minutes;
  }, record.surplusCentsPerMinute * figures.surplusMinutes);
  const rounded = 2 * roundingSlackCents(model) + costGrid(model).stepCents;
  return Math.ceil(rounded + charged * relativeError);
}

const relativeError = 1e-9;
