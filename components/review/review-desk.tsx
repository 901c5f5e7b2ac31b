'use client'

import { useState } from 'react'
import type { ReactNode } from 'react'
import { useWatch } from 'react-hook-form'
import { useActionForm } from '@/components/hooks/use-action-form'
import type { ActionResult } from '@/lib/errors'
import type { ApproveCrates, ReturnCrates } from '@/lib/schemas/approval'
import type { ReviewCrate, ReviewView } from '@/lib/views/review'
import { EarlySigns } from './early-signs'
import { DecisionPart } from './decision-part'
import { FindingsPart } from './findings-part'
import { approvalOf, returnOf, reviewFormSchema } from './review-form-schema'
import type { ReviewForm } from './review-form-schema'
import { OtherCrates } from './other-crates'
import { VetConditions } from './vet-conditions'
import { coveredFindings } from './override-words'

export interface ReviewActions {
  approve: (input: ApproveCrates) => Promise<ActionResult<unknown>>
  sendBack: (input: ReturnCrates) => Promise<ActionResult<unknown>>
}

/**
 * One crate set-up under review: pictures and findings in the middle, the decision at the right. One form holds both, so
 * that the statement names what is ticked beside it.
 */
export function ReviewDesk({
  view,
  pictures,
  requestId,
  actions,
}: {
  view: ReviewView
  pictures: ReactNode
  /** Minted with the page: pressing twice signs once. */
  requestId: string
  actions: ReviewActions
}) {
  const { sheet, chosen, crates } = view
  const { findings } = sheet
  const subject = { consignmentId: sheet.consignmentId, planHash: sheet.planHash, findings, coverage: view }
  // A refused attempt keeps its number: if the answer was lost on the way, the second press gets it.
  const [request] = useState(requestId)
  const state = useActionForm<ReviewForm, ReviewForm, unknown>({
    name: 'review',
    schema: reviewFormSchema,
    defaultValues: {
      crateIds: [chosen.crateId],
      overrides: findings.map(() => ({ on: false, reason: '' })),
      conditions: [],
      signs: crates.flatMap(({ crateId, earlySigns }) =>
        earlySigns.map((text) => ({ on: true, crateId, text })),
      ),
      reasons: '',
      examined: '',
      password: '',
    },
    action: (values) =>
      values.decision === 'return'
        ? actions.sendBack(returnOf(values, subject, request))
        : actions.approve(approvalOf(values, subject, request)),
  })

  const crateIds = useWatch({ control: state.form.control, name: 'crateIds' })
  const covered = coveredFindings(findings, view, crateIds)

  return (
    <form
      method="post"
      onSubmit={state.submit}
      noValidate
      className="mt-4 grid items-start gap-6 board:grid-cols-[minmax(0,1fr)_324px] wide:grid-cols-[minmax(0,1fr)_346px]"
    >
      <div className="min-w-0">
        {pictures}
        <FindingsPart
          form={state}
          findings={covered}
          all={findings}
          letters={lettersOf(crates, crateIds)}
          closed={view.closedWords !== ''}
        />
      </div>
      <div className="divide-y divide-rule border-2 border-ink bg-sheet [&>*]:px-4 [&>*]:py-3">
        <OtherCrates form={state} crates={crates} chosen={chosen} />
        <VetConditions
          form={state}
          conditions={sheet.conditions}
          legs={sheet.legs}
          closed={view.closedWords !== ''}
        />
        <EarlySigns
          form={state}
          crates={crates.filter((crate) => crateIds.includes(crate.crateId))}
          closed={view.closedWords !== ''}
        />
        <DecisionPart form={state} view={view} findings={covered} all={findings} />
      </div>
    </form>
  )
}

export type ReviewFormState = ReturnType<typeof useActionForm<ReviewForm, ReviewForm, unknown>>

function lettersOf(crates: readonly ReviewCrate[], crateIds: readonly string[]): string {
  return crates
    .filter((crate) => crateIds.includes(crate.crateId))
    .map((crate) => crate.letter)
    .join(', ')
}
