'use client';

import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { callApi } from '@/app/_api';
import { useAnnounce } from '@/app/_ui/live-region';
import type { RunEvent, RunView } from '@/modules/roster';
import { progressSentence } from './progress-sentence';

/** The drawing of the best roster is read again at most this often while figures stream in. */
const rereadMilliseconds = 3_000;
/** Figures are read aloud at most this often. */
const announceMilliseconds = 10_000;

/** The run as it stands: its first reading, then every report of its event stream. */
export function useLiveRun(start: RunView): RunView {
  const queries = useQueryClient();
  const announce = useAnnounce();
  const announcedAt = useRef(0);
  const queryKey = ['run', start.id];
  const { data: run } = useQuery({
    queryKey,
    queryFn: () => callApi<RunView>('GET', `runs/${start.id}`),
    initialData: start,
    refetchInterval: (query) =>
      query.state.data && isLive(query.state.data) ? rereadMilliseconds : false,
  });
  const isGoingOn = isLive(run);
  // biome-ignore lint/correctness/useExhaustiveDependencies: one stream for the life of a run that goes on
  useEffect(() => {
    if (!isGoingOn) return;
    const stream = new EventSource(`/api/v1/runs/${start.id}/events`);
    stream.onmessage = ({ data }) => {
      const event: RunEvent = JSON.parse(data);
      queries.setQueryData<RunView>(queryKey, (before) => before && withEvent(before, event));
      if (Date.now() - announcedAt.current < announceMilliseconds) return;
      announcedAt.current = Date.now();
      announce(progressSentence(event, start.currency));
    };
    stream.addEventListener('end', () => {
      stream.close();
      queries.invalidateQueries({ queryKey });
      announce('The run has ended.');
    });
    return () => stream.close();
  }, [isGoingOn]);
  return run;
}

/** While it computes a roster, and then while it looks for what stands in the way. */
const isLive = ({ state, isLookingForKnots }: RunView): boolean =>
  state === 'running' || isLookingForKnots;

function withEvent(run: RunView, event: RunEvent): RunView {
  if (run.events.some(({ sequence }) => sequence === event.sequence)) return run;
  const { shortageMinutes, shortageBoundMinutes, bestCostCents, boundCents } = event;
  return {
    ...run,
    shortageMinutes,
    shortageBoundMinutes,
    bestCostCents,
    boundCents,
    events: [...run.events, event],
  };
}
