import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/*
 * CBC and GLPK, two solvers that share nothing with HiGHS, as separate programs. A missing one fails the
 * test: on Debian, `apt-get install -y coinor-cbc glpk-utils`.
 */

export type ModelFormat = 'lp' | 'mps';

/** Best objective of a model as text, in the CPLEX LP or free MPS format; null when it has no solution. */
export type OutsideSolver = (model: string, format?: ModelFormat) => number | null;

/** COIN-OR CBC. Its solution file begins with a sentence on status and objective. */
export const solveWithCbc: OutsideSolver = (text, format = 'lp') =>
  inFolder(
    text,
    format,
    'cbc',
    (model, result) => [model, 'solve', 'solution', result],
    (solution) => {
      const found = /^Optimal - objective value\s+(\S+)/.exec(solution);
      if (found) return Number(found[1]);
      if (/^(Infeasible|Integer infeasible)/.test(solution)) return null;
      throw new Error(`cbc ended without an answer: ${solution.slice(0, 200)}`);
    },
  );

/** GNU GLPK. The line `s` of its solution file holds sizes, status letters and the objective. */
export const solveWithGlpk: OutsideSolver = (text, format = 'lp') =>
  inFolder(
    text,
    format,
    'glpsol',
    (model, result) => [
      format === 'lp' ? '--lp' : '--freemps',
      model,
      '--tmlim',
      '60',
      '--write',
      result,
    ],
    (solution, log) => {
      const whole = /^s mip \d+ \d+ (\w) (\S+)/m.exec(solution);
      const plain = /^s bas \d+ \d+ (\w) (\w) (\S+)/m.exec(solution);
      if (whole?.[1] === 'o') return Number(whole[2]);
      if (plain?.[1] === 'f' && plain[2] === 'f') return Number(plain[3]);
      if (/HAS NO (PRIMAL |INTEGER )?FEASIBLE SOLUTION|NO PRIMAL FEASIBLE/.test(log)) return null;
      throw new Error(`glpsol ended without an answer: ${log.slice(-400)}`);
    },
  );

/** A program that turns in circles is ended after this. */
const mostMilliseconds = 120_000;

function inFolder<T>(
  text: string,
  format: ModelFormat,
  program: string,
  argumentsOf: (model: string, result: string) => string[],
  read: (solution: string, log: string) => T,
): T {
  const folder = mkdtempSync(join(tmpdir(), 'floorwright-lp-'));
  try {
    const model = join(folder, `model.${format}`);
    const result = join(folder, 'result.txt');
    writeFileSync(model, text);
    writeFileSync(result, '');
    const options = { encoding: 'utf8', timeout: mostMilliseconds } as const;
    const run = spawnSync(program, argumentsOf(model, result), options);
    if (run.error) throw new Error(`${program} was not run to its end`, { cause: run.error });
    return read(readFileSync(result, 'utf8'), run.stdout);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
