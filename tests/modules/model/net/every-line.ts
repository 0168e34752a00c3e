import { type Net, type PersonLines, startNode } from '@/modules/model';
import type { PlannedAssignment, PlannedRoster, Problem, ProblemPerson } from '@/modules/problem';

/** One person's whole period: the index of the shift of each day, or null for a day off. */
export type ShiftLine = readonly (number | null)[];

/** Every choice of a shift or of none on each day, lawful or not. */
export function everyLine({ days, shifts }: Problem): ShiftLine[] {
  return [...days.keys()].reduce<ShiftLine[]>(
    (lines, day) => {
      const ofDay = shifts.filter(({ dayIndex }) => dayIndex === day).map(({ index }) => index);
      return lines.flatMap((line) => [null, ...ofDay].map((shift) => [...line, shift]));
    },
    [[]],
  );
}

/** A line as a roster. No rule but a pin cares for the post: it is the pinned one, or any that is allowed. */
export const rosterOf = (problem: Problem, person: ProblemPerson, line: ShiftLine): PlannedRoster =>
  line.flatMap((shiftIndex): PlannedAssignment[] => {
    const shift = problem.shifts[shiftIndex ?? -1];
    if (!shift) return [];
    const pinned = person.pins.find((pin) => pin.shiftIndex === shift.index)?.postSkillId;
    const allowed = person.skillIds.find((skill) => shift.postSkillIds?.includes(skill) ?? true);
    const postSkillId = pinned ?? allowed ?? person.skillIds[0] ?? '';
    return [{ personId: person.id, shiftIndex: shift.index, postSkillId }];
  });

/** The end of the net that a line leads to, as a position among the ends; -1 where the net has no such line. */
export function endOf(
  { net, options, mayBeFree, sideLimits }: PersonLines,
  line: ShiftLine,
): number {
  const worked = new Array<number>(net.groupCount).fill(0);
  let node = net.next.length > 0 ? startNode : -1;
  line.forEach((shiftIndex, day) => {
    if (node < 0) return;
    const group = shiftIndex === null ? 0 : groupOf(net, options, day, shiftIndex);
    const isOpen = shiftIndex === null ? mayBeFree[day] === 1 : group > 0;
    worked[group] = (worked[group] ?? 0) + 1;
    node = isOpen ? (net.next[node * net.groupCount + group] ?? -1) : -1;
  });
  const isOver = sideLimits.some(({ most, group }) => (worked[group] ?? 0) > most);
  return node < 0 || isOver ? -1 : node - (net.layers[net.dayCount] ?? 0);
}

/** The group in whose options the shift is on its day; 0 when a pin, or anything else, keeps it out. */
function groupOf(
  { groupCount }: Net,
  options: PersonLines['options'],
  day: number,
  shiftIndex: number,
): number {
  const groups = Array.from({ length: groupCount - 1 }, (_, index) => index + 1);
  const found = groups.find((group) =>
    options[day * groupCount + group]?.some(({ shift }) => shift.index === shiftIndex),
  );
  return found ?? 0;
}
