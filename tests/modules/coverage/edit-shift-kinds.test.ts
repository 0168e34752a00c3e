import { beforeEach, describe, expect, it } from 'vitest';
import {
  addShiftKind,
  changeShiftKind,
  listShiftKinds,
  retireShiftKind,
} from '@/modules/coverage/server';
import {
  auditActions,
  codeOf,
  expectOk,
  fieldsOf,
  kindInput,
  teamWithFloors,
} from './team-with-floors';

let given: ReturnType<typeof teamWithFloors>;

beforeEach(() => {
  given = teamWithFloors();
});

const late = kindInput({ name: 'Late', letter: 'L', startMinute: 900, endMinute: 1380 });

describe('adding a shift kind', () => {
  it('stores it as entered and lists it by its start', () => {
    const { supervisor, teamId, vet, nurse } = given;
    const second = expectOk(addShiftKind(supervisor, teamId, late));
    const input = kindInput({ skillIds: [vet, nurse, vet] });
    const first = expectOk(addShiftKind(supervisor, teamId, input));
    expect(first).toMatchObject({ ...input, skillIds: [vet, nurse], isRetired: false });
    const kinds = listShiftKinds(teamId);
    expect(kinds.map(({ id }) => id)).toEqual([first.id, second.id]);
    expect(new Set(kinds[0]?.skillIds)).toEqual(new Set([vet, nurse]));
    expect(kinds[1]).toEqual(second);
    expect(second.skillIds).toBeNull();
  });

  it.each([
    ['a name in use', { letter: 'X' }, ['name']],
    ['a name in use in other capitals', { name: 'EARLY', letter: 'X' }, ['name']],
    ['a letter in use', { name: 'Evening' }, ['letter']],
    ['a letter in use in other capitals', { name: 'Evening', letter: 'e' }, ['letter']],
    ['both in use', {}, ['name', 'letter']],
  ])('names the field for %s', (_, changes, paths) => {
    const { supervisor, teamId } = given;
    expectOk(addShiftKind(supervisor, teamId, kindInput()));
    const outcome = addShiftKind(supervisor, teamId, kindInput(changes));
    expect([codeOf(outcome), ...fieldsOf(outcome)]).toEqual(['invalid', ...paths]);
    expect(listShiftKinds(teamId)).toHaveLength(1);
  });

  it('names the skill that belongs to another team', () => {
    const { supervisor, teamId, vet, foreignSkill } = given;
    const outcome = addShiftKind(supervisor, teamId, kindInput({ skillIds: [vet, foreignSkill] }));
    expect([codeOf(outcome), ...fieldsOf(outcome)]).toEqual(['invalid', 'skillIds.1']);
    expect(listShiftKinds(teamId)).toEqual([]);
  });

  it('lets two teams use the same names', () => {
    const { owner, teamId, otherTeamId } = given;
    expectOk(addShiftKind(owner, teamId, kindInput()));
    expectOk(addShiftKind(owner, otherTeamId, kindInput()));
  });
});

describe('changing a shift kind', () => {
  it('replaces its values, its own name and letter included', () => {
    const { supervisor, teamId, vet } = given;
    const kind = expectOk(addShiftKind(supervisor, teamId, kindInput({ skillIds: [vet] })));
    const input = kindInput({ name: 'early', endMinute: 960, skillIds: null });
    const changed = expectOk(changeShiftKind(supervisor, kind.id, input));
    expect(changed).toEqual({ ...input, id: kind.id, teamId, isRetired: false });
    expect(listShiftKinds(teamId)).toEqual([changed]);
  });

  it('refuses the name of another kind and keeps what was there', () => {
    const { supervisor, teamId } = given;
    const kind = expectOk(addShiftKind(supervisor, teamId, kindInput()));
    expectOk(addShiftKind(supervisor, teamId, late));
    const outcome = changeShiftKind(supervisor, kind.id, { ...late, startMinute: 0 });
    expect([codeOf(outcome), ...fieldsOf(outcome)]).toEqual(['invalid', 'name', 'letter']);
    expect(listShiftKinds(teamId)[0]).toEqual(kind);
  });
});

describe('retiring a shift kind', () => {
  it('offers it no more, keeps it for old rosters and frees its name and letter', () => {
    const { supervisor, teamId } = given;
    const kind = expectOk(addShiftKind(supervisor, teamId, kindInput()));
    expectOk(retireShiftKind(supervisor, kind.id));
    expect(listShiftKinds(teamId)).toEqual([]);
    expect(listShiftKinds(teamId, { withRetired: true })).toEqual([{ ...kind, isRetired: true }]);
    const successor = expectOk(addShiftKind(supervisor, teamId, kindInput()));
    expect(listShiftKinds(teamId)).toEqual([successor]);
  });

  it('leaves nothing to change or retire again', () => {
    const { supervisor, teamId } = given;
    const kind = expectOk(addShiftKind(supervisor, teamId, kindInput()));
    expectOk(retireShiftKind(supervisor, kind.id));
    expect(codeOf(retireShiftKind(supervisor, kind.id))).toBe('conflict');
    expect(codeOf(changeShiftKind(supervisor, kind.id, late))).toBe('conflict');
  });
});

it('refuses other roles, and hides the team from everybody else', () => {
  const { refused, supervisor, teamId } = given;
  const kind = expectOk(addShiftKind(supervisor, teamId, kindInput()));
  const before = auditActions();
  for (const [actor, code] of refused) {
    expect(codeOf(addShiftKind(actor, teamId, late))).toBe(code);
    expect(codeOf(changeShiftKind(actor, kind.id, late))).toBe(code);
    expect(codeOf(retireShiftKind(actor, kind.id))).toBe(code);
  }
  expect(codeOf(retireShiftKind(supervisor, 'knd_none'))).toBe('not-found');
  expect(listShiftKinds(teamId)).toEqual([kind]);
  expect(auditActions()).toEqual(before);
});
