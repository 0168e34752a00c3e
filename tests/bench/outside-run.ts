import { spawn } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { BestSoFar } from './best-so-far';
import { cbc, glpsol, type OutsideProgram } from './outside-programs';

/** How a solver of others did on the compact model. Figures are those of the model's objective. */
export interface OutsideAnswer {
  readonly objective: number | null;
  readonly bound: number | null;
  readonly seconds: number;
  readonly at: Readonly<Record<string, number | null>>;
  /** Why there is no objective. */
  readonly failure: string | null;
}

export const outsidePrograms = { cbc, glpsol } as const;
export type OutsideName = keyof typeof outsidePrograms;

/** A program that does not end by itself is ended so long after its limit. */
const overrunSeconds = 20;

/** Lets a native solver work on a model in the CPLEX LP format, in a process of its own. */
export async function solveOutside(
  name: OutsideName,
  lp: string,
  limits: { readonly limitSeconds: number; readonly threads: number },
): Promise<OutsideAnswer> {
  const program = outsidePrograms[name];
  const folder = mkdtempSync(join(tmpdir(), 'floorwright-bench-'));
  try {
    const model = join(folder, 'model.lp');
    const result = join(folder, 'result.txt');
    writeFileSync(model, lp);
    writeFileSync(result, '');
    const args = program.argumentsOf({ model, result, ...limits });
    const run = await watch(program, name, args, limits.limitSeconds);
    if (run.failure !== null) return { ...nothing, failure: run.failure };
    const found = program.readResult(readFileSync(result, 'utf8'), run.log);
    run.best.see({ seconds: run.seconds, ...found });
    return {
      ...found,
      seconds: run.seconds,
      at: run.best.readings(limits.limitSeconds),
      failure: found.objective === null ? 'no roster' : null,
    };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

const nothing = { objective: null, bound: null, seconds: 0, at: {} };

interface Watched {
  readonly best: BestSoFar;
  readonly log: string;
  readonly seconds: number;
  readonly failure: string | null;
}

/** Reads the log line by line as it comes, since not every program tells the time in it. */
function watch(
  program: OutsideProgram,
  command: string,
  args: readonly string[],
  limitSeconds: number,
): Promise<Watched> {
  return new Promise((resolve) => {
    const startedAt = performance.now();
    const elapsed = () => (performance.now() - startedAt) / 1000;
    const best = new BestSoFar();
    const log: string[] = [];
    const child = spawn(command, args, { stdio: ['ignore', 'pipe', 'ignore'] });
    const timer = setTimeout(() => child.kill('SIGKILL'), (limitSeconds + overrunSeconds) * 1000);
    createInterface({ input: child.stdout }).on('line', (line) => {
      log.push(line);
      const seen = program.readLine(line);
      if (seen) best.see({ seconds: elapsed(), objective: null, bound: null, ...seen });
    });
    const end = (failure: string | null) => {
      clearTimeout(timer);
      resolve({ best, log: log.join('\n'), seconds: elapsed(), failure });
    };
    child.once('error', () => end(`not installed: apt-get install ${program.debianPackage}`));
    child.once('close', () => end(null));
  });
}
