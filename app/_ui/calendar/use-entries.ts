'use client';

import { useQuery } from '@tanstack/react-query';
import { callApi } from '@/app/_api';
import type { CalendarEntry } from '@/modules/roster';
import type { DateRange } from '@/modules/units';

/** Entries that the page came with, and the dates they are of. */
export interface FirstEntries {
  readonly range: DateRange;
  readonly entries: readonly CalendarEntry[];
}

/** The shifts of a range from `me/calendar` or a team's calendar; those the page came with at once. */
export function useEntries(path: string, { from, to }: DateRange, first: FirstEntries) {
  return useQuery({
    queryKey: ['calendar', path, from, to],
    queryFn: () => callApi<readonly CalendarEntry[]>('GET', `${path}?from=${from}&to=${to}`),
    ...(first.range.from === from && first.range.to === to ? { initialData: first.entries } : {}),
  });
}
