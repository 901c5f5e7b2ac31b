import { redirect } from 'next/navigation'
import { requireActor } from '@/lib/auth/actor'
import { HOME } from '@/lib/policies/routes'

export const dynamic = 'force-dynamic'

/** The first page is each role's own. */
export default async function FirstPage() {
  const actor = await requireActor()
  redirect(HOME[actor.role])
}
