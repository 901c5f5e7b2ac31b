import 'server-only'
import type { NextRequest } from 'next/server'
import { ZodError } from 'zod'
import { issuesOf } from '@/lib/action'
import { currentActor } from '@/lib/auth/actor'
import { requestIp } from '@/lib/auth/request-ip'
import { SteadfoldError, isSteadfoldError } from '@/lib/errors'
import type { ErrorCode } from '@/lib/errors'
import { logFault } from '@/lib/log'
import type { Actor } from '@/lib/policies/actor'
import { mayOpen } from '@/lib/policies/routes'
import type { RoutePattern } from '@/lib/policies/routes'

type Params = Record<string, string | string[]>

export interface Call {
  actor: Actor
  request: NextRequest
  params: Params
  now: Date
}

/** What a handler that needs no sign-in gets. */
export interface PublicCall {
  ip: string | null
  request: NextRequest
  params: Params
  now: Date
}

export interface Bytes {
  bytes: Uint8Array
  type: string
  fileName: string
}

type Handler = (request: NextRequest, context: { params: Promise<Params> }) => Promise<Response>

/** A handler that answers JSON to those who may open it. Expected refusals get their status, never 500. */
export function jsonRoute(pattern: RoutePattern, run: (call: Call) => Promise<unknown>): Handler {
  return guarded(pattern, async (call) => Response.json(await run(call), { headers: NOT_KEPT }))
}

/** A handler that answers a file, to be shown by the browser under its own name. */
export function bytesRoute(pattern: RoutePattern, run: (call: Call) => Promise<Bytes>): Handler {
  return guarded(pattern, async (call) => {
    const { bytes, type, fileName } = await run(call)
    return new Response(new Uint8Array(bytes), {
      headers: {
        ...NOT_KEPT,
        'content-type': type,
        'content-length': String(bytes.byteLength),
        'content-disposition': `inline; filename="${fileName.replace(/[^A-Za-z0-9._-]/g, '-')}"`,
        'x-content-type-options': 'nosniff',
      },
    })
  })
}

/** A handler anybody may call. */
export function publicRoute(run: (call: PublicCall) => Promise<unknown>): Handler {
  return async (request, context) => {
    try {
      const call = { request, params: await context.params, now: new Date(), ip: requestIp(request.headers) }
      return Response.json(await run(call), { headers: NOT_KEPT })
    } catch (error) {
      return refusal(error, request)
    }
  }
}

/** A row's number out of an address; what is no number is no row. */
export function idOf(params: Params, name: string): number {
  const value = params[name]
  if (typeof value === 'string' && /^[1-9]\d{0,14}$/.test(value)) return Number(value)
  throw new SteadfoldError('not_found', 'There is no such page.')
}

const NOT_KEPT = { 'cache-control': 'private, no-store' }

function guarded(pattern: RoutePattern, respond: (call: Call) => Promise<Response>): Handler {
  return async (request, context) => {
    try {
      insistSameOrigin(request)
      const actor = await currentActor()
      if (actor === null) throw new SteadfoldError('not_signed_in', 'Sign in first.')
      if (!mayOpen(actor, pattern)) throw new SteadfoldError('not_allowed', 'You may not do this.')
      return await respond({ actor, request, params: await context.params, now: new Date() })
    } catch (error) {
      return refusal(error, request)
    }
  }
}

/** The cookie alone must not let another site's page write in somebody's name. */
function insistSameOrigin(request: NextRequest) {
  if (request.method === 'GET' || request.method === 'HEAD') return
  const origin = request.headers.get('origin')
  const host = request.headers.get('host')
  if (origin === null || host === null || URL.parse(origin)?.host === host) return
  throw new SteadfoldError('not_allowed', 'This request comes from another site.')
}

const STATUS: Record<ErrorCode, number> = {
  invalid: 400,
  not_signed_in: 401,
  not_allowed: 403,
  not_found: 404,
  conflict: 409,
  wrong_state: 409,
  out_of_date: 409,
  refused: 422,
  not_converged: 422,
  throttled: 429,
  unavailable: 503,
}

function refusal(error: unknown, request: NextRequest): Response {
  const known = expected(error)
  if (known === null) {
    logFault(`${request.method} ${request.nextUrl.pathname}`, error)
    const body = { error: { code: 'unavailable', message: 'Something went wrong on our side.', issues: [] } }
    return Response.json(body, { status: 500, headers: NOT_KEPT })
  }
  const { code, message, issues, details } = known
  return Response.json(
    { error: { code, message, issues, details } },
    { status: STATUS[code], headers: { ...NOT_KEPT, ...retryAfter(known) } },
  )
}

function expected(error: unknown): SteadfoldError | null {
  if (isSteadfoldError(error)) return error
  if (error instanceof ZodError) {
    return new SteadfoldError('invalid', 'Put right what is marked.', { issues: issuesOf(error) })
  }
  if (error instanceof SyntaxError) return new SteadfoldError('invalid', 'What was sent cannot be read.')
  return null
}

function retryAfter({ details }: SteadfoldError): Record<string, string> {
  const until = typeof details['closedUntil'] === 'string' ? Date.parse(details['closedUntil']) : NaN
  if (Number.isNaN(until)) return {}
  return { 'retry-after': String(Math.max(1, Math.ceil((until - Date.now()) / 1000))) }
}
