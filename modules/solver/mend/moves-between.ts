import type { RosterModel } from '../../model';
import type { Move } from './mending';

/** Every day of a person that differs, in the order of people and days. */
export function movesBetween(
  { works }: RosterModel,
  before: ArrayLike<number>,
  after: ArrayLike<number>,
): Move[] {
  return works.flatMap(({ person, byDay }) =>
    byDay.flatMap((columns, dayIndex): Move[] => {
      const at = (values: ArrayLike<number>) => {
        const work = columns.find(({ column }) => (values[column] ?? 0) > 0.5);
        return work
          ? { personId: person.id, shiftIndex: work.shift.index, postSkillId: work.postSkillId }
          : null;
      };
      const [was, is] = [at(before), at(after)];
      const isSame = was?.shiftIndex === is?.shiftIndex && was?.postSkillId === is?.postSkillId;
      return isSame ? [] : [{ personId: person.id, dayIndex, before: was, after: is }];
    }),
  );
}
