import { completeValues, distancesOf } from './complete-values';
import type { Level } from './levels';
import { premiumPay, timePay } from './pay';
import { isOn, workedMinutes } from './read-roster';
import type { RosterModel } from './roster-model';
import { measureAt } from './rows/measures';
import type { TeamRow } from './rows/team-rows';
import { pricedStretches } from './weigh-stretches';
import { refusedPrices } from './wishes';

/** What a roster costs and lacks, in whole cents, minutes and units, from its shifts alone. */
export interface RosterFigures {
  /** In the order of the model's levels. */
  readonly levels: readonly number[];
  /** Missing person-minutes of firm floors of every priority. */
  readonly shortageMinutes: number;
  readonly costCents: number;
}

/** Reckons a solution anew from its shifts, without the errors of the solver's arithmetic. */
export function weighRoster(model: RosterModel, values: ArrayLike<number>): RosterFigures {
  const whole = completeValues(model, values);
  const payCents = payOf(model, whole);
  const broken = model.teamRows.map((row) => unitsBroken(model, row, whole, payCents));
  const levels = model.levels.map((level) => levelValue(model, level, whole, broken));
  const shortageMinutes = model.levels.reduce(
    (sum, { name }, index) => sum + (name === 'shortage' ? (levels[index] ?? 0) : 0),
    0,
  );
  const teamCents = model.teamRows.reduce(
    (sum, { priceCents }, index) => sum + (priceCents ?? 0) * (broken[index] ?? 0),
    0,
  );
  return {
    levels,
    shortageMinutes,
    costCents:
      payCents +
      pricedStretches(model, whole) +
      teamCents +
      wishCents(model, whole) +
      fairnessCents(model, whole),
  };
}

/** Units by which a team row is broken; a budget is held against the pay in whole cents. */
function unitsBroken(
  { problem }: RosterModel,
  row: TeamRow,
  whole: Float64Array,
  payCents: number,
): number {
  if (row.kind !== 'budget') {
    const { under, over } = distancesOf(row, whole);
    return under + over;
  }
  const rule = problem.teamRules.find(({ id }) => id === row.ruleId);
  return rule?.kind === 'budget' ? Math.max(0, payCents - rule.mostCents) : 0;
}

function levelValue(
  { linear, teamRows }: RosterModel,
  { name, row }: Level,
  whole: Float64Array,
  broken: readonly number[],
): number {
  if (name === 'teamRules') {
    return teamRows.reduce(
      (sum, { priceCents }, index) => sum + (priceCents === null ? (broken[index] ?? 0) : 0),
      0,
    );
  }
  let sum = 0;
  for (let at = linear.starts[row] ?? 0; at < (linear.starts[row + 1] ?? 0); at += 1) {
    sum += (linear.values[at] ?? 0) * (whole[linear.indices[at] ?? 0] ?? 0);
  }
  return sum;
}

function payOf({ problem, works }: RosterModel, whole: Float64Array): number {
  return works.reduce((sum, { person, columns }) => {
    const on = columns.filter((work) => isOn(work, whole));
    const premiums = on.reduce((cents, { shift }) => cents + premiumPay(problem, person, shift), 0);
    const { ordinary, overtime } = timePay(problem, person, workedMinutes(columns, whole));
    return sum + premiums + ordinary + overtime;
  }, 0);
}

const wishCents = ({ works }: RosterModel, whole: Float64Array): number =>
  works.reduce((sum, { person, columns }) => {
    const shifts = columns.filter((work) => isOn(work, whole)).map(({ shift }) => shift);
    return sum + refusedPrices(person, shifts);
  }, 0);

function fairnessCents({ spreads, shares }: RosterModel, whole: Float64Array): number {
  const apart = spreads.reduce((sum, { priceCents, people }) => {
    const counts = people.map((measure) => measureAt(measure, whole));
    return sum + priceCents * (Math.max(...counts) - Math.min(...counts));
  }, 0);
  return shares.reduce(
    (sum, share) => sum + share.priceCents * Math.max(0, measureAt(share, whole) - share.above),
    apart,
  );
}
