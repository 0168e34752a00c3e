import { inTransaction } from '../../db/client';
import { now } from '../../db/clock';
import type { Actor, TeamInfo } from '../access';
import { recordAudit } from '../access/server';
import type { RenderedMail } from '../mail';
import { nudgeSender, queueMails, renderRosterMails } from '../mail/server';
import type { Problem } from '../problem';
import type { Proof } from '../proof';
import { type Outcome, ok, type RosterId, refuse, toLocal } from '../units';
import { composePublication, type Release } from './compose-publication';
import { gatherProblem } from './gather-problem';
import { confirmByOf, noticeWarningOf } from './notice';
import { proveShifts } from './prove-version';
import { requireRoster } from './require';
import type { PublishInput } from './roster-input';
import { shortageLines } from './shortage-lines';
import { findNewestPublished, getNewestVersion, listShifts, markPublished } from './store';
import type { KeptShift, Roster, Version } from './stored';
import { summariseRoster } from './summarise-roster';
import { readTeamWords } from './team-words';
import type { PublishedRoster } from './views';

/**
 * Publishes the draft as the next numbered version: re-checked against today's data, told to everybody
 * it concerns by mail, in one transaction. Broken rules refuse it; missing cover refuses it until
 * `acceptShortage` says that it is meant.
 */
export async function publishRoster(
  actor: Actor,
  rosterId: RosterId,
  input: PublishInput,
): Promise<Outcome<PublishedRoster>> {
  const found = requireRoster(actor, 'rosters.publish', rosterId);
  if (!found.ok) return found;
  const { roster, team } = found.value;
  const prepared = prepareRelease(actor, team, roster, input);
  if (!prepared.ok) return prepared;
  const release = prepared.value;
  const mails = await renderRosterMails(composePublication(release));
  const stored = storeRelease(release, mails);
  if (!stored.ok) return stored;
  nudgeSender();
  const warning = noticeWarningOf(team, roster.startsOn, toLocal(now(), team.zone).date);
  return ok({ ...summariseRoster(team, roster), warnings: warning ? [warning] : [] });
}

function prepareRelease(
  actor: Actor,
  team: TeamInfo,
  roster: Roster,
  { acceptShortage = false }: PublishInput,
): Outcome<Release> {
  const version = getNewestVersion(roster.id);
  const shifts = listShifts(version.id);
  const refusal = findEmptiness(roster, version, shifts);
  if (refusal) return refuse('conflict', refusal);
  const words = readTeamWords(team.id);
  const { problem } = gatherProblem(team, roster);
  const proof = proveShifts(problem, shifts, words);
  if (proof.breaches.length > 0) {
    return refuse(
      'conflict',
      'The roster breaks rules as things stand today. Run again before publishing.',
      proof.breaches.map(({ sentence }) => ({ path: 'roster', message: sentence })),
    );
  }
  if (proof.shortages.length > 0 && !acceptShortage) return refuseShort(problem, proof);
  const before = findNewestPublished(roster.id);
  const publishedAtUtc = now();
  return ok({
    actor,
    team,
    roster,
    version,
    shifts,
    shiftsBefore: before ? listShifts(before.id) : [],
    proof,
    confirmBy: confirmByOf(roster.startsOn, toLocal(publishedAtUtc, team.zone).date),
    publishedAtUtc,
    words,
  });
}

function findEmptiness(
  roster: Roster,
  version: Version,
  shifts: readonly KeptShift[],
): string | null {
  if (roster.closedAtUtc !== null) return 'This period is closed.';
  if (version.publishedAtUtc !== null) {
    return `Version ${version.number} is published and nothing has changed since. Run again to make a new draft.`;
  }
  return shifts.length === 0 ? 'The draft has no shifts yet. Start a run first.' : null;
}

/** One field error for each stretch that is short, so that a program can list them too. */
function refuseShort(problem: Problem, { shortages }: Proof): Outcome<never> {
  return refuse(
    'conflict',
    'The roster is short of people. Run again with other floors, or publish it as it is by accepting the shortage.',
    shortageLines(problem, shortages).map((message) => ({ path: 'acceptShortage', message })),
  );
}

/** The mails were rendered outside the transaction: a draft that changed meanwhile is refused. */
function storeRelease(release: Release, mails: readonly RenderedMail[]): Outcome<undefined> {
  const { actor, roster, version, publishedAtUtc, confirmBy, proof } = release;
  return inTransaction(() => {
    const current = getNewestVersion(roster.id);
    if (
      current.id !== version.id ||
      current.publishedAtUtc !== null ||
      JSON.stringify(listShifts(current.id)) !== JSON.stringify(release.shifts)
    ) {
      return refuse(
        'conflict',
        'The draft changed while it was being published. Look at it, then publish again.',
      );
    }
    markPublished(version.id, { publishedAtUtc, publishedBy: actor.userId, confirmBy, proof });
    queueMails(mails);
    recordAudit({
      actor,
      teamId: roster.teamId,
      action: 'roster.publish',
      subjectId: roster.id,
      detail: {
        version: version.number,
        mails: mails.length,
        shortageMinutes: proof.shortageMinutes,
        wishedShortageMinutes: proof.wishedShortageMinutes,
      },
    });
    return ok(undefined);
  });
}
