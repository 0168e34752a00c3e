import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { type Attachment, type ParsedMail, simpleParser } from 'mailparser';
import { type FakeMail, type FakeMailSummary, fakeMailNameSchema } from './fake-mail';
import { outboxIdOf } from './message';
import type { OutboxId } from './store';

/** What came with a kept mail besides itself: the outbox row it stems from, null for a stranger's. */
export interface Kept<T> {
  readonly mail: T;
  readonly outboxId: OutboxId | null;
}

/** The newest kept mails of a folder, at most `limit`; none when the folder is not there. */
export async function listFakeMails(
  folder: string,
  limit: number,
): Promise<Kept<FakeMailSummary>[]> {
  const files = await readdir(folder).catch(() => []);
  const names = files
    .filter((name) => fakeMailNameSchema.safeParse(name).success)
    .sort((a, b) => Number.parseInt(b, 10) - Number.parseInt(a, 10))
    .slice(0, limit);
  const kept: Kept<FakeMailSummary>[] = [];
  for (const name of names) {
    const parsed = await parseFile(folder, name);
    if (parsed)
      kept.push({ mail: summaryOf(name, parsed), outboxId: outboxIdOf(parsed.messageId) });
  }
  return kept;
}

/** One kept mail in full; null when there is none of that name or the name is no mail file's. */
export async function readFakeMail(folder: string, name: string): Promise<Kept<FakeMail> | null> {
  if (!fakeMailNameSchema.safeParse(name).success) return null;
  const parsed = await parseFile(folder, name);
  if (!parsed) return null;
  const mail = {
    ...summaryOf(name, parsed),
    text: parsed.text ?? '',
    html: parsed.html || null,
    attachments: parsed.attachments.map((part) => ({
      name: nameOf(part),
      contentType: part.contentType,
      sizeBytes: part.size,
      text: part.contentType.startsWith('text/') ? part.content.toString('utf8') : null,
    })),
  };
  return { mail, outboxId: outboxIdOf(parsed.messageId) };
}

/** Reading may meet a file that was just removed: that is a mail that is not there. */
async function parseFile(folder: string, name: string): Promise<ParsedMail | null> {
  const source = await readFile(join(folder, name)).catch(() => null);
  return source ? simpleParser(source) : null;
}

function summaryOf(name: string, parsed: ParsedMail): FakeMailSummary {
  const to = Array.isArray(parsed.to) ? parsed.to : parsed.to ? [parsed.to] : [];
  return {
    name,
    to: to.map(({ text }) => text).join(', '),
    subject: parsed.subject ?? '',
    sentAtUtc: parsed.date?.getTime() ?? null,
    attachmentNames: parsed.attachments.map(nameOf),
  };
}

const nameOf = (part: Attachment): string => part.filename ?? 'unnamed';
