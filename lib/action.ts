import 'server-only'
import { revalidatePath } from 'next/cache'
import type { z } from 'zod'
import { currentActor } from '@/lib/auth/actor'
import { isSteadfoldError } from '@/lib/errors'
import type { ActionResult, ErrorCode, FieldIssue } from '@/lib/errors'
import { logFault } from '@/lib/log'
import type { Actor } from '@/lib/policies/actor'

/** A verb of lib/domain: who, what, when. */
export type DomainVerb<Input, T> = (actor: Actor, input: Input, now: Date) => Promise<T>

/**
 * A server action out of a schema and a verb: who is asking, is it well formed, do it. Whatever a person can act on comes
 * back as a value; a fault is logged and told as one. Afterwards every page is shown afresh.
 */
export function action<Schema extends z.ZodType, T>(
  schema: Schema,
  verb: DomainVerb<z.output<Schema>, T>,
): (input: z.input<Schema>) => Promise<ActionResult<T>> {
  return async (input) => {
    try {
      const actor = await currentActor()
      if (actor === null)
        return failure('not_signed_in', 'You are signed out. Sign in again; this page keeps what you typed.')
      const parsed = schema.safeParse(input)
      if (!parsed.success) return failure('invalid', 'Put right what is marked.', issuesOf(parsed.error))
      const data = await verb(actor, parsed.data, new Date())
      revalidatePath('/', 'layout')
      return { ok: true, data }
    } catch (error) {
      if (isSteadfoldError(error)) return failure(error.code, error.message, error.issues, error.details)
      logFault('action', error)
      return failure(
        'unavailable',
        'Something went wrong on our side. What you typed is still here; try again.',
      )
    }
  }
}

/** Zod's issues as the fields of a form know them. */
export function issuesOf(error: z.ZodError): FieldIssue[] {
  return error.issues.map(({ path, message }) => ({ path: path.join('.'), message }))
}

function failure(
  code: ErrorCode,
  message: string,
  issues: FieldIssue[] = [],
  details: Record<string, unknown> = {},
): { ok: false; code: ErrorCode; message: string; issues: FieldIssue[]; details: Record<string, unknown> } {
  return { ok: false, code, message, issues, details }
}
