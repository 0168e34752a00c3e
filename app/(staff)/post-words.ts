import type { OwnShift } from '@/modules/roster';

/** The post of a shift and who shares it: `Nurse, with Kwabena Tull`, or that nobody does. */
export function postWords({ withNames, skillName }: OwnShift): string {
  const last = withNames.at(-1);
  if (last === undefined) return `${skillName}, only you on this shift`;
  const names = withNames.length === 1 ? last : `${withNames.slice(0, -1).join(', ')} and ${last}`;
  return `${skillName}, with ${names}`;
}
