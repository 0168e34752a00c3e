import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

const places = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];

/** The browser that tests use: CHROMIUM_PATH, or where Debian and others put it. */
export function chromiumPath() {
  const wanted = process.env.CHROMIUM_PATH;
  return [wanted, ...places].find((place) => place && existsSync(place)) ?? null;
}

/** Installs Debian's Chromium where that is possible (as root); says whether a browser is there. */
export function ensureChromium() {
  if (!chromiumPath() && process.getuid?.() === 0 && existsSync('/usr/bin/apt-get')) {
    spawnSync('apt-get', ['update'], { stdio: 'inherit' });
    spawnSync('apt-get', ['install', '-y', 'chromium'], {
      stdio: 'inherit',
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    });
  }
  return chromiumPath() !== null;
}
