import type { APIRequestContext, PlaywrightWorkerArgs } from '@playwright/test'
import { DEMO_PASSWORD, personOf } from './people'
import type { Who } from './people'

/** Requests in a person's name, without a browser; null asks as nobody. Redirects are not followed. */
export async function session(
  playwright: PlaywrightWorkerArgs['playwright'],
  baseURL: string | undefined,
  who: Who | null,
): Promise<APIRequestContext> {
  const request = await playwright.request.newContext({
    maxRedirects: 0,
    ...(baseURL !== undefined && { baseURL }),
  })
  if (who === null) return request
  const { csrfToken } = (await (await request.get('/api/auth/csrf')).json()) as { csrfToken: string }
  await request.post('/api/auth/callback/credentials', {
    form: { csrfToken, email: personOf(who).email, password: DEMO_PASSWORD, json: 'true' },
  })
  const { actor } = (await (await request.get('/api/auth/session')).json()) as { actor?: { email: string } }
  if (actor?.email !== personOf(who).email) throw new Error(`${who} cannot sign in.`)
  return request
}

/** What was answered to a question for a page or a handler. */
export interface Answer {
  status: number
  /** Everything that came over the wire, also what a page keeps for its script. */
  body: string
  /** Nothing stands there, or not for this person. */
  refused: boolean
}

export async function ask(request: APIRequestContext, path: string): Promise<Answer> {
  const response = await request.get(path)
  const status = response.status()
  const body = await response.text()
  return { status, body, refused: isRefused(status, response.headers()['location'] ?? '', body) }
}

/**
 * A page that begins before it is known whose it is has status 200 already; the mark of what is not there comes later in
 * it. (The words of the page "Nothing stands at this address" are no mark: they travel with every page.)
 */
function isRefused(status: number, location: string, body: string): boolean {
  if (status >= 300 && status < 400) return new URL(location, 'http://here').pathname === '/sign-in'
  return status >= 400 || body.includes('NEXT_HTTP_ERROR_FALLBACK;404')
}
