import { env } from '../../db/env';
import { type Actor, can } from '../access';
import { listTeams } from '../access/server';
import { type Outcome, ok, refuse, type TeamId } from '../units';
import type { FakeMail, FakeMailSummary } from './fake-mail';
import { type Kept, listFakeMails, readFakeMail } from './fake-mails';
import { findTeamsOfMails, type OutboxId } from './store';

/** The newest mails that are read for the list, before those of other teams are left out. */
const longestList = 200;

const notHere = () => refuse('not-found', 'There is no such mail here.');

/** Kept mails are shown in demonstrations only, and only where the local fake keeps them. */
const isShown = (): boolean => env().DEMO === 'on' && !env().SMTP_URL;

/** The mails the local fake kept for the actor's teams, newest first. */
export async function listMails(actor: Actor): Promise<Outcome<FakeMailSummary[]>> {
  if (!can(actor, 'mail.read')) return refuse('not-allowed', 'Your role does not read mails.');
  if (!isShown()) return notHere();
  const kept = await listFakeMails(env().MAIL_FOLDER, longestList);
  return ok(keptForTeamsOf(actor, kept));
}

/** One kept mail in full; another team's is not found. */
export async function readMail(actor: Actor, name: string): Promise<Outcome<FakeMail>> {
  if (!can(actor, 'mail.read')) return refuse('not-allowed', 'Your role does not read mails.');
  if (!isShown()) return notHere();
  const kept = await readFakeMail(env().MAIL_FOLDER, name);
  const [mail] = keptForTeamsOf(actor, kept ? [kept] : []);
  return mail ? ok(mail) : notHere();
}

function keptForTeamsOf<T>(actor: Actor, kept: readonly Kept<T>[]): T[] {
  const ids = kept.flatMap(({ outboxId }) => outboxId ?? []);
  const teamOf: Map<OutboxId, TeamId> = findTeamsOfMails(ids);
  const own = new Set(listTeams(actor, 'mail.read').map(({ id }) => id));
  return kept
    .filter(({ outboxId }) => {
      const teamId = outboxId && teamOf.get(outboxId);
      return teamId !== null && teamId !== undefined && own.has(teamId);
    })
    .map(({ mail }) => mail);
}
