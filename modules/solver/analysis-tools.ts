import type { LinearModel } from '../model';
import type { LinearSession } from './linear-session';
import type { LinearSolver } from './linear-solver';

/** What every analysis of a problem works with. */
export interface AnalysisTools {
  readonly solve: LinearSolver;
  /** Keeps a plain linear program in the solver for one of its objectives. */
  readonly open: (model: LinearModel, objectiveName: string) => LinearSession;
  readonly isStopRequested: () => boolean;
  /** Milliseconds on a clock that only runs forward. */
  readonly clock: () => number;
}

/** The time of one analysis. */
export interface TimeLeft {
  readonly seconds: () => number;
  readonly isOver: () => boolean;
}

/** Counts down from now on; a stop ends the time too. */
export function countDown(
  { clock, isStopRequested }: Pick<AnalysisTools, 'clock' | 'isStopRequested'>,
  limitSeconds: number,
): TimeLeft {
  const endsAt = clock() + limitSeconds * 1000;
  const seconds = (): number => Math.max(0, (endsAt - clock()) / 1000);
  return { seconds, isOver: () => isStopRequested() || seconds() <= 0 };
}
