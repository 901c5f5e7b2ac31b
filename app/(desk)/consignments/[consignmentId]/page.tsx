import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { ActsBar } from '@/components/consignments/acts-bar'
import { AssessAgain } from '@/components/consignments/assess-again'
import { ConsignmentPage } from '@/components/consignments/consignment-page'
import { absoluteWords, mainAct } from '@/components/consignments/main-act'
import { Page } from '@/components/ui/section'
import { requireActor } from '@/lib/auth/actor'
import { loadDeskPage } from '@/lib/domain/consignments/desk-page'
import { loadConsignment } from '@/lib/domain/consignments/load'
import { mayEver } from '@/lib/policies/can'
import { mayOpen } from '@/lib/policies/routes'
import { assess, cancel, confirmAirOf, deliver, depart, release, stop, submit, writeAnswer } from '../actions'
import { orNotFound } from '../or-not-found'
import { rowId } from '../row-id'

export const metadata: Metadata = { title: 'Consignment' }
export const dynamic = 'force-dynamic'

export default async function ConsignmentRoute({
  params,
  searchParams,
}: {
  params: Promise<{ consignmentId: string }>
  searchParams: Promise<{ animal?: string }>
}) {
  const id = rowId((await params).consignmentId)
  const actor = await requireActor(`/consignments/${id}`)
  if (!mayOpen(actor, '/consignments/[consignmentId]')) notFound()
  const loaded = await orNotFound(loadConsignment(actor, { consignmentId: id }))
  const page = await orNotFound(loadDeskPage(actor, { consignmentId: id }, new Date()))
  const { row, assessment, releasing, releaseError, acts } = loaded
  const working = releasing || assessment?.status === 'queued' || assessment?.status === 'running'
  const { animal } = await searchParams
  const animals = page.sheet.animals
  const chosen = animals.find(({ animalId }) => animalId === animal) ?? worst(animals)
  const absolute = row.outOfDate ? null : absoluteWords(page.sheet.findings)
  return (
    <Page>
      <ConsignmentPage
        page={page}
        animalId={chosen?.animalId ?? null}
        inForceRevision={row.inForceRevision}
        acts={
          <ActsBar
            consignmentId={id}
            mark={row.mark}
            acts={acts}
            main={mainAct(row.state, acts, {
              needsAssessment: row.outOfDate || row.verdict === null,
              absolute: absolute !== null,
            })}
            absolute={absolute}
            actions={{ assess, submit, release, confirmAir: confirmAirOf, cancel, depart, deliver, stop }}
            readiness={page.readiness}
            working={working}
          />
        }
        work={
          <AssessAgain
            consignmentId={id}
            first={{
              assessment,
              releasing,
              releaseError,
              row: { state: row.state, outOfDate: row.outOfDate },
            }}
            assess={acts.includes('assess') ? assess : undefined}
          />
        }
        answer={mayEver(actor, 'consignment.confirm-condition') ? writeAnswer : undefined}
      />
    </Page>
  )
}

const ORDER = ['no-go', 'conditional', 'go', 'none']

/** The animal a reader must see first: the one with the worst verdict. */
function worst<T extends { stamp: { verdict: string } }>(animals: readonly T[]): T | undefined {
  return [...animals].sort((a, b) => ORDER.indexOf(a.stamp.verdict) - ORDER.indexOf(b.stamp.verdict))[0]
}
