import { followClass, type NetRules } from './net-rules';

/*
 * A history of a person as digits, as far as any rule can still see it: the state of a resource-constrained
 * shortest path (Irnich and Desaulniers, in: Column Generation, Springer 2005, 33-65). States lie one after
 * the other in an Int32Array, `stateSize` digits each, because a net visits millions of them.
 */

/** The last group worked and how many days ago; 0 and 0 once it can hinder nothing. */
const group = 0;
const age = 1;
/** Days with a shift in a row. */
const run = 2;
/** Days off in a row, counted up to the shortest allowed. */
const free = 3;
/** 1: the run touches the first day and may be shorter than the shortest. */
const isExempt = 4;
const nightRun = 5;
/** 1: the weekend under way is already counted. */
const isMarked = 6;
const weekends = 7;
const nights = 8;
/** Exactly counted kinds, as one mixed number. */
const counts = 9;
/** In the units of the net. */
const minutes = 10;

export const stateSize = 11;

/** What the end of a line has worked. */
export interface EndCounts {
  readonly minutes: number;
  readonly nights: number;
  readonly weekends: number;
}

/** The history before the first day. */
export function firstState(rules: NetRules): Int32Array {
  const state = new Int32Array(stateSize);
  const before = Math.min(rules.runBefore, rules.runCap);
  state[run] = before;
  state[free] = before > 0 ? 0 : rules.shortestFree;
  state[isExempt] = before > 0 ? 1 : 0;
  state[nightRun] = Math.min(rules.nightsBefore, rules.nightCap);
  return state;
}

/**
 * Writes to `next` the history after one more day with a group (0: off); false when a rule forbids it.
 * Indexes are in range by construction; `as number` says so where a check would cost a hot loop.
 */
export function stepState(
  rules: NetRules,
  states: Int32Array,
  at: number,
  day: number,
  chosen: number,
  next: Int32Array,
): boolean {
  for (let digit = 0; digit < stateSize; digit += 1) next[digit] = states[at + digit] as number;
  if (rules.weekdays[day] === 0) next[isMarked] = 0;
  if (!stepRun(rules, next, day, chosen > 0)) return false;
  if (chosen === 0) {
    const older = (next[age] as number) + 1;
    const matters = followClass(rules, next[group] as number, older) !== 0;
    next[age] = matters ? older : 0;
    if (!matters) next[group] = 0;
    next[nightRun] = 0;
    return true;
  }
  return stepShift(rules, next, day, chosen);
}

/**
 * Whether a line may end so: hours, and runs into the shifts that follow the period. A shift that leaves too
 * little rest before them is no option of the person at all.
 */
export function mayEnd(rules: NetRules, states: Int32Array, at: number): boolean {
  const worked = (states[at + minutes] as number) * rules.minuteUnit;
  return (
    worked >= rules.leastMinutes &&
    worked <= rules.mostMinutes &&
    mayJoin(states[at + run] as number, rules.runAfter, rules.longestRun) &&
    mayJoin(states[at + nightRun] as number, rules.nightsAfter, rules.longestNights)
  );
}

/** A run that does not reach the end of the period does not join the one after it, whose length stands fast. */
const mayJoin = (length: number, after: number, longest: number): boolean =>
  length === 0 || after === 0 || length + after <= longest;

/** Whether the hours can still reach the least when so many minutes at most are to come. */
export const canReachLeast = (rules: NetRules, state: Int32Array, mostToCome: number): boolean =>
  (state[minutes] as number) * rules.minuteUnit + mostToCome >= rules.leastMinutes;

/** What a price can see of an end. */
export const readCounts = (rules: NetRules, states: Int32Array, at: number): EndCounts => ({
  minutes: (states[at + minutes] as number) * rules.minuteUnit,
  nights: states[at + nights] as number,
  weekends: states[at + weekends] as number,
});

function stepRun(rules: NetRules, next: Int32Array, day: number, works: boolean): boolean {
  const before = next[run] as number;
  const off = next[free] as number;
  if (works) {
    if (off > 0 && off < rules.shortestFree) return false;
    if (before + 1 > rules.longestRun) return false;
    const touchesStart = day === 0 || (before > 0 && next[isExempt] === 1);
    next[run] = Math.min(before + 1, rules.runCap);
    next[free] = 0;
    next[isExempt] = touchesStart && rules.shortestRun > 1 ? 1 : 0;
    return true;
  }
  if (day > 0 && before > 0 && next[isExempt] === 0 && before < rules.shortestRun) return false;
  // Days off that touch the first day are enough whatever their number.
  next[free] = day === 0 ? rules.shortestFree : Math.min(off + 1, rules.shortestFree);
  next[run] = 0;
  next[isExempt] = 0;
  return true;
}

function stepShift(rules: NetRules, next: Int32Array, day: number, chosen: number): boolean {
  const { groups } = rules;
  const at = day * groups.groupCount + chosen;
  const follow = followClass(rules, next[group] as number, next[age] as number);
  if (rules.isAllowed[follow * rules.dayCount * groups.groupCount + at] === 0) return false;
  next[group] = chosen;
  next[age] = 1;
  next[minutes] = (next[minutes] as number) + (groups.minutes[at] as number) / rules.minuteUnit;
  if ((next[minutes] as number) * rules.minuteUnit > rules.mostMinutes) return false;
  const isNight = groups.isNight[at] === 1;
  const inARow = isNight ? (next[nightRun] as number) + 1 : 0;
  if (inARow > rules.longestNights) return false;
  next[nightRun] = Math.min(inARow, rules.nightCap);
  if (isNight && rules.countsNights) next[nights] = (next[nights] as number) + 1;
  if (rules.countsWeekends && groups.marksWeekend[at] === 1 && next[isMarked] === 0) {
    next[isMarked] = 1;
    next[weekends] = (next[weekends] as number) + 1;
  }
  if ((next[nights] as number) > rules.mostNights) return false;
  if ((next[weekends] as number) > rules.mostWeekends) return false;
  return stepCounts(rules, next, groups.limitOf[chosen] as number);
}

function stepCounts(rules: NetRules, next: Int32Array, limit: number): boolean {
  let radix = 1;
  for (const one of rules.counted) {
    if (one.limit === limit) {
      const held = next[counts] as number;
      if (Math.floor(held / radix) % (one.most + 1) === one.most) return false;
      next[counts] = held + radix;
      return true;
    }
    radix *= one.most + 1;
  }
  return true;
}
