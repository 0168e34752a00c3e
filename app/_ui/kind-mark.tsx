import type { ShiftKind, Tone } from '@/modules/coverage';
import { brickTones } from './people-grid/brick';

interface Props {
  readonly kind: Pick<ShiftKind, 'letter'>;
  readonly tone: Tone;
}

/** Fill, letter and outline of a brick; it darkens with lateness in both themes. */
export const brickClass = (tone: Tone): string => `border-[1.25px] border-ink ${brickTones[tone]}`;

/** The letter of a shift kind as a small brick. Decoration: the name stands beside it. */
export function KindMark({ kind, tone }: Props) {
  return (
    <span
      aria-hidden="true"
      className={`grid h-5 min-w-5 shrink-0 place-items-center px-0.5 text-note leading-none font-[760] figures ${brickClass(tone)}`}
    >
      {kind.letter}
    </span>
  );
}
