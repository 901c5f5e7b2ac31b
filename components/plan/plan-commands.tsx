'use client'

import { useFormContext, useFormState } from 'react-hook-form'
import { Button, Key, buttonClass } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { Hole } from '@/components/ui/holes'
import { Notice } from '@/components/ui/notice'
import type { Plan } from '@/lib/schemas/plan'
import { localTime } from '@/lib/views/format'
import { useProblems } from './plan-context'
import { PART_WORDS, PLAN_PARTS, countByPart, planPathId } from './plan-path'
import type { PlanPart } from './plan-path'
import type { PlanSaving } from './use-plan-saving'

/** The line under the head: what is saved, what each part still needs, and the two acts. */
export function PlanCommands({
  mark,
  savedAtMs,
  zone,
  saving,
  onAssess,
  onPart,
}: {
  mark: string | null
  savedAtMs: number | null
  zone: string
  saving: PlanSaving
  onAssess: () => void
  onPart: (part: PlanPart) => void
}) {
  const problems = useProblems()
  const counts = countByPart(problems.map(({ path }) => path))
  const { pending } = saving
  return (
    <>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2 py-2">
        <SavingLine isNew={mark === null} savedAtMs={savedAtMs} zone={zone} saving={saving} />
        <nav aria-label="Parts of the plan" className="flex flex-wrap gap-x-4 text-small">
          {PLAN_PARTS.map((part) => (
            <button key={part} type="button" className="link max-desk:min-h-11" onClick={() => onPart(part)}>
              {PART_WORDS[part]}
              {counts[part] > 0 && `, ${counts[part]} to put right`}
            </button>
          ))}
        </nav>
        <span className="ml-auto flex flex-wrap items-center gap-2">
          <Button type="submit" refused={pending === 'save' ? 'Saving' : undefined}>
            {pending === 'save' ? 'Saving' : 'Save the plan'}
            <span className="max-desk:hidden">
              <Key>Enter</Key>
            </span>
          </Button>
          {problems.length > 0 ? (
            // Dotted, since nothing can be assessed; pressed, it leads to what stands in the way.
            <button
              type="button"
              className={buttonClass({ refused: true })}
              aria-describedby="why-title"
              onClick={onAssess}
            >
              Assess {mark ?? 'this plan'}
            </button>
          ) : (
            <Button
              first
              onClick={onAssess}
              refused={pending === 'assess' ? 'Asking for the assessment' : undefined}
            >
              {pending === 'assess' ? 'Asking' : `Assess ${mark ?? 'this plan'}`}
            </Button>
          )}
        </span>
      </div>
      <Failure saving={saving} />
      {saving.note && (
        <div className="mb-3">
          <Notice role="status" title="Saved. Something became void">
            <p>{saving.note}</p>
          </Notice>
        </div>
      )}
    </>
  )
}

function SavingLine({
  isNew,
  savedAtMs,
  zone,
  saving,
}: {
  isNew: boolean
  savedAtMs: number | null
  zone: string
  saving: PlanSaving
}) {
  const { control } = useFormContext<Plan>()
  const { isDirty } = useFormState({ control })
  const { pending, keptAtMs } = saving
  return (
    <span role="status" className="flex flex-wrap items-center gap-x-2 text-small text-mute">
      <Hole
        state={pending === 'save' ? 'dashed' : isDirty || (isNew && savedAtMs === null) ? 'open' : 'filled'}
      />
      {pending === 'save' ? (
        <b className="text-ink">Saving</b>
      ) : keptAtMs !== null ? (
        <>
          <b className="text-ink">Typed at {localTime(keptAtMs, zone)}, not saved.</b> It was kept in this
          browser and put back.
          <button type="button" className="link" onClick={saving.throwAway}>
            Go back to the plan as saved
          </button>
        </>
      ) : isDirty ? (
        <>
          <b className="text-ink">Not saved yet.</b> A copy is kept in this browser.
        </>
      ) : savedAtMs !== null ? (
        <b className="text-ink">Saved {localTime(savedAtMs, zone)}.</b>
      ) : isNew ? (
        'Nothing saved yet.'
      ) : (
        'As saved.'
      )}
    </span>
  )
}

function Failure({ saving }: { saving: PlanSaving }) {
  const { failure } = saving
  if (failure === null) return null
  return (
    <div className="mb-3">
      <ErrorSummary
        title={failure.message}
        issues={failure.issues.map(({ path, message }) => ({ fieldId: planPathId(path), message }))}
      >
        <p>Nothing was saved. Everything typed is still here.</p>
      </ErrorSummary>
    </div>
  )
}
