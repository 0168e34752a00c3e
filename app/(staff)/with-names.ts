import { inSentence } from '@/app/_ui/calendar/block-words';
import type { OwnShift } from '@/modules/roster';

/** Who is in the same post on a shift: `with Kwabena Tull`, or that nobody is. */
export function withNames({ withNames: names, skillName }: OwnShift): string {
  if (names.length === 0) return `You are the only ${inSentence(skillName)} on this shift`;
  const last = names.at(-1);
  return names.length === 1 ? `with ${last}` : `with ${names.slice(0, -1).join(', ')} and ${last}`;
}
