import { formatInstant } from '@/app/_ui/clock';
import type { UtcMilliseconds, Zone } from '@/modules/units';
import { formatClock, formatDay, toLocal } from '@/modules/units';

/** A mail may come without a subject. */
export const subjectWords = (subject: string): string => subject || 'No subject';

/** When a mail was sent, by the team's clock. */
export const sentWords = (sentAtUtc: UtcMilliseconds | null, zone: Zone): string =>
  sentAtUtc === null ? 'no date' : formatInstant(sentAtUtc, zone);

/** `6.2 KB` of 6200 octets, `532 bytes` below a thousand. */
export const sizeWords = (octets: number): string =>
  octets < 1000 ? `${octets} bytes` : `${(octets / 1000).toFixed(1)} KB`;

/** `Fri 5 Feb, 23:00 to Sat 6 Feb, 07:00`; the date once where it is the same. */
export function spanWords(
  startsAtUtc: UtcMilliseconds,
  endsAtUtc: UtcMilliseconds,
  zone: Zone,
): string {
  const [start, end] = [toLocal(startsAtUtc, zone), toLocal(endsAtUtc, zone)];
  const endDay = end.date === start.date ? '' : `${formatDay(end.date)}, `;
  return `${formatDay(start.date)}, ${formatClock(start.minute)} to ${endDay}${formatClock(end.minute)}`;
}

/** A link that saves a text under its own type, without another request. */
export const textLink = (contentType: string, text: string): string =>
  `data:${contentType.split(';')[0]};charset=utf-8,${encodeURIComponent(text)}`;
