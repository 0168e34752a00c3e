import nodemailer, { type Transporter } from 'nodemailer';
import { now } from '../../db/clock';
import { env } from '../../db/env';
import { log } from '../../db/log';
import { mostTries, nextTryAt } from './back-off';
import { smtpUrl } from './mail-server';
import { messageOf } from './message';
import { listDueMails, markSent, markTried, type WaitingMail } from './store';

/** Mails sent, and tries that failed, in one round. */
export interface Delivery {
  readonly sent: number;
  readonly failed: number;
}

/** Mails read from the outbox at a time. */
const batchSize = 50;

/** Waits for the mail server, in milliseconds; SMTP_URL may carry others as query parameters. */
const patience = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 60_000 };

/** Errors of nodemailer that concern the server, not the mail at hand. */
const serverErrors = new Set([
  'ECONNECTION',
  'ETIMEDOUT',
  'ESOCKET',
  'EDNS',
  'ETLS',
  'EAUTH',
  'EPROTOCOL',
]);

const shared = globalThis as typeof globalThis & {
  floorwrightDelivery?: Promise<Delivery> | undefined;
};

/**
 * Sends what is due. Never overlaps with itself in this process: a second call joins the round that
 * runs. A failed try is made again later (see back-off.ts). What is sent is noted right after sending;
 * a crash in between sends that mail twice, under one Message-ID.
 */
export function deliverWaiting(): Promise<Delivery> {
  shared.floorwrightDelivery ??= deliverRound().finally(() => {
    shared.floorwrightDelivery = undefined;
  });
  return shared.floorwrightDelivery;
}

async function deliverRound(): Promise<Delivery> {
  const total = { sent: 0, failed: 0 };
  for (;;) {
    const due = listDueMails(now(), batchSize);
    if (!due.length) return total;
    const { sent, failed } = await deliver(due);
    total.sent += sent;
    total.failed += failed;
  }
}

async function deliver(due: readonly WaitingMail[]): Promise<Delivery> {
  const transport = await openTransport();
  let failed = 0;
  let closedDoors = 0;
  for (const [index, mail] of due.entries()) {
    const error = await trySend(transport, mail);
    closedDoors = serverErrors.has(codeOf(error)) ? closedDoors + 1 : 0;
    if (error === null) continue;
    // Two in a row: the rest would meet the same closed door and waits without knocking. One alone
    // may be a mail that the server hangs up on, and must not hold up the others.
    const isServerDown = closedDoors === 2;
    const stopped = isServerDown ? due.slice(index) : [mail];
    for (const one of stopped) noteFailure(one, error);
    failed += stopped.length;
    if (isServerDown) break;
  }
  return { sent: due.length - failed, failed };
}

async function openTransport(): Promise<Transporter> {
  const url = new URL(await smtpUrl());
  for (const [name, milliseconds] of Object.entries(patience)) {
    if (!url.searchParams.has(name)) url.searchParams.set(name, String(milliseconds));
  }
  return nodemailer.createTransport(url.href);
}

/** null when the server took the mail, otherwise why not. */
async function trySend(transport: Transporter, mail: WaitingMail): Promise<unknown> {
  try {
    await transport.sendMail(messageOf(mail, env().MAIL_FROM, now()));
  } catch (error) {
    return error;
  }
  markSent(mail.id, now());
  return null;
}

function noteFailure(mail: WaitingMail, error: unknown): void {
  const tries = mail.attempts + 1;
  const reason = error instanceof Error ? error.message : String(error);
  markTried(mail.id, tries, reason, tries < mostTries ? nextTryAt(tries, now()) : null);
  log().warn({ err: error, mail: mail.id, tries }, 'mail not sent');
}

const codeOf = (error: unknown): string =>
  error instanceof Error && 'code' in error ? String(error.code) : '';
