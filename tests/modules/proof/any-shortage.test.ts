import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PlannedRoster, Problem, ProblemFloor } from '@/modules/problem';
import { type Proof, proveRoster } from '@/modules/proof';
import { buildFloor, buildProblem } from '@/tests/support/problem-builder';

const people = [
  { id: 'ione', skillIds: ['nurse'] },
  { id: 'ravi', skillIds: ['nurse', 'desk'] },
  { id: 'gwen', skillIds: ['desk'] },
];

/* A small world of 30 minutes for comparison with a count that is as plain as the definition. */
const kinds = [
  { id: 'A', startMinute: 0, endMinute: 10 },
  { id: 'B', startMinute: 5, endMinute: 20 },
  { id: 'C', startMinute: 12, endMinute: 30 },
];
const floorArbitrary = fc
  .record({
    startMinute: fc.nat(25),
    length: fc.integer({ min: 1, max: 15 }),
    people: fc.integer({ min: 0, max: 3 }),
    skillId: fc.constantFrom('nurse', 'desk', null),
    counting: fc.constantFrom('seated' as const, 'shared' as const),
    priceCentsPerHour: fc.constantFrom(null, null, 60, 120),
    priority: fc.integer({ min: 1, max: 3 }),
  })
  .map(({ length, ...floor }) => ({ ...floor, endMinute: floor.startMinute + length }));
const rosterArbitrary = fc.array(
  fc.record({
    personId: fc.constantFrom('ione', 'ravi', 'gwen'),
    shiftIndex: fc.nat(2),
    postSkillId: fc.constantFrom('nurse', 'desk'),
  }),
  { maxLength: 6 },
);
const worldArbitrary = fc.record({
  floors: fc.array(floorArbitrary, { maxLength: 5 }),
  roster: rosterArbitrary,
});

const worldOf = (floors: readonly Partial<ProblemFloor>[]): Problem =>
  buildProblem({ kinds, people, dayCount: 1, floors: floors.map(buildFloor) });

/** By the definition, one minute and one floor at a time. */
function countPlainly(problem: Problem, roster: PlannedRoster) {
  const result = { shortageMinutes: 0, wishedShortageMinutes: 0, wishedShortageCents: 0 };
  const minutesOf = new Map<number, number>();
  const add = (floor: ProblemFloor, missing: number) => {
    if (floor.priceCentsPerHour === null) {
      result.shortageMinutes += missing;
      minutesOf.set(floor.priority, (minutesOf.get(floor.priority) ?? 0) + missing);
    } else {
      result.wishedShortageMinutes += missing;
      result.wishedShortageCents += (missing * floor.priceCentsPerHour) / 60;
    }
  };
  for (let minute = 0; minute < 60; minute += 1) {
    const isOn = (window: { startMinute: number; endMinute: number }) =>
      window.startMinute <= minute && minute < window.endMinute;
    const onDuty = roster.filter(({ shiftIndex }) => {
      const shift = problem.shifts[shiftIndex];
      return shift && isOn(shift);
    });
    const asking = problem.floors.filter(isOn);
    for (const floor of asking.filter(({ counting }) => counting === 'shared')) {
      const holders = onDuty.filter(
        ({ personId }) =>
          floor.skillId === null ||
          people.find(({ id }) => id === personId)?.skillIds.includes(floor.skillId),
      );
      add(floor, Math.max(0, floor.people - holders.length));
    }
    for (const skillId of ['nurse', 'desk', null]) {
      let free = onDuty.filter((one) => skillId === null || one.postSkillId === skillId).length;
      const inTurn = asking
        .filter((floor) => floor.counting === 'seated' && floor.skillId === skillId)
        .sort((one, other) => turnOf(one) - turnOf(other));
      for (const floor of inTurn) {
        const served = Math.min(free, floor.people);
        free -= served;
        add(floor, floor.people - served);
      }
    }
  }
  const shortageByPriority = [1, 2, 3]
    .filter((priority) => minutesOf.get(priority))
    .map((priority) => ({ priority, minutes: minutesOf.get(priority) ?? 0 }));
  return { ...result, shortageByPriority };
}

/** Firm floors by priority, then wished ones, the dearest first. */
const turnOf = ({ priceCentsPerHour, priority }: ProblemFloor): number =>
  priceCentsPerHour === null ? priority : 1e9 - priceCentsPerHour;

const withoutZeros = (proof: Proof): Proof => ({
  ...proof,
  shortageByPriority: proof.shortageByPriority.filter(({ minutes }) => minutes > 0),
});

describe('any floors and any roster', () => {
  it('come to the same as a plain count by minute and floor', () => {
    fc.assert(
      fc.property(worldArbitrary, ({ floors, roster }) => {
        const problem = worldOf(floors);
        expect(withoutZeros(proveRoster(problem, roster))).toMatchObject(
          countPlainly(problem, roster),
        );
      }),
      { numRuns: 500 },
    );
  });

  it('the listed stretches add up to the totals and lie within their floors', () => {
    fc.assert(
      fc.property(worldArbitrary, ({ floors, roster }) => {
        const problem = worldOf(floors);
        const proof = proveRoster(problem, roster);
        const minutes = { firm: 0, wished: 0 };
        for (const stretch of proof.shortages) {
          const length = stretch.endMinute - stretch.startMinute;
          minutes[stretch.isFirm ? 'firm' : 'wished'] += length * stretch.missingPeople;
          expect(length).toBeGreaterThan(0);
          expect(stretch.missingPeople).toBeGreaterThan(0);
          expect(stretch.floorIds.length).toBeGreaterThan(0);
        }
        expect(minutes).toEqual({
          firm: proof.shortageMinutes,
          wished: proof.wishedShortageMinutes,
        });
      }),
    );
  });

  it('one assignment more never makes a shortage larger', () => {
    fc.assert(
      fc.property(worldArbitrary, ({ floors, roster }) => {
        const problem = worldOf(floors);
        const [, ...fewer] = roster;
        const [more, less] = [proveRoster(problem, roster), proveRoster(problem, fewer)];
        expect(more.shortageMinutes).toBeLessThanOrEqual(less.shortageMinutes);
        expect(more.wishedShortageMinutes).toBeLessThanOrEqual(less.wishedShortageMinutes);
        expect(more.wishedShortageCents).toBeLessThanOrEqual(less.wishedShortageCents);
      }),
    );
  });

  it('one floor more never makes a shortage smaller', () => {
    fc.assert(
      fc.property(worldArbitrary, ({ floors, roster }) => {
        const more = proveRoster(worldOf(floors), roster);
        const less = proveRoster(worldOf(floors.slice(1)), roster);
        expect(more.shortageMinutes).toBeGreaterThanOrEqual(less.shortageMinutes);
        expect(more.wishedShortageMinutes + more.shortageMinutes).toBeGreaterThanOrEqual(
          less.wishedShortageMinutes + less.shortageMinutes,
        );
      }),
    );
  });
});
