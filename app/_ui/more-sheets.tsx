import Link from 'next/link';
import { SignOutButton } from './sign-out-button';
import type { SheetTab } from './tabs';
import { ThemeSwitch } from './theme-switch';

interface Props {
  readonly tabs: readonly SheetTab[];
  readonly onLeave: () => void;
}

/** What does not fit on the phone's bar: the other sheets, theme and sign-out. */
export function MoreSheets({ tabs, onLeave }: Props) {
  return (
    <div
      id="more-sheets"
      className="absolute inset-x-0 bottom-[calc(100%-0.5rem)] border-t-3 border-ink bg-paper px-(--page) pt-2 pb-4"
    >
      <ul className="grid grid-cols-2 gap-x-4">
        {tabs.map((tab) => (
          <li key={tab.href} className="line-row">
            <Link
              href={tab.href}
              onClick={onLeave}
              className="flex min-h-11 items-center font-[640]"
            >
              {tab.label}
            </Link>
          </li>
        ))}
      </ul>
      <div className="flex justify-between">
        <ThemeSwitch />
        <SignOutButton />
      </div>
    </div>
  );
}
