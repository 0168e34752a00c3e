import { mkdirSync, readdirSync } from 'node:fs';
import { rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { buffer } from 'node:stream/consumers';
import { SMTPServer } from 'smtp-server';
import { log } from '../../db/log';
import { fakeMailNameSchema } from './fake-mail';

export interface FakeSmtp {
  readonly port: number;
  readonly close: () => Promise<void>;
}

/** Largest mail it takes, in bytes. */
const largestMail = 10_000_000;

/**
 * Starts a mail server on this machine's own address that delivers nothing: it keeps each mail as a
 * numbered file. Numbers go on after a restart. One server a folder; port 0 takes any free port.
 */
export async function openFakeSmtp(options: {
  readonly folder: string;
  readonly port: number;
}): Promise<FakeSmtp> {
  mkdirSync(options.folder, { recursive: true });
  let lastNumber = highestNumber(options.folder);
  const server = new SMTPServer({
    disabledCommands: ['STARTTLS'],
    authOptional: true,
    disableReverseLookup: true,
    size: largestMail,
    onData(stream, _session, done) {
      buffer(stream)
        .then((content) => {
          if (stream.sizeExceeded) throw new Error('The mail is too large to keep.');
          lastNumber += 1;
          return keep(options.folder, lastNumber, content);
        })
        .then(() => done(), done);
    },
  });
  server.on('error', (error) => log().warn({ err: error }, 'fake mail server'));
  const port = await listen(server, options.port);
  return { port, close: () => new Promise((resolve) => server.close(() => resolve())) };
}

/** Written under another name first: a reader never sees half a mail. */
async function keep(folder: string, number: number, content: Buffer): Promise<void> {
  const file = join(folder, `${String(number).padStart(6, '0')}.eml`);
  await writeFile(`${file}.part`, content);
  await rename(`${file}.part`, file);
}

function highestNumber(folder: string): number {
  const names = readdirSync(folder).filter((name) => fakeMailNameSchema.safeParse(name).success);
  return names.reduce((highest, name) => Math.max(highest, Number.parseInt(name, 10)), 0);
}

function listen(server: SMTPServer, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.server.once('error', reject);
    server.listen(port, '127.0.0.1', () => {
      const address = server.server.address();
      resolve(typeof address === 'object' && address ? address.port : port);
    });
  });
}
