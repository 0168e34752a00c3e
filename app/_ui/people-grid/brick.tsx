import type { BoardKind } from '@/modules/roster';

/** How a brick is drawn apart from its tone. */
export interface BrickLook {
  /** Dashed: the person works in a second skill. */
  readonly isSecondSkill?: boolean;
  /** Outline and letter only: a day before the period, or somebody who comes from another group. */
  readonly isPale?: boolean;
  readonly isPinned?: boolean;
}

interface Props extends BrickLook {
  readonly kind: Pick<BoardKind, 'tone'>;
  readonly letter: string;
  /** Hours below the letter where there is room. */
  readonly times?: string | undefined;
  readonly className?: string;
  readonly style?: React.CSSProperties;
}

/** Fill and letter of a brick by its tone. */
export const brickTones = [
  'bg-(--brick-0) text-(--brick-letter)',
  'bg-(--brick-1) text-(--brick-letter)',
  'bg-(--brick-2) text-(--brick-letter)',
  'bg-(--brick-3) text-(--brick-letter-night)',
] as const;

/** One shift: tone by lateness, letter inside. Decoration; the cell around it is labelled in full. */
export function Brick({ kind, letter, times, className = '', style, ...look }: Props) {
  return (
    <span
      aria-hidden="true"
      style={style}
      className={`figures flex flex-col items-center justify-center border-[1.25px] text-note leading-none font-[760] ${
        look.isPale ? 'bg-transparent text-ink3' : brickTones[kind.tone]
      } ${outline(kind.tone, look)} ${look.isPinned ? 'border-b-3' : ''} ${className}`}
    >
      {letter}
      {times ? <span className="mt-0.5 text-[0.6875rem] font-[560]">{times}</span> : null}
    </span>
  );
}

/** On a dark brick dashes in ink would be ink on ink: they take the colour of the letter. */
function outline(tone: BoardKind['tone'], { isPale, isSecondSkill }: BrickLook): string {
  if (isPale) return isSecondSkill ? 'border-dashed border-edge' : 'border-edge';
  if (!isSecondSkill) return 'border-ink';
  return `border-dashed ${tone === 3 ? 'border-(--brick-letter-night)' : 'border-ink'}`;
}
