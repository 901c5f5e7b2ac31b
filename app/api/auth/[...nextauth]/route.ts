import type { NextRequest } from 'next/server'
import NextAuth from 'next-auth'
import { authOptions } from '@/lib/auth/config'

interface Context {
  params: Promise<{ nextauth: string[] }>
}

/** The options are made per request, so that a build needs no configuration. */
async function handle(request: NextRequest, context: Context): Promise<Response> {
  const handler = NextAuth(authOptions()) as (request: NextRequest, context: Context) => Promise<Response>
  return handler(request, context)
}

export { handle as GET, handle as POST }
