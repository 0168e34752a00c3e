import { beforeAll, describe, expect, it, vi } from 'vitest';
import type { ShiftKind } from '@/modules/coverage';
import type { SizingAnswer } from '@/modules/problem';
import { readLatestSizing, sizeTeam } from '@/modules/sizing/server';
import type { SizingOutcome } from '@/modules/solver';
import { line, monday, must, openTeam, type SizedTeam } from './sized-team';

/** A solver that ends as each case says, in place of the real one. */
const ending = vi.hoisted(() => ({ outcome: null as unknown }));
vi.mock('@/modules/solver/server', () => ({ solveSizing: async () => ending.outcome }));

let team: SizedTeam;
let day: ShiftKind;

beforeAll(() => {
  team = openTeam();
  day = team.addKind('Day', 8, 16);
  team.addFloor(8, 16, [1, 1, 1, 1, 1, 0, 0]);
});

/** One person from Monday to Friday holds every floor. */
const right: SizingAnswer = {
  floorsHold: true,
  shortageMinutes: 0,
  shortages: [],
  people: [{ patternId: 'Day/0', count: 1 }],
  objective: 1,
  linearBound: 1,
  provenBound: 1,
  isProven: true,
  floorPrices: [],
};

function sizeWith(outcome: SizingOutcome, mostPeople: number | null = null) {
  ending.outcome = outcome;
  return sizeTeam(team.actor, team.teamId, {
    weekOf: monday,
    span: 'week',
    objective: 'people',
    lines: [line(day)],
    mostPeople,
  });
}

describe('an answer that its re-check does not confirm', () => {
  it.each<[string, Partial<SizingAnswer>]>([
    ['hides a shortage', { people: [] }],
    ['names another shortage', { people: [], floorsHold: false, shortageMinutes: 480 }],
    ['says that floors do not hold which do', { floorsHold: false }],
    ['counts other people than it lists', { objective: 2 }],
    ['claims a bound above itself', { provenBound: 2 }],
  ])('is refused and not stored when it %s', async (_, changes) => {
    const outcome = await sizeWith({ kind: 'answered', answer: { ...right, ...changes } });
    expect(outcome).toMatchObject({ ok: false, error: { code: 'failed' } });
    expect(must(readLatestSizing(team.actor, team.teamId))).toBeNull();
  });

  it('is refused when it exceeds a limit on people', async () => {
    const outcome = await sizeWith({ kind: 'answered', answer: right }, 0);
    expect(outcome).toMatchObject({ ok: false, error: { code: 'failed' } });
  });
});

describe('a solver without an answer', () => {
  it.each<SizingOutcome>([
    { kind: 'out-of-time' },
    { kind: 'failed', message: 'It broke.', cause: new Error('broken') },
  ])('is told in a sentence: $kind', async (end) => {
    const outcome = await sizeWith(end);
    expect(outcome).toMatchObject({ ok: false, error: { code: 'failed' } });
    expect(must(readLatestSizing(team.actor, team.teamId))).toBeNull();
  });
});

describe('an answer that is confirmed', () => {
  it('is stored', async () => {
    const sizing = must(await sizeWith({ kind: 'answered', answer: right }));
    expect(must(readLatestSizing(team.actor, team.teamId))).toEqual(sizing);
  });
});
