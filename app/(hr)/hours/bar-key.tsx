import type { ReactNode } from 'react';
import { DimensionLine } from '@/app/_ui/dimension-line';

/** What the parts of a bar mean. */
export function BarKey() {
  return (
    <ul aria-label="Key of the bars" className="flex flex-wrap gap-x-4 gap-y-1 text-note text-ink2">
      <Entry words="contract">
        <span className="h-4 w-[3px] bg-ink" />
      </Entry>
      <Entry words="hours up to it">
        <span className="h-3 w-5 bg-stone" />
      </Entry>
      <Entry words="hours beyond it, overtime">
        <span className="h-3 w-5 border border-edge bg-spare" />
      </Entry>
      <Entry words="leave">
        <span className="w-6">
          <DimensionLine />
        </span>
      </Entry>
    </ul>
  );
}

function Entry({ words, children }: { readonly words: string; readonly children: ReactNode }) {
  return (
    <li className="flex items-center gap-1.5">
      <span aria-hidden="true" className="flex items-center">
        {children}
      </span>
      {words}
    </li>
  );
}
