import type { Metadata } from 'next';
import { demoAccounts } from '@/db/demo/accounts.mjs';
import { env } from '@/db/env';
import { Mark } from '../_ui/mark';
import { ThemeSwitch } from '../_ui/theme-switch';
import { safePath } from './safe-path';
import { SignInForm } from './sign-in-form';
import { WallDrawing } from './wall-drawing';

export const metadata: Metadata = { title: 'Sign in' };

/** The first page: what the product is for, the form, and a wall that explains line and hatch. */
export default async function SignInPage({ searchParams }: PageProps<'/sign-in'>) {
  const { callbackUrl } = await searchParams;
  const target = safePath(typeof callbackUrl === 'string' ? callbackUrl : undefined);
  return (
    <div className="flex min-h-dvh flex-col">
      <header className="flex justify-end px-(--page) pt-4">
        <ThemeSwitch />
      </header>
      <main className="mx-auto flex w-full max-w-[76rem] flex-wrap justify-between gap-9 px-(--page) pt-4 pb-9">
        <div className="max-w-[26rem]">
          <h1 className="flex items-center gap-4 text-figure font-[680] phone:text-title">
            <Mark className="size-12 phone:size-9" />
            Floorwright
          </h1>
          <p className="mt-6 text-verdict font-normal text-ink2 phone:mt-3 phone:text-head">
            You set the fewest people each hour needs. Floorwright finds a roster that keeps to it,
            at the least cost.
          </p>
        </div>
        <SignInForm
          target={target}
          {...(env().DEMO === 'on' ? { demoAccounts: [...demoAccounts] } : {})}
        />
      </main>
      <WallDrawing />
    </div>
  );
}
