import type { ReactNode } from 'react';
import type { FloorRow } from './floor-rows';

/** Below the table: its keys, and what the marks in the row heads mean where there are any. */
export function GridHints({ rows }: { readonly rows: readonly FloorRow[] }) {
  const isWished = rows.some(({ floor }) => floor.priceCentsPerHour !== null);
  const isShared = rows.some(({ floor }) => floor.counting === 'shared');
  return (
    <div className="grid gap-1 text-note text-ink2" data-print="off">
      <p className="phone:hidden">
        <Key>←↑↓→</Key> move, <Key>0–9</Key> type a number, <Key>Enter</Key> keeps it,{' '}
        <Key>Esc</Key> does not, <Key>Delete</Key> sets 0, <Key>Shift</Key> + arrows select. With
        several selected <Key>Ctrl R</Key> fills right, <Key>Ctrl D</Key> down. <Key>Ctrl Z</Key>{' '}
        undo, <Key>Ctrl Y</Key> redo.
      </p>
      <p className="desk:hidden">
        Tap a number to change it. With “Select several” on, tap the first and the last number to
        fill.
      </p>
      {isWished ? (
        <p>
          Wished: the roster may leave it short, at that price for each missing hour. All other
          floors are firm.
        </p>
      ) : null}
      {isShared ? (
        <p>Shared: everybody on duty who holds the skill counts, whatever post they hold.</p>
      ) : null}
    </div>
  );
}

const Key = ({ children }: { readonly children: ReactNode }) => (
  <kbd className="border border-edge px-1 text-[0.6875rem] whitespace-nowrap figures">
    {children}
  </kbd>
);
