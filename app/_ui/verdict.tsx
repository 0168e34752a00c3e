import type { ReactNode } from 'react';

interface Props {
  /** What is the case, in words: "Roster 1–28 February, the floor holds". */
  readonly children: ReactNode;
  /** One line of explanation below. */
  readonly lead?: ReactNode;
  /** Buttons at the right; below the words on phones. */
  readonly actions?: ReactNode;
}

/** The title of a sheet: its verdict, as the page's only h1. */
export function Verdict({ children, lead, actions }: Props) {
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-9 gap-y-3 pt-4 pb-3">
      <div className="min-w-0 max-w-[46rem]">
        <h1 className="text-title font-[640] phone:text-[1.5625rem]">{children}</h1>
        {lead ? <p className="mt-1 text-body text-ink2">{lead}</p> : null}
      </div>
      {actions ? (
        <div data-print="off" className="flex flex-wrap items-center gap-2">
          {actions}
        </div>
      ) : null}
    </div>
  );
}
