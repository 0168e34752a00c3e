import type { AuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { env } from '@/db/env';
import { longestMilliseconds, signIn, signOut } from '@/modules/access/server';
import type { SessionId } from '@/modules/units';

const secret = env().NEXTAUTH_SECRET;

/**
 * next-auth carries only the id of our session row in its encrypted cookie; who that is, and what they
 * may do, is read from the database on each request (`app/_session.ts`).
 */
export const authOptions: AuthOptions = {
  ...(secret ? { secret } : {}),
  session: { strategy: 'jwt', maxAge: longestMilliseconds / 1000 },
  pages: { signIn: '/sign-in' },
  providers: [
    CredentialsProvider({
      credentials: { email: { type: 'email' }, password: { type: 'password' } },
      async authorize(credentials) {
        const outcome = await signIn(credentials?.email ?? '', credentials?.password ?? '');
        if (!outcome.ok) throw new Error(outcome.error.detail);
        return { id: outcome.value };
      },
    }),
  ],
  callbacks: {
    jwt: ({ token, user }) => (user ? { ...token, sessionId: user.id as SessionId } : token),
    session: ({ session, token }) => ({ ...session, sessionId: token.sessionId }),
  },
  events: {
    signOut: ({ token }) => {
      if (token?.sessionId) signOut(token.sessionId);
    },
  },
};
