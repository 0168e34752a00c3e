interface SkillNeed {
  readonly skillId: string;
  readonly neededMinutes: number;
}

interface Supply {
  readonly skillIds: readonly string[];
  readonly minutes: number;
}

/** Beyond this many needed skills only single skills and all together are looked at. */
const mostSkillsInSets = 12;

/**
 * Least overtime that the needs force: the largest, over sets of skills, of what the set needs less
 * what the people who hold any of its skills have; and of everything needed less everything there is.
 * The condition of Hall's marriage theorem (P. Hall, J. London Math. Soc. 10, 1935, 26-30) for hours;
 * with every set looked at, it is exact for hours that can be split at will.
 */
export function overtimeBound(
  needs: readonly SkillNeed[],
  neededInAll: number,
  supplies: readonly Supply[],
): number {
  const needed = needs.filter(({ neededMinutes }) => neededMinutes > 0);
  const lacks = setsOf(needed).map((set) => {
    const holders = supplies.filter(({ skillIds }) =>
      set.some(({ skillId }) => skillIds.includes(skillId)),
    );
    return sum(set.map(({ neededMinutes }) => neededMinutes)) - sum(holders.map(minutesOf));
  });
  return Math.max(0, neededInAll - sum(supplies.map(minutesOf)), ...lacks);
}

const minutesOf = ({ minutes }: Supply): number => minutes;

const sum = (amounts: readonly number[]): number =>
  amounts.reduce((total, amount) => total + amount, 0);

/** Every set that is not empty, or the single ones when there would be too many. */
function setsOf<T>(items: readonly T[]): T[][] {
  if (items.length > mostSkillsInSets) return items.map((item) => [item]);
  const sets: T[][] = [];
  for (const item of items) sets.push([item], ...sets.map((set) => [...set, item]));
  return sets;
}
