import Link from 'next/link';
import type { ComponentProps } from 'react';

/** primary: the one thing this sheet is for. outline: other actions. quiet: looks like a link. */
export type ButtonLook = 'primary' | 'outline' | 'quiet';

const shape =
  'inline-flex items-center justify-center gap-2 text-body font-[640] phone:min-h-11 no-underline';
const looks: Record<ButtonLook, string> = {
  primary:
    'min-h-8 px-4 bg-act text-paper border-[1.25px] border-act hover:bg-ink hover:border-ink',
  outline: 'min-h-8 px-3 bg-transparent text-ink border-[1.25px] border-ink hover:bg-recess',
  quiet: 'min-h-6 px-0 bg-transparent text-act underline underline-offset-3 hover:decoration-2',
};
const idle =
  'disabled:cursor-not-allowed disabled:border-edge disabled:bg-transparent disabled:text-ink3';

/** Class names of a button, for elements that are not one. */
export const buttonClass = (look: ButtonLook, extra = ''): string =>
  `${shape} ${looks[look]} ${look === 'quiet' ? '' : idle} ${extra}`;

interface ButtonProps extends ComponentProps<'button'> {
  readonly look?: ButtonLook;
}

/** A button; at least 24 px to hit, 44 px on phones. It does not submit unless `type` says so. */
export function Button({ look = 'outline', className, type = 'button', ...rest }: ButtonProps) {
  return <button {...rest} type={type} className={buttonClass(look, className)} />;
}

interface ButtonLinkProps extends ComponentProps<typeof Link> {
  readonly look?: ButtonLook;
}

/** A link that looks like a button. */
export function ButtonLink({ look = 'outline', className, ...rest }: ButtonLinkProps) {
  return <Link {...rest} className={buttonClass(look, className)} />;
}
