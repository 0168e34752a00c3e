import type { FakeMailAttachment } from '@/modules/mail';
import type { Zone } from '@/modules/units';
import { type CalendarEvent, listEvents } from './calendar-events';
import { sizeWords, spanWords, textLink } from './mail-words';

interface Props {
  readonly attachment: FakeMailAttachment;
  readonly zone: Zone;
}

/** One attached file with a link that saves it; a calendar also with its events. */
export function Attachment({ attachment, zone }: Props) {
  const { name, contentType, sizeBytes, text } = attachment;
  const isCalendar = contentType.startsWith('text/calendar') && text !== null;
  return (
    <div className="mb-3">
      <p className="text-body">
        {text === null ? (
          name
        ) : (
          <a
            href={textLink(contentType, text)}
            download={name}
            className="inline-flex min-h-6 items-center font-[640] text-act underline underline-offset-3 phone:min-h-11"
          >
            {name}
          </a>
        )}
        <span className="text-ink2">
          , {contentType}, {sizeWords(sizeBytes)}
        </span>
      </p>
      {isCalendar ? <Events events={listEvents(text)} zone={zone} /> : null}
    </div>
  );
}

function Events({
  events,
  zone,
}: {
  readonly events: readonly CalendarEvent[];
  readonly zone: Zone;
}) {
  return (
    <>
      <p className="mt-1 text-second text-ink2">
        {events.length === 1 ? '1 event' : `${events.length} events`}, times of {zone}:
      </p>
      <ul className="text-second">
        {events.map(({ uid, title, startsAtUtc, endsAtUtc, isCancelled }) => (
          <li key={uid} className="line-row flex flex-wrap justify-between gap-x-4 py-1">
            <span>
              {title}
              {isCancelled ? <strong className="font-[660]">, taken back</strong> : null}
            </span>
            <span className="text-ink2">{spanWords(startsAtUtc, endsAtUtc, zone)}</span>
          </li>
        ))}
      </ul>
    </>
  );
}
