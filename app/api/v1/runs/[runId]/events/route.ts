import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { eventStream } from '@/app/_event-stream';
import { followRun } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

/**
 * What a run reports, as server-sent events with its sequence numbers as ids; `Last-Event-ID` replays
 * what was missed. Ends with an event `end` that carries the run's summary.
 */
export const GET = endpoint({
  need: 'rosters.read',
  params: z.object({ runId: idSchema('run') }),
  run: ({ actor, params, request }) => {
    const after = Number(request.headers.get('last-event-id'));
    return eventStream(request.signal, (stream) =>
      followRun(actor, params.runId, Number.isSafeInteger(after) ? after : 0, {
        onEvent: (event) => stream.send({ id: event.sequence, data: event }),
        onEnd: (summary) => {
          stream.send({ event: 'end', data: summary });
          stream.close();
        },
      }),
    );
  },
});
