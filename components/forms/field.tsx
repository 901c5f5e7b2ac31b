import type { ReactNode } from 'react'
import { join } from '@/components/ui/join'
import { Attention } from '@/components/ui/notice'

export interface FieldFace {
  /** Id of the control; the form hook gives it (see use-action-form.ts). */
  id: string
  label: ReactNode
  /** Stands under the label, never inside the field. */
  hint?: ReactNode
  /** A sentence saying what to put. */
  error?: string
  className?: string
}

/** Ids a control points at: its hint and its error, whichever there are. */
export function describedBy({
  id,
  hint,
  error,
}: Pick<FieldFace, 'id' | 'hint' | 'error'>): string | undefined {
  return join(hint ? `${id}-hint` : '', error ? `${id}-error` : '') || undefined
}

/**
 * Label above, hint under it, the control, and below it the error with its double rule. A `bare` field stands in a ledger
 * cell, too narrow for a sentence: its row says what is wrong, under the same id.
 */
export function Field({
  id,
  label,
  hint,
  error,
  className,
  bare = false,
  children,
}: FieldFace & { bare?: boolean; children: ReactNode }) {
  return (
    <div className={join('flex min-w-0 flex-col gap-0.5', className)}>
      <label htmlFor={id} className="text-small font-semibold">
        {label}
      </label>
      {hint && (
        <span id={`${id}-hint`} className="text-caption text-mute">
          {hint}
        </span>
      )}
      {children}
      {error && !bare && <Attention id={`${id}-error`}>{error}</Attention>}
    </div>
  )
}

/** Fields that answer one question together: radios, ticks, a pair of figures. */
export function FieldSet({
  id,
  legend,
  hint,
  error,
  className,
  children,
}: Omit<FieldFace, 'label'> & { legend: ReactNode; children: ReactNode }) {
  return (
    <fieldset
      id={id}
      aria-describedby={describedBy({ id, hint, error })}
      aria-invalid={error ? true : undefined}
      className={join('flex min-w-0 flex-col gap-1', className)}
    >
      <legend className="mb-0.5 text-small font-semibold">{legend}</legend>
      {hint && (
        <span id={`${id}-hint`} className="text-caption text-mute">
          {hint}
        </span>
      )}
      {children}
      {error && <Attention id={`${id}-error`}>{error}</Attention>}
    </fieldset>
  )
}

/**
 * The box one writes in: a violet foot means "you can write here". In error the frame is ink and its left edge a double
 * rule; `bare` is the same box inside a ledger cell.
 */
export function InputBox({
  error,
  unit,
  disabled,
  bare = false,
  children,
}: {
  error?: boolean
  unit?: ReactNode
  disabled?: boolean
  bare?: boolean
  children: ReactNode
}) {
  return (
    <span
      className={join(
        'flex min-h-8 items-center focus-within:outline-3 focus-within:outline-offset-2 focus-within:outline-hand max-desk:min-h-[52px]',
        error
          ? 'dbl border-y-2 border-r-2 border-y-ink border-r-ink bg-sheet'
          : disabled
            ? 'border border-dotted border-rule text-mute'
            : bare
              ? 'border-b-2 border-hand'
              : 'border border-rule border-b-2 border-b-hand bg-sheet',
      )}
    >
      {children}
      {unit && <span className="shrink-0 whitespace-nowrap pl-0.5 pr-2 text-small text-mute">{unit}</span>}
    </span>
  )
}

/** The control itself carries no edge: its box does. */
export const CONTROL =
  'w-full min-w-0 flex-1 appearance-none bg-transparent px-2 py-1 text-body text-ink outline-none disabled:text-mute'
