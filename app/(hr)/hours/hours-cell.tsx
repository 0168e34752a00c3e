interface Props {
  readonly minutes: number;
  readonly format: (minutes: number) => string;
  readonly className?: string;
}

/** A figure of a column; nothing is paler. */
export function HoursCell({ minutes, format, className = '' }: Props) {
  return (
    <td data-figure className={`${className} ${minutes === 0 ? 'text-ink3' : ''}`}>
      {minutes === 0 ? '0' : format(minutes)}
    </td>
  );
}
