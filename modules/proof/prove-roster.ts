import type { PlannedRoster, Problem, ProblemPerson } from '../problem';
import { checkAbsence } from './check-absence';
import { checkHours, workedMinutes } from './check-hours';
import { checkKindLimits } from './check-kind-limits';
import { checkKindsThatFollow } from './check-kinds-that-follow';
import { checkRunOfDays, checkRunOfNights } from './check-longest-runs';
import { checkNightPermission } from './check-night-permission';
import { checkNights, nightDuties } from './check-nights';
import { checkOneShift } from './check-one-shift';
import { checkPins } from './check-pins';
import { checkPost } from './check-post';
import { checkReferences } from './check-references';
import { checkRest } from './check-rest';
import { checkShortRunOfDays, checkShortRunOfFreeDays } from './check-shortest-runs';
import { checkWeekends } from './check-weekends';
import { type Finding, readSubject, type Subject } from './duties';
import type { Proof, ProvenPerson } from './proof';
import { proveFairness } from './prove-fairness';
import { overtimeMinutes, provePay } from './prove-pay';
import { proveShortage } from './prove-shortage';
import { proveSurplus } from './prove-surplus';
import { proveTeamRules } from './prove-team-rules';
import { proveWishes, refusedWishes } from './prove-wishes';
import { workedWeekends } from './weekends';

/** Checks of one person's plan; none looks at another person. */
const checks: readonly ((subject: Subject) => Finding)[] = [
  checkOneShift,
  checkPost,
  checkAbsence,
  checkNightPermission,
  checkRest,
  checkKindsThatFollow,
  checkRunOfDays,
  checkRunOfNights,
  checkShortRunOfDays,
  checkShortRunOfFreeDays,
  checkNights,
  checkKindLimits,
  checkWeekends,
  checkHours,
  checkPins,
];

/**
 * Re-checks a roster from the problem and the roster alone: every rule, every floor and ceiling, every
 * cent. Shares no code with what builds and solves models, so that a fault there cannot hide here.
 */
export function proveRoster(problem: Problem, roster: PlannedRoster): Proof {
  const subject = readSubject(problem, roster);
  const pay = provePay(subject);
  const payCents = pay.contractPayCents + pay.premiumPayCents + pay.overtimePayCents;
  const people = problem.people.map((person) => personLine(subject, person));
  const { finding, ...teamRules } = proveTeamRules(subject, payCents);
  const shortage = proveShortage(problem, subject.duties);
  const surplus = proveSurplus(problem, subject.duties);
  const wishes = proveWishes(subject);
  const fairness = proveFairness(problem, people);
  const findings = [
    checkReferences(problem, roster),
    ...checks.map((check) => check(subject)),
    finding,
  ];
  return {
    costCents:
      payCents +
      shortage.wishedShortageCents +
      surplus.pricedSurplusCents +
      teamRules.teamRuleCents +
      wishes.refusedWishCents +
      fairness.spreadCents +
      fairness.shareCents,
    ...pay,
    ...shortage,
    ...surplus,
    ...teamRules,
    ...wishes,
    ...fairness,
    breaches: findings.flatMap(({ breaches }) => breaches),
    checked: findings.map(({ rule, cases }) => ({ rule, cases })),
    people,
  };
}

function personLine(subject: Subject, person: ProblemPerson): ProvenPerson {
  const duties = subject.dutiesOf(person);
  return {
    personId: person.id,
    workedMinutes: workedMinutes(duties),
    overtimeMinutes: overtimeMinutes(person, duties),
    nights: nightDuties(duties).length,
    weekends: workedWeekends(subject.problem, person, duties).length,
    refusedWishes: refusedWishes(subject, person).length,
  };
}
