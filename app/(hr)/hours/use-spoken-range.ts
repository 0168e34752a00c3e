import { useEffect, useRef } from 'react';
import { dateRange } from '@/app/_ui/clock';
import { useAnnounce } from '@/app/_ui/live-region';
import type { HoursView } from '@/modules/hours';

/** Has it read aloud when other hours are shown; undefined while they are read. The first stay silent. */
export function useSpokenRange(view: HoursView | undefined): void {
  const announce = useAnnounce();
  const sentence = view
    ? `Hours of ${view.teamName}, ${dateRange(view.from, view.to, ' to ')}, ${view.people.length} people.`
    : null;
  const last = useRef(sentence);
  useEffect(() => {
    if (sentence === null || sentence === last.current) return;
    last.current = sentence;
    announce(sentence);
  }, [sentence, announce]);
}
