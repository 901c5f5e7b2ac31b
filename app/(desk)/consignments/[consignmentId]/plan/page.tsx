import type { Metadata } from 'next'
import { notFound, redirect } from 'next/navigation'
import { PlanEditor } from '@/components/plan/plan-editor'
import { Page } from '@/components/ui/section'
import { VERDICT_WORDS } from '@/components/ui/verdict'
import { requireActor } from '@/lib/auth/actor'
import { loadPlanEditor } from '@/lib/domain/consignments/load'
import { FIRM_ZONE } from '@/lib/domain/firm'
import { mayOpen } from '@/lib/policies/routes'
import { STATE_WORDS } from '@/lib/states/consignment'
import type { ConsignmentRow } from '@/lib/views/consignment-row'
import { assess, savePlan } from '../../actions'
import { cataloguesOf } from '../../catalogues'
import { orNotFound } from '../../or-not-found'
import { rowId } from '../../row-id'

export const metadata: Metadata = { title: 'Plan' }
export const dynamic = 'force-dynamic'

export default async function PlanPage({ params }: { params: Promise<{ consignmentId: string }> }) {
  const id = rowId((await params).consignmentId)
  const actor = await requireActor(`/consignments/${id}/plan`)
  if (!mayOpen(actor, '/consignments/[consignmentId]/plan')) notFound()
  const loaded = await orNotFound(loadPlanEditor(actor, { consignmentId: id }))
  const { consignment, plan } = loaded
  if (consignment === null || plan === null) notFound()
  // Who may not save, or whose journey has begun, reads the plan on the consignment's own page.
  if (!consignment.acts.includes('save')) redirect(`/consignments/${id}`)
  const { row, version } = consignment
  return (
    <Page>
      <PlanEditor
        consignment={{
          id,
          mark: row.mark,
          revision: row.revision,
          version,
          inForceRevision: row.inForceRevision,
          stateWords: STATE_WORDS[row.state],
          verdictWords: verdictWords(row),
        }}
        plan={plan}
        catalogues={cataloguesOf(loaded)}
        actions={{ save: savePlan, assess }}
        nowMs={new Date().getTime()}
        zone={FIRM_ZONE}
      />
    </Page>
  )
}

function verdictWords({ verdict, outOfDate }: ConsignmentRow): string {
  if (verdict === null) return 'Not assessed'
  return outOfDate ? `Out of date, was ${VERDICT_WORDS[verdict]}` : VERDICT_WORDS[verdict]
}
