'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { callApi } from '@/app/_api';
import { useAnnounce } from '@/app/_ui/live-region';
import type { Coverage } from '@/modules/coverage';
import type { TeamId } from '@/modules/units';

/** Where the floors and shift kinds of a team are kept in the browser. */
export const coverageKey = (teamId: TeamId) => ['coverage', teamId] as const;

/** Floors, shift kinds, skills and holidays of a team; `initial` is what the server read for this page. */
export function useCoverage(initial: Coverage): Coverage {
  const { id } = initial.team;
  const { data } = useQuery({
    queryKey: coverageKey(id),
    queryFn: () => callApi<Coverage>('GET', `teams/${id}/coverage`),
    initialData: initial,
  });
  return data;
}

/**
 * A change of floors or shift kinds. Once it is saved a sentence is read aloud, and everything that was
 * read before is read again: rosters and hours depend on both. Without a connection it fails at once.
 */
export function useCoverageChange<Input, Answer = unknown>(
  call: (input: Input) => Promise<Answer>,
  say: (input: Input, answer: Answer) => string,
) {
  const client = useQueryClient();
  const announce = useAnnounce();
  return useMutation({
    mutationFn: call,
    networkMode: 'always',
    onSuccess: (answer, input) => {
      // Not waited for: a dialog closes once its change is saved.
      void client.invalidateQueries();
      announce(say(input, answer));
    },
  });
}
