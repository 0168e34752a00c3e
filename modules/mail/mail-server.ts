import { env } from '../../db/env';
import { type FakeSmtp, openFakeSmtp } from './fake-smtp';

/** Kept on globalThis: pages, routes and start-up are separate bundles of one process. */
const shared = globalThis as typeof globalThis & {
  floorwrightFakeSmtp?: Promise<FakeSmtp> | undefined;
  floorwrightSmtpUrl?: string | undefined;
};

/** Starts the local fake of this process, once, on a free port; it keeps mails in MAIL_FOLDER. */
export function startFakeSmtp(): Promise<FakeSmtp> {
  shared.floorwrightFakeSmtp ??= openFakeSmtp({ folder: env().MAIL_FOLDER, port: 0 });
  return shared.floorwrightFakeSmtp;
}

/** Address of the mail server: SMTP_URL, or the local fake, which is started when it is not there. */
export async function smtpUrl(): Promise<string> {
  const url = shared.floorwrightSmtpUrl ?? env().SMTP_URL;
  return url ?? `smtp://127.0.0.1:${(await startFakeSmtp()).port}`;
}

/** Puts another mail server in place; for tests. */
export function replaceSmtpUrl(url: string): void {
  shared.floorwrightSmtpUrl = url;
}
