import NextAuth from 'next-auth';
import { authOptions } from '@/app/_auth';
import { problemResponse } from '@/app/_endpoint';

/** An e-mail, a password and a token fit many times over. */
const largestBody = 10_000;

const handler = NextAuth(authOptions);

/** Nobody is signed in yet here: a body that is large, or does not say how large it is, is not read. */
const guarded: typeof handler = (request: Request, context: unknown) => {
  const length = Number(request.headers.get('content-length') ?? Number.NaN);
  if (length <= largestBody) return handler(request, context);
  const detail = `Send at most ${largestBody.toLocaleString('en-GB')} bytes, with their Content-Length.`;
  return problemResponse({ code: 'too-large', detail }, request);
};

export { guarded as POST, handler as GET };
