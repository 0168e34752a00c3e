import type { Problem, TeamRule } from '../problem';
import { assertNever, formatMoney } from '../units';
import type { Subject } from './duties';
import { clockWords, dateOfDay, dateWords, firstDate } from './words';

/** One place at which a rule of the team is broken, and by how many units. */
export interface BrokenPlace {
  readonly units: number;
  readonly date: string;
  /** Everybody concerned; nobody for a budget. */
  readonly personIds: readonly string[];
  readonly sentence: string;
  readonly sentenceWithoutPay?: string;
}

type RuleOf<K extends TeamRule['kind']> = Extract<TeamRule, { kind: K }>;

/** The places at which a rule is broken; `payCents` is the pay of the whole roster. */
export function findBrokenPlaces(
  subject: Subject,
  rule: TeamRule,
  payCents: number,
): BrokenPlace[] {
  switch (rule.kind) {
    case 'together':
      return breakTogether(subject, rule);
    case 'apart':
      return breakApart(subject, rule);
    case 'mostFree':
      return breakMostFree(subject, rule);
    case 'budget':
      return breakBudget(subject.problem, rule, payCents);
    case 'linear':
      return breakLinear(subject, rule);
    default:
      return assertNever(rule);
  }
}

/** The minutes at which a shift of the problem starts, with the day it belongs to, in order. */
export const startMinutes = ({ shifts }: Problem): ReadonlyMap<number, number> =>
  new Map(
    shifts
      .map(({ startMinute, dayIndex }) => [startMinute, dayIndex] as const)
      .sort(([one], [other]) => one - other),
  );

/** A unit for each shift on which exactly one of the two is. */
function breakTogether(subject: Subject, rule: RuleOf<'together'>): BrokenPlace[] {
  const { problem } = subject;
  return problem.shifts.flatMap((shift): BrokenPlace[] => {
    const [on, ...others] = rule.personIds.filter((id) => worksShift(subject, id, shift.index));
    if (on === undefined || others.length > 0) return [];
    const off = rule.personIds.find((id) => id !== on) ?? on;
    const date = dateOfDay(problem, shift.dayIndex);
    const sentence = `${rule.name}: ${nameOf(problem, on)} is on ${shift.kindName} on ${dateWords(date)} and ${nameOf(problem, off)} is not; both or neither may be.`;
    return [{ units: 1, date, personIds: [on, off], sentence }];
  });
}

/**
 * At each minute at which a shift starts, a unit for each person on duty beyond the first. The same
 * people at later minutes of a day are one place.
 */
function breakApart(subject: Subject, rule: RuleOf<'apart'>): BrokenPlace[] {
  const { problem, duties } = subject;
  const own = duties.filter(({ person }) => rule.personIds.includes(person.id));
  const places = new Map<string, BrokenPlace>();
  for (const [minute, dayIndex] of startMinutes(problem)) {
    const onDuty = own.filter(
      ({ shift }) => shift.startMinute <= minute && minute < shift.endMinute,
    );
    const personIds = [...new Set(onDuty.map(({ person }) => person.id))].sort();
    if (personIds.length < 2) continue;
    const date = dateOfDay(problem, dayIndex);
    const key = `${date} ${personIds.join(' ')}`;
    const units = (places.get(key)?.units ?? 0) + personIds.length - 1;
    const names = listWords(personIds.map((id) => nameOf(problem, id)));
    const sentence = `${rule.name}: ${names} are on duty together on ${dateWords(date)} at ${clockWords(problem, minute)}; the most is 1 of them.`;
    places.set(key, { sentence, ...places.get(key), units, date, personIds });
  }
  return [...places.values()];
}

/** On each day, a unit for each person free beyond `most`; leave counts as free. */
function breakMostFree(subject: Subject, rule: RuleOf<'mostFree'>): BrokenPlace[] {
  const { problem, dutiesOf } = subject;
  const people = problem.people.filter(({ id }) => rule.personIds.includes(id));
  return problem.days.flatMap(({ date }, dayIndex): BrokenPlace[] => {
    const free = people.filter(
      (person) => !dutiesOf(person).some(({ shift }) => shift.dayIndex === dayIndex),
    );
    if (free.length <= rule.most) return [];
    const names = listWords(free.map(({ name }) => name));
    const sentence = `${rule.name}: ${free.length} of ${people.length} are free on ${dateWords(date)} (${names}); the most is ${rule.most}.`;
    const personIds = free.map(({ id }) => id);
    return [{ units: free.length - rule.most, date, personIds, sentence }];
  });
}

function breakBudget(problem: Problem, rule: RuleOf<'budget'>, payCents: number): BrokenPlace[] {
  const units = payCents - rule.mostCents;
  if (units <= 0) return [];
  const money = (cents: number): string => formatMoney(cents, problem.currency, 'en-GB', 2);
  const sentence = `${rule.name}: the pay is ${money(payCents)}; the most is ${money(rule.mostCents)}.`;
  const sentenceWithoutPay = `${rule.name}: the pay is above the budget.`;
  return [{ units, date: firstDate(problem), personIds: [], sentence, sentenceWithoutPay }];
}

/** Units by which the sum of the coefficients that are on lies outside [least, most]. */
function breakLinear(subject: Subject, rule: RuleOf<'linear'>): BrokenPlace[] {
  const { problem } = subject;
  const on = rule.terms.filter((term) => worksShift(subject, term.personId, term.shiftIndex));
  const sum = on.reduce((total, { coefficient }) => total + coefficient, 0);
  const isLow = rule.least !== null && sum < rule.least;
  const limit = isLow ? rule.least : rule.most;
  if (limit === null || (!isLow && sum <= limit)) return [];
  const dayIndexes = rule.terms.flatMap(({ shiftIndex }) =>
    problem.shifts.filter(({ index }) => index === shiftIndex).map(({ dayIndex }) => dayIndex),
  );
  const sentence = `${rule.name}: comes to ${sum}; the ${isLow ? 'least' : 'most'} is ${limit}.`;
  return [
    {
      units: Math.abs(sum - limit),
      date: dateOfDay(problem, Math.min(...dayIndexes)),
      personIds: [...new Set(rule.terms.map(({ personId }) => personId))],
      sentence,
    },
  ];
}

const worksShift = ({ duties }: Subject, personId: string, shiftIndex: number): boolean =>
  duties.some(({ person, shift }) => person.id === personId && shift.index === shiftIndex);

const nameOf = ({ people }: Problem, personId: string): string =>
  people.find(({ id }) => id === personId)?.name ?? personId;

/** `Ada`, `Ada and Bo`, `Ada, Bo and Cy`. */
function listWords(names: readonly string[]): string {
  const last = names.at(-1) ?? '';
  return names.length < 2 ? last : `${names.slice(0, -1).join(', ')} and ${last}`;
}
