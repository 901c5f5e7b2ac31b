'use client'

import { useWatch } from 'react-hook-form'
import { PasswordInput, TextArea } from '@/components/forms/text-input'
import { Radios } from '@/components/forms/ticks'
import { SubmitButton } from '@/components/forms/submit-button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { Notice } from '@/components/ui/notice'
import type { ReviewView } from '@/lib/views/review'
import type { FindingView } from '@/lib/views/sheet'
import { concernedIndexes, isBreach } from './override-words'
import { chosenOverrides } from './review-form-schema'
import type { ReviewForm } from './review-form-schema'
import type { ReviewFormState } from './review-desk'
import { SignerFacts } from './signer-facts'
import { Statement } from './statement'
import { stillMissing } from './still-missing'

/** Decision, statement and signature. What is still missing stands at the button. */
export function DecisionPart({
  form,
  view,
  findings,
  all,
}: {
  form: ReviewFormState
  view: ReviewView
  /** Those that speak of a crate the signature covers. */
  findings: readonly FindingView[]
  /** Every finding, in the order of the form's rows. */
  all: readonly FindingView[]
}) {
  const values = useWatch({ control: form.form.control }) as ReviewForm
  if (view.closedWords !== '')
    return (
      <section>
        <h3 className="text-sub">Decision</h3>
        <p className="mt-1">{view.closedWords}</p>
      </section>
    )
  const overridden = chosenOverrides(values, all).filter(({ finding }) => findings.includes(finding))
  const open = findings.filter(
    (finding) => isBreach(finding) && !overridden.some((one) => one.finding === finding),
  )
  const withConditions =
    overridden.length > 0 || values.conditions.length > 0 || view.sheet.conditions.length > 0
  const returning = values.decision === 'return'
  const marks = view.crates
    .filter((crate) => values.crateIds.includes(crate.crateId))
    .map((crate) => crate.mark)
  const missing = stillMissing(values, all, view.signer.cannot)
  return (
    <>
      <section>
        <Radios
          {...form.field('decision')}
          label={<span className="font-head text-sub">Decision</span>}
          options={[
            {
              value: 'approve',
              words: withConditions ? 'Approve with conditions' : 'Approve',
              refused: refusedApproval(open),
            },
            { value: 'return', words: 'Return with reasons', hint: 'the desk edits it like a draft' },
          ]}
        />
        {returning && (
          <TextArea
            {...form.field('reasons')}
            className="mt-2"
            label="Reasons"
            hint="What the desk has to change before you look again"
            rows={4}
            maxLength={1000}
          />
        )}
      </section>
      <section>
        {!returning && (
          <>
            <h3 className="text-sub">Sign</h3>
            <Statement
              examined={values.examined}
              marks={marks}
              conditionCount={view.sheet.conditions.length + values.conditions.length}
              overridden={overriddenWords(overridden, view, values.crateIds)}
            />
            <Radios
              {...form.field('examined')}
              className="mt-2"
              label={<span className="sr-only">Examined</span>}
              options={[
                { value: 'yes', words: 'I have examined the animals' },
                { value: 'no', words: 'I have not examined the animals' },
              ]}
            />
            <p className="mt-2 text-small font-semibold">This is not a certificate of fitness to travel.</p>
            <SignerFacts signer={view.signer} />
            {view.signer.cannot && (
              <Notice className="mt-2" title="You can’t sign">
                {view.signer.cannot}
              </Notice>
            )}
            <PasswordInput {...form.field('password')} className="mt-2" label="Your password, again" />
          </>
        )}
        <div className="mt-3 grid gap-3">
          <ErrorSummary title={form.refusal?.message} issues={form.issues} turn={form.turn} />
          <SubmitButton
            pending={form.pending}
            pendingWords={returning ? 'Sending back' : 'Signing'}
            refused={
              missing ? `${returning ? 'Before it can go' : 'Before you can sign'}: ${missing}` : undefined
            }
          >
            {returning ? `Return ${marks.join(', ')}` : `Sign ${marks.join(', ')}`}
          </SubmitButton>
        </div>
      </section>
    </>
  )
}

/** As the server names them: every single finding that goes along, in the order of the assessment. */
function overriddenWords(
  overridden: readonly { finding: FindingView }[],
  { crates, subjects }: ReviewView,
  crateIds: readonly string[],
): string[] {
  const indexes = overridden.flatMap(({ finding }) =>
    concernedIndexes(finding, { crates, subjects }, crateIds),
  )
  return indexes.sort((a, b) => a - b).flatMap((index) => subjects[index]?.words ?? [])
}

function refusedApproval(open: readonly FindingView[]): string | undefined {
  const fixed = open.filter((finding) => !finding.overridable)
  if (fixed.length > 0) return `not open: ${fixed.map((finding) => finding.asked).join('; ')}`
  if (open.length === 0) return undefined
  return `not open: ${open.length === 1 ? 'one breach is' : `${open.length} breaches are`} not overridden`
}
