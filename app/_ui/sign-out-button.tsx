'use client';

import { signOut } from 'next-auth/react';
import { Button } from './button';

/** Ends the session here and goes to the sign-in page. */
export function SignOutButton() {
  return (
    <Button
      look="quiet"
      className="text-second! font-normal!"
      onClick={() => signOut({ callbackUrl: '/sign-in' })}
    >
      Sign out
    </Button>
  );
}
