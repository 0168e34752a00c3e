import { daysBetween, toLocal, type Zone } from '../units';
import type { KeptShift } from './stored';
import type { TeamWords } from './team-words';
import type { OwnShift } from './views';

/** A kept shift in words and local times, for its own person. Colleagues are added by `withNames`. */
export function describeShift(
  shift: KeptShift,
  zone: Zone,
  words: TeamWords,
  withNames: readonly string[],
): OwnShift {
  const { name, letter, tone } = words.kind(shift.shiftKindId);
  const start = toLocal(shift.startsAtUtc, zone);
  const end = toLocal(shift.endsAtUtc, zone);
  return {
    date: shift.date,
    kindName: name,
    letter,
    tone,
    skillName: words.skill(shift.skillId),
    startsAtUtc: shift.startsAtUtc,
    endsAtUtc: shift.endsAtUtc,
    startMinute: start.minute,
    endMinute: end.minute + 1440 * daysBetween(start.date, end.date),
    paidMinutes: shift.paidMinutes,
    withNames,
  };
}
