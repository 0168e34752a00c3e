import { addDays, formatClock } from '@/modules/units';
import { clockRange, longDay, weekdayName } from '../clock';
import { type Block, postLines } from './blocks';

type Times = Pick<Block, 'date' | 'startMinute' | 'endMinute'>;

/** `23:00–07:00`. */
export const blockTimes = ({ startMinute, endMinute }: Times): string =>
  clockRange(startMinute, endMinute);

/** `ends Sun 07:00` where a shift ends on a later day than it starts, else null. */
export function endsNote({ date, endMinute }: Omit<Times, 'startMinute'>): string | null {
  if (endMinute <= 1440) return null;
  const endDate = addDays(date, Math.floor(endMinute / 1440));
  return `ends ${weekdayName(endDate)} ${formatClock(endMinute)}`;
}

/** What a day holds besides shifts. */
export interface DayNotes {
  readonly holidayName: string | null;
  readonly isLeave: boolean;
  /** Whether a roster covers the day. */
  readonly hasRoster: boolean;
}

/** A day of one person in a sentence: `Thursday 18 February, Lantern Day, Late 15:00–23:00, nurse`. */
export function ownDaySentence(
  date: Block['date'],
  blocks: readonly Block[],
  { holidayName, isLeave, hasRoster }: DayNotes,
): string {
  const shifts = blocks.map(
    (block) => `${block.kindName} ${blockTimes(block)}, ${postName(block)}${draftNote(block)}`,
  );
  const rest = isLeave
    ? ['leave']
    : shifts.length > 0
      ? []
      : [hasRoster ? 'no shift' : 'no roster'];
  return [longDay(date), ...(holidayName ? [holidayName] : []), ...shifts, ...rest].join(', ');
}

/** A day of a team in a sentence: `Thursday 18 February, Lantern Day, Early 5, Late 6, draft`. */
export function teamDaySentence(
  date: Block['date'],
  blocks: readonly Block[],
  { holidayName }: Pick<DayNotes, 'holidayName'>,
): string {
  const counts = blocks.map(({ kindName, entries }) => `${kindName} ${entries.length}`);
  return [
    longDay(date),
    ...(holidayName ? [holidayName] : []),
    ...(counts.length > 0 ? counts : ['nobody planned']),
    ...(isDraft(blocks) ? ['draft'] : []),
  ].join(', ');
}

/** Whether any of the blocks is not published yet. */
export const isDraft = (blocks: readonly Pick<Block, 'isPublished'>[]): boolean =>
  blocks.some(({ isPublished }) => !isPublished);

/** The post of one person's shift, as it stands in a sentence: `nurse`, but `ICU nurse`. */
export const postName = (block: Pick<Block, 'entries'>): string =>
  postLines(block)
    .map(({ post }) => inSentence(post))
    .join(' and ');

/** A skill's name inside a sentence: small letter first, unless it begins with an abbreviation. */
export const inSentence = (name: string): string =>
  /^\p{Lu}\p{Ll}/u.test(name) ? name.charAt(0).toLocaleLowerCase('en-GB') + name.slice(1) : name;

const draftNote = ({ isPublished }: Block): string => (isPublished ? '' : ', draft');
