import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ProblemFloor } from '@/modules/problem';
import { floorsLeft, type HeldOver } from '@/modules/problem/floors-left';
import { buildFloor } from '@/tests/support/problem-builder';

const held = (endMinute: number, postSkillId = 'nurse', skillIds = [postSkillId]): HeldOver => ({
  startMinute: -60,
  endMinute,
  postSkillId,
  skillIds,
});
const morning = (floor: Partial<ProblemFloor> = {}): ProblemFloor =>
  buildFloor({ startMinute: 0, endMinute: 600, people: 2, ...floor });
const left = (
  floors: readonly ProblemFloor[],
  heldOver: readonly HeldOver[],
  prior: readonly ProblemFloor[] = [],
) =>
  floorsLeft(floors, prior, heldOver).map(({ startMinute, endMinute, people }) => [
    startMinute,
    endMinute,
    people,
  ]);

describe('floors of the first morning', () => {
  it.each([
    ['stay as they are when nobody is still on duty', [morning()], [], [[0, 600, 2]]],
    [
      'lose the people who still are',
      [morning()],
      [held(420)],
      [
        [0, 420, 1],
        [420, 600, 2],
      ],
    ],
    ['vanish while they are held', [morning()], [held(420), held(420)], [[420, 600, 2]]],
    ['lose no more than they ask', [morning({ people: 1 })], [held(600), held(600)], []],
    [
      'come in one piece where two people follow each other',
      [morning()],
      [held(300), { ...held(600), startMinute: 300 }],
      [[0, 600, 1]],
    ],
    ['that begin later stay whole', [morning({ startMinute: 420 })], [held(420)], [[420, 600, 2]]],
    ['of another skill stay whole', [morning({ skillId: 'vet' })], [held(420)], [[0, 600, 2]]],
    [
      'for anybody count every post',
      [morning({ skillId: null })],
      [held(420, 'desk')],
      [
        [0, 420, 1],
        [420, 600, 2],
      ],
    ],
    [
      'that add up share who is there',
      [morning({ people: 1 }), morning({ people: 1 })],
      [held(600)],
      [[0, 600, 1]],
    ],
    [
      'are served before wished ones',
      [morning({ people: 1, priceCentsPerHour: 5 }), morning({ people: 1 })],
      [held(600)],
      [[0, 600, 1]],
    ],
  ] as const)('%s', (_, floors, heldOver, expected) => {
    expect(left([...floors], [...heldOver])).toEqual(expected);
  });

  it('wished floors are what is left when a firm one was served, the cheapest of them', () => {
    const floors = [1, 3, 2].map((priceCentsPerHour) => morning({ people: 1, priceCentsPerHour }));
    const rest = floorsLeft(floors, [], [held(600), held(600)]);
    expect(rest.map(({ priceCentsPerHour }) => priceCentsPerHour)).toEqual([1]);
  });

  it('shared floors stand alone and count who holds the skill', () => {
    const shared = morning({ people: 1, counting: 'shared' });
    expect(left([shared, shared], [held(600, 'desk', ['desk', 'nurse'])])).toEqual([]);
  });

  it('the floors of the night before are served first', () => {
    const night = buildFloor({ startMinute: -60, endMinute: 420 });
    expect(left([morning()], [held(420)], [night])).toEqual([[0, 600, 2]]);
    expect(left([morning()], [held(420), held(420)], [night])).toEqual([
      [0, 420, 1],
      [420, 600, 2],
    ]);
  });
});

describe('any first morning', () => {
  it('asks, minute by minute, for what is missing once the others are counted', () => {
    const floor = fc
      .record({
        startMinute: fc.nat(20),
        length: fc.integer({ min: 1, max: 20 }),
        people: fc.integer({ min: 1, max: 3 }),
      })
      .map(({ length, ...window }) =>
        buildFloor({ ...window, endMinute: window.startMinute + length }),
      );
    const person = fc.integer({ min: 1, max: 30 }).map((endMinute) => held(endMinute));
    fc.assert(
      fc.property(
        fc.array(floor, { maxLength: 4 }),
        fc.array(person, { maxLength: 4 }),
        (floors, people) => {
          const rest = floorsLeft(floors, [], people);
          for (let minute = 0; minute < 45; minute += 1) {
            const sumAt = (asking: readonly ProblemFloor[]): number =>
              asking
                .filter((one) => one.startMinute <= minute && minute < one.endMinute)
                .reduce((sum, one) => sum + one.people, 0);
            const have = people.filter(({ endMinute }) => minute < endMinute).length;
            expect(sumAt(rest)).toBe(Math.max(0, sumAt(floors) - have));
          }
        },
      ),
    );
  });
});
