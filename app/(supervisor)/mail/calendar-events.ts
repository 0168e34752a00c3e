import type { UtcMilliseconds } from '@/modules/units';

/** One event of a calendar file, as far as a list shows it. */
export interface CalendarEvent {
  readonly uid: string;
  readonly title: string;
  readonly startsAtUtc: UtcMilliseconds;
  readonly endsAtUtc: UtcMilliseconds;
  readonly isCancelled: boolean;
}

/**
 * The events of a calendar file (RFC 5545) whose times are in UTC, as ours are, by start. An event with
 * other times is left out: reading those takes a zone definition.
 */
export function listEvents(file: string): CalendarEvent[] {
  const lines = file.replace(/\r?\n[ \t]/g, '').split(/\r?\n/);
  const events: CalendarEvent[] = [];
  let properties: Map<string, string> | null = null;
  for (const line of lines) {
    if (line === 'BEGIN:VEVENT') properties = new Map();
    else if (line === 'END:VEVENT' && properties) {
      const event = eventOf(properties);
      if (event) events.push(event);
      properties = null;
    } else if (properties) setProperty(properties, line);
  }
  return events.sort((one, other) => one.startsAtUtc - other.startsAtUtc);
}

/** Parts at the first colon outside quotes; parameters such as LANGUAGE are left out. */
function setProperty(properties: Map<string, string>, line: string): void {
  const match = /^([A-Za-z0-9-]+)(?:;(?:"[^"]*"|[^":])*)?:(.*)$/.exec(line);
  if (match?.[1]) properties.set(match[1].toUpperCase(), match[2] ?? '');
}

function eventOf(properties: ReadonlyMap<string, string>): CalendarEvent | null {
  const startsAtUtc = instantOf(properties.get('DTSTART'));
  const endsAtUtc = instantOf(properties.get('DTEND'));
  if (startsAtUtc === null || endsAtUtc === null) return null;
  return {
    uid: properties.get('UID') ?? '',
    title: unescapeText(properties.get('SUMMARY') ?? ''),
    startsAtUtc,
    endsAtUtc,
    isCancelled: properties.get('STATUS') === 'CANCELLED',
  };
}

/** `20270201T070000Z`; null for anything else. RFC 5545, 3.3.5, form 2. */
function instantOf(text: string | undefined): UtcMilliseconds | null {
  const match = /^(\d{4})(\d{2})(\d{2})T(\d{2})(\d{2})(\d{2})Z$/.exec(text ?? '');
  if (!match) return null;
  const [year, month, day, hour, minute, second] = match.slice(1);
  return Date.parse(`${year}-${month}-${day}T${hour}:${minute}:${second}Z`);
}

/** RFC 5545, 3.3.11. */
const unescapeText = (text: string): string =>
  text.replace(/\\([\\;,nN])/g, (_, character: string) =>
    character.toLowerCase() === 'n' ? '\n' : character,
  );
