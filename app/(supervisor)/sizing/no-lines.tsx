import Link from 'next/link';

const linkClass = 'text-act underline underline-offset-3';

/** Stands where the lines will stand: what makes some. */
export function NoLines() {
  return (
    <p className="mt-2 text-body">
      No patterns yet. Set{' '}
      <Link className={linkClass} href="/floors">
        floors
      </Link>{' '}
      and{' '}
      <Link className={linkClass} href="/shift-kinds">
        shift kinds
      </Link>{' '}
      for this week first, or add a pattern yourself.
    </p>
  );
}
