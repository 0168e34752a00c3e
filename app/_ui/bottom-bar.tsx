'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { useState } from 'react';
import { MoreSheets } from './more-sheets';
import { isOpenTab, type SheetTab } from './tabs';

interface Props {
  readonly bar: readonly SheetTab[];
  readonly more: readonly SheetTab[];
}

/** The index of phones: a floor line at the bottom that steps up around the open sheet. */
export function BottomBar({ bar, more }: Props) {
  const pathname = usePathname();
  const [isOpen, setIsOpen] = useState(false);
  const isInMore = more.some((tab) => isOpenTab(pathname, tab));
  return (
    <nav
      aria-label="Sheets"
      className="fixed inset-x-0 bottom-0 z-20 h-(--bar) desk:hidden print:hidden"
      onKeyDown={(event) => event.key === 'Escape' && setIsOpen(false)}
    >
      {isOpen ? <MoreSheets tabs={more} onLeave={() => setIsOpen(false)} /> : null}
      <ul className="absolute inset-x-0 bottom-0 flex h-full">
        {bar.map((tab) => (
          <li key={tab.href} className="flex min-w-0 flex-1">
            <Link
              href={tab.href}
              aria-current={isOpenTab(pathname, tab) ? 'page' : undefined}
              className={placeClass(isOpenTab(pathname, tab))}
              onClick={() => setIsOpen(false)}
            >
              {tab.label}
            </Link>
          </li>
        ))}
        <li className="flex min-w-0 flex-1">
          <button
            type="button"
            aria-expanded={isOpen}
            aria-controls="more-sheets"
            className={placeClass(isInMore)}
            onClick={() => setIsOpen(!isOpen)}
          >
            More
          </button>
        </li>
      </ul>
    </nav>
  );
}

function placeClass(isOpen: boolean): string {
  const place =
    'flex min-w-0 flex-1 items-center justify-center bg-paper text-body outline-offset-[-5px]!';
  return isOpen
    ? `${place} border-3 border-b-0 border-ink font-[660]`
    : `${place} mt-2 border-t-3 border-ink font-[560] text-ink2`;
}
