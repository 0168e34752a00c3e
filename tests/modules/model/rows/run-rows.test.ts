import { describe, expect, it } from 'vitest';
import { buildRules } from '@/tests/support/problem-builder';
import { broken, days, past } from './broken-plan';

describe('runs of days and Nights', () => {
  const rules = { longestRunDays: 5, longestRunNights: 2 };
  it('allows the longest run and refuses one day more', () => {
    expect(broken({ rules }, days(0, 4))).toEqual([]);
    expect(broken({ rules }, days(0, 5))).toEqual(['run']);
  });
  it('counts the days worked before the period', () => {
    const sketch = { rules, people: [{ history: [past(-2, 420, 900), past(-1, 420, 900)] }] };
    expect(broken(sketch, days(0, 2))).toEqual([]);
    expect(broken(sketch, days(0, 3))).toEqual(['run']);
  });
  it('starts afresh after a free day before the period', () => {
    const sketch = { rules, people: [{ history: [past(-3, 420, 900), past(-2, 420, 900)] }] };
    expect(broken(sketch, days(0, 4))).toEqual([]);
  });
  it('counts Nights by themselves, with those before the period', () => {
    expect(broken({ rules }, days(0, 1, 'Night'))).toEqual([]);
    expect(broken({ rules }, days(0, 2, 'Night'))).toEqual(['nightrun']);
    const sketch = { rules, people: [{ history: [past(-1, 1380, 1860, true)] }] };
    expect(broken(sketch, days(0, 1, 'Night'))).toEqual(['nightrun']);
  });
  it('counts days and Nights published after the period', () => {
    const following = [past(7, 1380, 1860, true), past(8, 1380, 1860, true)];
    const sketch = { rules, people: [{ following }] };
    expect(broken(sketch, days(4, 6))).toEqual([]);
    expect(broken(sketch, days(3, 6))).toEqual(['run']);
    expect(broken(sketch, days(6, 6, 'Night'))).toEqual(['nightrun']);
    expect(broken(sketch, days(5, 5, 'Night'))).toEqual([]);
  });
  it('holds across a period shorter than the run, from before to after it', () => {
    const history = [past(-2, 420, 900), past(-1, 420, 900)];
    const following = [past(2, 420, 900), past(3, 420, 900)];
    const sketch = { rules, dayCount: 2, people: [{ history, following }] };
    expect(broken(sketch, days(0, 0))).toEqual([]);
    expect(broken(sketch, days(0, 1))).toEqual(['run']);
  });
  it('takes the limits of the person where they have their own', () => {
    const own = buildRules({ longestRunDays: 2 });
    expect(broken({ rules, people: [{ rules: own }] }, days(0, 2))).toEqual(['run']);
  });
  it('holds in a period shorter than the run', () => {
    const history = [-4, -3, -2, -1].map((day) => past(day, 420, 900));
    const sketch = { rules, dayCount: 2, people: [{ history }] };
    expect(broken(sketch, days(0, 0))).toEqual([]);
    expect(broken(sketch, days(0, 1))).toEqual(['run']);
  });
});
