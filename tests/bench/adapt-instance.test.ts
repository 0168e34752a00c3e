import { describe, expect, it } from 'vitest';
import { readProblem } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { centsPerPoint, problemOf, rosterOf, tableOf } from './adapt-instance';
import type { Instance, RosterTable } from './instance';
import { seededFigures } from './random';
import { scoreRoster } from './score-roster';
import { smallInstance, smallTable } from './small-instance';

describe('an instance as a problem', () => {
  const instance = smallInstance();
  const problem = problemOf(instance);

  it('is a document that the product reads', () => {
    expect(readProblem(problem)).toEqual({ ok: true, value: problem });
  });

  it('gives each kind its own post, limits only where they bind, and 0 by the lack of the skill', () => {
    const [uma, vito, wen] = problem.people;
    expect(uma?.skillIds).toEqual(['am', 'pm']);
    expect(uma?.kindLimits).toEqual([]);
    expect(vito?.kindLimits).toEqual([{ kindId: 'pm', most: 3 }]);
    expect(wen?.skillIds).toEqual(['pm']);
    expect(problem.shifts[3]).toMatchObject({ kindId: 'pm', dayIndex: 1, postSkillIds: ['pm'] });
  });

  it('asks for cover as wished floors and priced ceilings, without a floor for nobody', () => {
    expect(problem.floors).toHaveLength(14 + 10);
    expect(problem.ceilings).toHaveLength(28);
    expect(problem.floors[0]).toMatchObject({ people: 1, priceCentsPerHour: 3000 });
    expect(problem.ceilings[11]).toMatchObject({ people: 0, priceCentsPerHour: 700 });
  });

  it('blocks a day off for its own day alone', () => {
    const line = (table: Partial<typeof smallTable>) =>
      rosterOf(instance, { ...smallTable, ...table });
    const pmBefore = ['am', 'am', 'pm', '', 'am', 'am', '', '', '', '', '', '', '', ''];
    const rules = proveRoster(problem, line({ Uma: pmBefore })).breaches.map(({ rule }) => rule);
    expect(rules).not.toContain('absence');
    const onIt = ['am', 'am', '', 'am', 'am', 'am', '', '', '', '', '', '', '', ''];
    const broken = proveRoster(problem, line({ Uma: onIt })).breaches.map(({ rule }) => rule);
    expect(broken).toContain('absence');
  });

  it('goes to and fro between rosters and tables', () => {
    expect(tableOf(instance, rosterOf(instance, smallTable))).toEqual(smallTable);
  });

  it('gives a person who may have no kind a skill that no shift takes', () => {
    const [, , wen, ...rest] = instance.people;
    if (!wen) throw new Error('There are three people.');
    const idle = { ...wen, mostOfKind: new Map(instance.kinds.map(({ id }) => [id, 0])) };
    const changed = problemOf({ ...instance, people: [idle, ...rest], cover: [] });
    expect(changed.people[0]?.skillIds).toEqual(['no post']);
  });
});

describe('the proof of the problem and the scorer of the file', () => {
  const instance = smallInstance();
  const problem = problemOf(instance);
  const figure = seededFigures(7);
  const judge = (table: RosterTable) => ({
    score: scoreRoster(instance, table),
    proof: proveRoster(problem, rosterOf(instance, table)),
  });

  it('agree on the objective of the roster that was scored by hand', () => {
    const { score, proof } = judge(smallTable);
    expect(proof.breaches).toEqual([]);
    expect(proof.costCents).toBe(score.objective * centsPerPoint);
  });

  it('agree on random lawful rosters, to the point', () => {
    const lawful = Array.from({ length: 60 }, () => lawfulTable(instance, figure));
    for (const table of lawful) {
      const { score, proof } = judge(table);
      expect(score.breaches).toEqual([]);
      expect(proof.breaches).toEqual([]);
      expect(proof.costCents).toBe(score.objective * centsPerPoint);
    }
    expect(
      new Set(lawful.map((table) => scoreRoster(instance, table).objective)).size,
    ).toBeGreaterThan(20);
  });

  it('agree on who breaks a rule in rosters at random', () => {
    const tables = Array.from({ length: 300 }, () =>
      Object.fromEntries(instance.people.map(({ id }) => [id, randomLine(instance, figure)])),
    );
    const broken = (ids: readonly string[]) => [...new Set(ids)].sort();
    for (const table of tables) {
      const { score, proof } = judge(table);
      expect(broken(proof.breaches.map(({ personId }) => personId))).toEqual(
        broken(score.breaches.map((breach) => breach.split(':')[0] ?? '')),
      );
    }
  });
});

/** Each person's line is drawn until the scorer finds nothing wrong with it. */
function lawfulTable(instance: Instance, figure: () => number): RosterTable {
  const lines = instance.people.map((person) => {
    const alone = { ...instance, people: [person], cover: [] };
    for (;;) {
      const table = { [person.id]: randomLine(instance, figure) };
      if (scoreRoster(alone, table).breaches.length === 0) return table;
    }
  });
  return Object.assign({}, ...lines);
}

/** Work and days off in runs of one to five. */
function randomLine({ dayCount, kinds }: Instance, figure: () => number): string[] {
  const line: string[] = [];
  let isWork = figure() < 0.5;
  while (line.length < dayCount) {
    const length = 1 + Math.floor(figure() * 5);
    const kind = kinds[Math.floor(figure() * kinds.length)]?.id ?? '';
    for (let day = 0; day < length && line.length < dayCount; day += 1)
      line.push(isWork ? kind : '');
    isWork = !isWork;
  }
  return line;
}
