import { type RuleName, type RuleSet, ruleSources } from '../rules';
import { assertNever, formatHours } from '../units';

/** A rule in words: what it limits, how far, and who says so. */
export interface RuleLine {
  readonly label: string;
  readonly limit: string;
  readonly source: string;
}

const ruleNames: readonly RuleName[] = [
  'restMinutes',
  'longestRunDays',
  'longestRunNights',
  'nightsPerPeriod',
  'weekendsPerPeriod',
];

/** The rules of a set that are switched on, with limit and source, in the order people read them. */
export function ruleLines(rules: RuleSet): RuleLine[] {
  return ruleNames.flatMap((name) => {
    const limit = rules[name];
    return limit === null ? [] : [{ ...ruleSources[name], limit: limitText(name, limit) }];
  });
}

const counted = (count: number, one: string): string => `${count} ${one}${count === 1 ? '' : 's'}`;

function limitText(name: RuleName, limit: number): string {
  switch (name) {
    case 'restMinutes':
      return `${formatHours(limit)} h`;
    case 'longestRunDays':
      return counted(limit, 'day');
    case 'longestRunNights':
    case 'nightsPerPeriod':
      return counted(limit, 'night');
    case 'weekendsPerPeriod':
      return counted(limit, 'weekend');
    default:
      return assertNever(name);
  }
}
