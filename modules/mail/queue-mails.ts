import { now } from '../../db/clock';
import { isMailAddress } from './address';
import type { RenderedMail } from './publication';
import { insertMail } from './store';

/**
 * Puts rendered mails into the outbox. Synchronous, so that it can be called inside the transaction of
 * their cause: both are stored or neither. A person is told of one version once: a second mail throws.
 */
export function queueMails(mails: readonly RenderedMail[]): void {
  const atUtc = now();
  for (const mail of mails)
    insertMail({ ...mail, subject: oneLine(mail.subject) }, atUtc, refusalOf(mail));
}

const refusalOf = ({ recipient }: RenderedMail): string | null =>
  isMailAddress(recipient)
    ? null
    : `"${oneLine(recipient)}" is not an address that mail can be sent to.`;

/** Header values must not hold line breaks, or a name could add headers of its own (RFC 5322, 2.2). */
const oneLine = (text: string): string => text.replace(/\p{Cc}+/gu, ' ');
