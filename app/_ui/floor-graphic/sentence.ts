import type { Board, CoverLane } from '@/modules/roster';
import type { LocalDate } from '@/modules/units';
import { dateRange, longDay } from '../clock';
import { countSkill } from './count-skill';
import { coverSteps, type Stretch } from './cover-steps';
import type { GraphicState } from './drawing';
import { nameStretches, type TimeWords } from './name-stretch';

/** What a sentence about cover needs to know. A `Board` has all of it. */
export interface CoverWords extends TimeWords {
  readonly skills: Board['skills'];
  readonly lanes: readonly CoverLane[];
}

/** One shift of one day that is short, with the missing people by skill. */
export interface ShortPlace {
  readonly dayIndex: number;
  readonly date: LocalDate;
  /** Shift name, or clock times where no shift fits. */
  readonly shiftName: string;
  readonly missing: readonly { readonly skillName: string | null; readonly people: number }[];
  /** Shifts of the same day on which the same skill has people to spare. */
  readonly spare: readonly { readonly shiftName: string; readonly people: number }[];
}

const mostPlaces = 8;

/** Every shift that is short, in order of time, grouped by day and shift. */
export function shortPlaces(words: CoverWords): ShortPlace[] {
  const places = new Map<string, ShortPlace>();
  const found = words.lanes.flatMap((lane) => {
    const spare = nameStretches(words, lane, 'spare');
    return nameStretches(words, lane, 'short').map((short) => ({ lane, short, spare }));
  });
  found.sort((one, other) => one.short.startMinute - other.short.startMinute);
  for (const { lane, short, spare } of found) {
    const day = words.days[short.dayIndex];
    if (!day) continue;
    const key = `${short.dayIndex} ${short.name}`;
    const before = places.get(key);
    const own = spare.filter(({ dayIndex }) => dayIndex === short.dayIndex);
    places.set(key, {
      dayIndex: short.dayIndex,
      date: day.date,
      shiftName: short.name,
      missing: [
        ...(before?.missing ?? []),
        { skillName: skillNameOf(words, lane), people: short.people },
      ],
      spare: [
        ...(before?.spare ?? []),
        ...own.map(({ name, people }) => ({ shiftName: name, people })),
      ],
    });
  }
  return [...places.values()];
}

/** `Thursday 11 February Night short 1 vet and 1 nurse while Early has 1 spare`. */
export function shortPlaceText({ date, shiftName, missing, spare }: ShortPlace): string {
  const who = missing.map(({ people, skillName }) => countSkill(people, skillName)).join(' and ');
  const over = spare.map((one) => `${one.shiftName} has ${one.people} spare`).join(' and ');
  return `${longDay(date)} ${shiftName} short ${who}${over ? ` while ${over}` : ''}`;
}

/**
 * The sentence of a floor graphic: its period, whose cover, and every exception to "the floor holds".
 * Beyond eight exceptions it counts the rest; the table beside the graphic has them all.
 */
export function coverSentence(words: CoverWords, whose: string, state: GraphicState): string {
  const first = words.days[0]?.date;
  const last = words.days.at(-1)?.date;
  const period = first && last ? dateRange(first, last, ' to ') : 'no days';
  if (state === 'no-floors') return `${period}, ${whose}: no floors yet.`;
  if (state === 'no-roster') {
    const most = coverSteps(words.lanes).reduce((high, { need }) => Math.max(high, need), 0);
    return `Floors ${period}, ${whose}: no roster yet; at most ${countSkill(most, null)} needed at once.`;
  }
  const places = shortPlaces(words);
  if (places.length === 0) return `Cover ${period}, ${whose}: the floor holds.`;
  const told = places.slice(0, mostPlaces).map(shortPlaceText);
  const rest = places.length - told.length;
  if (rest > 0) told.push(`and ${rest} more`);
  return `Cover ${period}, ${whose}: the floor holds except: ${told.join('; ')}.`;
}

/** A few words for a lane's head: `floor holds`, `short 2 shifts`, or the state when nothing is planned. */
export function laneVerdict(words: CoverWords, state: GraphicState): string {
  if (state === 'no-floors') return 'no floors yet';
  if (state === 'no-roster') return 'no roster yet';
  const count = shortPlaces(words).reduce((sum, { missing }) => sum + missing.length, 0);
  if (count === 0) return 'floor holds';
  return `short ${count} ${count === 1 ? 'shift' : 'shifts'}`;
}

/** Shortages cut by shift, for the labels on the drawing: each skill and shift once. */
export const labelledShortages = (words: CoverWords): Stretch[] =>
  words.lanes.flatMap((lane) =>
    nameStretches(words, lane, 'short').map(({ startMinute, endMinute, people }) => ({
      skillId: lane.skillId,
      startMinute,
      endMinute,
      people,
    })),
  );

const skillNameOf = (words: CoverWords, lane: CoverLane): string | null =>
  words.skills.find(({ id }) => id === lane.skillId)?.name ?? null;
