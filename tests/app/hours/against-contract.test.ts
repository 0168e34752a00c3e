import { describe, expect, it } from 'vitest';
import {
  againstContract,
  contractBar,
  countedMinutes,
  longestMinutes,
} from '@/app/(hr)/hours/against-contract';
import { person } from './people';

const hours = (count: number) => count * 60;

describe('hours against the contract', () => {
  it.each([
    ['as contract', {}],
    ['as contract', { plannedMinutes: hours(120), leaveMinutes: hours(40) }],
    ['8 h over', { plannedMinutes: hours(168) }],
    ['24 h under', { plannedMinutes: hours(136) }],
    ['0.5 h over', { differenceMinutes: 30 }],
    ['no contract hours', { contractMinutes: 0 }],
  ])('says "%s"', (words, changes) => {
    expect(againstContract(person(changes))).toBe(words);
  });

  it('counts recorded work in place of the plan', () => {
    expect(countedMinutes(person({ plannedMinutes: 960, differenceMinutes: -60 }))).toBe(900);
  });
});

describe('the bar of a person', () => {
  const longest = hours(200);

  it('reaches the tick when hours are as the contract', () => {
    const bar = contractBar(person(), longest, 100);
    expect(bar).toEqual({
      within: { start: 0, length: 80 },
      beyond: null,
      leave: null,
      contractAt: 80,
    });
  });

  it('shows hours beyond the contract after the tick', () => {
    const bar = contractBar(person({ plannedMinutes: hours(180) }), longest, 100);
    expect(bar.within.length).toBe(80);
    expect(bar.beyond).toEqual({ start: 80, length: 10 });
  });

  it('shows leave after the hours', () => {
    const changes = { plannedMinutes: hours(120), leaveMinutes: hours(40) };
    const bar = contractBar(person(changes), longest, 100);
    expect(bar.within.length).toBe(60);
    expect(bar.leave).toEqual({ start: 60, length: 20 });
  });

  it('keeps a short stretch visible and inside the drawing', () => {
    const bar = contractBar(person({ plannedMinutes: hours(160) + 30 }), hours(160) + 30, 100);
    expect(bar.beyond).toEqual({ start: 96, length: 4 });
  });

  it('is empty, not broken, when nobody has hours', () => {
    const bar = contractBar(person({ contractMinutes: 0, plannedMinutes: 0 }), 0, 100);
    expect(bar).toEqual({
      within: { start: 0, length: 0 },
      beyond: null,
      leave: null,
      contractAt: null,
    });
  });

  it('stands on a scale that cuts nobody off', () => {
    const people = [person(), person({ plannedMinutes: hours(150), leaveMinutes: hours(40) })];
    expect(longestMinutes(people)).toBe(hours(190));
    expect(longestMinutes([])).toBe(0);
  });
});
