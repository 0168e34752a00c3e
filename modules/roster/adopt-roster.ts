import type { PlannedRoster, Problem } from '../problem';
import type { Proof } from '../proof';
import {
  formatDay,
  type PersonId,
  type RosterId,
  type RunId,
  type ShiftKindId,
  type SkillId,
  type TeamId,
} from '../units';
import { newId } from '../units/server';
import { originOf } from './axis';
import { getNewestVersion, insertDraft, listShifts, replaceShifts, setVersionRun } from './store';
import type { KeptShift, Version } from './stored';
import { readTeamWords } from './team-words';

type NewShift = Omit<KeptShift, 'id'>;

/**
 * Puts the roster of a run in place of the draft's shifts; where the newest version is published, a
 * new draft is made. Pins stay pins. Call it inside a transaction.
 */
export function adoptRoster(
  rosterId: RosterId,
  runId: RunId,
  problem: Problem,
  roster: PlannedRoster,
  proof: Proof,
): Version {
  const newest = getNewestVersion(rosterId);
  const pinned = new Set(pinnedShifts(newest).map(keyOf));
  const shifts = toShifts(problem, roster);
  const draftId = newest.publishedAtUtc === null ? newest.id : newId('ver');
  if (draftId !== newest.id) insertDraft(draftId, rosterId, newest.number + 1);
  replaceShifts(
    draftId,
    shifts.map((shift) => ({ ...shift, isPinned: pinned.has(keyOf(shift)) })),
  );
  setVersionRun(draftId, runId, proof);
  return getNewestVersion(rosterId);
}

/**
 * A pin of the newest version that the roster does not keep, in words, or null. It happens when
 * somebody pins while a run is on.
 */
export function findLostPin(
  rosterId: RosterId,
  teamId: TeamId,
  problem: Problem,
  roster: PlannedRoster,
): string | null {
  const kept = new Set(toShifts(problem, roster).map(keyOf));
  const lost = pinnedShifts(getNewestVersion(rosterId)).find((shift) => !kept.has(keyOf(shift)));
  if (!lost) return null;
  const words = readTeamWords(teamId);
  const kind = words.kind(lost.shiftKindId).name;
  return `${words.person(lost.personId)} was pinned to ${kind} on ${formatDay(lost.date)} while the run was on. The draft is unchanged; run again.`;
}

const pinnedShifts = (version: Version): KeptShift[] =>
  listShifts(version.id).filter(({ isPinned }) => isPinned);

const keyOf = ({ personId, date, shiftKindId, skillId }: NewShift): string =>
  `${personId} ${date} ${shiftKindId} ${skillId}`;

function toShifts(problem: Problem, roster: PlannedRoster): NewShift[] {
  const origin = originOf(problem).instant;
  return roster.map(({ personId, shiftIndex, postSkillId }) => {
    const shift = problem.shifts[shiftIndex];
    const date = shift && problem.days[shift.dayIndex]?.date;
    if (!shift || date === undefined) throw new Error(`No shift ${shiftIndex} in the problem`);
    return {
      personId: personId as PersonId,
      date,
      shiftKindId: shift.kindId as ShiftKindId,
      skillId: postSkillId as SkillId,
      startsAtUtc: origin + shift.startMinute * 60_000,
      endsAtUtc: origin + shift.endMinute * 60_000,
      paidMinutes: shift.paidMinutes,
      isPinned: false,
    };
  });
}
