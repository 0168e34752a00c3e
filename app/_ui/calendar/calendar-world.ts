'use client';

import { createContext, useContext } from 'react';
import type { CalendarFrame } from '@/modules/roster';
import type { DateRange, LocalDate } from '@/modules/units';
import type { Block } from './blocks';

/** What every cell of a calendar knows. */
export interface CalendarWorld {
  readonly frame: CalendarFrame;
  /** own: the shifts of one person. team: counts and names. */
  readonly audience: 'own' | 'team';
  /** False while the shifts are read: a day without blocks then says nothing. */
  readonly isRead: boolean;
  readonly blocksOn: ReadonlyMap<LocalDate, readonly Block[]>;
  /** Leave of the person, for `own`. */
  readonly leave: readonly { readonly startsOn: LocalDate; readonly endsOn: LocalDate }[];
  /** The date that the view is about. */
  readonly date: LocalDate;
  readonly range: DateRange;
  /** The day whose details stand below, for `own`. */
  readonly selected: LocalDate | null;
  /** Takes a day of the month: selects it or opens its view. */
  readonly onPick: (date: LocalDate) => void;
}

const World = createContext<CalendarWorld | null>(null);

/** Gives the cells their world: the calendar package passes them no more than a date. */
export const CalendarWorldProvider = World.Provider;

/** The world of the calendar around a cell. */
export function useCalendarWorld(): CalendarWorld {
  const world = useContext(World);
  if (!world) throw new Error('A calendar cell stands outside a calendar');
  return world;
}
