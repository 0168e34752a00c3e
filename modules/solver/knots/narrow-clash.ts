import type { Requirement } from '../../problem';
import type { ProbeAnswer, RelaxationProbe } from './relaxation-probe';

/** Lengths of windows that are tried, in days. */
const widths = [1, 2, 3, 5, 8, 14];

/**
 * Looks for the fewest days in a row whose floors and ceilings clash by themselves with the rest of a clash:
 * a filter alone ends at some smallest set, which may be spread over weeks although a short one exists. The
 * answer of the first such window; null when there is none, or no time.
 */
export function narrowClash(
  probe: RelaxationProbe,
  requirements: readonly Requirement[],
  clash: ReadonlySet<number>,
): ReadonlySet<number> | null {
  const dayOf = (member: number): number | null => {
    const requirement = requirements[member];
    const isPlaced = requirement?.kind === 'floor' || requirement?.kind === 'ceiling';
    return isPlaced ? requirement.dayIndex : null;
  };
  const days = [...new Set([...clash].flatMap((member) => dayOf(member) ?? []))].sort(
    (one, other) => one - other,
  );
  const [first = 0, last = 0] = [days[0], days.at(-1)];
  for (const width of widths.filter((each) => each <= last - first)) {
    for (const from of days) {
      const isIn = (member: number): boolean => {
        const day = dayOf(member);
        return day === null || (day >= from && day < from + width);
      };
      const answer: ProbeAnswer | null = probe.test(new Set([...clash].filter(isIn)));
      if (!answer) return null;
      if (answer.clashes) return answer.used;
    }
  }
  return null;
}
