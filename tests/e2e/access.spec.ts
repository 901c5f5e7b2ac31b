import type { APIRequestContext, Browser } from '@playwright/test'
import { expect, test } from '@playwright/test'
import type { Opening, RoutePattern } from '../../lib/policies/routes'
import { ROUTE_POLICIES } from '../../lib/policies/routes'
import type { Who } from './support/people'
import { open, personOf } from './support/people'

/*
 * Every kind of visitor against every route, and against records that are somebody else's. A page that is not for the
 * visitor is answered as if it did not exist; the demo's own words give a leak away.
 */
const VISITORS: readonly (Who | null)[] = [null, 'dispatcher', 'vet', 'driver', 'shipper', 'admin']

/** Words that stand on the horses' pages alone: consignor, animals, telephone. They are another shipper's and driver's. */
const HORSES = ['Fennel', 'Juno', 'Weidehof']

test('no visitor opens what is not theirs, and nothing fails', async ({ browser }) => {
  test.setTimeout(600_000)
  const ids = await demoIds(browser)
  for (const who of VISITORS) {
    const { context, page } = await open(browser, who)
    for (const pattern of Object.keys(ROUTE_POLICIES) as RoutePattern[]) {
      if (!IS_BUILT.has(pattern)) continue
      const path = pattern
        .replace('[consignmentId]', String(ids.horses))
        .replace('[documentId]', String(ids.horsesManifest))
        .replace('[code]', 'ABCDEFGH')
        .replace('[key]', 'dog')
        .replace('[...nextauth]', 'session')
      const response = await context.request.get(path, { maxRedirects: 0 })
      const where = `${who ?? 'nobody'} at ${path}`
      expect(response.status(), where).toBeLessThan(500)
      const body = response.status() === 200 ? await response.text() : ''
      if (!mayOpen(who, pattern)) {
        expect(response.status() !== 200 || NOT_THERE.test(body), `${where} is refused`).toBe(true)
      }
      if (!seesHorses(who))
        for (const word of HORSES) expect(body.includes(word), `${where} shows ${word}`).toBe(false)
    }
    await page.close()
    await context.close()
  }
})

test('acting without a session or as the wrong person changes nothing', async ({ browser }) => {
  const ids = await demoIds(browser)
  const entry = {
    clientId: crypto.randomUUID(),
    legId: 'leg-1',
    itemKey: 'x',
    kind: 'note',
    atMs: Date.now(),
  }
  for (const who of [null, 'driver', 'shipper', 'vet', 'admin'] as const) {
    const { context } = await open(browser, who)
    const response = await context.request.post(`/api/runs/${ids.horses}/entries`, {
      data: { entries: [{ ...entry, place: '', value: {}, alive: null, dead: null, short: null }] },
      maxRedirects: 0,
    })
    expect(response.status(), who ?? 'nobody').toBeLessThan(500)
    if (response.status() === 200) expect((await response.json()).stored ?? []).toEqual([])
    await context.close()
  }
})

const NOT_THERE = /Nothing stands at this address/

/** Routes the table keeps for pages that are not there yet. */
const IS_BUILT = new Set<RoutePattern>(
  (Object.keys(ROUTE_POLICIES) as RoutePattern[]).filter(
    (pattern) =>
      ![
        '/consignments/[consignmentId]/assessment',
        '/consignments/[consignmentId]/history',
        '/crate-models',
        '/admin/places',
      ].includes(pattern),
  ),
)

function mayOpen(who: Who | null, pattern: RoutePattern): boolean {
  const opening: Opening = ROUTE_POLICIES[pattern]
  if (opening === 'public') return true
  if (who === null) return false
  return opening === 'signed-in' || opening.includes(personOf(who).role)
}

const seesHorses = (who: Who | null) => who === 'dispatcher' || who === 'vet' || who === 'admin'

async function demoIds(browser: Browser) {
  const { context } = await open(browser, 'dispatcher')
  const horses = await idOf(context.request, 'Weidehof')
  let horsesManifest = 0
  for (let id = 1; id < 20 && horsesManifest === 0; id += 1) {
    const response = await context.request.get(`/api/documents/${id}/pdf`)
    const mark = horses.mark
    if (response.ok() && (response.headers()['content-disposition'] ?? '').includes(mark)) horsesManifest = id
  }
  expect(horsesManifest).toBeGreaterThan(0)
  await context.close()
  return { horses: horses.id, horsesManifest }
}

async function idOf(request: APIRequestContext, word: string): Promise<{ id: number; mark: string }> {
  const response = await request.get(`/api/consignments?find=${word}`)
  const text = await response.text()
  const found = JSON.parse(text) as {
    page?: { rows: { id: number; mark: string }[] }
    rows?: { id: number; mark: string }[]
  }
  const row = (found.rows ?? found.page?.rows ?? [])[0]
  if (row === undefined) throw new Error(`The board finds nothing for ${word}: ${text.slice(0, 200)}`)
  return row
}
