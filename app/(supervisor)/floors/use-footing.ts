'use client';

import { useQuery } from '@tanstack/react-query';
import { callApi } from '@/app/_api';
import type { Footing } from '@/modules/problem';
import type { TeamId } from '@/modules/units';
import type { Period } from './period';

/** Hours needed and available in a period; `initial` is what the server read for it, if it did. */
export function useFooting(teamId: TeamId, period: Period, initial: Footing | null) {
  const { startsOn, endsOn } = period;
  return useQuery({
    queryKey: ['footing', teamId, startsOn, endsOn],
    queryFn: () => callApi<Footing>('GET', `teams/${teamId}/footing?from=${startsOn}&to=${endsOn}`),
    ...(initial ? { initialData: initial } : {}),
  });
}
