import type { BoundRecord, Problem, ProblemPerson } from '../../problem';
import type { CoverGroup } from './cover-groups';
import { groupOf } from './cover-groups';

/** What a person earns on each shift (by position) by the multipliers of cover. */
export interface CoverWorth {
  /** Whoever is on the shift. */
  readonly anybody: Float64Array;
  /** In the post of a skill. */
  readonly byPost: ReadonlyMap<string, Float64Array>;
  /** Whoever holds a skill. */
  readonly byHolder: ReadonlyMap<string, Float64Array>;
}

/** Adds up, for each shift, the multipliers of the slices that it covers. */
export function readCoverWorth(
  problem: Problem,
  record: BoundRecord,
  groups: readonly CoverGroup[],
): CoverWorth {
  const none = () => new Float64Array(problem.shifts.length);
  const anybody = none();
  const byPost = new Map(problem.skills.map(({ id }) => [id, none()]));
  const byHolder = new Map(problem.skills.map(({ id }) => [id, none()]));
  for (const slice of record.slices) {
    const counting = groupOf(groups, slice)?.counting;
    const bySkill = counting === 'seated' ? byPost : byHolder;
    const worth = slice.skillId === null ? anybody : bySkill.get(slice.skillId);
    problem.shifts.forEach(({ startMinute, endMinute }, position) => {
      if (startMinute <= slice.startMinute && slice.endMinute <= endMinute) {
        addAt(worth, position, slice.cents);
      }
    });
  }
  return { anybody, byPost, byHolder };
}

/** Worth of a person on a shift in a post. */
export const worthInPost = (
  { anybody, byPost, byHolder }: CoverWorth,
  person: ProblemPerson,
  position: number,
  postSkillId: string,
): number =>
  at(anybody, position) +
  at(byPost.get(postSkillId), position) +
  person.skillIds.reduce((sum, skillId) => sum + at(byHolder.get(skillId), position), 0);

/** Adds to one place of an array; nothing happens where there is none. */
export function addAt(values: Float64Array | undefined, position: number, amount: number): void {
  if (values) values[position] = at(values, position) + amount;
}

/** A value by position; 0 where there is none. */
export const at = (values: Float64Array | undefined, position: number): number =>
  values?.[position] ?? 0;
