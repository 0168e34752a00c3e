import { periodDays } from './dates';
import { type DemoPerson, type DemoTeam, hours } from './team-data';

const opening = { startMinute: hours(8), endMinute: hours(16) };
const closing = { startMinute: hours(12), endMinute: hours(20) };

const person = (
  name: string,
  staffNumber: string,
  skill: string,
  payCentsPerHour: number,
): DemoPerson => ({
  name,
  staffNumber,
  skills: [skill],
  contract: {
    weeklyMinutes: hours(37.5),
    underMinutes: hours(7.5),
    overtimeMinutes: hours(15),
    payCentsPerHour,
    paidBy: 'contract',
    mayWorkNights: true,
  },
});

/** A small day clinic of the same organisation with its own supervisor. */
export const riverside: DemoTeam = {
  settings: {
    name: 'Riverside Clinic',
    zone: 'Europe/Dublin',
    dayStartsAtMinute: hours(8),
    periodDays,
    noticeDays: 16,
    restMinutes: hours(11),
    longestRunDays: 5,
    longestRunNights: null,
    nightsPerPeriod: null,
    weekendsPerPeriod: 2,
    weekendCountsFridayNight: false,
  },
  supervisor: 'Edda Marlowe',
  skills: ['Vet', 'Nurse'],
  kinds: [
    { name: 'Opening', letter: 'O', ...opening, unpaidBreakMinutes: 30, isNight: false },
    { name: 'Closing', letter: 'C', ...closing, unpaidBreakMinutes: 30, isNight: false },
  ],
  floors: [
    {
      skill: 'Vet',
      startMinute: opening.startMinute,
      endMinute: closing.endMinute,
      needs: [1, 1, 1, 1, 1, 0, 0, 0],
      counting: 'shared',
      priceCentsPerHour: null,
      dates: [],
    },
    {
      skill: 'Nurse',
      ...opening,
      needs: [1, 1, 1, 1, 1, 0, 0, 0],
      counting: 'seated',
      priceCentsPerHour: null,
      dates: [],
    },
    {
      skill: 'Nurse',
      ...closing,
      needs: [1, 1, 1, 1, 0, 0, 0, 0],
      counting: 'seated',
      priceCentsPerHour: null,
      dates: [],
    },
    {
      skill: null,
      ...opening,
      needs: [0, 0, 0, 0, 0, 1, 0, 0],
      counting: 'seated',
      priceCentsPerHour: 4000,
      dates: [],
    },
  ],
  people: [
    person('Tamsin Orlebar', '2001', 'Vet', 3800),
    person('Joss Kettlewyn', '2002', 'Vet', 3800),
    person('Amara Fenwhistle', '2003', 'Nurse', 2500),
    person('Rurik Dellamain', '2004', 'Nurse', 2500),
  ],
  holidays: [{ day: 18, name: 'Lantern Day' }],
  leave: [],
};
