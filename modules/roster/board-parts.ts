import { listLeave } from '../people/server';
import type { Problem } from '../problem';
import type { Proof } from '../proof';
import { elapsedMinutes, type UtcMilliseconds } from '../units';
import { readConfirmations } from './store';
import type { KeptShift, Roster, Version } from './stored';
import type { TeamWords } from './team-words';
import type { BoardCell, BoardKind, BoardPerson } from './views';

/** Kept shifts as bricks on the time axis that begins at `origin`. */
export const toCells = (shifts: readonly KeptShift[], origin: UtcMilliseconds): BoardCell[] =>
  shifts.map((shift) => ({
    personId: shift.personId,
    date: shift.date,
    kindId: shift.shiftKindId,
    postSkillId: shift.skillId,
    startMinute: elapsedMinutes(origin, shift.startsAtUtc),
    endMinute: elapsedMinutes(origin, shift.endsAtUtc),
    paidMinutes: shift.paidMinutes,
    isPinned: shift.isPinned,
  }));

/** The kinds that are offered, and the retired ones that a brick still shows, by start time. */
export function boardKinds(words: TeamWords, cells: readonly BoardCell[]): BoardKind[] {
  const used = new Set(cells.map(({ kindId }) => kindId));
  return words.kinds
    .filter(({ id, isRetired }) => !isRetired || used.has(id))
    .map((kind) => ({
      id: kind.id,
      name: kind.name,
      letter: kind.letter,
      startMinute: kind.startMinute,
      endMinute: kind.endMinute,
      isNight: kind.isNight,
      tone: words.kind(kind.id).tone,
    }));
}

/** Everybody who can be planned in the period, and those who have shifts in it all the same. */
export function boardPeople(
  roster: Roster,
  version: Version,
  problem: Problem,
  proof: Proof | null,
  cells: readonly BoardCell[],
  words: TeamWords,
): BoardPerson[] {
  const contracts = new Map(problem.people.map((person) => [person.id, person]));
  const proven = new Map(proof?.people.map((person) => [person.personId, person]));
  const confirmed = readConfirmations(version.id);
  const leave = listLeave(roster.teamId, roster.startsOn, roster.endsOn);
  const planned = new Map<string, number>();
  for (const { personId, paidMinutes } of cells) {
    planned.set(personId, (planned.get(personId) ?? 0) + paidMinutes);
  }
  return words.people
    .filter(({ id }) => contracts.has(id) || planned.has(id))
    .map(({ id, name, skills }) => ({
      id,
      name,
      skillIds: skills
        .map(({ skillId }) => skillId)
        .filter((skillId) => contracts.get(id)?.skillIds.includes(skillId) ?? true),
      contractMinutes: contracts.get(id)?.contractMinutes ?? 0,
      plannedMinutes: planned.get(id) ?? 0,
      creditMinutes: contracts.get(id)?.creditMinutes ?? 0,
      overtimeMinutes: proven.get(id)?.overtimeMinutes ?? 0,
      nights: proven.get(id)?.nights ?? 0,
      weekends: proven.get(id)?.weekends ?? 0,
      mayWorkNights: contracts.get(id)?.mayWorkNights ?? false,
      leave: leave
        .filter(({ personId }) => personId === id)
        .map(({ startsOn, endsOn }) => ({ startsOn, endsOn })),
      confirmedAtUtc: confirmed.get(id) ?? null,
    }));
}
