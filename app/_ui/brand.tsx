import Link from 'next/link';
import { Mark } from './mark';

/** Mark and name; leads to the first sheet. */
export function Brand() {
  return (
    <Link href="/" className="flex min-h-6 shrink-0 items-center gap-2.5 text-head font-[680]">
      <Mark />
      Floorwright
    </Link>
  );
}
