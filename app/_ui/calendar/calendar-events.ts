import { type Block, byDate } from './blocks';
import { columnStart, layOutDay, type Place } from './lay-out-day';
import { noonOf } from './wall-date';

/** A block as the calendar package takes it. `start` and `end` say only the date. */
export interface CalendarEvent {
  readonly id: string;
  readonly start: Date;
  readonly end: Date;
  readonly resource: PlacedBlock;
}

/** A block with its place in the column of its day. */
export interface PlacedBlock {
  readonly block: Block;
  readonly place: Place;
}

/**
 * Blocks as events, each on the day on which it starts and placed at the hours of the team's clock inside
 * its day column, which begins at `columnStart`.
 */
export function toEvents(blocks: readonly Block[], dayStartsAtMinute: number): CalendarEvent[] {
  const start = columnStart(blocks, dayStartsAtMinute);
  return [...byDate(blocks)].flatMap(([date, ofDay]) => {
    const noon = noonOf(date);
    return [...layOutDay(ofDay, start)].map(([block, place]) => ({
      id: block.id,
      start: noon,
      end: noon,
      resource: { block, place },
    }));
  });
}
