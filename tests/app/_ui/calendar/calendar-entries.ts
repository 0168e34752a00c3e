import type { CalendarEntry, OwnShift } from '@/modules/roster';
import { type LocalDate, toInstant } from '@/modules/units';

type Hours = { readonly startMinute: number; readonly endMinute: number };

const kinds = {
  Early: { letter: 'E', tone: 0, startMinute: 420, endMinute: 900 },
  Day: { letter: 'D', tone: 1, startMinute: 540, endMinute: 1020 },
  Late: { letter: 'L', tone: 2, startMinute: 900, endMinute: 1380 },
  Night: { letter: 'N', tone: 3, startMinute: 1380, endMinute: 1860 },
} as const;
export type SampleKind = keyof typeof kinds;

/** A shift of the sample kinds as a calendar reads it, on a date of a zone. */
export function entry(
  date: LocalDate,
  kind: SampleKind,
  changes: Partial<CalendarEntry> & { zone?: string } = {},
): CalendarEntry {
  const { zone = 'Europe/Dublin', ...rest } = changes;
  const { letter, tone, startMinute, endMinute } = kinds[kind];
  const personName = rest.personName ?? 'Sunniva Adeyo';
  return {
    id: `asg_${date}_${kind}_${personName}`,
    personId: `per_${personName}`,
    personName,
    kindName: kind,
    letter,
    tone,
    skillName: 'Nurse',
    date,
    startsAtUtc: toInstant(date, startMinute, zone),
    endsAtUtc: toInstant(date, endMinute, zone),
    isPublished: true,
    ...rest,
  };
}

/** A shift of the sample kinds as its own person reads it. */
export function ownShift(
  date: LocalDate,
  kind: SampleKind,
  changes: Partial<OwnShift> = {},
): OwnShift {
  const { letter, tone, startMinute, endMinute } = kinds[kind];
  return {
    date,
    kindName: kind,
    letter,
    tone,
    skillName: 'Nurse',
    startsAtUtc: toInstant(date, startMinute, 'Europe/Dublin'),
    endsAtUtc: toInstant(date, endMinute, 'Europe/Dublin'),
    startMinute,
    endMinute,
    paidMinutes: 480,
    withNames: [],
    ...changes,
  };
}

/** The hours of a sample kind. */
export const hoursOf = (kind: SampleKind): Hours => kinds[kind];
