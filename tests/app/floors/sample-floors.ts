import { floorRows } from '@/app/(supervisor)/floors/floor-rows';
import type { Floor, ShiftKind } from '@/modules/coverage';
import type { Skill } from '@/modules/people';

export const period = { startsOn: '2027-02-01', endsOn: '2027-02-28', isOpen: true };

export const skills: readonly Skill[] = [
  { id: 'ski_vet', teamId: 'tea_1', name: 'Vet', position: 0 },
  { id: 'ski_nurse', teamId: 'tea_1', name: 'Nurse', position: 1 },
];

/** A firm seated floor for one vet from 07:00 to 15:00 on working days, unless told otherwise. */
export const sampleFloor = (changes: Partial<Floor> = {}): Floor => ({
  id: 'flr_1',
  teamId: 'tea_1',
  skillId: 'ski_vet',
  startMinute: 420,
  endMinute: 900,
  needs: [1, 1, 1, 1, 1, 0, 0, 0],
  counting: 'seated',
  priceCentsPerHour: null,
  effectiveFrom: '2027-02-01',
  effectiveTo: '2027-02-28',
  dates: [],
  ...changes,
});

export const sampleKind = (changes: Partial<ShiftKind> = {}): ShiftKind => ({
  id: 'knd_early',
  teamId: 'tea_1',
  name: 'Early',
  letter: 'E',
  startMinute: 420,
  endMinute: 900,
  unpaidBreakMinutes: 0,
  isNight: false,
  skillIds: null,
  isRetired: false,
  ...changes,
});

/** Rows of floors for the sample team, with Early as its only shift kind. */
export const rowsOf = (...floors: Floor[]) =>
  floorRows(floors, skills, [sampleKind()], period, 'EUR');
