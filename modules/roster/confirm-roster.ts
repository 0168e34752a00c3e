import { inTransaction } from '../../db/client';
import { now } from '../../db/clock';
import type { Actor } from '../access';
import { recordAudit } from '../access/server';
import { type Outcome, refuse } from '../units';
import { readOwnShifts } from './own-shifts';
import { requireOwnPerson } from './require-own';
import type { ConfirmInput } from './roster-input';
import {
  findConfirmation,
  findNewestPublished,
  findRoster,
  findVersion,
  insertConfirmation,
  listShiftsOfPerson,
} from './store';
import type { OwnShifts } from './views';

/**
 * Notes that the actor has seen their own shifts of a published version; a second time changes
 * nothing. Only the newest published version can be confirmed.
 */
export function confirmRoster(actor: Actor, { versionId }: ConfirmInput): Outcome<OwnShifts> {
  const own = requireOwnPerson(actor, 'own-shifts.confirm');
  if (!own.ok) return own;
  const { person, team } = own.value;
  const version = findVersion(versionId);
  const roster = version && findRoster(version.rosterId);
  if (!version || !roster || roster.teamId !== team.id || version.publishedAtUtc === null) {
    return refuse('not-found', 'There is no such published roster of your team.');
  }
  if (findNewestPublished(roster.id)?.id !== versionId) {
    return refuse('conflict', 'A newer version was published. Look at it, then confirm that one.');
  }
  if (listShiftsOfPerson(versionId, person.id).length === 0) {
    return refuse('conflict', 'You have no shifts in this roster; there is nothing to confirm.');
  }
  if (findConfirmation(versionId, person.id) === null) {
    inTransaction(() => {
      insertConfirmation(versionId, person.id, now());
      recordAudit({ actor, teamId: team.id, action: 'roster.confirm', subjectId: versionId });
    });
  }
  return readOwnShifts(actor);
}
