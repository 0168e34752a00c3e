import { KeyCap } from '@/app/_ui/key-cap';
import type { FloorRow } from './floor-rows';

/** Below the table: its keys, and what the marks in the row heads mean where there are any. */
export function GridHints({ rows }: { readonly rows: readonly FloorRow[] }) {
  const isWished = rows.some(({ floor }) => floor.priceCentsPerHour !== null);
  const isShared = rows.some(({ floor }) => floor.counting === 'shared');
  return (
    <div className="grid gap-1 text-note text-ink2" data-print="off">
      <p className="phone:hidden">
        <KeyCap>←↑↓→</KeyCap> move, <KeyCap>0–9</KeyCap> type a number, <KeyCap>Enter</KeyCap> keeps
        it, <KeyCap>Esc</KeyCap> does not, <KeyCap>Delete</KeyCap> sets 0, <KeyCap>Shift</KeyCap> +
        arrows select. With several selected <KeyCap>Ctrl R</KeyCap> fills right,{' '}
        <KeyCap>Ctrl D</KeyCap> down. <KeyCap>Ctrl Z</KeyCap> undo, <KeyCap>Ctrl Y</KeyCap> redo.
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
