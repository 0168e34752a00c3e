'use client';

import { callApi } from '@/app/_api';
import type { ContinueFloors, Floor, FloorDate, FloorInput } from '@/modules/coverage';
import { type FloorId, formatDay, type TeamId } from '@/modules/units';
import { useCoverageChange } from '../_coverage';
import type { DateChange } from './date-form';

interface SaveFloor {
  /** null adds a floor. */
  readonly floorId: FloorId | null;
  readonly input: FloorInput;
}

/** Every change of floors but those of the table's cells. */
export function useFloorEdits(teamId: TeamId) {
  const save = useCoverageChange(
    ({ floorId, input }: SaveFloor) =>
      floorId
        ? callApi<Floor>('PUT', `floors/${floorId}`, input)
        : callApi<Floor>('POST', `teams/${teamId}/floors`, input),
    ({ floorId }) => (floorId ? 'Floor changed.' : 'Floor added.'),
  );
  const remove = useCoverageChange(
    (floorId: FloorId) => callApi('DELETE', `floors/${floorId}`),
    () => 'Floor removed.',
  );
  const setDate = useCoverageChange(
    ({ floorId, date, people, reason }: DateChange) =>
      callApi<Floor>('PUT', `floors/${floorId}/dates/${date}`, { people, reason }),
    ({ date, people }) => `${formatDay(date)} now asks for ${people}.`,
  );
  const clearDate = useCoverageChange(
    ({ floorId, date }: Pick<FloorDate, 'date'> & { readonly floorId: FloorId }) =>
      callApi<Floor>('DELETE', `floors/${floorId}/dates/${date}`),
    ({ date }) => `${formatDay(date)} follows the table again.`,
  );
  const carryOn = useCoverageChange(
    (dates: ContinueFloors) => callApi<Floor[]>('POST', `teams/${teamId}/floors/continue`, dates),
    ({ to }, continued) => `${continued.length} floors now hold through ${formatDay(to)}.`,
  );
  return { save, remove, setDate, clearDate, carryOn };
}

export type FloorEdits = ReturnType<typeof useFloorEdits>;
