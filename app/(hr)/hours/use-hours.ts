import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'next/navigation';
import { callApi } from '@/app/_api';
import type { HoursView } from '@/modules/hours';
import { addressOf, type HoursChoice, hoursPath, readAddress } from './hours-address';

/** What the page was opened with. */
interface Start {
  readonly choice: HoursChoice;
  readonly hours: HoursView;
}

/**
 * The hours that the page's address asks for, so that Back and a shared link show them again. The
 * former hours stay while others are read.
 */
export function useHours({ choice: start, hours }: Start) {
  const asked = readAddress(new URLSearchParams(useSearchParams()));
  const choice: HoursChoice = {
    teamId: asked.teamId ?? start.teamId,
    range: asked.range ?? start.range,
  };
  const isStart = addressOf(choice) === addressOf(start);
  const query = useQuery({
    queryKey: ['hours', choice.teamId, choice.range.from, choice.range.to],
    queryFn: () => callApi<HoursView>('GET', hoursPath(choice)),
    placeholderData: keepPreviousData,
    ...(isStart ? { initialData: hours } : {}),
  });
  const show = (next: Partial<HoursChoice>) =>
    window.history.pushState(null, '', addressOf({ ...choice, ...next }));
  return {
    choice,
    query,
    show,
    typed: { teamId: choice.teamId, ...(asked.typed ?? choice.range) },
    isUnreadable: asked.typed !== null && asked.range === null,
  };
}
