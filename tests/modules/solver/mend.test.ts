import { describe, expect, it } from 'vitest';
import { blendObjective, buildRosterModel, readRoster, withLevelBlend } from '@/modules/model';
import type { PlannedAssignment, PlannedRoster, Problem } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { mendRoster } from '@/modules/solver/mend/mend-roster';
import type { MendOptions, MendOutcome, NewAbsence } from '@/modules/solver/mend/mending';
import { withAbsences } from '@/modules/solver/mend/with-absences';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import { buildProblem } from '@/tests/support/problem-builder';
import { randomTeams } from '@/tests/support/random-teams';
import { realTools } from './analysis-solver';

/** A good roster of a problem: the levels first in practice, then cost. */
function planned(problem: Problem, targetGap = 0): PlannedRoster {
  const model = withLevelBlend(buildRosterModel(problem));
  const outcome = realTools.solve(model.linear, blendObjective, { limitSeconds: 60, targetGap });
  if (!('solution' in outcome) || !outcome.solution) throw new Error(outcome.kind);
  return readRoster(model, outcome.solution.values);
}

type Mended = Extract<MendOutcome, { kind: 'mended' }>;

function mend(
  problem: Problem,
  roster: PlannedRoster,
  absences: readonly NewAbsence[],
  options: Partial<MendOptions> = {},
): Mended {
  const given = { fromMinute: 0, untilMinute: 100_000, limitSeconds: 30, seed: 1, ...options };
  const outcome = mendRoster(realTools, problem, roster, { ...given, absences });
  if (outcome.kind !== 'mended') throw new Error(outcome.kind);
  return outcome;
}

const sick = (personId: string, day: number, days = 1): NewAbsence => ({
  personId,
  startMinute: day * 1440,
  endMinute: (day + days) * 1440,
  reason: 'ill',
});

const keyOf = ({ personId, shiftIndex, postSkillId }: PlannedAssignment): string =>
  `${personId} ${shiftIndex} ${postSkillId}`;

/** Three nurses, an Early and a Late on each day; everybody works at most five days. */
const ward = buildProblem({
  people: [{}, {}, {}].map(() => ({ contractMinutes: 2400, maximumMinutes: 2880 })),
  rules: { longestRunDays: 5 },
  floors: [0, 1, 2, 3, 4, 5, 6].flatMap((day) =>
    [420, 900].map((start) => ({
      floorId: String(start),
      dayIndex: day,
      startMinute: day * 1440 + start,
      endMinute: day * 1440 + start + 480,
    })),
  ),
});

describe('mending', () => {
  it('keeps every floor, touches few and never moves what lies outside the window', () => {
    const roster = planned(ward);
    const absent = roster.find(({ shiftIndex }) => ward.shifts[shiftIndex]?.dayIndex === 3);
    if (!absent) throw new Error('nobody works on day 3');
    const absences = [sick(absent.personId, 3)];
    const window = { fromMinute: 2 * 1440, untilMinute: 5 * 1440 };
    const mended = mend(ward, roster, absences, window);
    const { problem, roster: left } = withAbsences(ward, roster, absences);
    expect(mended).toMatchObject({ shortageMinutes: 0, isProven: true });
    expect(proveRoster(problem, mended.roster)).toMatchObject({
      breaches: [],
      shortageMinutes: 0,
      costCents: mended.costCents,
    });
    const outside = (list: PlannedRoster) =>
      list
        .filter(({ shiftIndex }) => {
          const start = ward.shifts[shiftIndex]?.startMinute ?? 0;
          return start < window.fromMinute || start >= window.untilMinute;
        })
        .map(keyOf)
        .sort();
    expect(outside(mended.roster)).toEqual(outside(left));
    expect(mended.touched).toEqual([...new Set(mended.moves.map(({ personId }) => personId))]);
  });

  it('credits the absence to the hours, so that nobody has to make them up', () => {
    const people = [{ minimumMinutes: 480, maximumMinutes: 480, contractMinutes: 480 }, {}];
    const problem = buildProblem({ people, floors: [{}] });
    const roster = [{ personId: 'ione', shiftIndex: 0, postSkillId: 'nurse' }];
    const mended = mend(problem, roster, [sick('ione', 0)]);
    expect(mended.roster).toEqual([{ personId: 'person-2', shiftIndex: 0, postSkillId: 'nurse' }]);
    expect(mended).toMatchObject({ touched: ['person-2'], shortageMinutes: 0 });
    expect(mended.aims.map(({ name, value }) => [name, value])).toEqual([
      ['shortage1', 0],
      ['touched', 1],
      ['moved', 1],
      ['cost', mended.costCents],
    ]);
    expect(mended.takeOvers).toHaveLength(1);
  });

  it('tells each lawful take-over and swap with its cost, at once', () => {
    // Ione falls ill for Early. Two worked a Night before: only Three may take it, or change with Four.
    const night = [{ dayIndex: -1, startMinute: -60, endMinute: 420, isNight: true }];
    const people = [{}, { history: night }, {}, { contractMinutes: 0, payCentsPerHour: 9000 }];
    const problem = buildProblem({
      people,
      floors: [{ floorId: 'e' }, { floorId: 'l', startMinute: 900, endMinute: 1380 }],
    });
    const roster = [
      { personId: 'ione', shiftIndex: 0, postSkillId: 'nurse' },
      { personId: 'person-3', shiftIndex: 2, postSkillId: 'nurse' },
    ];
    const { takeOvers, touched } = mend(problem, roster, [sick('ione', 0)]);
    // Overtime beyond a contract of nothing: 8 h at 90.00 and half as much again.
    expect(
      takeOvers.map(({ moves, costChangeCents }) => [
        moves.map(({ personId }) => personId),
        costChangeCents,
      ]),
    ).toEqual([
      [['person-4'], 108_000],
      [['person-3', 'person-4'], 108_000],
    ]);
    expect(takeOvers.every(({ shortageMinutes }) => shortageMinutes === 0)).toBe(true);
    expect(touched).toEqual(['person-4']);
  });

  it('leaves open what nobody can take, and proves it', () => {
    const problem = buildProblem({ people: [{}, { skillIds: ['desk'] }], floors: [{}] });
    const roster = [{ personId: 'ione', shiftIndex: 0, postSkillId: 'nurse' }];
    expect(mend(problem, roster, [sick('ione', 0)])).toMatchObject({
      roster: [],
      touched: [],
      shortageMinutes: 480,
      isProven: true,
    });
  });

  it('keeps the patched roster when there is no time for more, and claims nothing', () => {
    const problem = buildProblem({ people: [{}, {}], floors: [{}] });
    const roster = [{ personId: 'ione', shiftIndex: 0, postSkillId: 'nurse' }];
    expect(mend(problem, roster, [sick('ione', 0)], { limitSeconds: 0 })).toMatchObject({
      shortageMinutes: 0,
      touched: ['person-2'],
      isProven: false,
    });
  });

  it('says so when what stays as it is breaks a rule', () => {
    const problem = buildProblem({ people: [{}, {}], floors: [{}] });
    const roster = [
      { personId: 'ione', shiftIndex: 2, postSkillId: 'nurse' },
      { personId: 'ione', shiftIndex: 4, postSkillId: 'nurse' },
    ];
    const window = { fromMinute: 4 * 1440, untilMinute: 6 * 1440, limitSeconds: 20, seed: 1 };
    const outcome = mendRoster(realTools, problem, roster, {
      ...window,
      absences: [sick('ione', 5)],
    });
    expect(outcome).toMatchObject({ kind: 'impossible', sentence: expect.any(String) });
  });

  it('touches as few as trying every set of people finds', () => {
    for (const problem of randomTeams(12, 5)) {
      const roster = planned(problem);
      const [first] = roster;
      if (!first) continue;
      const day = problem.shifts[first.shiftIndex]?.dayIndex ?? 0;
      const absences = [sick(first.personId, day)];
      const mended = mend(problem, roster, absences);
      const { problem: after, roster: left } = withAbsences(problem, roster, absences);
      expect(mended.isProven).toBe(true);
      const proof = proveRoster(after, mended.roster);
      expect(proof).toMatchObject({ breaches: [], costCents: mended.costCents });
      expect(fewestTouched(after, left, mended.shortageMinutes)).toBe(mended.touched.length);
    }
  });

  it('mends a hospital of 24 people', () => {
    const problem = demoSizedProblem();
    const roster = planned(problem, 0.5);
    const vet = roster.find(
      ({ shiftIndex, postSkillId }) => shiftIndex === 43 && postSkillId === 'vet',
    );
    if (!vet) throw new Error('no vet on the Night of day 10');
    const window = { fromMinute: 10 * 1440, untilMinute: 18 * 1440, limitSeconds: 20 };
    const absences = [sick(vet.personId, 10, 2)];
    const mended = mend(problem, roster, absences, window);
    const proof = proveRoster(withAbsences(problem, roster, absences).problem, mended.roster);
    expect(proof).toMatchObject({ breaches: [], costCents: mended.costCents });
    expect(proof.shortageMinutes).toBe(mended.shortageMinutes);
    expect(mended.isProven).toBe(true);
  });
});

/** The smallest number of people who alone may change and reach the shortage, by trying all sets. */
function fewestTouched(problem: Problem, roster: PlannedRoster, shortage: number): number {
  const sets: string[][] = [[]];
  for (const { id } of problem.people) sets.push(...sets.map((set) => [...set, id]));
  sets.sort((one, other) => one.length - other.length);
  const enough = sets.find((free) => leastShortage(problem, roster, new Set(free)) <= shortage);
  return enough?.length ?? -1;
}

function leastShortage(problem: Problem, roster: PlannedRoster, free: ReadonlySet<string>): number {
  const people = problem.people.map((person) =>
    free.has(person.id)
      ? person
      : {
          ...person,
          pins: problem.days.map((_, dayIndex) => {
            const held = roster.find(
              ({ personId, shiftIndex }) =>
                personId === person.id && problem.shifts[shiftIndex]?.dayIndex === dayIndex,
            );
            return {
              dayIndex,
              shiftIndex: held?.shiftIndex ?? null,
              postSkillId: held?.postSkillId ?? null,
            };
          }),
        },
  );
  const model = buildRosterModel({ ...problem, people });
  if (model.levels.length === 0) return 0;
  const outcome = realTools.solve(model.linear, 'shortage1', { limitSeconds: 30 });
  return outcome.kind === 'optimal'
    ? Math.round(outcome.solution.objective)
    : Number.POSITIVE_INFINITY;
}
