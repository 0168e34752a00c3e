import { type Actor, canInTeam, type Need, type TeamInfo } from '../access';
import { findTeam } from '../access/server';
import type { Person } from '../people';
import { findPersonOfUser } from '../people/server';
import { type Outcome, ok, refuse } from '../units';

/**
 * The person the actor is, with their team, if the actor has the need in it. This is the whole row
 * scope of staff: nobody names another person here.
 */
export function requireOwnPerson(
  actor: Actor,
  need: Need,
): Outcome<{ readonly person: Person; readonly team: TeamInfo }> {
  const person = findPersonOfUser(actor.userId);
  const team = person && findTeam(person.teamId);
  if (!person?.isActive || !team) {
    return refuse(
      'not-found',
      'Your account belongs to nobody in a staff list yet. Ask your supervisor to link it.',
    );
  }
  return canInTeam(actor, need, team)
    ? ok({ person, team })
    : refuse('not-allowed', 'Only members of staff have own shifts.');
}
