import { describe, expect, it } from 'vitest';
import { findMembers } from '@/app/(owner)/members/find-members';
import { readRoles } from '@/app/(owner)/members/read-roles';
import { keysOf, membershipsOf, roleGroups, roleLines } from '@/app/(owner)/members/role-choices';
import type { Member, Membership } from '@/modules/access';

const groups = roleGroups([
  { id: 'tea_1', name: 'Animal care' },
  { id: 'tea_2', name: 'Riverside' },
]);
const memberships: Membership[] = [
  { role: 'staff', teamId: 'tea_2' },
  { role: 'owner', teamId: null },
  { role: 'supervisor', teamId: 'tea_2' },
];

describe('the boxes of the roles', () => {
  it('offer owner and HR once, supervisor and staff in each team', () => {
    const offered = groups.map(({ name, choices }) => [name, choices.map(({ label }) => label)]);
    expect(offered).toEqual([
      ['Whole organisation', ['Owner', 'HR']],
      ['Animal care', ['Supervisor', 'Staff']],
      ['Riverside', ['Supervisor', 'Staff']],
    ]);
  });

  it('give back the roles they show', () => {
    const back = membershipsOf(keysOf(memberships), groups);
    expect(back).toHaveLength(3);
    expect(back).toEqual(expect.arrayContaining(memberships));
  });

  it('tell the same role in two teams apart', () => {
    const staff: Membership[] = [{ role: 'staff', teamId: 'tea_1' }];
    expect(membershipsOf(keysOf(staff), groups)).toEqual(staff);
  });

  it('are named with their team', () => {
    expect(roleLines(memberships, groups)).toEqual([
      'Owner',
      'Supervisor in Riverside',
      'Staff in Riverside',
    ]);
  });
});

describe('ticked roles', () => {
  it('make a change that the route takes', () => {
    expect(readRoles(keysOf(memberships), groups)).toEqual({
      change: { memberships: membershipsOf(keysOf(memberships), groups) },
    });
  });

  it('must be at least one, and the reason says what to do', () => {
    expect(readRoles([], groups)).toEqual({
      error: 'Leave at least one role, or disable the account.',
    });
  });
});

describe('finding members', () => {
  const member = (name: string, email: string): Member => ({
    userId: 'usr_1',
    name,
    email,
    isDisabled: false,
    memberships: [],
  });
  const members = [
    member('Ingrid Solane', 'ingrid.solane@ravelmere.example'),
    member('Jörg Müller', 'joerg@ravelmere.example'),
  ];

  it.each([
    ['ingrid', ['Ingrid Solane']],
    ['SOLANE ing', ['Ingrid Solane']],
    ['muller', ['Jörg Müller']],
    ['joerg@', ['Jörg Müller']],
    ['ravelmere', ['Ingrid Solane', 'Jörg Müller']],
    ['  ', ['Ingrid Solane', 'Jörg Müller']],
    ['nobody', []],
  ])('by "%s"', (search, names) => {
    expect(findMembers(members, search).map(({ name }) => name)).toEqual(names);
  });
});
