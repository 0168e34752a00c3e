import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';

/** Solvers of others that confirm our answers, and the Debian package of each. */
const solvers = { cbc: 'coinor-cbc', glpsol: 'glpk-utils' };
const browsers = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];

/** The browser that tests use: CHROMIUM_PATH, or where Debian and others put it; null without one. */
export function chromiumPath() {
  const wanted = process.env.CHROMIUM_PATH;
  return [wanted, ...browsers].find((place) => place && existsSync(place)) ?? null;
}

/** Installs what the tests need of Debian's packages where that is possible (as root); names what is missing. */
export function ensureTools() {
  const missing = missingPackages();
  const mayInstall = process.getuid?.() === 0 && existsSync('/usr/bin/apt-get');
  if (missing.length === 0 || !mayInstall) return missing;
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  spawnSync('apt-get', ['update'], { stdio: 'inherit', env });
  spawnSync('apt-get', ['install', '-y', ...missing], { stdio: 'inherit', env });
  return missingPackages();
}

function missingPackages() {
  const folders = (process.env.PATH ?? '').split(delimiter);
  const isThere = (command) => folders.some((folder) => existsSync(join(folder, command)));
  const missing = Object.keys(solvers).filter((command) => !isThere(command));
  return [...missing.map((command) => solvers[command]), ...(chromiumPath() ? [] : ['chromium'])];
}
