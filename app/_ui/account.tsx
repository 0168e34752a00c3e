import Link from 'next/link';
import type { Role } from '@/modules/access';
import { SignOutButton } from './sign-out-button';
import { ThemeSwitch } from './theme-switch';

interface Props {
  readonly organisationName: string;
  readonly name: string;
  readonly roles: readonly Role[];
}

/** Who is signed in and where, with Help. Theme and sign-out stand behind "More" on phones. */
export function Account({ organisationName, name, roles }: Props) {
  return (
    <div className="flex flex-wrap items-center justify-end gap-x-4 text-second">
      <span className="text-ink2 phone:hidden">{organisationName}</span>
      <span className="text-ink2">
        <strong className="font-[660] text-ink">{name}</strong>
        <span className="phone:hidden">, {roles.map(roleName).join(', ')}</span>
      </span>
      <span className="flex items-center gap-x-4 print:hidden">
        <Link
          href="/help"
          className="inline-flex min-h-6 items-center text-act underline underline-offset-3 phone:min-h-11"
        >
          Help
        </Link>
        <span className="contents phone:hidden">
          <ThemeSwitch />
          <SignOutButton />
        </span>
      </span>
    </div>
  );
}

const roleName = (role: Role): string => (role === 'hr' ? 'HR' : role);
