/** What a program or a line of its log tells; null: nothing yet. */
export interface OutsideFigures {
  readonly objective: number | null;
  readonly bound: number | null;
}

/** How one native solver is called and what it says. */
export interface OutsideProgram {
  readonly debianPackage: string;
  readonly argumentsOf: (run: {
    readonly model: string;
    readonly result: string;
    readonly limitSeconds: number;
    readonly threads: number;
  }) => string[];
  /** What a line of the log tells of the whole-number search. */
  readonly readLine: (line: string) => Partial<OutsideFigures> | null;
  /** What the result file and the whole log tell at the end. */
  readonly readResult: (result: string, log: string) => OutsideFigures;
}

/** COIN-OR CBC, told to mind the wall clock and to use as many threads as the engine. */
export const cbc: OutsideProgram = {
  debianPackage: 'coinor-cbc',
  argumentsOf: ({ model, result, limitSeconds, threads }) => [
    model,
    ...['-seconds', String(limitSeconds), '-timeMode', 'elapsed'],
    ...(threads > 1 ? ['-threads', String(threads)] : []),
    ...['-solve', '-solution', result],
  ],
  readLine(line) {
    const found = /^Cbc00\d\dI .*solution of (\S+) found/.exec(line);
    if (found) return { objective: numberIn(found[1]) };
    const possible = /^Cbc0010I .*best possible (\S+) \(/.exec(line);
    return possible ? { bound: numberIn(possible[1]) } : null;
  },
  readResult(_result, log) {
    const objective = numberIn(/^Objective value:\s+(\S+)/m.exec(log)?.[1]);
    const bound = numberIn(/^Lower bound:\s+(\S+)/m.exec(log)?.[1]);
    const isSolved = /^Result - Optimal solution found/m.test(log);
    const isNothing = /no feasible solution found|no integer solution/i.test(log);
    if (isNothing) return { objective: null, bound };
    return { objective, bound: isSolved ? objective : bound };
  },
};

/** GNU GLPK. The line `s` of its result file holds sizes, a status letter and the objective. */
export const glpsol: OutsideProgram = {
  debianPackage: 'glpk-utils',
  argumentsOf: ({ model, result, limitSeconds }) => [
    ...['--lp', model, '--tmlim', String(Math.ceil(limitSeconds)), '--write', result],
  ],
  readLine(line) {
    const found = /mip =\s+(\S+|not found yet)\s+>=\s+(\S+)/.exec(line);
    return found ? { objective: numberIn(found[1]), bound: numberIn(found[2]) } : null;
  },
  readResult(result, log) {
    const [, status, value] = /^s mip \d+ \d+ (\w) (\S+)/m.exec(result) ?? [];
    const objective = status === 'o' || status === 'f' ? numberIn(value) : null;
    const last = [...log.matchAll(/mip =\s+(?:\S+|not found yet)\s+>=\s+(\S+)/g)].at(-1);
    return { objective, bound: status === 'o' ? objective : numberIn(last?.[1]) };
  },
};

/** The number in a text; null for words, and for the 1e50 that stands for no solution yet. */
function numberIn(text: string | undefined): number | null {
  const value = text === undefined ? Number.NaN : Number(text);
  return Math.abs(value) < 1e40 ? value : null;
}
