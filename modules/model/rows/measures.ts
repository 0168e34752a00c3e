import type { FairnessMeasure } from '../../problem';
import type { Entry } from '../model-builder';
import { refusalsBefore, refusalsOn } from '../wishes';
import type { PersonWork } from '../work-columns';
import type { WeekendColumn } from './weekend-rows';

/** How much a person has of what is to be shared: constant + sum of coefficient x column. */
export interface Measure {
  readonly personIndex: number;
  readonly constant: number;
  readonly entries: readonly Entry[];
  /** The measure is never above this. */
  readonly most: number;
}

/** Nights worked, weekends worked (by their marks) or wishes refused, of one person. */
export function measureOf(
  measure: FairnessMeasure,
  work: PersonWork,
  weekends: readonly WeekendColumn[],
): Measure {
  const { person, personIndex } = work;
  switch (measure) {
    case 'nights': {
      const nights = work.columns.filter(({ shift }) => shift.isNight);
      const most = new Set(nights.map(({ shift }) => shift.dayIndex)).size;
      const entries = nights.map(({ column }): Entry => [column, 1]);
      return { personIndex, constant: 0, entries, most };
    }
    case 'weekends': {
      const entries = weekends.map(({ column }): Entry => [column, 1]);
      return { personIndex, constant: 0, entries, most: weekends.length };
    }
    case 'refusedWishes': {
      const entries = work.columns.flatMap(({ column, shift }): Entry[] => {
        const change = refusalsOn(person, shift);
        return change === 0 ? [] : [[column, change]];
      });
      return {
        personIndex,
        constant: refusalsBefore(person),
        entries,
        most: person.wishes.length,
      };
    }
  }
}

/** The measure at a point of the model whose marks are right (`completeValues`). */
export const measureAt = ({ constant, entries }: Measure, values: ArrayLike<number>): number =>
  entries.reduce((sum, [column, weight]) => sum + weight * (values[column] ?? 0), constant);
