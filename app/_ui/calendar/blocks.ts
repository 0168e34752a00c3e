import type { CalendarEntry } from '@/modules/roster';
import { daysBetween, type LocalDate, toLocal, type Zone } from '@/modules/units';

/** Everybody on one shift kind of one day. Minutes are local to its date; the end may lie beyond 1440. */
export interface Block {
  readonly id: string;
  readonly date: LocalDate;
  readonly kindName: string;
  readonly letter: string;
  readonly tone: CalendarEntry['tone'];
  readonly startMinute: number;
  readonly endMinute: number;
  readonly isPublished: boolean;
  /** By post, then by name. */
  readonly entries: readonly CalendarEntry[];
}

/** Who is in one post of a block. */
export interface PostLine {
  readonly post: string;
  readonly names: readonly string[];
}

/**
 * Puts the shifts of one kind, day and time together, in the order of day and start, by the wall clock of
 * the team's zone whatever the viewer's zone is. Shifts of a kind that differ in time stay apart.
 */
export function toBlocks(entries: readonly CalendarEntry[], zone: Zone): Block[] {
  const groups = new Map<string, Block>();
  for (const entry of [...entries].sort(byPostAndName)) {
    const time = localTime(entry, zone);
    const id = `${entry.date} ${entry.kindName} ${time.startMinute}-${time.endMinute}`;
    const { date, kindName, letter, tone, isPublished } = entry;
    const group = groups.get(id) ?? {
      ...{ id, date, kindName, letter, tone, isPublished, entries: [] },
      ...time,
    };
    groups.set(id, { ...group, entries: [...group.entries, entry] });
  }
  return [...groups.values()].sort(byStart);
}

/** The posts of a block with the names in each. */
export function postLines({ entries }: Pick<Block, 'entries'>): PostLine[] {
  const posts = [...new Set(entries.map(({ skillName }) => skillName))];
  return posts.map((post) => ({
    post,
    names: entries
      .filter(({ skillName }) => skillName === post)
      .map(({ personName }) => personName),
  }));
}

/** Blocks by their date. */
export function byDate(blocks: readonly Block[]): ReadonlyMap<LocalDate, readonly Block[]> {
  const days = new Map<LocalDate, Block[]>();
  for (const block of blocks) days.set(block.date, [...(days.get(block.date) ?? []), block]);
  return days;
}

/** The shift kinds that occur, each once, by start time: for the legend. */
export function kindsOf(blocks: readonly Block[]): Block[] {
  const kinds = new Map<string, Block>();
  for (const block of blocks) {
    if (!kinds.has(block.kindName)) kinds.set(block.kindName, block);
  }
  return [...kinds.values()].sort(
    (a, b) => a.startMinute - b.startMinute || a.endMinute - b.endMinute,
  );
}

function localTime({ date, startsAtUtc, endsAtUtc }: CalendarEntry, zone: Zone) {
  const start = toLocal(startsAtUtc, zone);
  const end = toLocal(endsAtUtc, zone);
  return {
    startMinute: start.minute + 1440 * daysBetween(date, start.date),
    endMinute: end.minute + 1440 * daysBetween(date, end.date),
  };
}

const byPostAndName = (a: CalendarEntry, b: CalendarEntry): number =>
  a.skillName.localeCompare(b.skillName, 'en-GB') ||
  a.personName.localeCompare(b.personName, 'en-GB');

const byStart = (a: Block, b: Block): number =>
  a.date.localeCompare(b.date) || a.startMinute - b.startMinute || a.endMinute - b.endMinute;
