import type { ReactNode } from 'react';

/** One standing figure of the sheet. */
export interface StandingFigure {
  readonly label: string;
  readonly value: ReactNode;
  readonly tone?: 'ink' | 'short' | 'holds';
  /** Stands at the right end. */
  readonly isLast?: boolean;
  /** Left off on paper, e.g. money on a roster for the wall. */
  readonly isScreenOnly?: boolean;
}

const tones = { ink: 'text-ink', short: 'text-short', holds: 'text-holds' };

/**
 * The strip of standing figures at the foot of a sheet. It never holds actions. It stays in view on
 * screens that are wide and tall enough and prints with the sheet.
 */
export function TitleBlock({ figures }: { readonly figures: readonly StandingFigure[] }) {
  return (
    <footer className="pointer-events-none z-10 mx-[calc(-1*var(--page))] mt-auto pt-6 desk:tall:sticky desk:tall:bottom-0 print:static">
      <dl className="line-cut pointer-events-auto flex flex-wrap bg-paper">
        {figures.map(({ label, value, tone = 'ink', isLast, isScreenOnly }) => (
          <div
            key={label}
            data-print={isScreenOnly ? 'off' : undefined}
            className={`flex items-baseline gap-2 border-r border-rule px-(--page) py-2 phone:w-full phone:justify-between phone:border-r-0 phone:border-b phone:border-l-0 ${
              isLast ? 'desk:ml-auto desk:border-r-0 desk:border-l' : ''
            }`}
          >
            <dt className="text-note text-ink2">{label}</dt>
            <dd className={`text-second font-[660] ${tones[tone]}`}>{value}</dd>
          </div>
        ))}
      </dl>
    </footer>
  );
}
