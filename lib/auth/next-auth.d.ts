import type { Actor } from '@/lib/policies/actor'

declare module 'next-auth' {
  interface Session {
    /** null: the account is closed or gone. */
    actor: Actor | null
  }
}

declare module 'next-auth/jwt' {
  interface JWT {
    actor?: Actor | null
  }
}
