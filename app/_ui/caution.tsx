import type { ReactNode } from 'react';

/** A caution the reader should weigh: law, fatigue, safety. Not used for shortages. */
export function Caution({ children }: { readonly children: ReactNode }) {
  return (
    <p className="max-w-[60rem] border-l-3 border-caution py-1 pl-3 text-second text-ink2">
      <strong className="font-[660] text-caution">Caution. </strong>
      {children}
    </p>
  );
}
