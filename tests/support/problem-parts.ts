import type { Floor, ShiftKind } from '@/modules/coverage';
import type { Contract, Person, Skill } from '@/modules/people';
import type { ProblemParts } from '@/modules/problem';

/** Ids and parts of a small team in Berlin, as the other modules would hand them over. */
export const nurse: Skill = {
  id: 'ski_nurse',
  teamId: 'tea_ravelmere',
  name: 'Nurse',
  position: 0,
};
export const vet: Skill = { id: 'ski_vet', teamId: 'tea_ravelmere', name: 'Vet', position: 1 };

export const fullTime: Contract = {
  startsOn: '2020-01-01',
  endsOn: null,
  weeklyMinutes: 2400,
  underMinutes: 0,
  overtimeMinutes: 1440,
  payCentsPerHour: 2500,
  paidBy: 'contract',
  mayWorkNights: true,
};

export const kindOf = (kind: Partial<ShiftKind> = {}): ShiftKind => ({
  id: 'knd_early',
  teamId: 'tea_ravelmere',
  name: 'Early',
  letter: 'E',
  startMinute: 420,
  endMinute: 900,
  unpaidBreakMinutes: 0,
  isNight: false,
  skillIds: null,
  isRetired: false,
  ...kind,
});

export const nightKind = kindOf({
  id: 'knd_night',
  name: 'Night',
  letter: 'N',
  startMinute: 1320,
  endMinute: 1800,
  isNight: true,
});

export const floorOf = (floor: Partial<Floor> = {}): Floor => ({
  id: 'flr_one',
  teamId: 'tea_ravelmere',
  skillId: nurse.id,
  startMinute: 420,
  endMinute: 900,
  needs: [1, 1, 1, 1, 1, 1, 1, 1],
  counting: 'seated',
  priceCentsPerHour: null,
  effectiveFrom: '2020-01-01',
  effectiveTo: null,
  dates: [],
  ...floor,
});

export const personOf = (person: Partial<Person> = {}): Person => ({
  id: 'per_ione',
  teamId: 'tea_ravelmere',
  userId: null,
  name: 'Ione Baptisto',
  email: 'ione@ravelmere.example',
  staffNumber: '7',
  isActive: true,
  skills: [{ skillId: nurse.id, position: 0, expiresOn: null }],
  contracts: [fullTime],
  ...person,
});

/** One week from Mon 1 Feb 2027 with one nurse, one kind and one floor, unless the test says otherwise. */
export const partsOf = (parts: Partial<ProblemParts> = {}): ProblemParts => ({
  team: { name: 'Ravelmere', zone: 'Europe/Berlin', currency: 'EUR' },
  startsOn: '2027-02-01',
  endsOn: '2027-02-07',
  skills: [nurse, vet],
  shiftKinds: [kindOf()],
  floors: [floorOf()],
  holidays: [],
  people: [personOf()],
  leave: [],
  history: [],
  following: [],
  pins: [],
  rules: {
    restMinutes: 660,
    longestRunDays: 5,
    longestRunNights: 4,
    nightsPerPeriod: 8,
    weekendsPerPeriod: 3,
    weekendCountsFridayNight: false,
  },
  pay: {
    nightPercent: 25,
    weekendPercent: 20,
    holidayPercent: 100,
    overtimePercent: 150,
    nightStartMinute: 1380,
    nightEndMinute: 1860,
  },
  ...parts,
});
