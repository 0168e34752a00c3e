import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { blendObjective, buildRosterModel, withLevelBlend, writeLp } from '@/modules/model';
import { problemOf } from './adapt-instance';
import { CommandError } from './command-line';
import { InstanceError } from './instance-lines';
import { solveOutside } from './outside-run';
import { main } from './roster';
import { scoreRoster } from './score-roster';
import { smallInstance, smallText } from './small-instance';

let folder = '';
const file = () => join(folder, 'small.txt');

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'floorwright-bench-test-'));
  writeFileSync(file(), smallText);
});
afterEach(() => vi.restoreAllMocks());
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the command that solves one instance', () => {
  it('prints one line that native solvers and the scorer confirm', async () => {
    const written = vi.spyOn(process.stdout, 'write').mockReturnValue(true);
    const out = join(folder, 'roster.json');
    await main(['--file', file(), '--seconds', '20', '--threads', '1', '--out', out]);
    const lines = written.mock.calls.map(([text]) => String(text));
    expect(lines).toHaveLength(1);
    expect(readFileSync(out, 'utf8')).toBe(lines[0]);
    const answer = JSON.parse(lines[0] ?? '');
    expect(Object.keys(answer)).toEqual(['objective', 'bound', 'seconds', 'at', 'roster']);
    expect(Object.keys(answer.at)).toEqual(['3', '10']);
    expect(answer.bound).toBe(answer.objective);
    expect(scoreRoster(smallInstance(), answer.roster)).toEqual({
      objective: answer.objective,
      breaches: [],
    });
    const { linear } = withLevelBlend(buildRosterModel(problemOf(smallInstance())));
    const lp = writeLp(linear, blendObjective);
    const limits = { limitSeconds: 20, threads: 1 };
    for (const name of ['cbc', 'glpsol'] as const) {
      const outside = await solveOutside(name, lp, limits);
      expect(outside).toMatchObject({ failure: null, objective: answer.objective * 100 });
      expect(outside.bound).toBe(outside.objective);
    }
  });

  it('says in a sentence what it cannot do', async () => {
    const missing = join(folder, 'missing.txt');
    await expect(main(['--file', missing])).rejects.toThrow(`The file ${missing} cannot be read.`);
    await expect(main([])).rejects.toThrow('--file names the instance to solve.');
    await expect(main(['--file', file(), '--threads', '0'])).rejects.toThrow(CommandError);
    writeFileSync(missing, 'SECTION_HORIZON\nx\n');
    await expect(main(['--file', missing])).rejects.toThrow(InstanceError);
  });
});
