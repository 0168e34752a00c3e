import { type ShiftKind, type Tone, toneOf } from '../coverage';
import { listShiftKinds } from '../coverage/server';
import type { Person, Skill } from '../people';
import { listPeople, listSkills } from '../people/server';
import type { TeamId } from '../units';

/** Names of a team's people, skills and shift kinds, of those that are gone too. */
export interface TeamWords {
  readonly people: readonly Person[];
  readonly skills: readonly Skill[];
  /** Retired kinds included. */
  readonly kinds: readonly ShiftKind[];
  readonly person: (id: string) => string;
  readonly skill: (id: string) => string;
  readonly kind: (id: string) => KindWords;
}

/** What a brick shows of its shift kind. */
export interface KindWords {
  readonly name: string;
  readonly letter: string;
  readonly tone: Tone;
  readonly isNight: boolean;
}

/** Reads the names of a team once, for everything that tells of its shifts. */
export function readTeamWords(teamId: TeamId): TeamWords {
  const people = listPeople(teamId);
  const skills = listSkills(teamId);
  const kinds = listShiftKinds(teamId, { withRetired: true });
  const offered = kinds.filter(({ isRetired }) => !isRetired);
  const kindWords = new Map<string, KindWords>(
    kinds.map((kind) => [
      kind.id,
      { name: kind.name, letter: kind.letter, tone: toneOf(kind, offered), isNight: kind.isNight },
    ]),
  );
  return {
    people,
    skills,
    kinds,
    person: finder('person', new Map(people.map(({ id, name }) => [id, name]))),
    skill: finder('skill', new Map(skills.map(({ id, name }) => [id, name]))),
    kind: finder('shift kind', kindWords),
  };
}

/** Foreign keys keep every name; one that is missing is a bug and throws. */
function finder<T>(noun: string, values: ReadonlyMap<string, T>): (id: string) => T {
  return (id) => {
    const value = values.get(id);
    if (value === undefined) throw new Error(`No ${noun} ${id} in this team`);
    return value;
  };
}
