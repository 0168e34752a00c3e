'use client';

import { type KeyboardEvent, type ReactNode, useMemo, useRef } from 'react';
import type { CalendarEntry } from '@/modules/roster';
import { Button } from '../button';
import { ProblemNote } from '../problem-note';
import { byDate, toBlocks } from './blocks';
import { CalendarKey } from './calendar-key';
import { CalendarTable } from './calendar-table';
import type { CalendarWorld } from './calendar-world';
import { LazyCalendar } from './lazy-calendar';
import type { CalendarPlace } from './use-calendar-place';

interface Props
  extends Pick<CalendarWorld, 'frame' | 'audience' | 'leave' | 'selected' | 'onPick'> {
  readonly place: CalendarPlace;
  /** null while they are read. */
  readonly entries: readonly CalendarEntry[] | null;
  readonly problem: unknown;
  readonly onRetry: () => void;
  /** Stands between the calendar and its legend, e.g. the chosen day. */
  readonly children?: ReactNode;
}

/** Shifts as a calendar in the chosen view or as a plain table; the key T inside it turns one into the other. */
export function CalendarSheet({ place, entries, problem, onRetry, children, ...rest }: Props) {
  const { frame, audience } = rest;
  const blocks = useMemo(() => toBlocks(entries ?? [], frame.zone), [entries, frame.zone]);
  const blocksOn = useMemo(() => byDate(blocks), [blocks]);
  const { view, date, range, title, isTable } = place;
  const sheet = useRef<HTMLDivElement>(null);
  const onKeyDown = (event: KeyboardEvent) => {
    if (!isToggleKey(event)) return;
    place.setTable(!isTable);
    // What had the focus is about to go away.
    sheet.current?.focus();
  };
  const shown = blocks.filter((block) => range.from <= block.date && block.date <= range.to);
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: T is a short cut to the button above
    <div ref={sheet} tabIndex={-1} onKeyDown={onKeyDown} className="min-w-0">
      <div className="mb-2 empty:hidden">
        <ProblemNote problem={problem} action={<Button onClick={onRetry}>Read again</Button>} />
      </div>
      {entries === null && !problem ? (
        <p className="late-words text-second text-ink2">Reading {title}…</p>
      ) : null}
      {isTable && entries !== null ? (
        <CalendarTable
          label={`Shifts, ${title}`}
          {...{ blocks, range, audience }}
          holidays={frame.holidays}
        />
      ) : null}
      {isTable ? null : (
        <section
          // biome-ignore lint/a11y/noNoninteractiveTabindex: a strip that scrolls must take the keyboard
          tabIndex={0}
          aria-label={`Calendar, ${title}`}
          className="calendar-strip"
          data-audience={audience}
          data-view={view}
        >
          <LazyCalendar
            view={view}
            blocks={shown}
            world={{ ...rest, date, range, blocksOn, isRead: entries !== null }}
          />
        </section>
      )}
      {children}
      <CalendarKey blocks={shown} />
    </div>
  );
}

function isToggleKey({ key, ctrlKey, metaKey, altKey, target }: KeyboardEvent): boolean {
  const isTyping =
    target instanceof HTMLElement && /^(INPUT|SELECT|TEXTAREA)$/.test(target.tagName);
  return key.toLowerCase() === 't' && !ctrlKey && !metaKey && !altKey && !isTyping;
}
