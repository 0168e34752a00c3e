import { isLawBased, type Problem, type Requirement, requirementKey } from '../../problem';
import { type AnalysisTools, countDown } from '../analysis-tools';
import { chooseMembers } from './choose-members';
import { loosened, type Plan, plansFor, type Trial } from './plan-ways';
import type { Bracket, RosterSearch, WayOut, WayOutEffect, WaysOutOptions } from './way-out';

/**
 * What loosening the members of a knot does: each by its least step, floors and ceilings that need more
 * dropped, and pairs of steps when no single step undoes the knot, or none ends the shortage. Each loosened
 * problem is solved anew from today's roster, which stays lawful in it, for least shortage and then cost;
 * nothing is guessed. Law-based limits are left out unless asked for; what binds a person is marked and only
 * ever proposed.
 */
export function waysOut(
  tools: AnalysisTools,
  search: RosterSearch,
  problem: Problem,
  members: readonly Requirement[],
  options: WaysOutOptions,
  onWayOut: (wayOut: WayOut) => void = () => undefined,
): WayOut[] {
  const time = countDown(tools, options.limitSeconds);
  const trial: Trial = { tools, time, problem, members };
  const tried = members.filter((member) => options.triesLawBased || !isLawBased(member));
  const chosen = chooseMembers(problem, options.today.roster, tried, options.mostWays);
  const { today } = options;
  const solveAll = (plans: readonly Plan[], secondsKept: number): WayOut[] =>
    plans.map((plan, index): WayOut => {
      const left = Math.max(0, time.seconds() - secondsKept) / (plans.length - index);
      const isTried = !time.isOver() && left > 0;
      const start = today.roster;
      const solved = isTried
        ? search(loosened(problem, plan), { limitSeconds: left, start })
        : null;
      const wayOut = { ...plan, effect: solved && effectOf(solved, today) };
      onWayOut(wayOut);
      return wayOut;
    });
  const plans = plansFor(trial, chosen, options.mostWays);
  const singles = solveAll(plans, time.seconds() * pairShare);
  return [...singles, ...solveAll(pairsOfWays(singles, today.shortageMinutes), 0)];
}

/** Share of the time that is kept for pairs. */
const pairShare = 0.3;
const mostPairs = 4;

/**
 * Pairs of steps that may bring the shortage to nothing when no single one does, because it takes in other
 * knots too: together they do away with as much as is missing. Those that cost least by themselves first.
 */
function pairsOfWays(ways: readonly WayOut[], missingMinutes: number): Plan[] {
  if (ways.some(({ effect }) => effect?.shortageMinutes.most === 0)) return [];
  const steps = ways.filter(({ size, changes }) => size === 'step' && changes.length === 1);
  const gainOf = ({ effect }: WayOut): number => -(effect?.shortageChangeMinutes.most ?? 0);
  const costOf = ({ effect }: WayOut): number => effect?.costChangeCents.most ?? 0;
  const tried = new Set(ways.map(({ changes }) => changes.map(requirementKey).join()));
  const pairs = steps.flatMap((one, index) =>
    steps.slice(index + 1).map((other) => [one, other] as const),
  );
  return pairs
    .filter((pair) => pair.every((way) => gainOf(way) > 0))
    .filter((pair) => !tried.has(pair.flatMap(({ changes }) => changes.map(requirementKey)).join()))
    .filter(([one, other]) => gainOf(one) + gainOf(other) >= missingMinutes)
    .sort((one, other) => costOf(one[0]) + costOf(one[1]) - costOf(other[0]) - costOf(other[1]))
    .slice(0, mostPairs)
    .map(([one, other]) => ({
      changes: [...one.changes, ...other.changes],
      words: [...one.words, ...other.words],
      size: 'step',
      asksPerson: one.asksPerson || other.asksPerson,
      undoesKnot: one.undoesKnot || other.undoesKnot,
    }));
}

function effectOf(
  solved: NonNullable<ReturnType<RosterSearch>>,
  today: WaysOutOptions['today'],
): WayOutEffect {
  const shortageMinutes = { least: solved.shortageBoundMinutes, most: solved.shortageMinutes };
  const costCents = { least: solved.boundCents, most: solved.costCents };
  return {
    shortageMinutes,
    costCents,
    shortageChangeMinutes: against(shortageMinutes, today.shortageMinutes),
    costChangeCents: against(costCents, today.costCents),
    isProven: solved.isProven,
  };
}

const against = ({ least, most }: Bracket, today: number): Bracket => ({
  least: least - today,
  most: most - today,
});
