import { brickClass } from '@/app/_ui/kind-mark';
import type { ShiftKind, Tone } from '@/modules/coverage';
import { formatClock } from '@/modules/units';
import { brickPieces, lineMarks } from './brick-pieces';

interface Props {
  readonly kind: ShiftKind;
  readonly tone: Tone;
  readonly dayStartsAtMinute: number;
}

/** A shift as a brick at its true hours of the day. Decoration: its times stand beside it. */
export function DayLine({ kind, tone, dayStartsAtMinute }: Props) {
  return (
    <div aria-hidden="true" className="relative h-7 min-w-64 border-b-[1.5px] border-ink">
      {lineMarks(dayStartsAtMinute).map(({ left }) => (
        <span
          key={left}
          className="absolute inset-y-0 border-l border-rule"
          style={{ left: `${left}%` }}
        />
      ))}
      {brickPieces(kind, dayStartsAtMinute).map(({ left, width }) => (
        <span
          key={left}
          className={`absolute top-1.5 bottom-0 grid place-items-center overflow-hidden text-second leading-none font-[760] figures ${brickClass(tone)}`}
          style={{ left: `${left}%`, width: `${width}%` }}
        >
          {kind.letter}
        </span>
      ))}
    </div>
  );
}

/** The clock times over the lines of a column. */
export function DayLineHead({ dayStartsAtMinute }: Pick<Props, 'dayStartsAtMinute'>) {
  return (
    <div aria-hidden="true" className="relative h-4 text-note font-normal text-ink2 figures">
      {lineMarks(dayStartsAtMinute)
        .filter((_, index) => index % 2 === 0)
        .map(({ minute, left }) => (
          <span
            key={left}
            className={`absolute ${left === 0 ? '' : left === 100 ? '-translate-x-full' : '-translate-x-1/2'}`}
            style={{ left: `${left}%` }}
          >
            {formatClock(minute)}
          </span>
        ))}
    </div>
  );
}
