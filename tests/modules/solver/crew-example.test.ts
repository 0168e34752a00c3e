import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, it } from 'vitest';
import type { SizingProblem } from '@/modules/problem';
import { proveSizing } from '@/modules/proof';
import { closeSolver, solveSizing } from '@/modules/solver/server';

/*
 * `shiftcov.mod` of L. D'Agostino, an example of GLPK 5.0 in Debian's package glpk-utils: 16 hours on seven
 * days are to be covered, with nine patterns of shifts that have breaks. GLPK and CBC find 73 people, whole
 * or in parts. The file is read where the package puts it; systems that leave documents out have none.
 */
const example = '/usr/share/doc/glpk-utils/examples/shiftcov.mod';
const weekdays = ['MON', 'TUE', 'WED', 'THU', 'FRI', 'SAT', 'SUN'];

afterAll(closeSolver);

/** The example in the free MPS format, written by GLPK. */
function readExample(): string {
  const folder = mkdtempSync(join(tmpdir(), 'floorwright-example-'));
  try {
    const file = join(folder, 'model.mps');
    spawnSync('glpsol', ['-m', example, '--check', '--wfreemps', file]);
    return readFileSync(file, 'utf8');
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Names and values of one section, e.g. the cells of COLUMNS: column, then row and value, once or twice. */
function cellsOf(text: string, section: 'COLUMNS' | 'RHS'): [string, string, number][] {
  const lines = text.split('\n');
  const first = lines.indexOf(section) + 1;
  const length = lines.slice(first).findIndex((line) => /^[A-Z]/.test(line));
  return lines.slice(first, first + length).flatMap((line) => {
    const [name = '', ...pairs] = line.trim().split(/\s+/);
    if (pairs[0] === "'MARKER'") return [];
    return [0, 2].flatMap((at): [string, string, number][] =>
      pairs[at] === undefined ? [] : [[name, pairs[at] ?? '', Number(pairs[at + 1])]],
    );
  });
}

/** Minutes of the week of a row `Coverage[hour,day]`; null for the objective. */
function hourOf(row: string): { readonly startMinute: number; readonly endMinute: number } | null {
  const [, hour, day = ''] = /^Coverage\[(\d+),(\w+)\]$/.exec(row) ?? [];
  if (hour === undefined) return null;
  const startMinute = weekdays.indexOf(day) * 1440 + Number(hour) * 60;
  return { startMinute, endMinute: startMinute + 60 };
}

/** One floor for each hour that needs anybody, one pattern for each column. */
function problemOf(text: string): SizingProblem {
  const floors = cellsOf(text, 'RHS').flatMap(([, row, people]) => {
    const hour = hourOf(row);
    if (!hour) return [];
    const weekday = Math.floor(hour.startMinute / 1440);
    return [{ floorId: row, weekday, label: row, skillId: null, people, ...hour }];
  });
  const duties = new Map<string, { startMinute: number; endMinute: number }[]>();
  for (const [column, row, value] of cellsOf(text, 'COLUMNS')) {
    const hour = hourOf(row);
    if (hour && value === 1) duties.set(column, [...(duties.get(column) ?? []), hour]);
  }
  return {
    version: 1,
    cycleMinutes: 10_080,
    objective: 'people',
    floors,
    patterns: [...duties].map(([id, hours]) => ({
      id,
      lineId: id,
      label: id,
      skillId: null,
      duties: hours,
      costCents: 0,
    })),
    caps: [],
  };
}

it.runIf(existsSync(example))('takes 73 people, as a foreign solver says', async () => {
  const problem = problemOf(readExample());
  expect(problem.patterns).toHaveLength(9);
  const outcome = await solveSizing(problem, { limitSeconds: 30 });
  if (outcome.kind !== 'answered') throw new Error(outcome.kind);
  const { answer } = outcome;
  expect(answer).toMatchObject({ floorsHold: true, objective: 73, isProven: true });
  expect(answer.linearBound).toBeCloseTo(73, 6);
  expect(proveSizing(problem, answer.people)).toMatchObject({ objective: 73, shortageMinutes: 0 });
});
