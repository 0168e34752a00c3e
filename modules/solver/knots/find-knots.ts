import {
  capacityLacks,
  describeRequirement,
  type Problem,
  type Requirement,
  requirementKey,
} from '../../problem';
import { type AnalysisTools, countDown, type TimeLeft } from '../analysis-tools';
import { dropFrom, locatedIn } from './drop-located';
import { filterClash } from './filter-clash';
import { firmPart } from './firm-part';
import type { Knot, KnotOptions, KnotsAnswer } from './knot';
import { buildKnotModel } from './knot-model';
import { narrowClash } from './narrow-clash';
import { orderRequirements } from './order-requirements';
import { openProbe, type RelaxationProbe } from './relaxation-probe';
import { isHoldable } from './whole-test';

/** Capacity sums of up to so many members are made as small as can be. */
const mostFilteredSum = 12;
/** One test in whole shifts takes at most this. */
const testSeconds = 3;

interface Hunt {
  readonly tools: AnalysisTools;
  readonly time: TimeLeft;
  readonly problem: Problem;
  readonly firm: Problem;
  readonly requirements: readonly Requirement[];
  /** Positions of requirements, least informative first. */
  readonly order: readonly number[];
  readonly probe: RelaxationProbe;
}

/**
 * Why the floors of a problem cannot all be held: capacity sums first, then smallest clashing sets of what
 * the user entered. A clash that the relaxation sees is filtered there, then verified in whole shifts; one
 * that only whole shifts have is filtered with tests in whole shifts. After each knot its located members
 * are dropped, so that the next is another one. The same for the same problem unless time cuts it.
 */
export function findKnots(
  tools: AnalysisTools,
  problem: Problem,
  options: KnotOptions,
): KnotsAnswer {
  const time = countDown(tools, options.limitSeconds);
  const firm = firmPart(problem);
  const model = buildKnotModel(problem);
  const { requirements } = model;
  const hunt: Hunt = {
    tools,
    time,
    problem,
    firm,
    requirements,
    order: orderRequirements(problem, requirements, options.shortAtMinutes),
    probe: openProbe(tools, model, time),
  };
  try {
    return huntKnots(hunt, options.mostKnots);
  } finally {
    hunt.probe.close();
  }
}

function huntKnots(hunt: Hunt, mostKnots: number): KnotsAnswer {
  const knots: Knot[] = sumKnots(hunt);
  const located = knots.flatMap(({ members }) => members.filter(isFloor));
  let kept = dropFrom(hunt.requirements, new Set(hunt.requirements.keys()), located);
  for (let found = 0; found < mostKnots; found += 1) {
    const clash = findClash(hunt, kept);
    if (clash === 'none') return { knots, isComplete: true };
    // Nothing a user entered: shifts before or after the period clash by themselves.
    if (clash === 'unknown' || clash.length === 0) break;
    const whole = testWhole(hunt, new Set(clash));
    // The relaxation errs by its arithmetic: what holds in whole shifts is no knot.
    if (whole && !whole.clashes) break;
    const knot = verify(hunt, clash, null);
    knots.push(knot);
    kept = dropFrom(hunt.requirements, kept, locatedIn(knot.members));
  }
  const rest = hunt.time.isOver() ? null : testWhole(hunt, kept);
  return { knots, isComplete: rest !== null && !rest.clashes };
}

/** Capacity sums as knots; small ones are filtered, large ones would only repeat the sentence. */
function sumKnots(hunt: Hunt): Knot[] {
  const positions = new Map(hunt.requirements.map((one, index) => [requirementKey(one), index]));
  return capacityLacks(hunt.problem).map((lack) => {
    const clash = lack.requirements.flatMap((one) => positions.get(requirementKey(one)) ?? []);
    if (clash.length <= mostFilteredSum) return verify(hunt, clash, lack.sentence);
    return knotOf(hunt, clash, false, lack.sentence);
  });
}

/** A set that clashes, small by the relaxation or by tests in whole shifts. */
function findClash(hunt: Hunt, kept: ReadonlySet<number>): readonly number[] | 'none' | 'unknown' {
  const { probe, order } = hunt;
  const ordered = (set: ReadonlySet<number>) => order.filter((member) => set.has(member));
  const first = probe.test(kept);
  if (first?.clashes) {
    // All of the kept floors, not only the used ones: a short window needs all of its own.
    const candidates = ordered(narrowClash(probe, hunt.requirements, kept) ?? first.used);
    return ordered(filterClash(candidates, Math.ceil(candidates.length / 4), probe.test).kept);
  }
  const whole = testWhole(hunt, kept, hunt.time.seconds() / 2);
  if (!whole) return 'unknown';
  if (!whole.clashes) return 'none';
  const all = ordered(kept);
  return ordered(filterClash(all, Math.ceil(all.length / 4), (set) => testWhole(hunt, set)).kept);
}

/** Leaves out each member in turn in whole shifts; what the rest can do without is dropped. */
function verify(hunt: Hunt, clash: readonly number[], sentence: string | null): Knot {
  const { kept, necessary } = filterClash(clash, 1, (set) => testWhole(hunt, set));
  return knotOf(hunt, [...kept], kept.size === necessary.size, sentence);
}

function testWhole(hunt: Hunt, kept: ReadonlySet<number>, limitSeconds = testSeconds) {
  const { tools, time, firm, requirements } = hunt;
  const dropped = requirements.filter((_, index) => !kept.has(index));
  const limit = time.isOver() ? 0 : Math.min(limitSeconds, time.seconds());
  const answer = isHoldable(tools, firm, dropped, limit);
  return answer === 'unknown' ? null : { clashes: answer === 'no', used: kept };
}

function knotOf(
  { problem, requirements }: Hunt,
  positions: readonly number[],
  isMinimal: boolean,
  sentence: string | null,
): Knot {
  const members = [...positions]
    .sort((one, other) => one - other)
    .flatMap((index) => requirements[index] ?? []);
  const words = members.map((member) => describeRequirement(problem, member));
  return { members, words, isMinimal, sentence };
}

const isFloor = ({ kind }: Requirement): boolean => kind === 'floor';
