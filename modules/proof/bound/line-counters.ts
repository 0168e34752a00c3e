import { type Problem, type ProblemPerson, rulesOf } from '../../problem';
import type { LineDay, LineOption } from './line-options';

/** Something that is summed up over the period. */
export interface LineCounter {
  readonly kind: 'nights' | 'weekends' | 'shiftsOfKind' | 'minutes';
  /** What an option adds; `isNewWeekend` tells whether it marks a weekend not counted yet. */
  readonly add: (option: LineOption, isNewWeekend: boolean) => number;
  /** Its counts are below this. */
  readonly radix: number;
  /** Place value of the counter in a number that holds all of them. */
  readonly unit: number;
}

export interface LineCounters {
  readonly list: readonly LineCounter[];
  /** All counters together take the values from 0 to below this. */
  readonly size: number;
  /** Minutes of one step of the counter of minutes; 0 when minutes are not counted. */
  readonly minuteStep: number;
  /** Least and most minutes a line may have, leave left out. */
  readonly leastMinutes: number;
  readonly mostMinutes: number;
}

/**
 * Largest product of (most + 1) over the kind limits that are counted. Looser limits beyond it are left
 * out, which keeps the bound true and may make it lower.
 */
const mostKindCounts = 32;

/** The sums that the rules or the cost of one person depend on. null: the hours cannot be kept at all. */
export function readLineCounters(
  problem: Problem,
  person: ProblemPerson,
  days: readonly LineDay[],
): LineCounters | null {
  const rules = rulesOf(problem, person);
  const leastMinutes = person.minimumMinutes - person.creditMinutes;
  const mostMinutes = person.maximumMinutes - person.creditMinutes;
  if (mostMinutes < 0 || mostMinutes < leastMinutes) return null;
  const shares = person.isOutside ? [] : problem.fairness.filter(({ kind }) => kind === 'share');
  const hasShare = (measure: string): boolean => shares.some((term) => term.measure === measure);
  const counters: Omit<LineCounter, 'unit'>[] = [];
  const count = (
    kind: LineCounter['kind'],
    most: number | null,
    isPriced: boolean,
    add: LineCounter['add'],
  ): void => {
    const possible = mostPossible(days, (option) => add(option, true));
    if (isPriced || (most !== null && most < possible)) {
      counters.push({ kind, add, radix: 1 + Math.min(most ?? possible, possible) });
    }
  };
  count('nights', rules.nightsPerPeriod, hasShare('nights'), ({ shift }) =>
    shift.isNight ? 1 : 0,
  );
  count('weekends', rules.weekendsPerPeriod, hasShare('weekends'), (_, isNewWeekend) =>
    isNewWeekend ? 1 : 0,
  );
  for (const { kindId, most } of countedKindLimits(person, days, mostMinutes)) {
    count('shiftsOfKind', most, false, ({ shift }) => (shift.kindId === kindId ? 1 : 0));
  }
  const minuteStep = days
    .flatMap(({ options }) => options.map(({ shift }) => shift.paidMinutes))
    .reduce(greatestDivisor, 0);
  if (minuteStep > 0) {
    const addMinutes = ({ shift }: LineOption): number => shift.paidMinutes / minuteStep;
    const most = Math.floor(mostMinutes / minuteStep);
    count('minutes', most, leastMinutes > 0 || person.payCentsPerHour > 0, addMinutes);
  }
  return { ...placeCounters(counters), minuteStep, leastMinutes, mostMinutes };
}

/** How much a counter stands at in the number that holds all of them. */
export const countOf = ({ unit, radix }: LineCounter, counted: number): number =>
  Math.floor(counted / unit) % radix;

/** The tightest kind limits that can bind, as far as there is room for them. */
function countedKindLimits(
  { kindLimits }: ProblemPerson,
  days: readonly LineDay[],
  mostMinutes: number,
): ProblemPerson['kindLimits'] {
  let product = 1;
  return [...kindLimits]
    .sort((one, other) => one.most - other.most)
    .filter(({ kindId, most }) => {
      const ofKind = days.flatMap(({ options }) =>
        options.filter(({ shift }) => shift.kindId === kindId),
      );
      const shortest = Math.min(...ofKind.map(({ shift }) => shift.paidMinutes));
      const isTight = most < ofKind.length && (most + 1) * shortest <= mostMinutes;
      if (!isTight || product * (most + 1) > mostKindCounts) return false;
      product *= most + 1;
      return true;
    });
}

const mostPossible = (days: readonly LineDay[], add: (option: LineOption) => number): number =>
  days.reduce((sum, { options }) => sum + Math.max(0, ...options.map(add)), 0);

function placeCounters(
  counters: readonly Omit<LineCounter, 'unit'>[],
): Pick<LineCounters, 'list' | 'size'> {
  let size = 1;
  const list = counters.map((counter) => {
    const placed = { ...counter, unit: size };
    size *= counter.radix;
    return placed;
  });
  return { list, size };
}

const greatestDivisor = (one: number, other: number): number =>
  other === 0 ? one : greatestDivisor(other, one % other);
