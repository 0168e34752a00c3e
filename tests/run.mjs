/*
 * `npm test`: every check there is, one after the other, even when an earlier one fails. The last line
 * counts them all: "N passed, N failed"; types, lint and each test count one.
 */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { chromiumPath, ensureTools } from './support/debian-tools.mjs';

const results = join('test-results', 'run');
const totals = { passed: 0, failed: 0 };
rmSync(results, { recursive: true, force: true });
mkdirSync(results, { recursive: true });

const missing = ensureTools();
if (missing.length > 0) {
  process.stdout.write(`The tests need: apt-get install -y ${missing.join(' ')}\n`);
  count(0, missing.length);
}
check('lint and format', 'biome', ['check', '.']);
check('route types', 'next', ['typegen'], { NEXT_TELEMETRY_DISABLED: '1' });
check('types', 'tsc', ['--noEmit', '--incremental', 'false']);
unitAndIntegration();
browser();

process.stdout.write(`\n${totals.passed} passed, ${totals.failed} failed\n`);
process.exit(totals.failed > 0 || totals.passed === 0 ? 1 : 0);

function check(name, command, args, environment = {}) {
  count(call(name, command, args, environment) ? 1 : 0, 1);
}

function unitAndIntegration() {
  const file = join(results, 'vitest.json');
  const args = ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${file}`];
  const went = call('unit and integration tests', 'vitest', args);
  const report = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null;
  const passed = report?.numPassedTests ?? 0;
  const all = report?.numTotalTests ?? 0;
  // A run that fails outside any test (a file that cannot be read, say) counts one failure.
  count(passed, went ? all : Math.max(all, passed + 1));
}

function browser() {
  if (!chromiumPath()) return;
  const built = spawnSync(process.execPath, ['app/serve.mjs', '--build-only'], {
    stdio: 'inherit',
  });
  count(built.status === 0 ? 1 : 0, 1);
  if (built.status !== 0) return;
  const file = join(results, 'playwright.json');
  const went = call('browser tests', 'playwright', ['test', '--reporter=list,json'], {
    PLAYWRIGHT_JSON_OUTPUT_NAME: file,
    CHROMIUM_PATH: chromiumPath(),
  });
  const stats = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')).stats : null;
  const passed = stats?.expected ?? 0;
  const all = passed + (stats?.unexpected ?? 0) + (stats?.flaky ?? 0) + (stats?.skipped ?? 0);
  count(passed, went ? all : Math.max(all, passed + 1));
}

function call(name, command, args, environment = {}) {
  process.stdout.write(`\n== ${name}\n`);
  const outcome = spawnSync(join('node_modules', '.bin', command), args, {
    stdio: 'inherit',
    env: { ...process.env, ...environment },
  });
  return outcome.status === 0;
}

function count(passed, all) {
  totals.passed += passed;
  totals.failed += all - passed;
}
