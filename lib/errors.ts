/**
 * Errors a person can act on. They cross from verbs to pages as data, so they carry an id and never rely on `instanceof`
 * (each route bundle may hold its own copy of a class).
 */

export interface FieldIssue {
  /** Dotted path into what was typed, e.g. "legs.2.airTempC". */
  path: string
  message: string
  received?: unknown
}

export type ErrorCode =
  | 'invalid'
  | 'not_signed_in'
  | 'not_allowed'
  | 'not_found'
  | 'conflict'
  | 'wrong_state'
  | 'out_of_date'
  | 'throttled'
  | 'refused'
  | 'not_converged'
  | 'unavailable'

export class SteadfoldError extends Error {
  readonly code: ErrorCode
  readonly issues: FieldIssue[]
  readonly details: Record<string, unknown>

  constructor(
    code: ErrorCode,
    message: string,
    more: { issues?: FieldIssue[]; details?: Record<string, unknown> } = {},
  ) {
    super(message)
    this.name = 'SteadfoldError'
    this.code = code
    this.issues = more.issues ?? []
    this.details = more.details ?? {}
  }
}

/** True for a SteadfoldError from any bundle. */
export function isSteadfoldError(error: unknown): error is SteadfoldError {
  return error instanceof Error && error.name === 'SteadfoldError' && 'code' in error
}

/** What a server action returns: expected failures are values, never thrown. */
export type ActionResult<T = undefined> =
  | { ok: true; data: T }
  | { ok: false; code: ErrorCode; message: string; issues: FieldIssue[]; details: Record<string, unknown> }
