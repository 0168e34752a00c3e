import { join } from 'node:path';
import { build } from 'esbuild';

/** The bodies of the worker threads, by the name of the bundle that each becomes. */
const workers = {
  solver: 'modules/solver/worker.ts',
  bound: 'modules/roster/bound-worker.ts',
};

/** Bundles the bodies of the worker threads to dist/workers/<name>.mjs; packages stay outside. */
export async function buildWorkers() {
  const root = join(import.meta.dirname, '..');
  await build({
    entryPoints: Object.entries(workers).map(([name, file]) => ({
      in: join(root, file),
      out: name,
    })),
    outdir: join(root, 'dist', 'workers'),
    outExtension: { '.js': '.mjs' },
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    packages: 'external',
    sourcemap: 'inline',
    logLevel: 'warning',
  });
}
