import type { Problem, ProblemRules, TeamRule } from '../problem';
import { type RuleName, ruleSources } from '../rules';
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

/**
 * What every roster of a problem keeps, with limit and source, in the order people read it: the limits of
 * the team that are switched on, who has limits of their own, and the firm rules that join people.
 */
export function ruleLines(problem: Problem): RuleLine[] {
  return [
    ...ruleNames.flatMap((name) => {
      const limit = problem.rules[name];
      return limit === null ? [] : [{ ...ruleSources[name], limit: limitText(name, limit) }];
    }),
    ...patternLines(problem.rules, kindNames(problem)),
    ...personLines(problem),
    ...problem.teamRules.flatMap((rule) => (rule.priceCents === null ? [teamRuleLine(rule)] : [])),
  ];
}

const counted = (count: number, one: string, many = `${one}s`): string =>
  `${count} ${count === 1 ? one : many}`;

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

const kindNames = ({ shifts }: Problem): ReadonlyMap<string, string> =>
  new Map(shifts.map(({ kindId, kindName }) => [kindId, kindName]));

function patternLines(rules: ProblemRules, names: ReadonlyMap<string, string>): RuleLine[] {
  const { shortestRunDays, shortestRunFreeDays, kindsThatMayNotFollow } = rules;
  const source = 'House rule';
  const pairs = kindsThatMayNotFollow.map(
    ({ kindId, nextKindId }) =>
      `${names.get(kindId) ?? kindId} before ${names.get(nextKindId) ?? nextKindId}`,
  );
  return [
    ...(shortestRunDays === null
      ? []
      : [{ label: 'Days in a row, at least', limit: counted(shortestRunDays, 'day'), source }]),
    ...(shortestRunFreeDays === null
      ? []
      : [
          {
            label: 'Days off in a row, at least',
            limit: counted(shortestRunFreeDays, 'day'),
            source,
          },
        ]),
    ...(pairs.length === 0
      ? []
      : [{ label: 'Never on the next day', limit: pairs.join(', '), source }]),
  ];
}

function personLines({ people }: Problem): RuleLine[] {
  const own = people.filter(({ rules }) => rules !== null).length;
  const limited = people.filter(({ kindLimits }) => kindLimits.length > 0).length;
  const source = 'Contract or agreement of the person';
  const line = (label: string, count: number): RuleLine[] =>
    count === 0 ? [] : [{ label, limit: counted(count, 'person', 'people'), source }];
  return [
    ...line('Limits of their own in place of these', own),
    ...line('Most shifts of a kind', limited),
  ];
}

function teamRuleLine(rule: TeamRule): RuleLine {
  return { label: rule.name, limit: teamRuleText(rule), source: 'Rule of the team' };
}

function teamRuleText(rule: TeamRule): string {
  switch (rule.kind) {
    case 'together':
      return 'both or neither';
    case 'apart':
      return 'never at once';
    case 'mostFree':
      return `${rule.most} free`;
    case 'budget':
      return 'pay';
    case 'linear':
      return [
        ...(rule.least === null ? [] : [`least ${rule.least}`]),
        ...(rule.most === null ? [] : [`most ${rule.most}`]),
      ].join(', ');
    default:
      return assertNever(rule);
  }
}
