import { eq } from 'drizzle-orm';
import { listShiftKinds } from '../../modules/coverage/server';
import { listPeople } from '../../modules/people/server';
import { proveNewest } from '../../modules/roster/server';
import {
  addDays,
  elapsedMinutes,
  type PersonId,
  type RosterId,
  type TeamId,
  toInstant,
  type UserId,
  type VersionId,
} from '../../modules/units';
import { newId } from '../../modules/units/server';
import { db } from '../client';
import { assignments, confirmations, rosters, rosterVersions } from '../schema';
import { type DemoDates, type DemoPeriod, dayOf } from './dates';
import { insertWorked } from './insert-worked';
import { ravelmere } from './ravelmere';
import { draftRoster, runningRoster } from './ravelmere-rosters';

const { zone, noticeDays } = ravelmere.settings;
const dayMilliseconds = 86_400_000;
/** They have not confirmed the running period yet. */
const unconfirmed = ['Kwabena Tull', 'Mateo Grindle', 'Zuri Hallam'];
/** Leave granted after the draft was made: these cells are empty now. */
const takenAway = { name: 'Tobias Lindrao', days: [11, 12] };

/**
 * Inserts the team's three rosters: the running one published, confirmed and worked up to now, the
 * next a draft, the one after opened with nothing in it. Call it inside a transaction.
 */
export function insertRosters(
  teamId: TeamId,
  supervisorId: UserId,
  dates: DemoDates,
  now: number,
): void {
  const running = insertRoster(teamId, dates.running, runningRoster);
  publish(running, supervisorId, dates.running);
  const publishedAtUtc = toInstant(addDays(dates.running.startsOn, -noticeDays), 605, zone);
  for (const { id, name } of listPeople(teamId)) {
    if (!unconfirmed.includes(name)) confirm(running.versionId, id, publishedAtUtc);
  }
  insertWorked(running.versionId, now);
  insertRoster(teamId, dates.draft, withoutTaken(draftRoster));
  insertRoster(teamId, dates.next, {});
}

interface Inserted {
  readonly rosterId: RosterId;
  readonly versionId: VersionId;
}

function insertRoster(
  teamId: TeamId,
  period: DemoPeriod,
  plan: Readonly<Record<string, string>>,
): Inserted {
  const rosterId = newId('ros');
  const versionId = newId('ver');
  db()
    .insert(rosters)
    .values({ id: rosterId, teamId, ...period })
    .run();
  db().insert(rosterVersions).values({ id: versionId, rosterId, number: 1 }).run();
  insertAssignments(teamId, versionId, period, plan);
  return { rosterId, versionId };
}

function insertAssignments(
  teamId: TeamId,
  versionId: VersionId,
  period: DemoPeriod,
  plan: Readonly<Record<string, string>>,
): void {
  const kinds = new Map(listShiftKinds(teamId).map((kind) => [kind.letter, kind]));
  for (const person of listPeople(teamId)) {
    const [home, second] = person.skills;
    [...(plan[person.name] ?? '')].forEach((letter, index) => {
      const kind = kinds.get(letter.toUpperCase());
      const post = letter === letter.toUpperCase() ? home : second;
      if (!kind || !post) return;
      const date = dayOf(period, index + 1);
      const startsAtUtc = toInstant(date, kind.startMinute, zone);
      const endsAtUtc = toInstant(date, kind.endMinute, zone);
      db()
        .insert(assignments)
        .values({
          id: newId('asg'),
          versionId,
          personId: person.id,
          date,
          shiftKindId: kind.id,
          skillId: post.skillId,
          startsAtUtc,
          endsAtUtc,
          paidMinutes: elapsedMinutes(startsAtUtc, endsAtUtc) - kind.unpaidBreakMinutes,
        })
        .run();
    });
  }
}

function publish(
  { rosterId, versionId }: Inserted,
  publishedBy: UserId,
  { startsOn }: DemoPeriod,
): void {
  const publishedOn = addDays(startsOn, -noticeDays);
  db()
    .update(rosterVersions)
    .set({
      publishedAtUtc: toInstant(publishedOn, 605, zone),
      publishedBy,
      confirmBy: addDays(publishedOn, 3),
      proof: proveNewest(rosterId),
    })
    .where(eq(rosterVersions.id, versionId))
    .run();
}

function confirm(versionId: VersionId, personId: PersonId, publishedAtUtc: number): void {
  const confirmedAtUtc = publishedAtUtc + dayMilliseconds;
  db().insert(confirmations).values({ versionId, personId, confirmedAtUtc }).run();
}

function withoutTaken(plan: Readonly<Record<string, string>>): Readonly<Record<string, string>> {
  const row = [...(plan[takenAway.name] ?? '')];
  for (const day of takenAway.days) row[day - 1] = '.';
  return { ...plan, [takenAway.name]: row.join('') };
}
