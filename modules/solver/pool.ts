import { join } from 'node:path';
import { Piscina } from 'piscina';
import { env } from '../../db/env';

/** A thread without work ends after this and gives its memory back. */
const idleMilliseconds = 60_000;

/** Kept on globalThis: pages, routes and start-up are separate bundles of one process. */
const shared = globalThis as typeof globalThis & { floorwrightSolverPool?: Piscina };

/** The solver threads of this process, at most SOLVER_THREADS; further jobs wait in line. */
export function solverPool(): Piscina {
  shared.floorwrightSolverPool ??= new Piscina({
    filename: join(process.cwd(), 'dist', 'workers', 'solver.mjs'),
    minThreads: 0,
    maxThreads: env().SOLVER_THREADS,
    idleTimeout: idleMilliseconds,
  });
  return shared.floorwrightSolverPool;
}

/** Ends all threads; the next job makes new ones. */
export async function closeSolver(): Promise<void> {
  const pool = shared.floorwrightSolverPool;
  delete shared.floorwrightSolverPool;
  await pool?.destroy();
}
