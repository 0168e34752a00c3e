import { afterEach, describe, expect, it, vi } from 'vitest';
import { toBlocks } from '@/app/_ui/calendar/blocks';
import { toEvents } from '@/app/_ui/calendar/calendar-events';
import { columnStart, layOutDay } from '@/app/_ui/calendar/lay-out-day';
import { dateOf } from '@/app/_ui/calendar/wall-date';
import { entry, hoursOf } from './calendar-entries';

afterEach(() => {
  vi.unstubAllEnvs();
});

describe('events of the calendar package', () => {
  const blocks = toBlocks(
    [entry('2027-03-28', 'Day'), entry('2027-03-28', 'Night')],
    'Europe/Dublin',
  );

  it.each(['Europe/Dublin', 'America/Los_Angeles', 'Pacific/Auckland', 'Africa/Cairo'])(
    'stand on the same day at the same hours for a viewer in %s, also when clocks change',
    (viewerZone) => {
      vi.stubEnv('TZ', viewerZone);
      expect(Intl.DateTimeFormat().resolvedOptions().timeZone).toBe(viewerZone);
      const events = toEvents(blocks, 420);
      expect(events.map(({ start }) => dateOf(start))).toEqual(['2027-03-28', '2027-03-28']);
      expect(events.map(({ resource }) => resource.place)).toEqual([
        { top: (100 * 2) / 24, height: (100 * 8) / 24, left: 0, width: 100 },
        { top: (100 * 16) / 24, height: (100 * 8) / 24, left: 0, width: 100 },
      ]);
    },
  );
});

describe('the layout of a day', () => {
  it('puts overlapping kinds side by side and lets touching ones follow each other', () => {
    const [early, day, late] = [hoursOf('Early'), hoursOf('Day'), hoursOf('Late')];
    const places = layOutDay([early, day, late], 420);
    expect(places.get(early)).toMatchObject({ left: 0, width: 50 });
    expect(places.get(day)).toMatchObject({ left: 50, width: 50 });
    expect(places.get(late)).toMatchObject({ left: 0, width: 50 });
  });

  it('gives a kind that overlaps nothing the whole width', () => {
    const night = hoursOf('Night');
    expect(layOutDay([hoursOf('Late'), night], 420).get(night)).toMatchObject({
      left: 0,
      width: 100,
    });
  });

  it('never lets two blocks of a day cover each other', () => {
    const blocks = Array.from({ length: 9 }, (_, index) => ({
      startMinute: 420 + 60 * index,
      endMinute: 420 + 60 * index + 480,
    }));
    const places = [...layOutDay(blocks, 420).values()];
    for (const one of places) {
      for (const other of places) {
        const apart =
          one === other ||
          one.top + one.height <= other.top + 1e-9 ||
          other.top + other.height <= one.top + 1e-9 ||
          one.left + one.width <= other.left + 1e-9 ||
          other.left + other.width <= one.left + 1e-9;
        expect(apart).toBe(true);
      }
    }
  });

  it('begins at the start of the day, or earlier for an earlier shift', () => {
    expect(columnStart([hoursOf('Late')], 420)).toBe(420);
    expect(columnStart([{ startMinute: 330 }], 420)).toBe(330);
    expect(columnStart([], 420)).toBe(420);
  });

  it('cuts what lasts beyond its column', () => {
    const long = { startMinute: 1380, endMinute: 2100 };
    expect(layOutDay([long], 420).get(long)).toMatchObject({ height: (100 * 8) / 24 });
  });
});
