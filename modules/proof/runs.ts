import type { Problem } from '../problem';
import { dateOfDay, dateWords } from './words';

/** Days in a row, both ends included; days before the period are negative. */
export interface Run {
  readonly from: number;
  readonly to: number;
}

/** The maximal runs of some days, in order; a day that comes twice counts once. */
export function runsOf(dayIndexes: readonly number[]): Run[] {
  const days = [...new Set(dayIndexes)].sort((one, other) => one - other);
  const runs: { from: number; to: number }[] = [];
  for (const day of days) {
    const last = runs.at(-1);
    if (last && last.to === day - 1) last.to = day;
    else runs.push({ from: day, to: day });
  }
  return runs;
}

export const lengthOf = ({ from, to }: Run): number => to - from + 1;

/** `Mon 1 Feb to Wed 3 Feb`, or `Mon 1 Feb` for a single day. */
export function spanWords(problem: Problem, { from, to }: Run): string {
  const day = (index: number): string => dateWords(dateOfDay(problem, index));
  return from === to ? day(from) : `${day(from)} to ${day(to)}`;
}
