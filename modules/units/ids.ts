/** Two or three letters that say what an id names, so that a wrong id is seen in a log at a glance. */
export type IdPrefix =
  | 'org'
  | 'tea'
  | 'usr'
  | 'ses'
  | 'mem'
  | 'per'
  | 'con'
  | 'ski'
  | 'lea'
  | 'knd'
  | 'flr'
  | 'hol'
  | 'ros'
  | 'ver'
  | 'asg'
  | 'run'
  | 'siz'
  | 'out'
  | 'aud'
  | 'wrk';

/** A prefixed text id, e.g. `per_k3v9...`. */
export type Id<P extends IdPrefix> = `${P}_${string}`;

export type OrganisationId = Id<'org'>;
export type TeamId = Id<'tea'>;
export type UserId = Id<'usr'>;
export type SessionId = Id<'ses'>;
export type PersonId = Id<'per'>;
export type SkillId = Id<'ski'>;
export type LeaveId = Id<'lea'>;
export type ShiftKindId = Id<'knd'>;
export type FloorId = Id<'flr'>;
export type RosterId = Id<'ros'>;
export type VersionId = Id<'ver'>;
export type RunId = Id<'run'>;

/** Makes a new id of 128 random bits. The one place where ids come from. */
export function newId<P extends IdPrefix>(prefix: P): Id<P> {
  return `${prefix}_${crypto.randomUUID().replaceAll('-', '')}`;
}
