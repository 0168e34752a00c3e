import type { PlannedRoster, Problem } from '../../problem';
import { explainClash } from '../explain-clash';
import type { LinearSolver } from '../linear-solver';
import { anneal, layAll } from '../lines/anneal';
import { LinePool } from '../lines/line-pool';
import type { OpenSession } from '../lines/pattern-master';
import { seededRandom } from '../lines/random';
import type { RosterOutcome } from '../roster-outcome';
import { findClashes, type Ground, prepareGround, putRoster } from './first-roster';
import { Improvement } from './improve';
import { layByModel } from './lay-by-model';
import { type Pace, paceByClock, paceByWork } from './pace';
import type { PeerLink } from './peer-link';
import { boundByPatterns, isClose, isSmall, searchTree } from './prove-cost';
import { proveLevels } from './prove-levels';
import { raiseByPrices, relaxCompact } from './relax';
import { type SearchHooks, SearchState } from './search-state';
import { temperatures } from './temperatures';

export interface RosterOptions {
  readonly limitSeconds: number;
  /** Nominal seconds of counted work instead of the clock, so that a run repeats itself; null: the clock. */
  readonly workSeconds: number | null;
  /** Relative gap of the cost at which to stop; 0 searches to the end. */
  readonly targetGap: number;
  readonly seed: number;
  /** A roster that breaks no rule, e.g. the draft: the search never ends with a worse one. */
  readonly start: PlannedRoster | null;
}

/** The two ways in which a lane can solve linear models. */
export interface LinearTools {
  readonly solve: LinearSolver;
  readonly open: OpenSession;
}

/**
 * Lane 0 finds a first roster, relaxes, proves and, when that is done or too hard, improves. Lane 1
 * searches for better rosters; where the relaxation is close it also tries a bound by patterns (`assist`).
 * A run on one thread has lane 0 alone.
 */
export interface Lane {
  readonly number: 0 | 1;
  readonly isAlone: boolean;
  readonly peer: PeerLink;
}

interface Search extends LinearTools {
  readonly ground: Ground;
  readonly state: SearchState;
  readonly pace: Pace;
  readonly random: () => number;
  readonly options: RosterOptions;
  readonly lane: Lane;
  readonly pool: LinePool;
}

/** Nominal seconds of the first annealing, before anything guides it. */
const firstAnneal = 0.35;
/** Share of what is left, and nominal seconds at most, of the guided annealing. */
const shortAnneal = { share: 0.08, most: 2 };
const longAnneal = { share: 0.25, most: 12 };
/** Shares of what is left: for column generation, for a short try of it, for a search tree. */
const columnShare = 0.35;
const tryShare = 0.15;
const treeShare = { alone: 0.35, accompanied: 0.6 };

/** One lane of a search; blocks its thread until the end, and then leaves the other lane alone. */
export function searchLane(
  tools: LinearTools,
  problem: Problem,
  options: RosterOptions,
  lane: Lane,
  hooks: SearchHooks,
): RosterOutcome {
  try {
    return search(tools, problem, options, lane, hooks);
  } finally {
    lane.peer.end();
  }
}

function search(
  tools: LinearTools,
  problem: Problem,
  options: RosterOptions,
  lane: Lane,
  hooks: SearchHooks,
): RosterOutcome {
  const startedAt = hooks.clock();
  const pace =
    options.workSeconds === null
      ? paceByClock(hooks.clock, options.limitSeconds)
      : paceByWork(options.workSeconds);
  const ground = prepareGround(problem);
  const clashes = findClashes(ground);
  if (clashes.length > 0) return explainClashes(tools.solve, problem, clashes);
  const given = { targetGap: options.targetGap, startedAt };
  const state = new SearchState(ground, pace, lane.peer, hooks, given);
  const random = seededRandom(options.seed * 2 + lane.number);
  const all: Search = {
    ...tools,
    ground,
    state,
    pace,
    random,
    options,
    lane,
    pool: new LinePool(problem.people.length),
  };
  const failure = runLane(all);
  state.fetchFromPeer();
  state.report(true);
  // A solver that breaks late leaves the best roster, unproven: it is lawful all the same.
  const isLost = failure !== null && (failure.kind === 'impossible' || state.best === null);
  return isLost ? failure : conclude(state, options);
}

function explainClashes(
  solve: LinearSolver,
  problem: Problem,
  clashes: readonly number[],
): RosterOutcome {
  return {
    kind: 'impossible',
    clashes: clashes.flatMap((position) => {
      const person = problem.people[position];
      if (!person) return [];
      const alone = { ...problem, people: [person] };
      return [{ personId: person.id, sentence: explainClash(solve, alone, person) }];
    }),
  };
}

type Failure = Extract<RosterOutcome, { kind: 'failed' | 'impossible' }>;

function runLane(search: Search): Failure | null {
  const { state, lane } = search;
  const impossible = findFirst(search);
  if (impossible) return impossible;
  if (lane.number === 0) {
    const sentence = prove(search);
    if (sentence) return { kind: 'failed', message: sentence };
  } else assist(search);
  improve(search);
  state.fetchFromPeer();
  return null;
}

/** The given roster, if any, and a first one of our own, annealed for a moment. */
function findFirst(search: Search): Failure | null {
  const { ground, state, options, random, solve, pace } = search;
  if (options.start && putRoster(ground, options.start).length === 0) state.offerLines(ground);
  if (!options.start || state.best === null) {
    ground.lines.isIn.fill(0);
    ground.lines.recount();
  }
  const left = layAll(ground.lines, ground.refill, { random, worth: null });
  for (const person of left) {
    const laid = layByModel(ground, person, solve, pace);
    if (laid === 'impossible') {
      return explainClashes(solve, ground.model.problem, [person]) as Failure;
    }
  }
  state.offerLines(ground);
  annealFor(search, firstAnneal);
  return null;
}

/**
 * Lane 0: relaxation, least levels, least cost. Where the relaxation is close, a search tree over the
 * compact model comes first, elsewhere whole-period patterns. A sentence when the solver breaks.
 */
function prove(search: Search): string | null {
  const { ground, state, pace, lane, solve, options } = search;
  if (state.isOver) return null;
  const prices = relaxCompact(ground, state, solve, pace);
  state.fetchFromPeer();
  if (lane.isAlone || state.best?.levels.some((value) => value > 0)) annealGuided(search);
  const failure = proveLevels({ ground, state, solve, pace, seed: options.seed });
  if (failure || state.isOver) return failure;
  if (prices) raiseByPrices(ground, state, prices);
  const proof = { ...search, seed: options.seed };
  if (prices && isClose(proof)) {
    const broken = searchTree(proof, lane.isAlone ? treeShare.alone : treeShare.accompanied);
    if (!broken && !state.isOver) boundByPatterns(proof, columnShare);
    return broken;
  }
  boundByPatterns(proof, columnShare);
  return state.isOver || !isSmall(ground) ? null : searchTree(proof, treeShare.alone);
}

/** Lane 1: while lane 0 is busy with a search tree, patterns may settle what the tree does not. */
function assist(search: Search): void {
  annealGuided(search);
  const { state, options } = search;
  if (!state.isOver && isClose(search)) {
    boundByPatterns({ ...search, seed: options.seed }, tryShare);
  }
}

/** Where the relaxation is close to the best roster, small parts solved exactly gain more than annealing. */
function annealGuided(search: Search): void {
  search.state.fetchFromPeer();
  const { most, share } = isClose(search) ? shortAnneal : longAnneal;
  annealFor(search, Math.min(most, search.pace.remaining() * share));
  search.state.fetchFromPeer();
}

/** Anneals the lines of the ground, from the best roster when there is one. */
function annealFor({ ground, state, pace, random, pool }: Search, seconds: number): void {
  if (state.best) putRoster(ground, state.best.roster);
  if (ground.lines.isIn.some((isIn) => isIn === 0)) return;
  const startedAt = pace.elapsed();
  let counted = ground.refill.work;
  const { hotCents, coldCents } = temperatures(ground);
  let shownAt = startedAt;
  let batches = 0;
  anneal(ground.lines, ground.refill, {
    progress: () => {
      pace.countArcs(ground.refill.work - counted);
      counted = ground.refill.work;
      batches += 1;
      if (batches % batchesAPool === 0) pool.take(ground.lines);
      return state.isOver ? 1 : (pace.elapsed() - startedAt) / seconds;
    },
    hotCents,
    coldCents,
    random,
    worth: state.worth,
    onBest: () => {
      // Weighing takes longer than a move: better rosters are shown a few times a second.
      if (pace.isCounted || pace.elapsed() - shownAt < showEvery) return;
      shownAt = pace.elapsed();
      state.offerLines(ground);
    },
  });
  state.offerLines(ground);
}

const showEvery = 0.25;
/** Batches of moves between two looks at the lines for the pool. */
const batchesAPool = 10;

/** Fix and optimise until the end. */
function improve(search: Search): void {
  const { state, pace } = search;
  const improvement = new Improvement(search);
  while (!state.isOver) {
    improvement.step();
    pace.countArcs(0);
    state.fetchFromPeer();
  }
}

function conclude(state: SearchState, options: RosterOptions): RosterOutcome {
  const solved = state.solved();
  if (state.isStopRequested) return { kind: 'stopped', best: solved };
  if (!solved) {
    return {
      kind: 'failed',
      message: 'The time was over before a first lawful roster was found; allow more seconds.',
    };
  }
  if (!state.isProven()) return { kind: 'out-of-time', ...solved };
  if (state.isOptimal(solved)) return { kind: 'optimal', ...solved };
  return { kind: solved.gap <= options.targetGap ? 'good-enough' : 'out-of-time', ...solved };
}
