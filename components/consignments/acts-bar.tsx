'use client'

import { Button, ButtonLink } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import type { ActionResult } from '@/lib/errors'
import { cancelSchema } from '@/lib/schemas/act'
import type {
  CancelConsignment,
  DeliverConsignment,
  DepartConsignment,
  StopConsignment,
} from '@/lib/schemas/act'
import { ActDialog } from './act-dialog'
import { ReleaseDialog } from './release-dialog'
import { RoadActs } from './road-acts'
import type { DeskAct } from './status-view'
import { useSimpleAct } from './use-simple-act'
import type { ReleaseReadiness } from '@/lib/views/desk-page'

type Simple = (input: { consignmentId: number; requestId: string }) => Promise<ActionResult<unknown>>

export interface DeskActions {
  assess: Simple
  submit: Simple
  release: Simple
  confirmAir: (input: {
    consignmentId: number
    requestId: string
    legIds: string[]
  }) => Promise<ActionResult<unknown>>
  cancel: (input: CancelConsignment) => Promise<ActionResult<unknown>>
  depart: (input: DepartConsignment) => Promise<ActionResult<unknown>>
  deliver: (input: DeliverConsignment) => Promise<ActionResult<unknown>>
  stop: (input: StopConsignment) => Promise<ActionResult<unknown>>
}

/** What the reader may do with the consignment in its state: the next act first and filled, what ends it last. */
export function ActsBar({
  consignmentId,
  mark,
  acts,
  main,
  actions,
  readiness,
  absolute,
  working,
}: {
  consignmentId: number
  mark: string
  acts: readonly DeskAct[]
  /** The act that moves it on from here. */
  main: DeskAct | null
  actions: DeskActions
  readiness: ReleaseReadiness | null
  /** A breach nobody may override, in words: such a plan does not go to the vet. */
  absolute: string | null
  /** The worker has it in hand: asking again would change nothing. */
  working: boolean
}) {
  const assess = useSimpleAct(consignmentId, actions.assess)
  const submit = useSimpleAct(consignmentId, actions.submit)
  const refused = assess.refused ?? submit.refused
  const may = (act: DeskAct) => acts.includes(act)
  return (
    <div className="no-print">
      <div className="flex flex-wrap items-center gap-2">
        {may('assess') && (
          <Button
            first={main === 'assess'}
            refused={assess.pending || working ? 'It is being assessed already.' : undefined}
            onClick={assess.run}
          >
            {main === 'assess' ? `Assess ${mark}` : 'Assess again'}
          </Button>
        )}
        {may('submit') && (
          <Button
            first={main === 'submit'}
            refused={
              submit.pending
                ? 'Sending'
                : absolute === null
                  ? undefined
                  : `No vet can approve this: ${absolute}`
            }
            onClick={submit.run}
          >
            {submit.pending ? 'Sending' : 'Send to the vet'}
          </Button>
        )}
        {may('release') && readiness !== null && (
          <ReleaseDialog
            consignmentId={consignmentId}
            mark={mark}
            readiness={readiness}
            release={actions.release}
            confirmAir={actions.confirmAir}
            working={working}
          />
        )}
        <RoadActs consignmentId={consignmentId} mark={mark} acts={acts} actions={actions} />
        {may('save') && (
          <ButtonLink first={main === 'save'} href={`/consignments/${consignmentId}/plan`}>
            {main === 'save' ? `Re-plan ${mark}` : 'Edit the plan'}
          </ButtonLink>
        )}
        <ButtonLink href={`/consignments/${consignmentId}/sheet`}>Go/no-go sheet</ButtonLink>
        {may('cancel') && (
          <ActDialog
            words={`Cancel ${mark}`}
            title={`Cancel consignment ${mark}`}
            schema={cancelSchema}
            action={actions.cancel}
            start={{ consignmentId, requestId: '', reason: '' }}
            asks={[
              {
                path: 'reason',
                label: 'Reason',
                hint: 'Stands in the history and on void papers.',
                long: true,
              },
            ]}
            done={`Cancel ${mark} for good`}
          >
            <p>
              It cannot be taken up again, its papers become void, and its mark is free for another
              consignment.
            </p>
          </ActDialog>
        )}
      </div>
      {may('submit') && absolute !== null && (
        <p className="mt-2 text-small">
          <b>No vet can approve this plan:</b> {absolute}
        </p>
      )}
      {refused !== null && (
        <div className="mt-3">
          <ErrorSummary title={refused.message} issues={refused.issues.map(({ message }) => ({ message }))}>
            {refused.issues.length > 0 && may('save') && (
              <p>
                <a className="link" href={`/consignments/${consignmentId}/plan`}>
                  Open the plan
                </a>{' '}
                to put it right.
              </p>
            )}
            {refused.issues.length === 0 ? <p>Nothing was changed.</p> : null}
          </ErrorSummary>
        </div>
      )}
    </div>
  )
}
