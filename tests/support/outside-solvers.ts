import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/*
 * CBC and GLPK, two solvers that share nothing with HiGHS, as separate programs. A missing one fails the
 * test: on Debian, `apt-get install -y coinor-cbc glpk-utils`.
 */

/** Best objective of a model in the CPLEX LP format, or null when it has no solution. */
export type OutsideSolver = (lp: string) => number | null;

/** COIN-OR CBC. Its solution file begins with a sentence on status and objective. */
export const solveWithCbc: OutsideSolver = (lp) =>
  inFolder(
    lp,
    'cbc',
    (model, result) => [model, 'solve', 'solution', result],
    (text) => {
      const found = /^Optimal - objective value\s+(\S+)/.exec(text);
      if (found) return Number(found[1]);
      if (/^(Infeasible|Integer infeasible)/.test(text)) return null;
      throw new Error(`cbc ended without an answer: ${text.slice(0, 200)}`);
    },
  );

/** GNU GLPK. The line `s` of its solution file holds sizes, status letters and the objective. */
export const solveWithGlpk: OutsideSolver = (lp) =>
  inFolder(
    lp,
    'glpsol',
    (model, result) => ['--lp', model, '--tmlim', '60', '--write', result],
    (text, log) => {
      const whole = /^s mip \d+ \d+ (\w) (\S+)/m.exec(text);
      const plain = /^s bas \d+ \d+ (\w) (\w) (\S+)/m.exec(text);
      if (whole?.[1] === 'o') return Number(whole[2]);
      if (plain?.[1] === 'f' && plain[2] === 'f') return Number(plain[3]);
      if (/HAS NO (PRIMAL |INTEGER )?FEASIBLE SOLUTION|NO PRIMAL FEASIBLE/.test(log)) return null;
      throw new Error(`glpsol ended without an answer: ${log.slice(-400)}`);
    },
  );

function inFolder<T>(
  lp: string,
  program: string,
  argumentsOf: (model: string, result: string) => string[],
  read: (text: string, log: string) => T,
): T {
  const folder = mkdtempSync(join(tmpdir(), 'floorwright-lp-'));
  try {
    const model = join(folder, 'model.lp');
    const result = join(folder, 'result.txt');
    writeFileSync(model, lp);
    writeFileSync(result, '');
    const run = spawnSync(program, argumentsOf(model, result), { encoding: 'utf8' });
    if (run.error) throw new Error(`${program} could not be started`, { cause: run.error });
    return read(readFileSync(result, 'utf8'), run.stdout);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
