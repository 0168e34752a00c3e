import type { BoundRecord, Problem, TeamRule } from '../../problem';
import { assertNever } from '../../units';
import { addAt } from './worth';

/** What the rules that join people add to a bound, and how each person's line is priced by them. */
export interface TeamRuleBound {
  readonly cents: number;
  readonly magnitude: number;
  /** What a person earns on each shift (by position), by id. */
  readonly worthOf: ReadonlyMap<string, Float64Array>;
  /** What one cent more pay is worth; never above 0. */
  readonly payWorth: number;
  /** A firm rule that no roster can keep, or null. */
  readonly impossibleRule: string | null;
}

type Entry = BoundRecord['teamRules'][number];

/** The left-hand side of one row of a rule: whole numbers from least to most, kept within a range. */
interface Row {
  readonly from: number;
  readonly to: number;
  readonly least: number;
  readonly most: number;
}

/**
 * Prices the rows of the record: its own cost with the left-hand side at whatever value suits it best,
 * plus that value times the multiplier, which the lines of the people earn. Rows without an entry have
 * the multiplier 0 and cost nothing at best.
 */
export function priceTeamRules(problem: Problem, record: BoundRecord): TeamRuleBound {
  const worthOf = new Map(
    problem.people.map(({ id }) => [id, new Float64Array(problem.shifts.length)]),
  );
  let [cents, magnitude, payWorth] = [0, 0, 0];
  let impossibleRule: string | null = null;
  for (const entry of record.teamRules) {
    const rule = problem.teamRules.find(({ id }) => id === entry.ruleId);
    if (!rule) continue;
    if (rule.kind === 'budget') {
      const multiplier = clampPayWorth(rule, entry);
      payWorth += multiplier;
      cents += multiplier * rule.mostCents;
      magnitude += Math.abs(multiplier * rule.mostCents);
      continue;
    }
    const row = addRow(problem, rule, entry, worthOf);
    const least = leastCost(row, rule.priceCents, entry.cents);
    if (least === null) impossibleRule ??= rule.name;
    cents += least ?? 0;
    magnitude += Math.abs(entry.cents) * Math.max(Math.abs(row.from), Math.abs(row.to));
  }
  return { cents, magnitude, worthOf, payWorth, impossibleRule };
}

/**
 * A budget bounds pay from above only, so more pay is never worth anything, and never worse than the
 * price of the rule. Beyond that the bound would have no floor; the nearest figure that is of use is taken.
 */
const clampPayWorth = ({ priceCents }: TeamRule, { cents }: Entry): number =>
  Math.min(0, Math.max(cents, priceCents === null ? cents : -priceCents));

/** Adds the multiplier to everybody who is on the left-hand side of the row; answers the row. */
function addRow(
  problem: Problem,
  rule: Exclude<TeamRule, { kind: 'budget' }>,
  { at, cents }: Entry,
  worthOf: ReadonlyMap<string, Float64Array>,
): Row {
  const add = (personId: string, counts: (shift: Problem['shifts'][number]) => number): void => {
    problem.shifts.forEach((shift, position) => {
      const coefficient = counts(shift);
      if (coefficient !== 0) addAt(worthOf.get(personId), position, cents * coefficient);
    });
  };
  const here = 'personIds' in rule ? knownPeople(problem, rule.personIds) : [];
  switch (rule.kind) {
    case 'together': {
      const [first, second] = rule.personIds;
      add(first, ({ index }) => (index === at ? 1 : 0));
      add(second, ({ index }) => (index === at ? -1 : 0));
      return { from: -1, to: 1, least: 0, most: 0 };
    }
    case 'apart': {
      const minute = at ?? 0;
      for (const id of here) {
        add(id, ({ startMinute, endMinute }) =>
          startMinute <= minute && minute < endMinute ? 1 : 0,
        );
      }
      return { from: 0, to: here.length, least: 0, most: 1 };
    }
    case 'mostFree':
      for (const id of here) add(id, ({ dayIndex }) => (dayIndex === at ? 1 : 0));
      return { from: 0, to: here.length, least: here.length - rule.most, most: here.length };
    case 'linear':
      for (const { personId, shiftIndex, coefficient } of rule.terms) {
        add(personId, ({ index }) => (index === shiftIndex ? coefficient : 0));
      }
      return linearRow(rule);
    default:
      return assertNever(rule);
  }
}

const knownPeople = ({ people }: Problem, ids: readonly string[]): string[] =>
  people.filter(({ id }) => ids.includes(id)).map(({ id }) => id);

function linearRow({ terms, least, most }: Extract<TeamRule, { kind: 'linear' }>): Row {
  const sumOf = (sign: 1 | -1): number =>
    terms.reduce((sum, { coefficient }) => sum + sign * Math.max(0, sign * coefficient), 0);
  return {
    from: sumOf(-1),
    to: sumOf(1),
    least: least ?? Number.NEGATIVE_INFINITY,
    most: most ?? Number.POSITIVE_INFINITY,
  };
}

/**
 * Least of price x distance from [least, most] + multiplier x value over the values of the row; for a
 * firm rule over those inside alone, null when there are none. Linear between the corners looked at.
 */
function leastCost(row: Row, price: number | null, multiplier: number): number | null {
  const { from, to, least, most } = row;
  const corners = [from, to, least, most].filter((value) => from <= value && value <= to);
  const costs = corners.flatMap((value) => {
    const distance = Math.max(0, least - value, value - most);
    if (price === null && distance > 0) return [];
    return [(price ?? 0) * distance + multiplier * value];
  });
  return costs.length === 0 ? null : Math.min(...costs);
}
