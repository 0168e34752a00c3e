import type { CoverWords } from '../_ui/floor-graphic';

const date = '2027-02-01';
const nurse = 'ski_nurse';
const night = 1380;

/** One day of nurses: Early has one to spare, Late is one short, Night holds. */
export const exampleDay: CoverWords = {
  days: [{ date, startMinute: 0, endMinute: 1440, holidayName: null, isWeekend: false }],
  dayStartsAtMinute: 420,
  kinds: [
    { name: 'Early', startMinute: 420, endMinute: 900 },
    { name: 'Late', startMinute: 900, endMinute: night },
    { name: 'Night', startMinute: night, endMinute: 1860 },
  ],
  skills: [{ id: nurse, name: 'Nurse' }],
  lanes: [
    {
      skillId: nurse,
      slots: [
        { startMinute: 420, endMinute: 900, need: 2, have: 3 },
        { startMinute: 900, endMinute: night, need: 2, have: 1 },
        { startMinute: night, endMinute: 1860, need: 1, have: 1 },
      ],
    },
  ],
};
