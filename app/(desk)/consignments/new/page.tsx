import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { PlanEditor } from '@/components/plan/plan-editor'
import { Empty } from '@/components/ui/notice'
import { Page } from '@/components/ui/section'
import { requireActor } from '@/lib/auth/actor'
import { loadPlanEditor } from '@/lib/domain/consignments/load'
import { FIRM_ZONE } from '@/lib/domain/firm'
import { emptyPlan } from '@/lib/planning/new-plan'
import { can } from '@/lib/policies/can'
import { mayOpen } from '@/lib/policies/routes'
import { assess, savePlan } from '../actions'
import { cataloguesOf } from '../catalogues'

export const metadata: Metadata = { title: 'New consignment' }
export const dynamic = 'force-dynamic'

export default async function NewConsignmentPage() {
  const actor = await requireActor('/consignments/new')
  if (!mayOpen(actor, '/consignments/new') || !can(actor, 'consignment.create')) notFound()
  const catalogues = cataloguesOf(await loadPlanEditor(actor, { consignmentId: null }))
  const shipper = catalogues.shippers[0]
  return (
    <Page>
      {shipper === undefined ? (
        <Empty>There is no shipper yet. An admin enters shippers; a consignment belongs to one.</Empty>
      ) : (
        <PlanEditor
          consignment={null}
          plan={emptyPlan(shipper.id)}
          catalogues={catalogues}
          actions={{ save: savePlan, assess }}
          nowMs={new Date().getTime()}
          zone={FIRM_ZONE}
        />
      )}
    </Page>
  )
}
