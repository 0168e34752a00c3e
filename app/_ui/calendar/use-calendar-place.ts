'use client';

import { useState } from 'react';
import type { DateRange, LocalDate } from '@/modules/units';
import { useAnnounce } from '../live-region';
import { rangeOf, readRangeOf, stepFrom, titleOf, type View } from './view-range';

/** What a calendar shows: a view around a date, as a drawing or as a table. */
export interface CalendarPlace {
  readonly view: View;
  readonly date: LocalDate;
  readonly range: DateRange;
  /** The dates to read: the range and more. */
  readonly readRange: DateRange;
  readonly title: string;
  readonly isTable: boolean;
  readonly show: (view: View, date: LocalDate) => void;
  readonly step: (step: 1 | -1) => void;
  readonly setTable: (isTable: boolean) => void;
}

/** Keeps what a calendar shows, from the month of a date on, and says aloud where a step led. */
export function useCalendarPlace(start: LocalDate): CalendarPlace {
  const [view, setView] = useState<View>('month');
  const [date, setDate] = useState(start);
  const [isTable, setTable] = useState(false);
  const announce = useAnnounce();
  const show = (nextView: View, nextDate: LocalDate) => {
    setView(nextView);
    setDate(nextDate);
    announce(titleOf(nextView, nextDate));
  };
  return {
    view,
    date,
    range: rangeOf(view, date),
    readRange: readRangeOf(view, date),
    title: titleOf(view, date),
    isTable,
    show,
    step: (step) => show(view, stepFrom(view, date, step)),
    setTable,
  };
}
