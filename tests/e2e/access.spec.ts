import type { APIRequestContext } from '@playwright/test'
import { expect, test } from '@playwright/test'
import type { Opening, RoutePattern } from '../../lib/policies/routes'
import { ROUTE_POLICIES } from '../../lib/policies/routes'
import type { Who } from './support/people'
import { personOf } from './support/people'
import type { DemoRecord } from './support/records'
import { demoRecords, stands } from './support/records'
import type { Answer } from './support/session'
import { ask, session } from './support/session'

/*
 * Every kind of visitor at every address, and at every consignment and paper of the demo. What is not the visitor's is
 * answered as if it did not exist, and no answer whatever holds a word of somebody else's consignment: also not the part of
 * a page that only its script reads.
 */
const VISITORS: readonly (Who | null)[] = [
  null,
  'dispatcher',
  'vet',
  'admin',
  'driver',
  'second-driver',
  'shipper',
  'second-shipper',
]
const DESK: readonly (Who | null)[] = ['dispatcher', 'vet', 'admin']
const PATTERNS = Object.keys(ROUTE_POLICIES) as RoutePattern[]
const OF_A_RECORD = PATTERNS.filter((pattern) => pattern.includes('[consignmentId]'))
const OF_NONE = PATTERNS.filter(
  (pattern) => !pattern.includes('[consignmentId]') && !pattern.includes('[documentId]'),
)

/** A page of one consignment that says in its own words what it is about. */
const OWN_PAGE: Partial<Record<string, RoutePattern>> = {
  dispatcher: '/consignments/[consignmentId]',
  driver: '/runs/[consignmentId]',
  'second-driver': '/runs/[consignmentId]',
  shipper: '/portal/[consignmentId]',
  'second-shipper': '/portal/[consignmentId]',
}

let records: DemoRecord[]
const asking = new Map<Who | null, APIRequestContext>()

test.beforeAll(async ({ playwright, baseURL }) => {
  for (const who of VISITORS) asking.set(who, await session(playwright, baseURL, who))
  records = await demoRecords(requestOf('dispatcher'))
})
test.afterAll(async () => {
  for (const request of asking.values()) await request.dispose()
})

test('the demo can give a leak away', () => {
  // Two shippers and two drivers, each with consignments in force that the other must not see.
  for (const [who, other] of [
    ['shipper', 'second-shipper'],
    ['second-shipper', 'shipper'],
    ['driver', 'second-driver'],
    ['second-driver', 'driver'],
  ] as const) {
    const own = records.filter((record) => record.inForce && sees(who, record) && !sees(other, record))
    expect(own.length, `only ${who}’s`).toBeGreaterThan(0)
  }
  for (const { key, words } of records) expect(words.length, key).toBeGreaterThan(1)
  expect(records.flatMap(({ papers }) => papers).length).toBeGreaterThanOrEqual(6)
})

for (const who of VISITORS) {
  test(`${who ?? 'nobody'} opens what is theirs and nothing else`, async () => {
    const request = requestOf(who)
    await Promise.all(
      OF_NONE.map((pattern) => {
        const path = pattern
          .replace('[code]', 'ABCDEFGH')
          .replace('[key]', 'dog')
          .replace('[...nextauth]', 'session')
        return walk(request, who, path, { open: mayOpen(who, pattern) && !TAKES_ONLY.includes(pattern) })
      }),
    )
    for (const [index, record] of records.entries()) {
      const patterns = OF_A_RECORD.filter((pattern) => index === 0 || !isSame(who, pattern))
      await Promise.all(
        patterns.map(async (pattern) => {
          const path = pattern.replace('[consignmentId]', String(record.id))
          const open = mayOpen(who, pattern) && sees(who, record) && !TAKES_ONLY.includes(pattern)
          const { body } = await walk(request, who, path, { open })
          if (!open || !record.inForce || pattern !== OWN_PAGE[who ?? '']) return
          const own = record.words.filter((word) => stands(word, body))
          expect(own.length, `${path} is about ${record.key}`).toBeGreaterThan(0)
        }),
      )
    }
  })
}

test('papers go to the desk, to their shipper and to the drivers named, and to nobody else', async () => {
  for (const record of records) {
    for (const { id, isManifest } of record.papers) {
      for (const who of VISITORS) {
        const response = await requestOf(who).get(`/api/documents/${id}/pdf`)
        const where = `${who ?? 'nobody'} at paper ${id} of ${record.key}`
        const may = sees(who, record) && (isManifest || !isDriver(who))
        expect(response.status(), where).toBe(may ? 200 : who === null ? 401 : 404)
        const begins = (await response.body()).subarray(0, 5).toString('latin1')
        expect(begins === '%PDF-', where).toBe(may)
        expect((response.headers()['content-disposition'] ?? '').includes(record.mark), where).toBe(may)
      }
    }
  }
})

test('acting without a session or as the wrong person changes nothing', async () => {
  const nothing = { place: '', value: {}, alive: null, dead: null, short: null }
  for (const record of records) {
    for (const who of VISITORS.filter((one) => !isDriver(one) || !sees(one, record))) {
      const entry = { clientId: crypto.randomUUID(), legId: 'leg-1', itemKey: 'x', kind: 'note', ...nothing }
      const response = await requestOf(who).post(`/api/runs/${record.id}/entries`, {
        data: { entries: [{ ...entry, atMs: Date.now() }] },
      })
      const where = `${who ?? 'nobody'} writes on ${record.key}`
      expect([401, 403, 404], where).toContain(response.status())
    }
  }
})

/** Handlers that show nothing: they take what is sent. */
const TAKES_ONLY: readonly RoutePattern[] = ['/api/verify', '/api/runs/[consignmentId]/entries']

/** The desk's long pages are the same for all of the desk: the dispatcher's walk reads every one of them. */
function isSame(who: Who | null, pattern: RoutePattern): boolean {
  return (who === 'vet' || who === 'admin') && mayOpen('dispatcher', pattern) && mayOpen(who, pattern)
}

/** Asks once: refused or not as it must be, no fault of ours, and no word of what the visitor may not see. */
async function walk(
  request: APIRequestContext,
  who: Who | null,
  path: string,
  { open }: { open: boolean },
): Promise<Answer> {
  const answer = await ask(request, path)
  const where = `${who ?? 'nobody'} at ${path}`
  expect(answer.status, where).toBeLessThan(500)
  expect(answer.refused ? 'refused' : 'open', where).toBe(open ? 'open' : 'refused')
  for (const record of records.filter((one) => !sees(who, one))) {
    const leaked = record.words.filter((word) => stands(word, answer.body))
    expect(leaked, `${where} tells of ${record.key}`).toEqual([])
  }
  return answer
}

/** Whether somebody may see this consignment at all: the desk each, a shipper own ones, a driver those released to them. */
function sees(who: Who | null, { shippers, drivers, inForce }: DemoRecord): boolean {
  if (who === null) return false
  return DESK.includes(who) || shippers.includes(who) || (inForce && drivers.includes(who))
}

function isDriver(who: Who | null): boolean {
  return who !== null && personOf(who).role === 'driver'
}

function mayOpen(who: Who | null, pattern: RoutePattern): boolean {
  const opening: Opening = ROUTE_POLICIES[pattern]
  if (opening === 'public') return true
  if (who === null) return false
  return opening === 'signed-in' || opening.includes(personOf(who).role)
}

function requestOf(who: Who | null): APIRequestContext {
  const request = asking.get(who)
  if (request === undefined) throw new Error(`${who ?? 'nobody'} has no session.`)
  return request
}
