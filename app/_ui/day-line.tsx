import { Brick } from './people-grid/brick';

interface Props {
  readonly shift: {
    readonly startMinute: number;
    readonly endMinute: number;
    readonly letter: string;
    readonly tone: 0 | 1 | 2 | 3;
  };
  /** Local minute at which the drawn day begins. */
  readonly dayStartsAtMinute: number;
  readonly className?: string;
}

const dayMinutes = 1440;

/** One shift as a brick at its true hours on the line of its day. Decoration: the times stand beside it. */
export function DayLine({ shift, dayStartsAtMinute, className = '' }: Props) {
  const start = clamp(shift.startMinute - dayStartsAtMinute);
  const end = clamp(shift.endMinute - dayStartsAtMinute);
  return (
    <span aria-hidden="true" className={`relative block h-4 border-b border-ink ${className}`}>
      <Brick
        kind={shift}
        letter={shift.letter}
        className="absolute inset-y-0 overflow-hidden"
        style={{ left: percent(start), width: percent(end - start) }}
      />
    </span>
  );
}

const clamp = (minute: number): number => Math.min(dayMinutes, Math.max(0, minute));

const percent = (minutes: number): string => `${(100 * minutes) / dayMinutes}%`;
