import type { ReactNode } from 'react';
import { env } from '@/db/env';
import type { Actor } from '@/modules/access';
import { Account } from './account';
import { BottomBar } from './bottom-bar';
import { Brand } from './brand';
import { SheetIndex } from './sheet-index';
import { barTabsFor, tabsFor } from './tabs';

interface Props {
  readonly actor: Actor;
  readonly children: ReactNode;
}

/**
 * The sheet around every page of a signed-in person: the index that steps up around the open sheet, who
 * is signed in, Help, theme and sign-out, and on phones the bar at the bottom. A `TitleBlock` goes last
 * among the children.
 */
export function Shell({ actor, children }: Props) {
  const isDemo = env().DEMO === 'on';
  const { bar, more } = barTabsFor(actor, isDemo);
  return (
    <div className="flex min-h-dvh flex-col pb-(--bar) print:pb-0">
      <a
        href="#sheet"
        className="absolute left-2 -top-12 z-40 bg-act px-3 py-2 font-[640] text-paper focus:top-2"
      >
        Skip to the sheet
      </a>
      <SheetIndex tabs={tabsFor(actor, isDemo)} brand={<Brand />}>
        <Account
          organisationName={actor.organisationName}
          name={actor.name}
          roles={[...new Set(actor.memberships.map(({ role }) => role))]}
        />
      </SheetIndex>
      <main id="sheet" tabIndex={-1} className="flex min-w-0 flex-1 flex-col px-(--page)">
        {children}
      </main>
      <BottomBar bar={bar} more={more} />
    </div>
  );
}
