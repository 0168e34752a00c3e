import type { PlannedRoster, Problem } from '../problem';
import { checkAbsence } from './check-absence';
import { checkHours, workedMinutes } from './check-hours';
import { checkNightPermission } from './check-night-permission';
import { checkNights, nightDuties } from './check-nights';
import { checkOneShift } from './check-one-shift';
import { checkPins } from './check-pins';
import { checkPost } from './check-post';
import { checkReferences } from './check-references';
import { checkRest } from './check-rest';
import { checkRunOfDays, checkRunOfNights } from './check-runs';
import { checkWeekends } from './check-weekends';
import { type Finding, readSubject, type Subject } from './duties';
import type { Proof } from './proof';
import { overtimeMinutes, provePay } from './prove-pay';
import { proveShortage } from './prove-shortage';
import { workedWeekends } from './weekends';

/** Checks of one person's plan; none looks at another person. */
const checks: readonly ((subject: Subject) => Finding)[] = [
  checkOneShift,
  checkPost,
  checkAbsence,
  checkNightPermission,
  checkRest,
  checkRunOfDays,
  checkRunOfNights,
  checkNights,
  checkWeekends,
  checkHours,
  checkPins,
];

/**
 * Re-checks a roster from the problem and the roster alone: every rule, every floor, every cent.
 * Shares no code with what builds and solves models, so that a fault there cannot hide here.
 */
export function proveRoster(problem: Problem, roster: PlannedRoster): Proof {
  const subject = readSubject(problem, roster);
  const findings = [checkReferences(problem, roster), ...checks.map((check) => check(subject))];
  const pay = provePay(subject);
  const shortage = proveShortage(problem, subject.duties);
  return {
    costCents:
      pay.contractPayCents +
      pay.premiumPayCents +
      pay.overtimePayCents +
      shortage.wishedShortageCents,
    ...pay,
    ...shortage,
    breaches: findings.flatMap((finding) => finding.breaches),
    checked: findings.map(({ rule, cases }) => ({ rule, cases })),
    people: problem.people.map((person) => peopleLine(subject, person)),
  };
}

function peopleLine(
  { problem, dutiesOf }: Subject,
  person: Problem['people'][number],
): Proof['people'][number] {
  const duties = dutiesOf(person);
  return {
    personId: person.id,
    workedMinutes: workedMinutes(duties),
    overtimeMinutes: overtimeMinutes(person, duties),
    nights: nightDuties(duties).length,
    weekends: workedWeekends(problem, duties).length,
  };
}
