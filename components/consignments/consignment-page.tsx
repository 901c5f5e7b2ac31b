import type { ReactNode } from 'react'
import { ConditionsTable } from '@/components/sheets/conditions-table'
import { EnduranceTable } from '@/components/sheets/endurance-table'
import { FindingsInTwo } from '@/components/sheets/findings-table'
import { LegsTable } from '@/components/sheets/legs-table'
import { Cautions, Provenance } from '@/components/sheets/provenance'
import { StopLimits } from '@/components/sheets/stop-limits'
import { Section } from '@/components/ui/section'
import type { DeskPageView } from '@/lib/views/desk-page'
import { AnimalPart } from './animal-part'
import { AnimalTabs } from './animal-tabs'
import { ApprovalsPart } from './approvals-part'
import { ConditionAnswer } from './condition-answer'
import type { AnswerCondition } from './condition-answer'
import { ConsignmentHead } from './consignment-head'
import { DocumentsPart } from './documents-part'
import { HistoryPart } from './history-part'

/** The whole page of a consignment: verdict and acts, one animal's pictures, then everything in tables. */
export function ConsignmentPage({
  page,
  animalId,
  inForceRevision,
  acts,
  work,
  answer,
}: {
  page: DeskPageView
  animalId: string | null
  inForceRevision: number | null
  acts: ReactNode
  work: ReactNode
  /** Absent where the reader may not write an answer down. */
  answer?: AnswerCondition
}) {
  const { sheet } = page
  const assessed = sheet.assessed !== null
  return (
    <>
      <ConsignmentHead view={sheet} inForceRevision={inForceRevision} />
      <div className="my-3 flex flex-col gap-3">
        {acts}
        {work}
      </div>
      {animalId !== null && assessed && (
        <>
          <AnimalTabs view={sheet} animalId={animalId} base={`/consignments/${sheet.consignmentId}`} />
          <AnimalPart view={sheet} animalId={animalId} dark={page.dark} />
        </>
      )}
      {assessed && <AssessedParts page={page} animalId={animalId} answer={answer} />}
      <div className="grid gap-x-6 wide:grid-cols-2">
        <Section id="approvals" title="Approvals" words="What was signed, and what became void and why">
          <ApprovalsPart approvals={page.approvals} />
        </Section>
        <Section id="documents" title="Papers" words="As issued; a later one replaces an earlier one">
          <DocumentsPart documents={page.documents} />
        </Section>
      </div>
      {assessed && (
        <Section id="speaks-of" title="What the figures speak of">
          <Provenance view={sheet} />
          <div className="mt-3 border-t border-rule pt-2">
            <Cautions cautions={sheet.cautions} />
          </div>
        </Section>
      )}
      <Section id="history" title="History">
        <HistoryPart history={page.history} />
      </Section>
    </>
  )
}

function AssessedParts({
  page: { sheet },
  animalId,
  answer,
}: {
  page: DeskPageView
  animalId: string | null
  answer?: AnswerCondition
}) {
  const { outOfDate } = sheet.stamp
  const animal = sheet.animals.find((one) => one.animalId === animalId)
  return (
    <>
      <Section
        id="legs"
        title="Legs"
        words="In the frame minutes to spare, beside it outside air; below the limit that decides, then body"
      >
        <LegsTable legs={sheet.legs} animals={sheet.animals} animalId={animalId} outOfDate={outOfDate} />
      </Section>
      <Section id="findings" title="Findings" words={`${sheet.findings.length}, the deciding ones first`}>
        <FindingsInTwo findings={sheet.findings} />
      </Section>
      <Section id="conditions" title="Conditions" words={sheet.conditionsWords}>
        <ConditionsTable
          conditions={sheet.conditions}
          act={answer && ((condition) => <ConditionAnswer condition={condition} answer={answer} />)}
        />
      </Section>
      <div className="grid gap-x-6 wide:grid-cols-[1fr_1fr]">
        <Section
          id="endurance"
          title={animal ? `Endurance of ${animal.name}` : 'Endurance'}
          words="Minutes to a limit after a failure, at the worst moment of the leg"
        >
          {animal && (
            <EnduranceTable endurance={sheet.endurance} animalId={animal.animalId} name={animal.name} />
          )}
        </Section>
        <Section id="stop-limits" title="Stop limits" words="What the driver stops and rings for">
          <StopLimits
            limits={sheet.stopLimits}
            telephone={sheet.firm.deskTelephone}
            hours={sheet.firm.deskHours}
          />
        </Section>
      </div>
    </>
  )
}
