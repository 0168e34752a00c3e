import { toDate } from 'date-fns';
import type { SendMailOptions } from 'nodemailer';
import type { UtcMilliseconds } from '../units';
import { readSender } from './address';
import { calendarFileName } from './calendar-file';
import type { OutboxId, WaitingMail } from './store';

/**
 * A mail of the outbox as nodemailer wants it. The Message-ID is made from the outbox id: when the
 * process dies between sending and noting it, the mail goes out once more under the same Message-ID,
 * and receivers that drop twins drop it.
 */
export function messageOf(
  mail: WaitingMail,
  from: string,
  atUtc: UtcMilliseconds,
): SendMailOptions {
  const sender = readSender(from);
  return {
    from: sender,
    to: { name: '', address: mail.recipient },
    subject: mail.subject,
    date: toDate(atUtc),
    messageId: `<${mail.id}@${sender.address.split('@')[1]}>`,
    // RFC 3834: keeps holiday notices from answering.
    headers: { 'Auto-Submitted': 'auto-generated' },
    text: mail.text,
    html: mail.html,
    attachments: mail.calendar === null ? [] : [calendarPart(mail.calendar, mail.periodStartsOn)],
    disableFileAccess: true,
    disableUrlAccess: true,
  };
}

/** The type names the METHOD that stands inside the file (RFC 6047, 2.4). */
const calendarPart = (calendar: string, periodStartsOn: string | null) => ({
  filename: periodStartsOn ? calendarFileName(periodStartsOn) : 'shifts.ics',
  content: calendar,
  contentType: 'text/calendar; method=PUBLISH; charset=UTF-8',
});

/** The outbox id in a Message-ID that `messageOf` made, null for any other. */
export function outboxIdOf(messageId: string | undefined): OutboxId | null {
  const match = /^<?(out_[\w-]+)@/.exec(messageId ?? '');
  return match ? (match[1] as OutboxId) : null;
}
