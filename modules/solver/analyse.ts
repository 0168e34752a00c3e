import type { PlannedRoster, Problem, Requirement } from '../problem';
import type { AnalysisAnswer, AnalysisJob } from './analysis-job';
import type { KnotOptions, KnotsAnswer } from './knots/knot';
import type { WayOut, WaysOutOptions } from './knots/way-out';
import type { MendOptions, MendOutcome, TakeOver } from './mend/mending';
import type { SolverMessage } from './messages';
import type { CurvePoint, FloorPrice, PriceOptions, PriceQuestion } from './prices/floor-price';
import type { SolverFailure } from './roster-outcome';
import { runJob } from './run-job';
import { settle } from './settle';

/** How an analysis ends; `ended` without an answer: stopped or out of time before it had one. */
export type AnalysisOutcome<T> =
  | { readonly kind: 'answered'; readonly answer: T }
  | { readonly kind: 'ended'; readonly wasStopped: boolean }
  | SolverFailure;

interface Stoppable {
  readonly stop?: AbortSignal;
}

/** Why floors cannot be held, in a solver thread. Never rejects. */
export const solveKnots = (
  problem: Problem,
  { stop, ...options }: KnotOptions & Stoppable,
): Promise<AnalysisOutcome<KnotsAnswer>> => analyse({ kind: 'knots', problem, options }, stop);

/** What loosening the members of a knot does, told one by one, in a solver thread. Never rejects. */
export async function solveWaysOut(
  problem: Problem,
  members: readonly Requirement[],
  {
    stop,
    onWayOut,
    ...options
  }: WaysOutOptions & Stoppable & { readonly onWayOut?: (wayOut: WayOut) => void },
): Promise<AnalysisOutcome<readonly WayOut[]>> {
  let told = 0;
  const job = { kind: 'waysOut', problem, members, options } as const;
  const outcome = await analyse<readonly WayOut[]>(job, stop, (message) => {
    if (message.kind !== 'wayOut') return;
    told += 1;
    onWayOut?.(message.wayOut);
  });
  // The last messages of a thread may be overtaken by its answer.
  if (outcome.kind === 'answered') for (const way of outcome.answer.slice(told)) onWayOut?.(way);
  return outcome;
}

/** About what one person more or less on floors costs, in a solver thread. Never rejects. */
export const estimatePrices = (
  problem: Problem,
  questions: readonly PriceQuestion[],
  { stop, ...options }: PriceOptions & Stoppable,
): Promise<AnalysisOutcome<readonly FloorPrice[]>> =>
  analyse({ kind: 'prices', problem, questions, options }, stop);

/** Least cost against people on a family of floors, in a solver thread. Never rejects. */
export const estimateFloorCurve = (
  problem: Problem,
  family: readonly PriceQuestion[],
  changes: readonly number[],
  { stop, limitSeconds }: { readonly limitSeconds: number } & Stoppable,
): Promise<AnalysisOutcome<readonly CurvePoint[]>> =>
  analyse({ kind: 'floorCurve', problem, family, changes, options: { limitSeconds } }, stop);

/** Least cost against the number of people like one, in a solver thread. Never rejects. */
export const estimatePeopleCurve = (
  problem: Problem,
  personId: string,
  mostMore: number,
  { stop, limitSeconds }: { readonly limitSeconds: number } & Stoppable,
): Promise<AnalysisOutcome<readonly CurvePoint[]>> =>
  analyse({ kind: 'peopleCurve', problem, personId, mostMore, options: { limitSeconds } }, stop);

/** Mends a roster after absences, in a solver thread; take-overs are told at once. Never rejects. */
export async function solveMending(
  problem: Problem,
  roster: PlannedRoster,
  {
    stop,
    onTakeOvers,
    ...options
  }: MendOptions & Stoppable & { readonly onTakeOvers?: (found: readonly TakeOver[]) => void },
): Promise<AnalysisOutcome<MendOutcome>> {
  let isTold = false;
  const job = { kind: 'mend', problem, roster, options } as const;
  const outcome = await analyse<MendOutcome>(job, stop, (message) => {
    if (message.kind !== 'takeOvers') return;
    isTold = true;
    onTakeOvers?.(message.takeOvers);
  });
  const answer = outcome.kind === 'answered' ? outcome.answer : null;
  const mended = answer?.kind === 'mended' ? answer : null;
  if (!isTold && mended) onTakeOvers?.(mended.takeOvers);
  return outcome;
}

async function analyse<T extends NonNullable<AnalysisAnswer>>(
  job: AnalysisJob,
  stop: AbortSignal | undefined,
  onMessage: (message: SolverMessage) => void = () => undefined,
): Promise<AnalysisOutcome<T>> {
  const { limitSeconds } = job.options;
  const end = await runJob<T | null>(job, { limitSeconds, stop, onMessage });
  if (end.kind === 'killed') return { kind: 'ended', wasStopped: end.wasStopped };
  if (end.kind === 'broken') return settle(end);
  return end.answer === null
    ? { kind: 'ended', wasStopped: stop?.aborted ?? false }
    : { kind: 'answered', answer: end.answer };
}
