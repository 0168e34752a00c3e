import type { HoursDay, HoursPerson } from '@/modules/hours';

/** A day of eight planned hours without a record, unless told otherwise. */
export const day = (changes: Partial<HoursDay> = {}): HoursDay => ({
  date: '2027-02-01',
  shift: 'Early',
  post: 'Nurse',
  plannedMinutes: 480,
  workedMinutes: null,
  nightMinutes: 0,
  weekendMinutes: 0,
  holidayMinutes: 0,
  reason: '',
  ...changes,
});

/** A person with 160 contract and 160 planned hours, unless told otherwise. */
export const person = (changes: Partial<HoursPerson> = {}): HoursPerson => ({
  personId: 'per_1',
  name: 'Ravi Thornby',
  staffNumber: '1013',
  homeSkill: 'Nurse',
  contractMinutes: 9600,
  leaveMinutes: 0,
  plannedMinutes: 9600,
  workedMinutes: 0,
  differenceMinutes: 0,
  nightMinutes: 0,
  weekendMinutes: 0,
  holidayMinutes: 0,
  days: [],
  ...changes,
});
