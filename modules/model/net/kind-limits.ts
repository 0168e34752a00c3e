import type { ProblemPerson } from '../../problem';
import type { KindGroups } from './kind-groups';

/**
 * Largest product of (most + 1) over the kind limits a net counts exactly. Larger maxima are left to a
 * check of the whole line and, in pricing, to a multiplier: they would swell the net more than they
 * sharpen it.
 */
const mostExactCounts = 10;

/** The limits to count exactly, the tightest first, as positions in the person's kindLimits. */
export function countExactly(
  person: ProblemPerson,
  groups: KindGroups,
  dayCount: number,
): { readonly limit: number; readonly most: number }[] {
  const used = new Set(groups.limitOf);
  const limits = person.kindLimits
    .map(({ most }, limit) => ({ limit, most }))
    .filter(({ limit, most }) => used.has(limit) && most < dayCount)
    .sort((one, other) => one.most - other.most);
  let product = 1;
  return limits.filter(({ most }) => {
    if (product * (most + 1) > mostExactCounts) return false;
    product *= most + 1;
    return true;
  });
}
