'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { signIn } from 'next-auth/react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { Button } from '../_ui/button';
import { TextField } from '../_ui/field';
import { DemoButtons } from './demo-buttons';

const credentialsSchema = z.strictObject({
  email: z.email('Write your whole e-mail address, for example name@company.example.'),
  password: z.string().min(1, 'Write your password.'),
});
type Credentials = z.infer<typeof credentialsSchema>;

export interface DemoAccount extends Credentials {
  readonly label: string;
}

interface Props {
  /** Path of this site to go to afterwards. */
  readonly target: string;
  /** Given in demo mode only. */
  readonly demoAccounts?: readonly DemoAccount[];
}

/** E-mail and password. A refusal keeps the e-mail and says what to do. */
export function SignInForm({ target, demoAccounts }: Props) {
  const [refusal, setRefusal] = useState<string | null>(null);
  const form = useForm<Credentials>({
    resolver: zodResolver(credentialsSchema),
    defaultValues: { email: '', password: '' },
  });
  const { errors, isSubmitting } = form.formState;

  const submit = async (credentials: Credentials) => {
    setRefusal(null);
    const sentence = await trySignIn(credentials);
    if (sentence === null) return window.location.assign(target);
    setRefusal(sentence);
    form.setValue('password', '');
    form.setFocus('password');
  };

  return (
    <form
      method="post"
      noValidate
      onSubmit={form.handleSubmit(submit)}
      className="w-full max-w-[23rem] space-y-4"
    >
      <h2 className="text-verdict font-[660]">Sign in</h2>
      {refusal ? (
        <p role="alert" className="border-[1.25px] border-short px-3 py-2 text-short">
          <span aria-hidden="true">! </span>
          {refusal}
        </p>
      ) : null}
      <TextField
        label="E-mail"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        error={errors.email?.message}
        {...form.register('email')}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...form.register('password')}
      />
      <Button type="submit" look="primary" disabled={isSubmitting} className="min-h-11 w-full">
        {isSubmitting ? 'Signing in…' : 'Sign in'}
      </Button>
      {demoAccounts ? (
        <DemoButtons
          accounts={demoAccounts}
          onChoose={(account) => submit(pickOf(form, account))}
        />
      ) : null}
    </form>
  );
}

/** Fills the form with an account, so that it is seen who signs in. */
function pickOf(
  form: { readonly setValue: (name: 'email' | 'password', value: string) => void },
  { email, password }: DemoAccount,
): Credentials {
  form.setValue('email', email);
  form.setValue('password', password);
  return { email, password };
}

/** Null when signed in, otherwise what to say. */
async function trySignIn({ email, password }: Credentials): Promise<string | null> {
  try {
    const answer = await signIn('credentials', { redirect: false, email, password });
    if (answer?.ok && !answer.error) return null;
    const isOurs = answer?.error && /\s/.test(answer.error);
    return isOurs
      ? String(answer.error)
      : 'E-mail and password do not match. Check both and try again.';
  } catch {
    return 'The connection dropped. Your e-mail is kept here; try again.';
  }
}
