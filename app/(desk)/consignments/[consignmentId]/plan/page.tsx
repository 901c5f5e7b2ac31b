import type { Metadata } from 'next'
import { notFound, redirect } from 'next/navigation'
import { PlanEditor } from '@/components/plan/plan-editor'
import { Page } from '@/components/ui/section'
import { VERDICT_WORDS } from '@/components/ui/verdict'
import { requireActor } from '@/lib/auth/actor'
import { planCatalogues } from '@/lib/domain/catalogue/plan-catalogues'
import { openPlan } from '@/lib/domain/consignments/open-plan'
import type { OpenPlan } from '@/lib/domain/consignments/open-plan'
import { FIRM_ZONE } from '@/lib/domain/firm'
import { mayOpen } from '@/lib/policies/routes'
import { STATE_WORDS } from '@/lib/states/consignment'
import { assess, savePlan } from '../../actions'
import { orNotFound } from '../../or-not-found'
import { rowId } from '../../row-id'

export const metadata: Metadata = { title: 'Plan' }
export const dynamic = 'force-dynamic'

export default async function PlanPage({ params }: { params: Promise<{ consignmentId: string }> }) {
  const { consignmentId } = await params
  const actor = await requireActor(`/consignments/${consignmentId}/plan`)
  if (!mayOpen(actor, '/consignments/[consignmentId]/plan')) notFound()
  const opened = await orNotFound(openPlan(actor, rowId(consignmentId)))
  if (!opened.editable) redirect(`/consignments/${opened.id}`)
  return (
    <Page>
      <PlanEditor
        consignment={{
          id: opened.id,
          mark: opened.mark,
          revision: opened.revision,
          version: opened.version,
          inForceRevision: opened.inForceRevision,
          stateWords: STATE_WORDS[opened.state],
          verdictWords: verdictWords(opened),
        }}
        plan={opened.plan}
        catalogues={await planCatalogues(actor)}
        actions={{ save: savePlan, assess }}
        nowMs={new Date().getTime()}
        zone={FIRM_ZONE}
      />
    </Page>
  )
}

function verdictWords({ verdict, outOfDate }: OpenPlan): string {
  if (verdict === null) return 'Not assessed'
  return outOfDate ? `Out of date, was ${VERDICT_WORDS[verdict]}` : VERDICT_WORDS[verdict]
}
