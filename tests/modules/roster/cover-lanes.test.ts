import fc from 'fast-check';
import { expect, test } from 'vitest';
import { axisMinutesOf, coverLanes, type Duty } from '@/modules/roster';
import type { SkillId } from '@/modules/units';
import { buildFloor } from '../../support/problem-builder';

const nurse: SkillId = 'ski_nurse';
const vet: SkillId = 'ski_vet';
const axis = 1440;

const duty = (startMinute: number, endMinute: number, changes: Partial<Duty> = {}): Duty => ({
  startMinute,
  endMinute,
  postSkillId: nurse,
  skillIds: [nurse],
  ...changes,
});
const floor = (changes: Parameters<typeof buildFloor>[0] = {}) =>
  buildFloor({ skillId: nurse, ...changes });

test('slots show need and cover hour by hour, touch, and cover the whole axis', () => {
  const lanes = coverLanes([floor({ people: 2 })], [duty(420, 900)], [vet, nurse], axis);
  expect(lanes).toEqual([
    {
      skillId: nurse,
      slots: [
        { startMinute: 0, endMinute: 420, need: 0, have: 0 },
        { startMinute: 420, endMinute: 900, need: 2, have: 1 },
        { startMinute: 900, endMinute: 1440, need: 0, have: 0 },
      ],
    },
  ]);
});

test('seated floors of one skill add up where they overlap', () => {
  const floors = [floor(), floor({ startMinute: 600, endMinute: 1080, people: 2 })];
  const [lane] = coverLanes(floors, [], [nurse], axis);
  expect(lane?.slots.map(({ startMinute, need }) => [startMinute, need])).toEqual([
    [0, 0],
    [420, 1],
    [600, 3],
    [900, 2],
    [1080, 0],
  ]);
});

test('a person counts for seated floors in their post only, for shared ones by every skill they hold', () => {
  const both = duty(420, 900, { postSkillId: vet, skillIds: [vet, nurse] });
  const seated = coverLanes([floor()], [both], [nurse], axis)[0];
  const shared = coverLanes([floor({ counting: 'shared' })], [both], [nurse], axis)[0];
  expect(seated?.slots[1]).toMatchObject({ need: 1, have: 0 });
  expect(shared?.slots[1]).toMatchObject({ need: 1, have: 1 });
});

test('where seated and shared floors ask at once, the one with more missing is shown', () => {
  const floors = [floor({ people: 1 }), floor({ counting: 'shared', people: 3 })];
  const [lane] = coverLanes(floors, [duty(420, 900)], [nurse], axis);
  expect(lane?.slots[1]).toMatchObject({ need: 3, have: 1 });
});

test('floors for anybody have a lane of their own, last, that everybody on duty fills', () => {
  const floors = [floor({ skillId: null, people: 2 })];
  const duties = [duty(420, 900), duty(420, 900, { postSkillId: vet, skillIds: [vet] })];
  const lanes = coverLanes(floors, duties, [nurse, vet], axis);
  expect(lanes.map(({ skillId }) => skillId)).toEqual([nurse, vet, null]);
  expect(lanes[2]?.slots[1]).toMatchObject({ need: 2, have: 2 });
});

test('a skill that nobody asks for and nobody holds a post in has no lane', () => {
  expect(coverLanes([], [], [nurse, vet], axis)).toEqual([]);
});

test('shifts that touch without a change of cover make one slot', () => {
  const [lane] = coverLanes([], [duty(0, 480), duty(480, 1440)], [nurse], axis);
  expect(lane?.slots).toEqual([{ startMinute: 0, endMinute: 1440, need: 0, have: 1 }]);
});

test('the axis reaches as far as the last night', () => {
  expect(axisMinutesOf([{ startMinute: 1380, endMinute: 1860 }], [], 1440)).toBe(1860);
  expect(axisMinutesOf([], [], 1440)).toBe(1440);
});

test('cover in the slots adds up to the minutes people are on duty', () => {
  const duties = fc.array(
    fc
      .tuple(fc.integer({ min: 0, max: 1400 }), fc.integer({ min: 1, max: 600 }))
      .map(([start, length]) => duty(start, Math.min(axis, start + length))),
    { minLength: 1, maxLength: 12 },
  );
  fc.assert(
    fc.property(duties, (some) => {
      const [lane] = coverLanes([floor()], some, [nurse], axis);
      const slots = lane?.slots ?? [];
      const have = slots.reduce((sum, s) => sum + s.have * (s.endMinute - s.startMinute), 0);
      expect(have).toBe(some.reduce((sum, d) => sum + d.endMinute - d.startMinute, 0));
      expect(slots[0]?.startMinute).toBe(0);
      expect(slots.at(-1)?.endMinute).toBe(axis);
      slots.slice(1).forEach((slot, index) => {
        expect(slot.startMinute).toBe(slots[index]?.endMinute);
      });
    }),
  );
});
