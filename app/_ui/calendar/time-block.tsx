'use client';

import type { ReactNode } from 'react';
import type { EventWrapperProps } from 'react-big-calendar';
import { KindMark } from '../kind-mark';
import { blockTimes, endsNote } from './block-words';
import { type Block, postLines } from './blocks';
import type { CalendarEvent } from './calendar-events';
import { useCalendarWorld } from './calendar-world';

/** Names that a block of the week has room for; the view of the day has more. */
const mostNames = { week: 8, day: 40 };

type Props = EventWrapperProps<CalendarEvent> & { readonly children?: ReactNode };

/** All people of one kind as one block at its true hours, in place of the package's own element. */
export function TimeBlock({ event }: Props) {
  const { block, place } = event.resource;
  const { audience, range } = useCalendarWorld();
  const most = range.from === range.to ? mostNames.day : mostNames.week;
  const ends = endsNote(block);
  return (
    <div
      className="time-block"
      data-tone={block.tone}
      style={{
        top: `${place.top}%`,
        height: `${place.height}%`,
        left: `${place.left}%`,
        width: `${place.width}%`,
      }}
    >
      <p className="flex flex-wrap items-baseline gap-x-1.5 text-second font-[700]">
        <span className="min-w-0 break-words">{block.kindName}</span>
        {audience === 'team' ? <span className="font-normal">{block.entries.length}</span> : null}
      </p>
      <p className="text-note">
        {blockTimes(block)}
        {ends ? <span className="block">{ends}</span> : null}
        {block.isPublished ? null : <span className="block">draft</span>}
      </p>
      <Names block={block} most={most} withNames={audience === 'team'} />
    </div>
  );
}

interface NamesProps {
  readonly block: Block;
  readonly most: number;
  readonly withNames: boolean;
}

/** Who is on, by post; beyond the room there is, how many more. */
function Names({ block, most, withNames }: NamesProps) {
  const lines = postLines(block);
  if (!withNames) return <p className="text-note">{lines.map(({ post }) => post).join(', ')}</p>;
  const more = block.entries.length - most;
  let room = most;
  return (
    <dl className="mt-1 text-note leading-tight">
      {lines.map(({ post, names }) => {
        const shown = names.slice(0, Math.max(0, room));
        room -= shown.length;
        if (shown.length === 0) return null;
        return (
          <div key={post} className="mb-1">
            <dt className="font-[700]">{post}</dt>
            {shown.map((name) => (
              <dd key={name}>{name}</dd>
            ))}
          </div>
        );
      })}
      {more > 0 ? (
        <div>
          <dt>{more} more</dt>
          <dd>see the day</dd>
        </div>
      ) : null}
    </dl>
  );
}

/** A row of the agenda: brick, kind, and who is on. */
export function AgendaBlock({ event }: { readonly event: CalendarEvent }) {
  const { block } = event.resource;
  const { audience } = useCalendarWorld();
  const lines = postLines(block);
  return (
    <div className="flex gap-2">
      <KindMark kind={block} tone={block.tone} />
      <div className="min-w-0">
        <span className="font-[660]">{block.kindName}</span>
        {block.isPublished ? null : <span className="text-second text-ink2"> draft</span>}
        {audience === 'own' ? (
          <span className="text-second text-ink2">
            , {lines.map(({ post }) => post).join(', ')}
          </span>
        ) : (
          <div className="flex flex-wrap gap-x-5 text-second">
            {lines.map(({ post, names }) => (
              <p key={post}>
                <span className="font-[660]">{post}</span> {names.join(', ')}
              </p>
            ))}
          </div>
        )}
      </div>
    </div>
  );
}
