import type { ReactNode } from 'react';

interface Props {
  readonly label: string;
  readonly children: ReactNode;
  /** A smaller note behind the figure, e.g. "0.36 %". */
  readonly note?: ReactNode;
  readonly tone?: 'ink' | 'act' | 'short' | 'holds';
  /** big: the single figure of a sheet. middle: one of several. */
  readonly size?: 'big' | 'middle';
}

const tones = { ink: 'text-ink', act: 'text-act', short: 'text-short', holds: 'text-holds' };
const sizes = { big: 'text-figure font-[680]', middle: 'text-title font-[680]' };

/** A figure that carries the sheet, with its label above. */
export function Figure({ label, children, note, tone = 'ink', size = 'middle' }: Props) {
  return (
    <div>
      <div className="text-second text-ink2">{label}</div>
      <div className={`${sizes[size]} ${tones[tone]}`}>
        {children}
        {note ? <span className="ml-2 text-head font-normal text-ink2">{note}</span> : null}
      </div>
    </div>
  );
}
