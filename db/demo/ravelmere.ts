import { periodDays } from './dates';
import { ravelmereLeave, ravelmerePeople } from './ravelmere-people';
import { type DemoFloor, type DemoFloorDate, type DemoTeam, hours } from './team-data';

/** An invented animal hospital that never closes. */
export const organisation = {
  name: 'Ravelmere Animal Hospital',
  currency: 'EUR',
  locale: 'en-IE',
  nightStartMinute: hours(23),
  nightEndMinute: hours(31),
  nightPercent: 25,
  weekendPercent: 20,
  holidayPercent: 100,
  overtimePercent: 150,
};

const windows = {
  Early: [hours(7), hours(15)],
  Day: [hours(9), hours(17)],
  Late: [hours(15), hours(23)],
  Night: [hours(23), hours(31)],
} as const;
type Shift = keyof typeof windows;

type FloorRow = readonly [
  skill: string,
  shift: Shift,
  weekdays: number,
  weekendAndHoliday: number,
  differs?: DemoFloorDate,
];

const floorRows: readonly FloorRow[] = [
  ['Vet', 'Early', 1, 1],
  ['Vet', 'Day', 1, 0],
  ['Vet', 'Late', 1, 1, { day: 18, people: 2, reason: 'Lantern Day crowds' }],
  ['Vet', 'Night', 1, 1],
  ['Nurse', 'Early', 2, 2],
  ['Nurse', 'Day', 1, 0],
  ['Nurse', 'Late', 2, 2, { day: 18, people: 3, reason: 'Lantern Day crowds' }],
  ['Nurse', 'Night', 1, 1, { day: 17, people: 2, reason: 'Kennels filled for the holiday' }],
  ['Ward', 'Early', 1, 1],
  ['Ward', 'Late', 1, 1],
  ['Ward', 'Night', 1, 1],
  ['Desk', 'Early', 1, 1],
  ['Desk', 'Day', 1, 0],
  ['Desk', 'Late', 1, 1],
];

function toFloor([skill, shift, weekdays, rest, differs]: FloorRow): DemoFloor {
  const [startMinute, endMinute] = windows[shift];
  return {
    skill,
    startMinute,
    endMinute,
    needs: [weekdays, weekdays, weekdays, weekdays, weekdays, rest, rest, rest],
    counting: 'seated',
    priceCentsPerHour: null,
    dates: differs ? [differs] : [],
  };
}

const kind = (name: Shift, letter: string) => ({
  name,
  letter,
  startMinute: windows[name][0],
  endMinute: windows[name][1],
  unpaidBreakMinutes: 0,
  isNight: name === 'Night',
});

export const ravelmere: DemoTeam = {
  settings: {
    name: 'Main Hospital',
    zone: 'Europe/Dublin',
    dayStartsAtMinute: hours(7),
    periodDays,
    noticeDays: 16,
    restMinutes: hours(11),
    longestRunDays: 5,
    longestRunNights: 4,
    nightsPerPeriod: 8,
    weekendsPerPeriod: 3,
    weekendCountsFridayNight: false,
  },
  supervisor: 'Ingrid Solane',
  skills: ['Vet', 'Nurse', 'Ward', 'Desk'],
  kinds: [kind('Early', 'E'), kind('Day', 'D'), kind('Late', 'L'), kind('Night', 'N')],
  floors: floorRows.map(toFloor),
  people: ravelmerePeople,
  holidays: [{ day: 18, name: 'Lantern Day' }],
  leave: ravelmereLeave,
};
