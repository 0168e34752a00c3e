import type { HoursPerson } from '@/modules/hours';
import { formatHours } from '@/modules/units';

type Hours = Pick<
  HoursPerson,
  'contractMinutes' | 'leaveMinutes' | 'plannedMinutes' | 'differenceMinutes'
>;

/** A stretch of a bar in drawing units. */
interface Stretch {
  readonly start: number;
  readonly length: number;
}

/** The bar of one person: hours up to the contract, hours beyond it, leave after them, the contract's tick. */
export interface ContractBar {
  readonly within: Stretch;
  readonly beyond: Stretch | null;
  readonly leave: Stretch | null;
  readonly contractAt: number | null;
}

/** Shorter stretches could not be seen. */
const shortest = 4;

/** Minutes that count: worked where work is recorded, planned elsewhere. */
export const countedMinutes = ({ plannedMinutes, differenceMinutes }: Hours): number =>
  plannedMinutes + differenceMinutes;

/** Minutes at the right end of every bar of a table: nobody's is cut off. */
export const longestMinutes = (people: readonly Hours[]): number =>
  people.reduce(
    (longest, person) =>
      Math.max(longest, person.contractMinutes, countedMinutes(person) + person.leaveMinutes),
    0,
  );

/** The bar of a person in a room of `width` units that stands for `longest` minutes, linear from zero. */
export function contractBar(person: Hours, longest: number, width: number): ContractBar {
  const { contractMinutes, leaveMinutes } = person;
  const counted = countedMinutes(person);
  const at = (minutes: number) => (longest > 0 ? (minutes / longest) * width : 0);
  const stretch = (from: number, minutes: number): Stretch | null => {
    if (minutes <= 0) return null;
    const length = Math.max(shortest, at(minutes));
    return { start: Math.min(at(from), width - length), length };
  };
  const within = Math.min(counted, contractMinutes);
  return {
    within: { start: 0, length: at(within) },
    beyond: stretch(contractMinutes, counted - contractMinutes),
    leave: stretch(counted, leaveMinutes),
    contractAt: contractMinutes > 0 ? at(contractMinutes) : null,
  };
}

/** The same in words: hours and leave against the contract. `8 h over`, `as contract`. */
export function againstContract(person: Hours): string {
  if (person.contractMinutes === 0) return 'no contract hours';
  const over = countedMinutes(person) + person.leaveMinutes - person.contractMinutes;
  if (over === 0) return 'as contract';
  return `${formatHours(Math.abs(over))} h ${over > 0 ? 'over' : 'under'}`;
}
