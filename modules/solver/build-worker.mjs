import { join } from 'node:path';
import { build } from 'esbuild';

/** Bundles the body of the solver threads to dist/workers/solver.mjs; packages stay outside. */
export async function buildWorker() {
  await build({
    entryPoints: [join(import.meta.dirname, 'worker.ts')],
    outfile: join(import.meta.dirname, '..', '..', 'dist', 'workers', 'solver.mjs'),
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    packages: 'external',
    sourcemap: 'inline',
    logLevel: 'warning',
  });
}
