import type { ComponentProps, ReactNode } from 'react'
import { join } from '@/components/ui/join'
import { FieldSet, describedBy } from './field'
import type { FieldFace } from './field'

type NativeInput = Omit<ComponentProps<'input'>, 'id' | 'className' | 'type' | 'children'>

/** One tick with its words. A drawn tick in a violet box, never a cross: a cross near NO-GO reads as refusal. */
export function Tick({
  id,
  label,
  hint,
  error,
  className,
  ...rest
}: { id: string; label: ReactNode; hint?: ReactNode; error?: string; className?: string } & NativeInput) {
  return (
    <div className={className}>
      <label
        className={join(
          'inline-flex cursor-pointer items-start gap-2 max-desk:min-h-11 max-desk:items-center',
          rest.disabled && 'cursor-not-allowed text-mute',
        )}
      >
        <span className="relative mt-px inline-flex shrink-0">
          <input
            {...rest}
            id={id}
            type="checkbox"
            aria-invalid={error ? true : undefined}
            aria-describedby={describedBy({ id, hint, error })}
            className="peer size-[18px] cursor-[inherit] appearance-none border-2 border-hand bg-sheet disabled:border-dotted disabled:border-rule max-desk:size-[26px]"
          />
          <TickMark />
        </span>
        <span>{label}</span>
      </label>
      {hint && (
        <span id={`${id}-hint`} className="block pl-[26px] text-caption text-mute">
          {hint}
        </span>
      )}
      {error && (
        <span id={`${id}-error`} className="dbl mt-0.5 block pl-2 text-small font-semibold">
          {error}
        </span>
      )}
    </div>
  )
}

export interface Option {
  value: string
  words: ReactNode
  hint?: ReactNode
  /** Why it isn't open: the ring is dotted and the reason stands under it. */
  refused?: string
}

/**
 * One of a few, all in view. `name` and the rest go to every ring, so that one register() serves them all; without one,
 * `chosen` says which ring is filled.
 */
export function Radios({
  id,
  label,
  hint,
  error,
  className,
  options,
  inRow = false,
  chosen,
  ...rest
}: FieldFace & NativeInput & { options: readonly Option[]; inRow?: boolean; chosen?: string }) {
  return (
    <FieldSet {...{ id, legend: label, hint, error, className }}>
      <span className={join('flex gap-x-4 gap-y-1', inRow ? 'flex-wrap' : 'flex-col')}>
        {options.map((option) => (
          <label
            key={option.value}
            className={join(
              'inline-flex cursor-pointer items-start gap-2 has-checked:font-semibold max-desk:min-h-11 max-desk:items-center',
              option.refused && 'cursor-not-allowed text-mute',
            )}
          >
            <input
              {...rest}
              {...(chosen !== undefined && { checked: chosen === option.value })}
              id={`${id}-${option.value}`}
              type="radio"
              value={option.value}
              disabled={Boolean(option.refused) || rest.disabled}
              aria-describedby={describedBy({ id, hint, error })}
              className="mt-px size-[18px] shrink-0 cursor-[inherit] appearance-none rounded-hole border-2 border-hand bg-sheet checked:bg-[radial-gradient(circle,var(--hand)_0_4px,transparent_4.8px)] disabled:border-dotted disabled:border-rule max-desk:size-[26px] max-desk:checked:bg-[radial-gradient(circle,var(--hand)_0_7px,transparent_7.8px)] forced-colors:appearance-auto"
            />
            <span>
              {option.words}
              {(option.refused ?? option.hint) && (
                <span className="block text-caption font-normal text-mute">
                  {option.refused ?? option.hint}
                </span>
              )}
            </span>
          </label>
        ))}
      </span>
    </FieldSet>
  )
}

/** Any of a few, all in view: one name, an array of values. */
export function Ticks({
  id,
  label,
  hint,
  error,
  className,
  options,
  inRow = true,
  ...rest
}: FieldFace & NativeInput & { options: readonly Option[]; inRow?: boolean }) {
  return (
    <FieldSet {...{ id, legend: label, hint, error, className }}>
      <span className={join('flex gap-x-4 gap-y-1', inRow ? 'flex-wrap' : 'flex-col')}>
        {options.map((option) => (
          <Tick
            key={option.value}
            {...rest}
            id={`${id}-${option.value}`}
            value={option.value}
            label={option.words}
            hint={option.refused ?? option.hint}
            disabled={Boolean(option.refused) || rest.disabled}
          />
        ))}
      </span>
    </FieldSet>
  )
}

function TickMark() {
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 18 18"
      className="pointer-events-none absolute inset-0 hidden size-full fill-none stroke-hand peer-checked:block"
    >
      <path d="M4.2 9.4 7.6 12.8 13.6 4.6" strokeWidth="3" />
    </svg>
  )
}
