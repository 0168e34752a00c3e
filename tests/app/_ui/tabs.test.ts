import { describe, expect, it } from 'vitest';
import { barTabsFor, isOpenTab, tabsFor } from '@/app/_ui/tabs';
import type { Actor, Role } from '@/modules/access';

const actor = (...roles: readonly Role[]): Actor => ({
  userId: 'usr_1',
  sessionId: 'ses_1',
  organisationId: 'org_1',
  organisationName: 'Ravelmere',
  name: 'Ingrid Solane',
  email: 'ingrid@ravelmere.example',
  memberships: roles.map((role) => ({ role, teamId: null })),
  personId: null,
});

const labels = (roles: readonly Role[], isDemo = false) =>
  tabsFor(actor(...roles), isDemo).map(({ label }) => label);

describe('the sheet index', () => {
  it.each<[Role, string[]]>([
    ['supervisor', ['Floors', 'Shift kinds', 'Roster', 'Runs', 'Sizing', 'Calendar']],
    ['staff', ['Shifts', 'Month']],
    ['hr', ['Roster', 'Calendar', 'Hours']],
    [
      'owner',
      ['Floors', 'Shift kinds', 'Roster', 'Runs', 'Sizing', 'Calendar', 'Hours', 'Members'],
    ],
  ])('shows a %s their own sheets', (role, expected) => {
    expect(labels([role])).toEqual(expected);
  });

  it('shows the mail of the local fake in demo mode only', () => {
    expect(labels(['supervisor'], true)).toContain('Mail');
  });

  it('joins the sheets of several roles', () => {
    expect(labels(['staff', 'hr'])).toEqual(['Shifts', 'Month', 'Roster', 'Calendar', 'Hours']);
  });

  it('marks a sheet as open on its own pages and on no other', () => {
    const tab = { href: '/roster', label: 'Roster' };
    expect(isOpenTab('/roster', tab)).toBe(true);
    expect(isOpenTab('/roster/ros_1', tab)).toBe(true);
    expect(isOpenTab('/rosters', tab)).toBe(false);
  });
});

describe('the bar of phones', () => {
  it('holds at most four sheets, and every other one behind "More"', () => {
    const { bar, more } = barTabsFor(actor('owner'), true);
    expect(bar.map(({ label }) => label)).toEqual(['Roster', 'Floors', 'Runs', 'Calendar']);
    expect(bar.length + more.length).toBe(tabsFor(actor('owner'), true).length);
  });
});
