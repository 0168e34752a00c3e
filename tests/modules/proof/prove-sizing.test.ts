import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { SizingFloor, SizingPattern, SizingProblem } from '@/modules/problem';
import { proveSizing } from '@/modules/proof';

const floor = (given: Partial<SizingFloor> = {}): SizingFloor => ({
  floorId: 'floor',
  weekday: 0,
  label: 'Monday',
  skillId: null,
  startMinute: 0,
  endMinute: 1440,
  people: 1,
  ...given,
});
const pattern = (given: Partial<SizingPattern> = {}): SizingPattern => ({
  id: 'pattern',
  lineId: 'line',
  label: 'Pattern',
  skillId: null,
  duties: [{ startMinute: 0, endMinute: 1440 }],
  costCents: 100,
  ...given,
});
const problem = (given: Partial<SizingProblem> = {}): SizingProblem => ({
  version: 1,
  cycleMinutes: 10080,
  objective: 'people',
  floors: [],
  patterns: [pattern()],
  caps: [],
  ...given,
});

/**
 * Five days on, two off, weekly needs Monday to Sunday 17 13 15 19 14 16 11: W. L. Winston, Operations
 * Research: Applications and Algorithms, 4th ed. 2004, section 3.5.
 */
const postOffice = (people: readonly number[]) => {
  const days = [0, 1, 2, 3, 4, 5, 6];
  const dayOf = (weekday: number) => ({
    startMinute: weekday * 1440,
    endMinute: (weekday + 1) * 1440,
  });
  return proveSizing(
    problem({
      floors: [17, 13, 15, 19, 14, 16, 11].map((need, weekday) =>
        floor({ floorId: `floor-${weekday}`, weekday, ...dayOf(weekday), people: need }),
      ),
      patterns: days.map((first) =>
        pattern({
          id: `start-${first}`,
          duties: [0, 1, 2, 3, 4].map((step) => dayOf((first + step) % 7)),
        }),
      ),
    }),
    people.map((count, first) => ({ patternId: `start-${first}`, count })),
  );
};

describe('a week of five days on and two off', () => {
  it('holds with 23 people in the right places', () => {
    expect(postOffice([7, 4, 1, 8, 0, 3, 0])).toMatchObject({ objective: 23, shortageMinutes: 0 });
  });

  it('lists what is short, by floor', () => {
    // By hand: 14 of 15 on Wednesday, 15 of 16 on Saturday, enough on the other days.
    const proof = postOffice([7, 4, 1, 8, 0, 2, 0]);
    expect(proof.objective).toBe(22);
    expect(
      proof.shortages.map(({ weekday, people, minutes }) => [weekday, people, minutes]),
    ).toEqual([
      [2, 1, 1440],
      [5, 1, 1440],
    ]);
    expect(proof.shortageMinutes).toBe(2 * 1440);
  });
});

describe('time in a circle', () => {
  it('a duty beyond the end covers the start', () => {
    const night = pattern({ duties: [{ startMinute: 1380, endMinute: 1860 }] });
    const morning = floor({ startMinute: 0, endMinute: 420 });
    const sized = problem({ cycleMinutes: 1440, patterns: [night], floors: [morning] });
    expect(proveSizing(sized, [{ patternId: 'pattern', count: 1 }]).shortageMinutes).toBe(0);
  });

  it('a floor beyond the end asks at the start', () => {
    const early = pattern({ duties: [{ startMinute: 0, endMinute: 420 }] });
    const night = floor({ startMinute: 1380, endMinute: 1860, people: 2 });
    const sized = problem({ cycleMinutes: 1440, patterns: [early], floors: [night] });
    expect(proveSizing(sized, [{ patternId: 'pattern', count: 1 }]).shortages).toEqual([
      { floorId: 'floor', weekday: 0, label: 'Monday', people: 2, minutes: 60 * 2 + 420 },
    ]);
  });
});

describe('who counts for what', () => {
  const floors = [
    floor({ floorId: 'nurse', skillId: 'nurse' }),
    floor({ floorId: 'any', people: 2 }),
  ];
  const patterns = [
    pattern({ id: 'nurse', skillId: 'nurse' }),
    pattern({ id: 'desk', skillId: 'desk' }),
    pattern({ id: 'none' }),
  ];
  it.each([
    ['nurse and desk', ['nurse', 'desk'], []],
    ['desk and a pattern of no skill', ['desk', 'none'], ['nurse']],
    ['a nurse alone', ['nurse'], ['any']],
    ['nobody', [], ['nurse', 'any']],
  ])('%s', (_, ids, short) => {
    const proof = proveSizing(
      problem({ floors, patterns }),
      ids.map((patternId) => ({ patternId, count: 1 })),
    );
    expect(proof.shortages.map(({ floorId }) => floorId)).toEqual(short);
  });

  it('floors stand alone where they overlap', () => {
    const proof = proveSizing(problem({ floors: [floor(), floor()] }), [
      { patternId: 'pattern', count: 1 },
    ]);
    expect(proof.shortageMinutes).toBe(0);
  });
});

describe('objective and caps', () => {
  const patterns = [
    pattern({ id: 'full', lineId: 'full', costCents: 500 }),
    pattern({ id: 'part', lineId: 'part', costCents: 300 }),
  ];
  const people = [
    { patternId: 'full', count: 3 },
    { patternId: 'part', count: 1 },
  ];
  it('counts people or pay', () => {
    expect(proveSizing(problem({ patterns }), people).objective).toBe(4);
    expect(proveSizing(problem({ patterns, objective: 'pay' }), people).objective).toBe(1800);
  });

  it.each([
    ['people on a line, at the limit', { lineIds: ['full'], limit: { people: 3 } }, true],
    ['people on a line, above it', { lineIds: ['full'], limit: { people: 2 } }, false],
    ['people on all lines', { lineIds: ['full', 'part'], limit: { people: 3 } }, false],
    ['a share, at the limit', { lineIds: ['part'], limit: { percentOfAll: 25 } }, true],
    ['a share, above it', { lineIds: ['part'], limit: { percentOfAll: 24 } }, false],
  ])('%s', (label, cap, holds) => {
    const sized = problem({ patterns, caps: [{ label, ...cap }] });
    expect(proveSizing(sized, people).capsHold).toBe(holds);
  });

  it.each([
    ['an unknown pattern', { patternId: 'other', count: 1 }],
    ['half a person', { patternId: 'full', count: 0.5 }],
    ['fewer than nobody', { patternId: 'full', count: -1 }],
  ])('refuses %s', (_, entry) => {
    expect(() => proveSizing(problem({ patterns }), [entry])).toThrow();
  });
});

describe('any sizing', () => {
  it('one person more costs one and never makes the shortage larger', () => {
    const count = fc.nat(25);
    fc.assert(
      fc.property(fc.array(count, { minLength: 7, maxLength: 7 }), fc.nat(6), (people, at) => {
        const more = people.map((heads, first) => (first === at ? heads + 1 : heads));
        expect(postOffice(more).shortageMinutes).toBeLessThanOrEqual(
          postOffice(people).shortageMinutes,
        );
        expect(postOffice(more).objective).toBe(postOffice(people).objective + 1);
      }),
    );
  });
});
