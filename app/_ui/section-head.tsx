import type { ReactNode } from 'react';

interface Props {
  readonly children: ReactNode;
  /** For aria-labelledby of the section. */
  readonly id?: string;
  /** A figure, link or button at the right end. */
  readonly aside?: ReactNode;
}

/** Head of a section under the 3 px cut line. */
export function SectionHead({ children, id, aside }: Props) {
  return (
    <div className="line-cut flex flex-wrap items-center justify-between gap-x-4 gap-y-1 pt-3 pb-2">
      <h2 id={id} className="text-head font-[660]">
        {children}
      </h2>
      {aside}
    </div>
  );
}
