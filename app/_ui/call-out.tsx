import type { ComponentProps } from 'react';

interface Look {
  readonly number: number;
  /** A shortage has a double ring as well as its colour. */
  readonly isShort?: boolean;
}

const ring =
  'grid size-6 place-items-center rounded-full border-[1.5px] bg-paper text-second font-[680]';
const tone = (isShort: boolean) =>
  isShort ? 'border-short text-short ring-1 ring-inset ring-offset-0 ring-short' : 'border-ink';

/** A numbered circle on a drawing that leads to its entry in the list. */
export function CallOutButton({
  number,
  isShort = false,
  className = '',
  ...rest
}: Look & ComponentProps<'button'>) {
  return (
    <button {...rest} type="button" className={`${ring} ${tone(isShort)} ${className}`}>
      {number}
    </button>
  );
}
