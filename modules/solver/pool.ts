import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { Piscina } from 'piscina';
import { env } from '../../db/env';
import { workerFile } from './worker-file';

/** What every solver thread is given. */
export interface SolverThreadData {
  /** HiGHS, compiled once a process. */
  readonly wasmModule: WebAssembly.Module;
}

/** A thread without work ends after this and gives its memory back. */
const idleMilliseconds = 60_000;
/** Heap of a thread beyond which it is ended and replaced; the memory of HiGHS counts apart. */
const mostHeapMegabytes = 600;

/** Kept on globalThis: pages, routes and start-up are separate bundles of one process. */
const shared = globalThis as typeof globalThis & { floorwrightSolverPool?: Promise<Piscina> };

/** The solver threads of this process, at most SOLVER_THREADS; further jobs wait in line. */
export function solverPool(): Promise<Piscina> {
  shared.floorwrightSolverPool ??= makePool();
  return shared.floorwrightSolverPool;
}

async function makePool(): Promise<Piscina> {
  const require = createRequire(join(process.cwd(), 'package.json'));
  const folder = dirname(require.resolve('highs'));
  const wasmModule = await WebAssembly.compile(await readFile(join(folder, 'highs.wasm')));
  const workerData: SolverThreadData = { wasmModule };
  return new Piscina({
    filename: workerFile('solver'),
    minThreads: 0,
    maxThreads: env().SOLVER_THREADS,
    idleTimeout: idleMilliseconds,
    resourceLimits: { maxOldGenerationSizeMb: mostHeapMegabytes },
    workerData,
  });
}

/** Ends all threads; the next job makes new ones. */
export async function closeSolver(): Promise<void> {
  const pool = shared.floorwrightSolverPool;
  delete shared.floorwrightSolverPool;
  await (await pool)?.destroy();
}
