import { existsSync } from 'node:fs';
import { build } from 'esbuild';

const entry = 'modules/solver/worker.ts';

/** Bundles the solver's worker thread to dist/workers/solver.mjs: the same file for start, dev and tests. */
export async function buildWorker() {
  if (!existsSync(entry)) return;
  await build({
    entryPoints: [entry],
    outfile: 'dist/workers/solver.mjs',
    bundle: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    packages: 'external',
    logLevel: 'warning',
  });
}
