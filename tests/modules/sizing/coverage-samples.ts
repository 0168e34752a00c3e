import type { Floor, ShiftKind } from '@/modules/coverage';
import type { Skill } from '@/modules/people';
import type { SizingInput, SizingLine } from '@/modules/sizing';

/** Samples for tests of pure functions: nothing of them is stored. */
export const teamId = 'tea_sample';

export const nurse: Skill = { id: 'ski_nurse', teamId, name: 'Nurse', position: 0 };
export const desk: Skill = { id: 'ski_desk', teamId, name: 'Desk', position: 1 };
export const skills = [nurse, desk];

export function sampleKind(id: string, changes: Partial<ShiftKind> = {}): ShiftKind {
  return {
    id: `knd_${id}`,
    teamId,
    name: id,
    letter: id.slice(0, 3),
    startMinute: 420,
    endMinute: 900,
    unpaidBreakMinutes: 0,
    isNight: false,
    skillIds: null,
    isRetired: false,
    ...changes,
  };
}

export function sampleFloor(id: string, changes: Partial<Floor> = {}): Floor {
  return {
    id: `flr_${id}`,
    teamId,
    skillId: null,
    startMinute: 420,
    endMinute: 900,
    needs: [1, 1, 1, 1, 1, 1, 1, 0],
    counting: 'seated',
    priceCentsPerHour: null,
    effectiveFrom: '2027-01-01',
    effectiveTo: null,
    dates: [],
    ...changes,
  };
}

export function sampleLine(changes: Partial<SizingLine> = {}): SizingLine {
  return {
    id: 'full-time',
    name: 'Full time',
    shiftKindId: 'knd_early',
    skillId: null,
    daysOn: 5,
    startWeekdays: [0, 1, 2, 3, 4, 5, 6],
    weekdayCents: 10_000,
    saturdayCents: 12_000,
    sundayCents: 15_000,
    extraDayCents: null,
    mostPeople: null,
    mostPercent: null,
    ...changes,
  };
}

/** The week of Monday 1 February 2027, unless told otherwise. */
export function sampleInput(changes: Partial<SizingInput> = {}): SizingInput {
  return {
    weekOf: '2027-02-01',
    span: 'week',
    objective: 'people',
    lines: [sampleLine()],
    mostPeople: null,
    ...changes,
  };
}
