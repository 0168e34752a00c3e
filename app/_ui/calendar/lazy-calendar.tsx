'use client';

import dynamic from 'next/dynamic';

/** The calendar, loaded in the browser only: it draws in the viewer's own zone, which the server lacks. */
export const LazyCalendar = dynamic(() => import('./big-calendar'), {
  ssr: false,
  loading: () => <p className="late-words line-group py-4 text-ink2">Reading the calendar…</p>,
});
