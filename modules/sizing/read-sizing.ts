import { now } from '../../db/clock';
import type { Actor } from '../access';
import { requireTeam } from '../access/server';
import { listFloors, listShiftKinds } from '../coverage/server';
import { listPeople, listSkills } from '../people/server';
import { readPayRules } from '../rules/server';
import { mondayOf, type Outcome, ok, type TeamId, toLocal } from '../units';
import { defaultInput } from './default-input';
import type { Sizing } from './sizing';
import type { SizingSheet } from './sizing-sheet';
import { findLatestSizing } from './store';

/** The sizing of a team that was asked for last; null before the first one. */
export function readLatestSizing(actor: Actor, teamId: TeamId): Outcome<Sizing | null> {
  const team = requireTeam(actor, 'sizing.run', teamId);
  return team.ok ? ok(findLatestSizing(teamId)) : team;
}

/** What the sizing page needs; the table to begin with takes the floors of the running week. */
export function readSizingSheet(actor: Actor, teamId: TeamId): Outcome<SizingSheet> {
  const team = requireTeam(actor, 'sizing.run', teamId);
  if (!team.ok) return team;
  const skills = listSkills(teamId);
  const kinds = listShiftKinds(teamId);
  const thisWeek = mondayOf(toLocal(now(), team.value.zone).date);
  const beginning = defaultInput(thisWeek, {
    kinds,
    skills,
    floors: listFloors(teamId),
    people: listPeople(teamId),
    pay: readPayRules(team.value.organisationId),
  });
  return ok({ team: team.value, skills, kinds, beginning, latest: findLatestSizing(teamId) });
}
