import { type ColumnGenerationResult, generateColumns } from '../lines/column-generation';
import type { Pattern } from '../lines/pattern-master';
import type { Ground } from './first-roster';
import { masterWork, type Pace } from './pace';
import type { LinearTools } from './search-lane';
import type { SearchState } from './search-state';

export interface Dive extends Pick<LinearTools, 'open'> {
  readonly ground: Ground;
  readonly state: SearchState;
  readonly pace: Pace;
  readonly random: () => number;
}

/** Share of the people left that each step settles, and the value at which a pattern settles anyway. */
const settledShare = 0.05;
const surely = 0.8;
/** Rounds of pricing between two steps. */
const roundsAStep = 8;
/** With few people left the rounds are quick, and what they miss cannot be mended later. */
const fewPeople = 12;
const roundsOfFew = 80;

/**
 * Dives into the relaxation over patterns: the people whose pattern has the largest value keep it, the
 * others are priced and solved anew around them, until everybody has one. A diving heuristic of branch and
 * price (Lübbecke and Desrosiers, Operations Research 53, 2005, 1007-1023). The roster it ends in is
 * offered; the ground's lines hold it.
 */
export function dive(
  { ground, state, open, pace, random }: Dive,
  found: ColumnGenerationResult,
): void {
  const { lines, refill } = ground;
  const left = new Set(found.part.people);
  for (const person of left) {
    lines.countDays(person, 0, lines.days, -1);
    lines.countEnd(person, -1);
  }
  let { patterns, values } = found;
  while (left.size > 0 && !state.isOver) {
    for (const pattern of choose(patterns, values, left.size, random)) {
      settle(ground, pattern);
      left.delete(pattern.person);
    }
    if (left.size === 0) break;
    const step = generateColumns(lines, refill, open, {
      part: { people: [...left], from: 0, to: lines.days },
      patterns: patterns.filter(({ person }) => left.has(person)),
      mostRounds: left.size > fewPeople ? roundsAStep : roundsOfFew,
      limitSeconds: pace.isCounted ? Number.POSITIVE_INFINITY : pace.remaining(),
      shouldStop: () => state.isOver,
      onIterations: (count) => pace.countSolve(masterWork, count),
      onBound: () => undefined,
      isEnough: () => false,
    });
    if (step.values.length === 0) return;
    patterns = step.patterns;
    values = step.values;
  }
  state.offerLines(ground);
}

/** Patterns with the largest values, one a person: the sure ones, and a share of the people in any case. */
function choose(
  patterns: readonly Pattern[],
  values: ArrayLike<number>,
  people: number,
  random: () => number,
): Pattern[] {
  const ranked = patterns
    .map((pattern, index) => ({ pattern, value: values[index] ?? 0 }))
    .filter(({ value }) => value > 1e-6)
    .map((one) => ({ ...one, rank: one.value + 0.1 * random() }))
    .sort((one, other) => other.rank - one.rank);
  const most = Math.max(1, Math.round(people * settledShare));
  const chosen = new Map<number, Pattern>();
  for (const { pattern, value } of ranked) {
    if (chosen.size >= most && value < surely) break;
    if (!chosen.has(pattern.person)) chosen.set(pattern.person, pattern);
  }
  return [...chosen.values()];
}

function settle({ lines }: Ground, { person, cells }: Pattern): void {
  lines.cells.set(cells, person * lines.days);
  lines.trace(person);
  lines.countDays(person, 0, lines.days, 1);
  lines.countEnd(person, 1);
}
