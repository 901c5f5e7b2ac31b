'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import { useId, useState, useTransition } from 'react'
import { useForm } from 'react-hook-form'
import type { DefaultValues, FieldErrors, FieldValues, Path, UseFormReturn } from 'react-hook-form'
import type { z } from 'zod'
import { fieldId } from '@/components/forms/field-id'
import { parseFigure } from '@/components/forms/figure'
import type { SummaryIssue } from '@/components/ui/error-summary'
import type { ActionResult, ErrorCode } from '@/lib/errors'

export interface Refusal {
  code: ErrorCode | 'unreachable'
  message: string
  details: Record<string, unknown>
}

export interface ActionForm<In extends FieldValues, Out, T> {
  form: UseFormReturn<In, unknown, Out>
  /** Give to <form onSubmit>. */
  submit: (event?: React.BaseSyntheticEvent) => Promise<void>
  pending: boolean
  /** Give both to <ErrorSummary>. */
  issues: SummaryIssue[]
  turn: number
  /** The whole form was refused (a conflict, a wrong state): title for the summary, and what came with it. */
  refusal: Refusal | null
  done: T | null
  /** Id, error and register() of a field of words, a select, ticks or radios. */
  field: (path: Path<In>) => FieldBinding<In>
  /** The same for a figure: decimal comma or point, empty is null. */
  figure: (path: Path<In>) => FieldBinding<In>
}

type FieldBinding<In extends FieldValues> = ReturnType<UseFormReturn<In>['register']> & {
  id: string
  error?: string
}

/**
 * One schema, one server action, one form. The schema is checked here and again in the action; what the action refuses
 * comes back as field errors and a summary that takes the focus, and nothing typed is lost.
 */
export function useActionForm<In extends FieldValues, Out extends FieldValues, T = undefined>({
  schema,
  action,
  defaultValues,
  onDone,
  name,
}: {
  schema: z.ZodType<Out, In>
  action: (input: Out) => Promise<ActionResult<T>>
  defaultValues: DefaultValues<In>
  onDone?: (data: T) => void
  /** Prefix of the field ids; needed only where two forms of a kind stand on one page or a test looks for them. */
  name?: string
}): ActionForm<In, Out, T> {
  const ownId = useId().replace(/[^A-Za-z0-9]/g, '')
  const prefix = name ?? `f${ownId}`
  const form = useForm<In, unknown, Out>({
    resolver: zodResolver<In, unknown, Out>(schema),
    defaultValues,
    shouldFocusError: false,
  })
  const [pending, startTransition] = useTransition()
  const [turn, setTurn] = useState(0)
  const [refusal, setRefusal] = useState<Refusal | null>(null)
  const [loose, setLoose] = useState<SummaryIssue[]>([])
  const [done, setDone] = useState<T | null>(null)
  const { errors } = form.formState

  const submit = form.handleSubmit(
    (input) =>
      new Promise<void>((resolve) => {
        startTransition(async () => {
          await send(input)
          resolve()
        })
      }),
    () => {
      setRefusal(null)
      setLoose([])
      setTurn((before) => before + 1)
    },
  )

  async function send(input: Out): Promise<void> {
    setRefusal(null)
    setLoose([])
    const result = await answerOf(() => action(input))
    if (result.ok) {
      setDone(() => result.data)
      onDone?.(result.data)
      return
    }
    const values = form.getValues()
    const unplaced: SummaryIssue[] = []
    for (const issue of result.issues) {
      if (hasPath(values, issue.path))
        form.setError(issue.path as Path<In>, { type: 'server', message: issue.message })
      else unplaced.push({ message: issue.message })
    }
    setLoose(unplaced)
    setRefusal({ code: result.code, message: result.message, details: result.details })
    setTurn((before) => before + 1)
  }

  const bind = (path: Path<In>, options?: Parameters<typeof form.register>[1]): FieldBinding<In> => ({
    ...form.register(path, options),
    id: fieldId(prefix, path),
    error: messageAt(errors, path),
  })

  return {
    form,
    submit,
    pending,
    issues: [...issuesOf(errors, prefix), ...loose],
    turn,
    refusal,
    done,
    field: (path) => bind(path),
    figure: (path) => bind(path, { setValueAs: parseFigure }),
  }
}

/** A thrown action is a lost connection or a fault: the form stays as typed, and says so. */
async function answerOf<T>(
  call: () => Promise<ActionResult<T>>,
): Promise<
  | ActionResult<T>
  | { ok: false; code: 'unreachable'; message: string; issues: []; details: Record<string, unknown> }
> {
  try {
    return await call()
  } catch {
    return {
      ok: false,
      code: 'unreachable',
      message: 'No answer came. What you typed is still here; send it again.',
      issues: [],
      details: {},
    }
  }
}

function issuesOf(errors: FieldErrors, prefix: string, path = ''): SummaryIssue[] {
  return Object.entries(errors).flatMap(([key, error]) => {
    if (!error || typeof error !== 'object' || key === 'ref' || key === 'types') return []
    const here = path ? `${path}.${key}` : key
    if (typeof error.message === 'string' && 'type' in error) {
      return key === 'root'
        ? [{ message: error.message }]
        : [{ fieldId: fieldId(prefix, here), message: error.message }]
    }
    return issuesOf(error as FieldErrors, prefix, here)
  })
}

function messageAt(errors: FieldErrors, path: string): string | undefined {
  const found = at(errors, path)
  return found && typeof found === 'object' && 'message' in found && typeof found.message === 'string'
    ? found.message
    : undefined
}

function hasPath(values: unknown, path: string): boolean {
  return path !== '' && at(values, path) !== undefined
}

function at(value: unknown, path: string): unknown {
  return path
    .split('.')
    .reduce<unknown>(
      (inner, key) =>
        inner && typeof inner === 'object' ? (inner as Record<string, unknown>)[key] : undefined,
      value,
    )
}
