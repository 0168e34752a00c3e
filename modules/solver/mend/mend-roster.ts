import {
  buildRosterModel,
  placeRoster,
  type RosterModel,
  readRoster,
  roundingSlackCents,
  weighRoster,
} from '../../model';
import type { PlannedRoster, Problem } from '../../problem';
import { type AnalysisTools, countDown } from '../analysis-tools';
import { findTakeOvers } from './find-take-overs';
import { buildMendModel } from './mend-model';
import { MendSearch } from './mend-search';
import type { MendOptions, MendOutcome, TakeOver } from './mending';
import { movesBetween } from './moves-between';
import { withAbsences } from './with-absences';

/**
 * Mends a roster within a window after absences: in strict order the least shortage (and what comes before
 * it: team rules, ceilings), the fewest people touched, the fewest days changed, the least cost; one solve
 * after the other, each with those before held. First the take-overs by enumeration, told at once, whose
 * best start the solver. What lies outside the window does not move; absences are credited to hours.
 */
export function mendRoster(
  tools: AnalysisTools,
  problem: Problem,
  roster: PlannedRoster,
  options: MendOptions,
  onTakeOvers: (takeOvers: readonly TakeOver[]) => void = () => undefined,
): MendOutcome {
  const time = countDown(tools, options.limitSeconds);
  const before = weighed(problem, roster);
  const absent = withAbsences(problem, roster, options.absences);
  const model = buildRosterModel(absent.problem);
  const { takeOvers, patched } = findTakeOvers(model, absent.roster, options);
  onTakeOvers(takeOvers);
  const start = placeRoster(model, absent.roster);
  const mending = buildMendModel(model, start, options);
  const search = new MendSearch(tools, time, mending, options.seed);
  const outcome = search.run([start, placeRoster(model, patched)]);
  if (outcome === 'impossible') {
    return {
      kind: 'impossible',
      sentence:
        'What stays as it is breaks a rule by itself, or leaves somebody no lawful line; widen the window or mend the rule first.',
    };
  }
  if (!outcome) return { kind: 'out-of-time' };
  const { values, figures } = outcome.point;
  const moves = movesBetween(model, start, values);
  return {
    kind: 'mended',
    takeOvers,
    roster: readRoster(model, values),
    touched: [...new Set(moves.map(({ personId }) => personId))],
    moves,
    shortageMinutes: weighRoster(model, values).shortageMinutes,
    costCents: figures.at(-1) ?? 0,
    costChangeCents: (figures.at(-1) ?? 0) - before,
    aims: outcome.aims,
    isProven: outcome.aims.every(
      ({ name, value, bound }) => value - bound <= (name === 'cost' ? roundingCents(model) : 0),
    ),
  };
}

/** Cents between cost and bound that only the rounding of pay explains. */
function roundingCents(model: RosterModel): number {
  const slack = roundingSlackCents(model);
  return slack === 0 ? 0 : Math.ceil(2 * slack) + 1;
}

function weighed(problem: Problem, roster: PlannedRoster): number {
  const model = buildRosterModel(problem);
  return weighRoster(model, placeRoster(model, roster)).costCents;
}
