import type { BoundRecord, Problem, ProblemPerson, ProblemShift, TeamRule } from '../../problem';
import { assertNever } from '../../units';
import { startMinutes } from '../broken-team-rules';
import type { Interval } from '../minute-counts';
import { type CoverGroup, groupOf, type RecordSlice } from './cover-groups';
import { mayWork, postsOf } from './line-options';

/** Why a record proves nothing about a problem, in one sentence, or null. */
export function findRecordFault(
  problem: Problem,
  record: BoundRecord,
  groups: readonly CoverGroup[],
): string | null {
  const fault =
    findPriceFault(problem, record) ??
    findSliceFault(problem, record, groups) ??
    findTeamRuleFault(problem, record) ??
    findSpreadFault(problem, record);
  return fault === null ? null : `The record of the bound ${fault}.`;
}

function findPriceFault(problem: Problem, record: BoundRecord): string | null {
  const isFirm = ({ priceCentsPerHour: price }: { priceCentsPerHour: number | null }) =>
    price === null;
  const priorities = new Set(problem.floors.filter(isFirm).map(({ priority }) => priority));
  for (const { priority } of record.shortage) {
    if (!priorities.has(priority)) {
      return `prices firm floors of priority ${priority}, which the problem does not have`;
    }
  }
  if (hasTwice(record.shortage.map(({ priority }) => priority))) return 'prices a priority twice';
  if (record.surplusCentsPerMinute > 0 && !problem.ceilings.some(isFirm)) {
    return 'prices firm ceilings, which the problem does not have';
  }
  return null;
}

function findSliceFault(
  problem: Problem,
  record: BoundRecord,
  groups: readonly CoverGroup[],
): string | null {
  const slicesOf = new Map<CoverGroup, RecordSlice[]>();
  for (const slice of record.slices) {
    const group = groupOf(groups, slice);
    if (!group || !isAskedThroughout(group, slice)) {
      return `prices ${sliceWords(slice)}, where the problem asks for nothing`;
    }
    if (isCut(problem, group, slice)) {
      return `prices ${sliceWords(slice)}, within which a shift starts or ends`;
    }
    slicesOf.set(group, [...(slicesOf.get(group) ?? []), slice]);
  }
  for (const slices of slicesOf.values()) {
    const inOrder = [...slices].sort((one, other) => one.startMinute - other.startMinute);
    const second = inOrder.find(
      ({ startMinute }, index) => startMinute < (inOrder[index - 1]?.endMinute ?? startMinute),
    );
    if (second) return `prices ${sliceWords(second)} twice`;
  }
  return null;
}

/** Whether somebody who counts may come or go inside the slice: then it has no one number of people. */
const isCut = (problem: Problem, group: CoverGroup, slice: Interval): boolean =>
  problem.shifts
    .filter(
      ({ startMinute, endMinute }) => isWithin(slice, startMinute) || isWithin(slice, endMinute),
    )
    .some((shift) =>
      problem.people.some(
        (person) => mayWork(problem, person, shift) && mayCount(problem, group, person, shift),
      ),
    );

const mayCount = (
  problem: Problem,
  { counting, skillId }: CoverGroup,
  person: ProblemPerson,
  shift: ProblemShift,
): boolean => {
  const posts = postsOf(problem, person, shift);
  if (skillId === null || counting === 'seated') {
    return posts.some((post) => skillId === null || post === skillId);
  }
  return posts.length > 0 && person.skillIds.includes(skillId);
};

const isWithin = ({ startMinute, endMinute }: Interval, minute: number): boolean =>
  startMinute < minute && minute < endMinute;

/** Whether some window of the group is open at every minute of the slice, and the slice is not empty. */
function isAskedThroughout({ windows }: CoverGroup, { startMinute, endMinute }: Interval): boolean {
  let until = startMinute;
  for (const window of [...windows].sort((one, other) => one.startMinute - other.startMinute)) {
    if (window.startMinute <= until) until = Math.max(until, window.endMinute);
  }
  return startMinute < endMinute && endMinute <= until;
}

const sliceWords = ({ of, skillId, id, startMinute, endMinute }: RecordSlice): string =>
  `${of} cover (${id ?? skillId ?? 'any skill'}) from minute ${startMinute} to ${endMinute}`;

function findTeamRuleFault(problem: Problem, record: BoundRecord): string | null {
  for (const { ruleId, at } of record.teamRules) {
    const rule = problem.teamRules.find(({ id }) => id === ruleId);
    if (!rule || !hasRow(problem, rule, at)) {
      return `prices the rule ${rule?.name ?? ruleId} at ${at}, which the problem does not have`;
    }
  }
  const rows = record.teamRules.map(({ ruleId, at }) => JSON.stringify([ruleId, at]));
  return hasTwice(rows) ? 'prices a rule that joins people twice' : null;
}

function hasRow(problem: Problem, rule: TeamRule, at: number | null): boolean {
  switch (rule.kind) {
    case 'together':
      return problem.shifts.some(({ index }) => index === at);
    case 'apart':
      return at !== null && startMinutes(problem).has(at);
    case 'mostFree':
      return at !== null && problem.days[at] !== undefined;
    case 'budget':
    case 'linear':
      return at === null;
    default:
      return assertNever(rule);
  }
}

function findSpreadFault(problem: Problem, record: BoundRecord): string | null {
  const insiders = new Set(problem.people.filter((one) => !one.isOutside).map(({ id }) => id));
  for (const { term, personId } of record.spreads) {
    if (problem.fairness[term]?.kind !== 'spread' || !insiders.has(personId)) {
      return `prices the part of ${personId} in fairness term ${term}, which the problem does not have`;
    }
  }
  const parts = record.spreads.map(({ term, personId }) => JSON.stringify([term, personId]));
  return hasTwice(parts) ? 'prices the part of a person in fairness twice' : null;
}

const hasTwice = (keys: readonly (string | number)[]): boolean => new Set(keys).size < keys.length;
