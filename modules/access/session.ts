import { now } from '../../db/clock';
import { type Outcome, ok, refuse, type SessionId } from '../units';
import type { Actor } from './actor';
import { hashPassword, isPassword } from './password';
import {
  endSession,
  findCredentials,
  findSession,
  insertSession,
  readActor,
  touchSession,
} from './store';

const minute = 60_000;
/** A session nobody uses ends after this time (OWASP ASVS 5.0, 7.3.1). */
export const idleMilliseconds = 12 * 60 * minute;
/** A session ends after this time in any case (OWASP ASVS 5.0, 7.3.2). */
export const longestMilliseconds = 7 * 24 * 60 * minute;
/** Failed tries allowed for one e-mail before it has to wait. */
const mostFailures = 10;
const failureWindow = 15 * minute;

/** RFC 5321 allows no longer address; longer passwords only cost time. */
const longestEmail = 254;
const longestPassword = 1000;

const failures = new Map<string, number[]>();
let decoyHash: Promise<string> | undefined;

const doesNotFit = () =>
  refuse('not-signed-in', 'E-mail and password do not fit together. Check both.');

/**
 * Checks e-mail and password and opens a session. The refusal says the same for an unknown e-mail, a
 * wrong password and a disabled account, and takes as long; ten failures make an e-mail wait.
 */
export async function signIn(email: string, password: string): Promise<Outcome<SessionId>> {
  const key = email.toLowerCase();
  const recent = (failures.get(key) ?? []).filter((at) => at > now() - failureWindow);
  if (recent.length >= mostFailures) {
    return refuse('too-many', 'Too many failed tries. Wait 15 minutes and try again.');
  }
  if (email.length > longestEmail || password.length > longestPassword) return doesNotFit();
  // Counted before the slow check, so that many tries at once count too.
  failures.set(key, [...recent, now()]);
  const found = findCredentials(key);
  decoyHash ??= hashPassword('no account has this password');
  const fits = await isPassword(found?.passwordHash ?? (await decoyHash), password);
  if (!found || !fits || found.disabledAtUtc !== null) {
    return doesNotFit();
  }
  failures.delete(key);
  return ok(insertSession(found.userId, now()));
}

/**
 * Who is behind a session right now, read from the database: null when the session ended or ran out
 * or the account is disabled. Roles are as they are at this moment.
 */
export function findActor(sessionId: SessionId): Actor | null {
  const session = findSession(sessionId);
  const at = now();
  if (!session || session.endedAtUtc !== null) return null;
  if (at - session.lastSeenAtUtc > idleMilliseconds) return null;
  if (at - session.createdAtUtc > longestMilliseconds) return null;
  if (at - session.lastSeenAtUtc > minute) touchSession(sessionId, at);
  return readActor(session.userId, sessionId);
}

/** Ends a session: an old cookie opens nothing from here on. */
export function signOut(sessionId: SessionId): void {
  endSession(sessionId, now());
}
