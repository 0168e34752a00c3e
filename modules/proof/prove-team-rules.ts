import type { Problem, TeamRule } from '../problem';
import { assertNever } from '../units';
import { findBrokenPlaces, startMinutes } from './broken-team-rules';
import type { Finding, Subject } from './duties';
import type { Breach } from './proof';

/** What breaks rules that join people: firm ones in units and breaches, the others in cents. */
export interface TeamRuleFinding {
  readonly teamRuleUnits: number;
  readonly teamRuleCents: number;
  readonly finding: Finding;
}

/** Re-checks the rules that join people; `payCents` is the pay of the whole roster. */
export function proveTeamRules(subject: Subject, payCents: number): TeamRuleFinding {
  const { problem } = subject;
  let teamRuleUnits = 0;
  let teamRuleCents = 0;
  const breaches: Breach[] = [];
  for (const rule of problem.teamRules) {
    for (const { units, personIds, ...place } of findBrokenPlaces(subject, rule, payCents)) {
      if (rule.priceCents !== null) {
        teamRuleCents += units * rule.priceCents;
        continue;
      }
      teamRuleUnits += units;
      breaches.push({ rule: 'teamRules', personId: personIds[0] ?? '', ...place });
    }
  }
  const cases = problem.teamRules.reduce((sum, rule) => sum + placesOf(problem, rule), 0);
  return { teamRuleUnits, teamRuleCents, finding: { rule: 'teamRules', cases, breaches } };
}

/** In how many places a rule can be broken. */
function placesOf(problem: Problem, rule: TeamRule): number {
  switch (rule.kind) {
    case 'together':
      return problem.shifts.length;
    case 'apart':
      return startMinutes(problem).size;
    case 'mostFree':
      return problem.days.length;
    case 'budget':
    case 'linear':
      return 1;
    default:
      return assertNever(rule);
  }
}
