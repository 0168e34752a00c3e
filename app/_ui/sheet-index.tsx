'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';
import { isOpenTab, type SheetTab } from './tabs';

interface Props {
  readonly tabs: readonly SheetTab[];
  readonly brand: ReactNode;
  /** Who is signed in, at the right. */
  readonly children: ReactNode;
}

/** The head of the sheet: its lower edge is a floor line that steps up around the open tab. */
export function SheetIndex({ tabs, brand, children }: Props) {
  const pathname = usePathname();
  return (
    <header className="relative px-(--page) desk:after:absolute desk:after:inset-x-0 desk:after:bottom-0 desk:after:h-[3px] desk:after:bg-ink">
      <div className="flex flex-wrap-reverse items-end justify-between gap-x-6 phone:flex-wrap phone:items-center phone:py-2">
        <div className="flex min-w-0 max-w-full items-end gap-5">
          <div className="desk:pb-2.5">{brand}</div>
          <nav aria-label="Sheets" className="relative z-1 min-w-0 pt-2 phone:hidden print:hidden">
            <ul className="flex overflow-x-auto">
              {tabs.map((tab) => (
                <li key={tab.href}>
                  <Tab tab={tab} isOpen={isOpenTab(pathname, tab)} />
                </li>
              ))}
            </ul>
          </nav>
        </div>
        <div className="desk:py-2.5">{children}</div>
      </div>
    </header>
  );
}

function Tab({ tab, isOpen }: { readonly tab: SheetTab; readonly isOpen: boolean }) {
  return (
    <Link
      href={tab.href}
      aria-current={isOpen ? 'page' : undefined}
      className={`flex min-h-9 items-center whitespace-nowrap border-3 border-b-0 px-3.5 text-body outline-offset-[-5px]! ${
        isOpen
          ? 'border-ink bg-paper pb-[3px] font-[660]'
          : 'border-transparent pb-[3px] font-[560] text-ink2 hover:text-ink hover:underline underline-offset-4'
      }`}
    >
      {tab.label}
    </Link>
  );
}
