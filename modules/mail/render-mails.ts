import { env } from '../../db/env';
import { publishedRosterMail } from '../../emails/published-roster';
import { readSender } from './address';
import { calendarFileName, calendarOf, shiftUid } from './calendar-file';
import type { MailShift, PersonShifts, Publication, RenderedMail } from './publication';

/**
 * Renders one mail per person with their own shifts and calendar file. To be awaited before the
 * transaction that publishes; `queueMails` then stores the result inside it.
 */
export function renderRosterMails(publication: Publication): Promise<RenderedMail[]> {
  return Promise.all(publication.people.map((person) => renderMail(publication, person)));
}

async function renderMail(publication: Publication, person: PersonShifts): Promise<RenderedMail> {
  const calendar = calendarFor(publication, person);
  const { people: _, ...facts } = publication;
  const content = await publishedRosterMail({
    ...facts,
    ...person,
    removedShifts: person.removedShifts ?? [],
    shiftsUrl: `${env().NEXTAUTH_URL.replace(/\/+$/, '')}/shifts`,
    calendarName: calendar === null ? null : calendarFileName(publication.startsOn),
  });
  return {
    teamId: publication.teamId,
    personId: person.personId,
    versionId: publication.versionId,
    recipient: person.recipient,
    ...content,
    calendar,
  };
}

function calendarFor(publication: Publication, person: PersonShifts): string | null {
  const eventOf = (shift: MailShift) => ({
    uid: shiftUid(publication.rosterId, person.personId, shift.date),
    startsAtUtc: shift.startsAtUtc,
    endsAtUtc: shift.endsAtUtc,
    title: `${shift.kindName}, ${shift.skillName}`,
    post: shift.skillName,
    teamName: publication.teamName,
  });
  const shifts = [
    ...person.shifts.map(eventOf),
    ...(person.removedShifts ?? []).map((shift) => ({ ...eventOf(shift), isCancelled: true })),
  ];
  if (!shifts.length) return null;
  return calendarOf({
    organisationName: publication.organisationName,
    organizerAddress: readSender(env().MAIL_FROM).address,
    personName: person.personName,
    zone: publication.zone,
    stampUtc: publication.publishedAtUtc,
    sequence: publication.versionNumber - 1,
    shifts,
  });
}
