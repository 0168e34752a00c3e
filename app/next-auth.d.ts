import type { SessionId } from '@/modules/units';

declare module 'next-auth' {
  interface Session {
    sessionId?: SessionId;
  }
}

declare module 'next-auth/jwt' {
  interface JWT {
    sessionId?: SessionId;
  }
}
