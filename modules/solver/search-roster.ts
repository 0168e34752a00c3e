import { buildRosterModel, placeRoster, type RosterModel, relaxed, withRowBounds } from '../model';
import type { PlannedRoster, Problem } from '../problem';
import type { LinearOutcome } from './linear-outcome';
import type { LinearOptions, LinearSolver } from './linear-solver';
import { planInTurn } from './plan-in-turn';
import type { RosterOutcome } from './roster-outcome';
import { type SearchHooks, SearchState } from './search-state';

export interface RosterOptions {
  readonly limitSeconds: number;
  /** Relative gap of the cost at which to stop; 0 searches to the end. */
  readonly targetGap: number;
  readonly seed: number;
  /** A roster that breaks no rule, e.g. the draft: the search never ends with a worse one. */
  readonly start: PlannedRoster | null;
}

/** Share of the time for a roster that reaches the bound of the relaxation, when none is found. */
const shortcutShare = 0.25;
/** Share of the remaining time for the least shortage, when it is not proven. */
const stageOneShare = 0.6;
/** Costs are whole cents: less than one between cost and bound proves the cost. */
const wholeCentGap = 0.9;

/**
 * Least shortage first, then least cost with the shortage kept at its least; both with proven bounds.
 *
 * 0. One person after the other: a first lawful roster, and the names of those whose own rules clash.
 * 1. The linear relaxation bounds the shortage from below. The shortcut looks at once for the cheapest
 *    roster that reaches this bound: when there is one, it proves stage one too. Otherwise the least
 *    shortage is searched for, starting from the best roster so far.
 * 2. The cheapest roster with at most that shortage, starting from the best roster so far.
 */
export function searchRoster(
  solve: LinearSolver,
  problem: Problem,
  options: RosterOptions,
  hooks: SearchHooks,
): RosterOutcome {
  const model = buildRosterModel(problem);
  const state = new SearchState(model, options.limitSeconds, hooks);
  const stoppable: LinearSolver = (linear, objective, given) =>
    solve(linear, objective, { ...given, shouldStop: () => state.isStopRequested });
  const first = planInTurn(stoppable, model, () => state.remainingSeconds());
  if (first.kind === 'impossible') return first;
  if (first.kind === 'lawful') state.offer(placeRoster(model, first.roster));
  if (options.start) state.offer(placeRoster(model, options.start));
  const failure = searchStages({ solve, model, state, options });
  state.report(true);
  return failure ?? conclude(state, options);
}

interface Search {
  readonly solve: LinearSolver;
  readonly model: RosterModel;
  readonly state: SearchState;
  readonly options: RosterOptions;
}

type Failure = Extract<RosterOutcome, { kind: 'failed' }>;

function searchStages(search: Search): Failure | null {
  const { state } = search;
  const failure = boundShortage(search);
  if (failure || isOver(state)) return failure;
  const shortcut = takeShortcut(search);
  if (shortcut === 'reached' || isOver(state)) return null;
  if (shortcut !== 'not-reached') return shortcut;
  const stageOne = state.isShortageProven ? null : leastShortage(search);
  return stageOne ?? (isOver(state) ? null : leastCost(search));
}

const isOver = (state: SearchState): boolean =>
  state.isStopRequested || state.remainingSeconds() <= 0;

/** Bound of stage one: the least shortage of the relaxation, rounded up to whole steps. */
function boundShortage({ solve, model, state }: Search): Failure | null {
  const outcome = solve(relaxed(model.linear), 'shortage', {
    limitSeconds: state.remainingSeconds(),
    shouldStop: () => state.isStopRequested,
  });
  if (outcome.kind === 'optimal') state.raiseShortageBound(outcome.bound);
  return failureOf(outcome);
}

function takeShortcut(search: Search): 'reached' | 'not-reached' | Failure {
  const { state, options } = search;
  const target = state.shortageBoundMinutes;
  const givesUpAt = state.remainingSeconds() - options.limitSeconds * shortcutShare;
  const isHopeless = () => !state.isShortageProven && state.remainingSeconds() < givesUpAt;
  const outcome = solveCost(search, target, isHopeless);
  if (outcome.kind === 'infeasible') {
    state.raiseShortageBound(target + state.stepMinutes);
    return 'not-reached';
  }
  return failureOf(outcome) ?? (state.isShortageProven ? 'reached' : 'not-reached');
}

/** Stage one to the end of its share: the least shortage and its bound. */
function leastShortage({ solve, model, state, options }: Search): Failure | null {
  const outcome = solve(model.linear, 'shortage', {
    ...searchOptions(state, options),
    limitSeconds: state.remainingSeconds() * stageOneShare,
    // One step less than the best is the next value there is.
    absoluteGap: state.stepMinutes * 0.99,
    onBound: (bound) => state.raiseShortageBound(bound),
  });
  if ('bound' in outcome) state.raiseShortageBound(outcome.bound);
  return failureOf(outcome);
}

function leastCost(search: Search): Failure | null {
  const { state } = search;
  state.beginStageTwo();
  return failureOf(solveCost(search, state.best?.shortageMinutes ?? Number.POSITIVE_INFINITY));
}

/** Stage two for a shortage of at most `mostMinutes`. `givesUp` may end it early. */
function solveCost(
  { solve, model, state, options }: Search,
  mostMinutes: number,
  givesUp: () => boolean = () => false,
): LinearOutcome {
  state.beginCostBound(mostMinutes);
  const lower = Number.NEGATIVE_INFINITY;
  const outcome = solve(
    withRowBounds(model.linear, model.shortageRow, lower, mostMinutes),
    'cost',
    {
      ...searchOptions(state, options),
      targetGap: options.targetGap,
      absoluteGap: wholeCentGap,
      onBound: (bound) => state.raiseCostBound(bound),
      shouldStop: () => state.isStopRequested || givesUp(),
    },
  );
  if ('bound' in outcome) state.raiseCostBound(outcome.bound);
  return outcome;
}

function searchOptions(state: SearchState, { seed }: RosterOptions): LinearOptions {
  return {
    limitSeconds: state.remainingSeconds(),
    seed,
    ...(state.best ? { start: state.best.values } : {}),
    onSolution: (values) => state.offer(values),
    shouldStop: () => state.isStopRequested,
  };
}

const failureOf = (outcome: LinearOutcome): Failure | null => {
  switch (outcome.kind) {
    case 'failed':
      return { kind: 'failed', message: outcome.message };
    case 'infeasible':
    case 'unbounded':
      return { kind: 'failed', message: `The solver contradicts itself: ${outcome.kind}.` };
    default:
      return null;
  }
};

function conclude(state: SearchState, options: RosterOptions): RosterOutcome {
  const solved = state.solved();
  if (state.isStopRequested) return { kind: 'stopped', best: solved };
  if (!solved) {
    return {
      kind: 'failed',
      message: 'The time was over before a first lawful roster was found; allow more seconds.',
    };
  }
  if (!state.isShortageProven) return { kind: 'out-of-time', ...solved };
  if (solved.costCents - solved.boundCents <= state.roundingCents)
    return { kind: 'optimal', ...solved };
  return { kind: solved.gap <= options.targetGap ? 'good-enough' : 'out-of-time', ...solved };
}
