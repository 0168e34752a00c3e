import type { CalendarEntry } from '@/modules/roster';

/** What a calendar is narrowed to; null: everybody, every post. */
export interface Choice {
  readonly personId: CalendarEntry['personId'] | null;
  readonly skillName: string | null;
}

export const everything: Choice = { personId: null, skillName: null };

/** The entries of one person, one post, or both. */
export const chooseEntries = (
  entries: readonly CalendarEntry[],
  { personId, skillName }: Choice,
): CalendarEntry[] =>
  entries.filter(
    (entry) =>
      (personId === null || entry.personId === personId) &&
      (skillName === null || entry.skillName === skillName),
  );

/** The people and posts that occur, by name: what may be chosen. */
export function choicesIn(entries: readonly CalendarEntry[]) {
  const people = new Map(entries.map(({ personId, personName }) => [personId, personName]));
  return {
    people: [...people]
      .map(([id, name]) => ({ id, name }))
      .sort((a, b) => a.name.localeCompare(b.name, 'en-GB')),
    posts: [...new Set(entries.map(({ skillName }) => skillName))].sort((a, b) =>
      a.localeCompare(b, 'en-GB'),
    ),
  };
}
