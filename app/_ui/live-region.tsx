'use client';

import { createContext, type ReactNode, useContext, useState } from 'react';

const Announce = createContext<(sentence: string) => void>(() => undefined);

/** Holds the one polite live region of the page. */
export function LiveRegionProvider({ children }: { readonly children: ReactNode }) {
  const [sentence, setSentence] = useState('');
  return (
    <Announce value={setSentence}>
      {children}
      <div role="status" aria-live="polite" className="sr-only">
        {sentence}
      </div>
    </Announce>
  );
}

/**
 * Gives a function that has a sentence read aloud once the reader is idle, e.g.
 * `announce('Vet Night Thu 11 now short 1')`. Repeating the same sentence stays silent.
 */
export const useAnnounce = () => useContext(Announce);
