import type { ReactNode } from 'react';

interface Props {
  /** Names the table and its scroll strip. */
  readonly label: string;
  /** thead, tbody and tfoot, written plainly with `th scope` in each row. */
  readonly children: ReactNode;
  /** Keeps the first column in view while the strip scrolls sideways. */
  readonly holdsFirstColumn?: boolean;
  /** Highest the strip may grow before it scrolls, as a CSS length. */
  readonly maxHeight?: string;
}

const lines =
  'w-full border-collapse text-body [&_caption]:sr-only ' +
  '[&_:is(th,td)]:px-2 [&_:is(th,td)]:py-1 [&_:is(th,td)]:text-left [&_:is(th,td)]:align-baseline ' +
  '[&_:is(th,td)[data-figure]]:text-right [&_[data-figure]]:tabular-nums [&_[data-figure]]:whitespace-nowrap ' +
  '[&_thead_th]:align-bottom [&_thead_th]:text-second [&_thead_th]:font-[640] ' +
  '[&_thead_tr:last-child>*]:border-b-[1.5px] [&_thead_tr:last-child>*]:border-ink ' +
  '[&_tbody_:is(th,td)]:border-b [&_tbody_:is(th,td)]:border-rule [&_tbody_th]:font-[640] ' +
  '[&_tfoot_:is(th,td)]:border-t-3 [&_tfoot_:is(th,td)]:border-ink [&_tfoot]:font-[660]';

const held =
  '[&_tr>*:first-child]:sticky [&_tr>*:first-child]:left-0 [&_tr>*:first-child]:z-1 ' +
  '[&_tr>*:first-child]:bg-paper';

/**
 * A plain table in its own strip that scrolls sideways, also by keyboard. Columns of figures carry
 * `data-figure` on their cells.
 */
export function Table({ label, children, holdsFirstColumn = true, maxHeight }: Props) {
  return (
    <section
      // biome-ignore lint/a11y/noNoninteractiveTabindex: a strip that scrolls must take the keyboard
      tabIndex={0}
      aria-label={label}
      className="relative max-w-full overflow-auto print:overflow-visible"
      style={{ maxHeight }}
    >
      <table className={`${lines} ${holdsFirstColumn ? held : ''}`}>
        <caption>{label}</caption>
        {children}
      </table>
    </section>
  );
}
