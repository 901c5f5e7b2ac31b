import type { ReactNode } from 'react'
import { Top } from '@/components/ui/top'
import { requireActor } from '@/lib/auth/actor'
import { HOME } from '@/lib/policies/routes'

/** The desk's head over every page of it. Authority is asked again by each page and each verb. */
export default async function DeskLayout({ children }: { children: ReactNode }) {
  const actor = await requireActor()
  return (
    <>
      <Top user={{ name: actor.name, role: actor.role }} home={HOME[actor.role]} />
      {children}
    </>
  )
}
