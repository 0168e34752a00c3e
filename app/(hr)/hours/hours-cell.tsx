import type { FormatHours } from './format-hours';

interface Props {
  readonly minutes: number;
  readonly format: FormatHours;
  readonly className?: string;
}

/** A figure of a column; nothing is paler. */
export function HoursCell({ minutes, format, className = '' }: Props) {
  return (
    <td data-figure className={`${className} ${minutes === 0 ? 'text-ink3' : ''}`}>
      {format(minutes)}
    </td>
  );
}
