import type { CoverWords } from '@/app/_ui/floor-graphic';
import { drawnDays } from '@/app/_ui/floor-graphic';
import type { CoverLane } from '@/modules/roster';
import type { SkillId } from '@/modules/units';

export const vet: SkillId = 'ski_vet';
export const nurse: SkillId = 'ski_nurse';

const hour = 60;
const dayMinutes = 1440;

/** Shift kinds of the demo hospital: the day begins at 07:00. */
export const kinds = [
  { name: 'Early', startMinute: 7 * hour, endMinute: 15 * hour },
  { name: 'Day', startMinute: 9 * hour, endMinute: 17 * hour },
  { name: 'Late', startMinute: 15 * hour, endMinute: 23 * hour },
  { name: 'Night', startMinute: 23 * hour, endMinute: 31 * hour },
];

/** Axis minute of a clock hour on a day of February 2027, day 0 being Monday 1. */
export const at = (dayIndex: number, clockHour: number): number =>
  dayIndex * dayMinutes + clockHour * hour;

/** A lane of pieces `[from, to, need, have]`; between them nothing is needed. */
export function lane(
  skillId: SkillId | null,
  ...pieces: readonly (readonly [number, number, number, number])[]
): CoverLane {
  return {
    skillId,
    slots: pieces.map(([startMinute, endMinute, need, have]) => ({
      startMinute,
      endMinute,
      need,
      have,
    })),
  };
}

/** Words for the week of 1 to 7 February 2027. */
export function week(...lanes: readonly CoverLane[]): CoverWords {
  return {
    days: drawnDays('2027-02-01', '2027-02-07', 'Europe/Berlin'),
    dayStartsAtMinute: 7 * hour,
    kinds,
    skills: [
      { id: vet, name: 'Vet' },
      { id: nurse, name: 'Nurse' },
    ],
    lanes,
  };
}
