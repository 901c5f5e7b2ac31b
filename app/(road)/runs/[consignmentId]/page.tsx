import { randomUUID } from 'node:crypto'
import type { Metadata } from 'next'
import { openPage, orNotFound, rowIdOf } from '@/app/open-page'
import { Checklist } from '@/components/road/checklist'
import { LegForms } from '@/components/road/leg-form'
import { RunHead } from '@/components/road/run-head'
import { loadRun } from '@/lib/domain/runs/load'
import { depart, deliver, stop } from '../actions'

export const metadata: Metadata = { title: 'Checklist' }
export const dynamic = 'force-dynamic'

export default async function RunPage({ params }: { params: Promise<{ consignmentId: string }> }) {
  const consignmentId = rowIdOf((await params).consignmentId)
  const actor = await openPage('/runs/[consignmentId]', `/runs/${consignmentId}`)
  const view = await orNotFound(loadRun(actor, { consignmentId }, new Date()))
  return (
    <main id="main" tabIndex={-1} className="outline-none">
      <RunHead view={view} />
      <Checklist
        view={view}
        storageKey={`steadfold-entries-${actor.id}-${consignmentId}`}
        actions={{ depart, deliver, stop }}
        requestIds={{ depart: randomUUID(), deliver: randomUUID(), stop: randomUUID() }}
      />
      <LegForms view={view} />
    </main>
  )
}
