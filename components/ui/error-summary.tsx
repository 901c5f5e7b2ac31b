'use client'

import { useEffect, useRef } from 'react'
import type { ReactNode } from 'react'

export interface SummaryIssue {
  /** Id of the field it speaks of; absent for what belongs to no field. */
  fieldId?: string
  message: string
}

/**
 * What has to be put right before the form can go, each linked to its field. Takes the focus when `turn` changes, so that
 * a second try is announced again.
 */
export function ErrorSummary({
  title,
  issues,
  turn = 0,
  children,
}: {
  title?: string
  issues: readonly SummaryIssue[]
  turn?: number
  children?: ReactNode
}) {
  const box = useRef<HTMLDivElement>(null)
  const shown = issues.length > 0 || Boolean(children)
  useEffect(() => {
    if (shown) box.current?.focus()
  }, [shown, turn])
  if (!shown) return null
  return (
    <div
      ref={box}
      tabIndex={-1}
      role="alert"
      aria-labelledby="error-summary-title"
      className="dbl border-y-2 border-r-2 border-y-ink border-r-ink bg-sheet px-4 py-3"
    >
      <h2 id="error-summary-title" className="text-sub">
        {title ?? titleFor(issues.length)}
      </h2>
      {children}
      {issues.length > 0 && (
        <ol className="mt-1.5 list-none">
          {issues.map((issue, index) => (
            <li
              key={`${issue.fieldId ?? ''}-${issue.message}`}
              className="grid grid-cols-[24px_1fr] border-t border-hair py-1.5"
            >
              <span className="font-head font-bold">{index + 1}</span>
              {issue.fieldId ? (
                <a href={`#${issue.fieldId}`} onClick={(event) => toField(event, issue.fieldId)}>
                  {issue.message}
                </a>
              ) : (
                <span>{issue.message}</span>
              )}
            </li>
          ))}
        </ol>
      )}
    </div>
  )
}

function titleFor(many: number): string {
  return many === 1 ? '1 thing to put right' : `${many} things to put right`
}

/** Focus goes to the field with its label in view: a field alone at the top edge says nothing. */
function toField(event: React.MouseEvent, fieldId: string | undefined): void {
  const field = fieldId ? document.getElementById(fieldId) : null
  if (!field || !fieldId) return
  event.preventDefault()
  const label =
    document.querySelector(`label[for="${CSS.escape(fieldId)}"]`) ?? field.closest('fieldset') ?? field
  label.scrollIntoView({ block: 'start' })
  const control = field.matches('input,select,textarea,button')
    ? field
    : field.querySelector<HTMLElement>('input,select,textarea,button')
  ;(control ?? field).focus({ preventScroll: true })
}
