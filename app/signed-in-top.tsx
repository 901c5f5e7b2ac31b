import { Top } from '@/components/ui/top'
import { requireActor } from '@/lib/auth/actor'
import { HOME } from '@/lib/policies/routes'

/** The head of a signed-in person's pages. Authority is asked again by each page and each verb. */
export async function SignedInTop() {
  const actor = await requireActor()
  return <Top user={{ name: actor.name, role: actor.role }} home={HOME[actor.role]} />
}
