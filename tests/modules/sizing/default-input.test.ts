import { describe, expect, it } from 'vitest';
import type { Contract, Person } from '@/modules/people';
import { defaultInput, type SizingSetting } from '@/modules/sizing';
import { desk, nurse, sampleFloor, sampleKind, skills, teamId } from './coverage-samples';

const pay = {
  nightStartMinute: 1380,
  nightEndMinute: 1860,
  nightPercent: 25,
  weekendPercent: 20,
  holidayPercent: 100,
  overtimePercent: 150,
};

function samplePerson(id: string, skillIds: `ski_${string}`[], payCentsPerHour: number): Person {
  const contract: Contract = {
    startsOn: '2026-01-01',
    endsOn: null,
    weeklyMinutes: 2400,
    underMinutes: 0,
    overtimeMinutes: 0,
    payCentsPerHour,
    paidBy: 'contract',
    mayWorkNights: true,
  };
  return {
    id: `per_${id}`,
    teamId,
    userId: null,
    name: id,
    email: '',
    staffNumber: id,
    isActive: true,
    skills: skillIds.map((skillId, position) => ({ skillId, position, expiresOn: null })),
    contracts: [contract],
  };
}

const setting: SizingSetting = {
  skills,
  kinds: [
    sampleKind('early', { unpaidBreakMinutes: 30 }),
    sampleKind('night', { startMinute: 1380, endMinute: 1860 }),
  ],
  floors: [
    sampleFloor('n', { skillId: nurse.id }),
    sampleFloor('nn', { skillId: nurse.id, startMinute: 1380, endMinute: 1860 }),
    sampleFloor('d', { skillId: desk.id }),
  ],
  people: [samplePerson('a', [nurse.id], 2500), samplePerson('b', [nurse.id, desk.id], 2000)],
  pay,
};

const linesOf = (changes: Partial<SizingSetting> = {}) =>
  defaultInput('2027-02-01', { ...setting, ...changes }).lines;

describe('the table to begin with', () => {
  it('has five days on for each skill on each shift kind its floors ask for', () => {
    const lines = linesOf();
    expect(lines.map(({ name }) => name)).toEqual(['Nurse early', 'Nurse night', 'Desk early']);
    expect(lines.every(({ daysOn }) => daysOn === 5)).toBe(true);
  });

  it('pays the lowest contract of the skill for the paid hours, weekend premium added', () => {
    expect(linesOf()[0]).toMatchObject({
      weekdayCents: 15_000,
      saturdayCents: 18_000,
      sundayCents: 18_000,
    });
  });

  it('adds the night premium, and on Sunday the weekend premium before midnight only', () => {
    expect(linesOf()[1]).toMatchObject({
      weekdayCents: 20_000,
      saturdayCents: 23_200,
      sundayCents: 20_400,
    });
  });

  it('pays nothing where nobody has the skill', () => {
    expect(linesOf({ people: [] })[2]).toMatchObject({ weekdayCents: 0 });
  });

  it('leaves out kinds on which the skill is not posted', () => {
    const kinds = [sampleKind('early', { skillIds: [desk.id] })];
    expect(linesOf({ kinds }).map(({ name }) => name)).toEqual(['Desk early']);
  });

  it('uses people of any skill where floors ask for anybody and no skill has a line', () => {
    const floors = [sampleFloor('any')];
    expect(linesOf({ floors }).map(({ name, skillId }) => [name, skillId])).toEqual([
      ['early', null],
    ]);
  });

  it('has no lines without floors', () => {
    expect(linesOf({ floors: [] })).toEqual([]);
  });
});
