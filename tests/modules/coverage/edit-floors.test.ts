import { beforeEach, describe, expect, it } from 'vitest';
import { db } from '@/db/client';
import { floorDates, floorNeeds } from '@/db/schema';
import {
  addFloor,
  changeFloor,
  listFloors,
  removeFloor,
  setFloorDate,
} from '@/modules/coverage/server';
import {
  auditActions,
  codeOf,
  expectOk,
  fieldsOf,
  floorInput,
  teamWithFloors,
} from './team-with-floors';

let given: ReturnType<typeof teamWithFloors>;

beforeEach(() => {
  given = teamWithFloors();
});

describe('adding a floor', () => {
  it('stores it as entered, and the record says so', () => {
    const { owner, teamId, nurse } = given;
    const input = floorInput({
      skillId: nurse,
      startMinute: 1380,
      endMinute: 1860,
      needs: [1, 2, 3, 4, 5, 6, 7, 8],
      counting: 'shared',
      priceCentsPerHour: 2500,
      effectiveTo: null,
    });
    const floor = expectOk(addFloor(owner, teamId, input));
    expect(floor).toEqual({ ...input, id: floor.id, teamId, dates: [] });
    expect(listFloors(teamId)).toContainEqual(floor);
    expect(auditActions()).toEqual(['floor.add', 'floor.add']);
  });

  it('lists floors by skill, then by window, floors for anybody last', () => {
    const { owner, teamId, nurse, vet } = given;
    addFloor(owner, teamId, floorInput({ skillId: null }));
    addFloor(owner, teamId, floorInput({ skillId: nurse }));
    addFloor(owner, teamId, floorInput({ skillId: vet, startMinute: 0, endMinute: 60 }));
    expect(listFloors(teamId).map(({ skillId, startMinute }) => [skillId, startMinute])).toEqual([
      [vet, 0],
      [vet, 420],
      [nurse, 420],
      [null, 420],
    ]);
  });

  it('names the field for a skill of another team or none at all', () => {
    const { owner, teamId, foreignSkill } = given;
    for (const skillId of [foreignSkill, 'ski_none', '']) {
      const outcome = addFloor(owner, teamId, floorInput({ skillId }));
      expect([codeOf(outcome), ...fieldsOf(outcome)]).toEqual(['invalid', 'skillId']);
    }
    expect(listFloors(teamId)).toHaveLength(1);
  });

  it('refuses the same cover on common dates and names the floor that is there', () => {
    const { owner, teamId, vet } = given;
    const outcome = addFloor(owner, teamId, floorInput({ skillId: vet, effectiveTo: null }));
    expect(codeOf(outcome)).toBe('conflict');
    expect(outcome.ok ? '' : outcome.error.detail).toContain(
      'Vet 07:00–15:00 from Mon 1 Feb to Sun 28 Feb',
    );
    expect(listFloors(teamId)).toHaveLength(1);
  });

  it('takes a wished floor beside a firm one, and the same cover on later dates', () => {
    const { owner, teamId, vet } = given;
    expectOk(addFloor(owner, teamId, floorInput({ skillId: vet, priceCentsPerHour: 4000 })));
    expectOk(
      addFloor(
        owner,
        teamId,
        floorInput({ skillId: vet, effectiveFrom: '2027-03-01', effectiveTo: null }),
      ),
    );
    expect(listFloors(teamId)).toHaveLength(3);
  });
});

describe('changing a floor', () => {
  it('replaces its values and keeps its dates that differ', () => {
    const { supervisor, teamId, floor, nurse } = given;
    const date = { date: '2027-02-17', people: 2, reason: 'fair' };
    expectOk(setFloorDate(supervisor, floor.id, date));
    const input = floorInput({ skillId: nurse, needs: [0, 0, 0, 0, 0, 5, 5, 5], startMinute: 480 });
    const changed = expectOk(changeFloor(supervisor, floor.id, input));
    expect(changed).toEqual({ ...input, id: floor.id, teamId, dates: [date] });
    expect(listFloors(teamId)).toEqual([changed]);
  });

  it('does not stand in its own way, but in that of others', () => {
    const { supervisor, teamId, floor, vet, nurse } = given;
    expectOk(addFloor(supervisor, teamId, floorInput({ skillId: nurse })));
    expectOk(changeFloor(supervisor, floor.id, floorInput({ skillId: vet, effectiveTo: null })));
    const outcome = changeFloor(supervisor, floor.id, floorInput({ skillId: nurse }));
    expect(codeOf(outcome)).toBe('conflict');
    expect(listFloors(teamId).map(({ skillId }) => skillId)).toEqual([vet, nurse]);
  });

  it.each([
    ['effectiveTo', { effectiveTo: '2027-02-16' }],
    ['effectiveFrom', { effectiveFrom: '2027-02-18' }],
  ])('keeps a date that differs inside: names %s otherwise', (path, changes) => {
    const { supervisor, floor, vet } = given;
    expectOk(setFloorDate(supervisor, floor.id, { date: '2027-02-17', people: 2, reason: '' }));
    const outcome = changeFloor(supervisor, floor.id, floorInput({ skillId: vet, ...changes }));
    expect([codeOf(outcome), ...fieldsOf(outcome)]).toEqual(['invalid', path]);
    expect(listFloors(floor.teamId)[0]?.effectiveTo).toBe('2027-02-28');
  });
});

describe('removing a floor', () => {
  it('takes its pattern and dates along and leaves a record', () => {
    const { supervisor, floor, teamId } = given;
    expectOk(setFloorDate(supervisor, floor.id, { date: '2027-02-17', people: 2, reason: '' }));
    expectOk(removeFloor(supervisor, floor.id));
    expect(listFloors(teamId)).toEqual([]);
    expect(db().select().from(floorNeeds).all()).toEqual([]);
    expect(db().select().from(floorDates).all()).toEqual([]);
    expect(auditActions().at(-1)).toBe('floor.remove');
    expect(codeOf(removeFloor(supervisor, floor.id))).toBe('not-found');
  });
});

describe('who may write floors', () => {
  it('refuses other roles, and hides the team from everybody else', () => {
    const { refused, teamId, floor } = given;
    for (const [actor, code] of refused) {
      const input = floorInput({ effectiveFrom: '2030-01-01', effectiveTo: null });
      expect(codeOf(addFloor(actor, teamId, input))).toBe(code);
      expect(codeOf(changeFloor(actor, floor.id, input))).toBe(code);
      expect(codeOf(removeFloor(actor, floor.id))).toBe(code);
    }
    expect(listFloors(teamId)).toEqual([floor]);
    expect(auditActions()).toEqual(['floor.add']);
  });

  it('answers for a foreign floor exactly as for one that does not exist', () => {
    const [, , [otherSupervisor]] = given.refused;
    expect(removeFloor(otherSupervisor, given.floor.id)).toEqual(
      removeFloor(otherSupervisor, 'flr_none'),
    );
  });
});
