import type { ReactNode } from 'react';

/** A span between two slanted ticks, with its measure in the middle: leave, hours given. */
export function DimensionLine({ children }: { readonly children?: ReactNode }) {
  return (
    <span className="flex w-full items-center text-note text-ink2">
      <Tick />
      <span className="h-px min-w-0 flex-1 bg-ink" aria-hidden="true" />
      {children ? <span className="truncate px-1">{children}</span> : null}
      <span className="h-px min-w-0 flex-1 bg-ink" aria-hidden="true" />
      <Tick />
    </span>
  );
}

function Tick() {
  return (
    <svg viewBox="0 0 6 10" className="h-2.5 w-1.5 shrink-0" aria-hidden="true">
      <path d="M.5 9.5 5.5.5" className="fill-none stroke-ink" strokeWidth="1.5" />
    </svg>
  );
}
