/*
 * `npm start`: makes what is missing (folder, session secret, worker bundles, build), then serves.
 * With --dev the pages are compiled as they are asked for.
 */
import { spawn } from 'node:child_process';
import { createHash, randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { buildWorkers } from './build-workers.mjs';

const isDev = process.argv.includes('--dev');
const port = process.env.PORT || '3000';
const stampFile = join('.next', 'source-stamp');
const sources = ['app', 'modules', 'db', 'emails', 'public', 'drizzle'];
const rootFiles = [
  'package-lock.json',
  'next.config.mjs',
  'tsconfig.json',
  'postcss.config.mjs',
  'instrumentation.ts',
];

mkdirSync('var', { recursive: true });
const environment = {
  ...process.env,
  PORT: port,
  NEXT_TELEMETRY_DISABLED: '1',
  NEXTAUTH_URL: process.env.NEXTAUTH_URL || `http://localhost:${port}`,
  NEXTAUTH_SECRET: process.env.NEXTAUTH_SECRET || keptSecret(join('var', 'session-secret')),
};

await buildWorkers();
if (!isDev) await buildIfChanged();
if (!process.argv.includes('--build-only')) serve();

/** The secret that seals session cookies, made once and readable by this account alone. */
function keptSecret(file) {
  if (!existsSync(file))
    writeFileSync(file, randomBytes(48).toString('base64url'), { mode: 0o600 });
  return readFileSync(file, 'utf8').trim();
}

async function buildIfChanged() {
  const stamp = sourceStamp();
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp) return;
  say('Building the pages, this takes a minute or two the first time.');
  const code = await run('build');
  if (code !== 0) process.exit(code ?? 1);
  writeFileSync(stampFile, stamp);
}

/** A hash of every source file: names and contents. */
function sourceStamp() {
  const hash = createHash('sha256');
  const files = sources.flatMap((folder) =>
    existsSync(folder)
      ? readdirSync(folder, { recursive: true, withFileTypes: true })
          .filter((entry) => entry.isFile())
          .map((entry) => join(entry.parentPath, entry.name))
      : [],
  );
  for (const file of [...files, ...rootFiles].sort()) hash.update(file).update(readFileSync(file));
  return hash.digest('hex');
}

function run(command, ...rest) {
  return new Promise((resolve) => start(command, ...rest).once('exit', resolve));
}

function start(command, ...rest) {
  const next = join('node_modules', 'next', 'dist', 'bin', 'next');
  return spawn(process.execPath, [next, command, ...rest], { stdio: 'inherit', env: environment });
}

function serve() {
  const server = start(isDev ? 'dev' : 'start', '--port', port);
  for (const signal of ['SIGINT', 'SIGTERM']) process.once(signal, () => server.kill(signal));
  server.once('exit', (code) => process.exit(code ?? 0));
  announceWhenUp().catch((error) => say(String(error)));
}

async function announceWhenUp() {
  const address = environment.NEXTAUTH_URL;
  for (let tries = 0; tries < 240; tries++) {
    await new Promise((resolve) => setTimeout(resolve, 500));
    const answer = await fetch(`http://127.0.0.1:${port}/sign-in`).catch(() => null);
    if (answer?.ok) break;
  }
  say(`Floorwright is ready at ${address}`);
  if ((process.env.DEMO || 'on') !== 'on') return;
  const { demoAccounts } = await import('../db/demo/accounts.mjs');
  say('Demo accounts, all with the password shown:');
  for (const { label, email, password } of demoAccounts)
    say(`  ${label.padEnd(12)}${email}   ${password}`);
}

function say(line) {
  process.stdout.write(`${line}\n`);
}
