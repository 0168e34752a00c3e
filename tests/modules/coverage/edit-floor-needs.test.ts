import { beforeEach, describe, expect, it } from 'vitest';
import { continueFloorsSchema, floorNeedsSchema } from '@/modules/coverage';
import {
  addFloor,
  clearFloorDate,
  continueFloors,
  listFloors,
  setFloorDate,
  setFloorNeeds,
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

describe('setting cells of the floors table', () => {
  it('saves all of them at once and gives back the floors they belong to', () => {
    const { supervisor, teamId, floor, nurse } = given;
    const other = expectOk(addFloor(supervisor, teamId, floorInput({ skillId: nurse })));
    const third = expectOk(addFloor(supervisor, teamId, floorInput()));
    const changed = expectOk(
      setFloorNeeds(supervisor, teamId, [
        { floorId: floor.id, day: 0, people: 4 },
        { floorId: floor.id, day: 7, people: 12 },
        { floorId: other.id, day: 6, people: 0 },
        { floorId: other.id, day: 6, people: 3 },
      ]),
    );
    expect(changed.map(({ needs }) => needs)).toEqual([
      [4, 1, 1, 1, 1, 0, 0, 12],
      [1, 1, 1, 1, 1, 0, 3, 0],
    ]);
    expect(listFloors(teamId)).toEqual([...changed, third]);
    expect(auditActions().at(-1)).toBe('floor-needs.set');
  });

  it('saves nothing when one floor is unknown or belongs to another team', () => {
    const { supervisor, owner, teamId, otherTeamId, floor } = given;
    const foreign = expectOk(addFloor(owner, otherTeamId, floorInput()));
    for (const floorId of ['flr_none', foreign.id]) {
      const cells = [
        { floorId: floor.id, day: 0, people: 9 },
        { floorId, day: 0, people: 9 },
      ];
      expect(codeOf(setFloorNeeds(supervisor, teamId, cells))).toBe('not-found');
    }
    expect(listFloors(teamId)).toEqual([floor]);
    expect(listFloors(otherTeamId)).toEqual([foreign]);
  });

  it('leaves nothing half written when the database refuses a later cell', () => {
    const { supervisor, teamId, floor } = given;
    const cells = [
      { floorId: floor.id, day: 0, people: 9 },
      { floorId: floor.id, day: 1, people: 1000 },
    ];
    expect(() => setFloorNeeds(supervisor, teamId, cells)).toThrow();
    expect(listFloors(teamId)).toEqual([floor]);
    expect(auditActions()).toEqual(['floor.add']);
  });

  it.each([
    ['nothing to change', []],
    ['a negative number', [{ floorId: 'flr_1', day: 0, people: -1 }]],
    ['half a person', [{ floorId: 'flr_1', day: 0, people: 0.5 }]],
    ['a thousand people', [{ floorId: 'flr_1', day: 0, people: 1000 }]],
    ['a ninth column', [{ floorId: 'flr_1', day: 8, people: 1 }]],
    ['something unknown', [{ floorId: 'flr_1', day: 0, people: 1, reason: 'x' }]],
  ])('is not valid with %s', (_, cells) => {
    expect(floorNeedsSchema.safeParse(cells).success).toBe(false);
  });
});

describe('a date that differs', () => {
  it('is set, set again and cleared', () => {
    const { supervisor, teamId, floor } = given;
    const fair = { date: '2027-02-17', people: 2, reason: 'fair' };
    expectOk(setFloorDate(supervisor, floor.id, fair));
    const earlier = { date: '2027-02-03', people: 0, reason: 'closed' };
    expectOk(setFloorDate(supervisor, floor.id, earlier));
    const bigger = { ...fair, people: 3 };
    const changed = expectOk(setFloorDate(supervisor, floor.id, bigger));
    expect(changed.dates).toEqual([earlier, bigger]);
    expect(listFloors(teamId)).toEqual([changed]);
    const cleared = expectOk(clearFloorDate(supervisor, floor.id, earlier.date));
    expect(cleared.dates).toEqual([bigger]);
    expect(listFloors(teamId)).toEqual([cleared]);
    expect(auditActions().slice(1)).toEqual([
      'floor-date.set',
      'floor-date.set',
      'floor-date.set',
      'floor-date.clear',
    ]);
  });

  it.each(['2027-01-31', '2027-03-01'])('cannot lie outside the floor: %s', (date) => {
    const { supervisor, floor } = given;
    const outcome = setFloorDate(supervisor, floor.id, { date, people: 1, reason: '' });
    expect([codeOf(outcome), ...fieldsOf(outcome)]).toEqual(['invalid', 'date']);
    expect(listFloors(floor.teamId)).toEqual([floor]);
  });

  it('cannot be cleared where none was set', () => {
    const { supervisor, floor } = given;
    expect(codeOf(clearFloorDate(supervisor, floor.id, '2027-02-17'))).toBe('not-found');
  });
});

describe('continuing floors', () => {
  it('lets floors in force hold longer, without their dates that differ', () => {
    const { supervisor, teamId, floor, nurse } = given;
    expectOk(setFloorDate(supervisor, floor.id, { date: '2027-02-17', people: 2, reason: '' }));
    const ended = { skillId: nurse, effectiveFrom: '2027-01-04', effectiveTo: '2027-01-31' };
    expectOk(addFloor(supervisor, teamId, floorInput(ended)));
    const continued = expectOk(
      continueFloors(supervisor, teamId, { from: '2027-02-28', to: '2027-03-28' }),
    );
    expect(continued.map(({ id, effectiveTo }) => [id, effectiveTo])).toEqual([
      [floor.id, '2027-03-28'],
    ]);
    expect(continued[0]?.dates.map(({ date }) => date)).toEqual(['2027-02-17']);
    expect(listFloors(teamId).map(({ effectiveTo }) => effectiveTo)).toEqual([
      '2027-03-28',
      '2027-01-31',
    ]);
  });

  it('names the date when no floor holds on it', () => {
    const { supervisor, teamId, floor } = given;
    const outcome = continueFloors(supervisor, teamId, { from: '2027-03-01', to: '2027-03-28' });
    expect([codeOf(outcome), ...fieldsOf(outcome)]).toEqual(['invalid', 'from']);
    expect(listFloors(teamId)).toEqual([floor]);
  });

  it('is not valid backwards', () => {
    const outcome = continueFloorsSchema.safeParse({ from: '2027-03-01', to: '2027-02-28' });
    expect(outcome.error?.issues.map(({ path }) => path)).toEqual([['to']]);
  });
});

it('refuses other roles, and hides the team from everybody else', () => {
  const { refused, teamId, floor } = given;
  const before = auditActions();
  for (const [actor, code] of refused) {
    const cells = [{ floorId: floor.id, day: 0, people: 9 }];
    const date = { date: '2027-02-17', people: 9, reason: '' };
    expect(codeOf(setFloorNeeds(actor, teamId, cells))).toBe(code);
    expect(codeOf(setFloorDate(actor, floor.id, date))).toBe(code);
    expect(codeOf(clearFloorDate(actor, floor.id, '2027-02-17'))).toBe(code);
    expect(codeOf(continueFloors(actor, teamId, { from: '2027-02-28', to: '2027-03-28' }))).toBe(
      code,
    );
  }
  expect(listFloors(teamId)).toEqual([floor]);
  expect(auditActions()).toEqual(before);
});
