/*
 * Runs a command of the benchmark: `node tests/bench/run.mjs roster --file ...`. Bundles the
 * workers and the commands, since Node does not read TypeScript, then calls `main` of the one asked for.
 */
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { build } from 'esbuild';
import { buildWorkers } from '../../app/build-workers.mjs';

const folder = join('dist', 'bench');
const [command, ...args] = process.argv.slice(2);

await buildWorkers();
await build({
  entryPoints: ['roster', 'bench', 'solve-case'].map((name) =>
    join(import.meta.dirname, `${name}.ts`),
  ),
  outdir: folder,
  outExtension: { '.js': '.mjs' },
  bundle: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  packages: 'external',
  sourcemap: 'inline',
  logLevel: 'warning',
});

try {
  const { main } = await import(pathToFileURL(join(folder, `${command}.mjs`)).href);
  await main(args);
} catch (error) {
  const isExpected = ['CommandError', 'InstanceError'].includes(error?.name);
  process.stderr.write(`${isExpected ? error.message : (error?.stack ?? error)}\n`);
  process.exitCode = 1;
}
