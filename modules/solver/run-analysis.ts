import type { AnalysisAnswer, AnalysisJob } from './analysis-job';
import type { AnalysisTools } from './analysis-tools';
import { findKnots } from './knots/find-knots';
import type { RosterSearch } from './knots/way-out';
import { waysOut } from './knots/ways-out';
import { mendRoster } from './mend/mend-roster';
import type { SolverMessage } from './messages';
import { curveOfPeople } from './prices/curve-of-people';
import { curveOfFloors, priceFloors } from './prices/price-floors';
import { noPeer } from './search/peer-link';
import { searchLane } from './search/search-lane';

/** A way out is told when its cost is within this of its bound. */
const wayOutGap = 0.001;

/** Does one analysis; blocks its thread until the end. */
export function runAnalysis(
  tools: AnalysisTools,
  job: AnalysisJob,
  send: (message: SolverMessage) => void,
): AnalysisAnswer {
  switch (job.kind) {
    case 'knots':
      return findKnots(tools, job.problem, job.options);
    case 'waysOut':
      return waysOut(tools, searchWith(tools), job.problem, job.members, job.options, (wayOut) =>
        send({ kind: 'wayOut', wayOut }),
      );
    case 'prices':
      return priceFloors(tools, job.problem, job.questions, job.options);
    case 'floorCurve':
      return curveOfFloors(tools, job.problem, job.family, job.changes, job.options.limitSeconds);
    case 'peopleCurve':
      return curveOfPeople(
        tools,
        job.problem,
        job.personId,
        job.mostMore,
        job.options.limitSeconds,
      );
    case 'mend':
      return mendRoster(tools, job.problem, job.roster, job.options, (takeOvers) =>
        send({ kind: 'takeOvers', takeOvers }),
      );
  }
}

/** The search for rosters on this thread alone. */
export const searchWith =
  (tools: AnalysisTools): RosterSearch =>
  (problem, { limitSeconds, start }) => {
    const outcome = searchLane(
      tools,
      problem,
      { limitSeconds, workSeconds: null, targetGap: wayOutGap, seed: 0, start },
      { number: 0, isAlone: true, peer: noPeer },
      { ...tools, onProgress: () => undefined, onRoster: () => undefined },
    );
    switch (outcome.kind) {
      case 'optimal':
      case 'good-enough':
      case 'out-of-time':
        return { ...outcome, isProven: outcome.kind === 'optimal' };
      case 'stopped':
        return outcome.best && { ...outcome.best, isProven: false };
      default:
        return null;
    }
  };
