import type { ReactNode } from 'react';

/** A key of the keyboard inside a sentence. */
export function KeyCap({ children }: { readonly children: ReactNode }) {
  return (
    <kbd className="border border-edge px-1 text-[0.6875rem] whitespace-nowrap figures">
      {children}
    </kbd>
  );
}
