import { hashPassword } from '../../modules/access/server';
import { toLocal } from '../../modules/units';
import { newId } from '../../modules/units/server';
import { db, inTransaction } from '../client';
import { organisations } from '../schema';
import { demoPassword } from './accounts.mjs';
import { demoDates } from './dates';
import { insertAccount } from './insert-account';
import { insertRosters } from './insert-rosters';
import { insertTeam } from './insert-team';
import { organisation, ravelmere } from './ravelmere';
import { riverside } from './riverside';

/**
 * Loads the demo organisation into a database without organisations, all of it or nothing. `now` is an
 * instant in milliseconds: the demo's periods lie around its date.
 */
export async function loadDemo(now: number): Promise<void> {
  if (!isEmpty()) return;
  const passwordHash = await hashPassword(demoPassword);
  const dates = demoDates(toLocal(now, ravelmere.settings.zone).date);
  inTransaction(() => {
    if (!isEmpty()) return;
    const organisationId = newId('org');
    db()
      .insert(organisations)
      .values({ id: organisationId, ...organisation })
      .run();
    const account = { organisationId, passwordHash };
    insertAccount('Rowan Keele', { role: 'owner', teamId: null }, account);
    insertAccount('Marcus Tealby', { role: 'hr', teamId: null }, account);
    const { teamId, supervisorId } = insertTeam(ravelmere, dates, account);
    insertRosters(teamId, supervisorId, dates, now);
    insertTeam(riverside, dates, account);
  });
}

const isEmpty = (): boolean =>
  db().select({ id: organisations.id }).from(organisations).limit(1).get() === undefined;
