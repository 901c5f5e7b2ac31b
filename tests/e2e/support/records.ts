import type { APIRequestContext } from '@playwright/test'
import { DEMO_CONSIGNMENTS } from '../../../seeders/demo/consignments'
import type { DemoWorld } from '../../../seeders/demo/consignments/common'
import { DEMO_PEOPLE, DEMO_SHIPPERS } from '../../../seeders/demo/people'
import { DEMO_PLACES } from '../../../seeders/demo/places'
import type { Plan } from '../../../lib/schemas/plan'
import type { Who } from './people'

/** A consignment of the demo as the dispatcher finds it, and what gives it away. */
export interface DemoRecord {
  key: string
  id: number
  mark: string
  /** A revision of it is released or under way, or was. */
  inForce: boolean
  /** Drivers named on its legs. */
  drivers: Who[]
  /** People who speak for its shipper. */
  shippers: Who[]
  /** Words that stand in no other plan of the demo: animals, identifications, parties, their telephones. */
  words: string[]
  papers: Paper[]
}

/** Every consignment of the demo with its number, mark and papers, as the dispatcher's own pages tell them. */
export async function demoRecords(dispatcher: APIRequestContext): Promise<DemoRecord[]> {
  const plans = DEMO_CONSIGNMENTS.map(({ key, plan }) => ({ key, plan: plan(WORLD) }))
  const publicPage = await (await dispatcher.get('/sign-in')).text()
  const papers = await allPapers(dispatcher)
  const records: DemoRecord[] = []
  for (const { key, plan } of plans) {
    const others = plans.filter((one) => one.key !== key).map((one) => JSON.stringify(one.plan))
    const own = wordsOf(plan).filter(
      (word) => !others.some((other) => stands(word, other)) && !stands(word, publicPage),
    )
    const { id, mark, inForceRevision } = await found(dispatcher, key, own)
    records.push({
      key,
      id,
      mark,
      inForce: inForceRevision !== null,
      drivers: DRIVERS.filter((who) => plan.legs.some(({ driverId }) => driverId === WORLD.people[who])),
      shippers: shippersOf(plan),
      words: [...own, ...plan.crates.map(({ letter }) => `${mark}-${letter}`)],
      papers: papers.filter((paper) => paper.mark === mark),
    })
  }
  return records
}

/** Whether a word stands in a text as a word: "Ash" is not in "hash". */
export function stands(word: string, text: string): boolean {
  const letters = word.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')
  return new RegExp(`(?<![\\p{L}\\p{N}])${letters}(?![\\p{L}\\p{N}])`, 'u').test(text)
}

const DRIVERS = ['driver', 'second-driver'] as const satisfies Who[]
const placeKeys = Object.keys(DEMO_PLACES)

/** The world the demo's plans are built in, with numbers of our own: only the words of the plans are used. */
const WORLD: DemoWorld = {
  now: new Date(),
  places: Object.fromEntries(placeKeys.map((key, index) => [key, index + 1])) as DemoWorld['places'],
  people: Object.fromEntries(DEMO_PEOPLE.map(({ key }, index) => [key, index + 1])),
  shippers: Object.fromEntries(DEMO_SHIPPERS.map(({ accountNo }, index) => [accountNo, index + 1])),
}

function wordsOf(plan: Plan): string[] {
  const { animals, consignor, consignee, emergencyContact } = plan
  const parties = [consignor, consignee].flatMap(({ name, telephone }) => [name, telephone])
  const contact = [emergencyContact.name, emergencyContact.telephone]
  const beasts = animals.flatMap(({ name, identification }) => [name, identification])
  return [...new Set([...beasts, ...parties, ...contact])].filter((word) => word.length > 3)
}

function shippersOf({ shipperId }: Plan): Who[] {
  const account = DEMO_SHIPPERS.find(({ accountNo }) => WORLD.shippers[accountNo] === shipperId)?.accountNo
  return DEMO_PEOPLE.filter((person) => account !== undefined && person.shipperAccount === account).map(
    ({ key }) => key as Who,
  )
}

interface Paper {
  id: number
  mark: string
  isManifest: boolean
}

/** Every paper there is, by its number; a few numbers may be missing where a release was refused at last. */
async function allPapers(dispatcher: APIRequestContext): Promise<Paper[]> {
  const papers: Paper[] = []
  for (let id = 1, missing = 0; missing < 5; id += 1) {
    const response = await dispatcher.get(`/api/documents/${id}/pdf`)
    missing = response.ok() ? 0 : missing + 1
    const name = /filename="(\d{4})-(manifest|go-no-go)-/.exec(
      response.headers()['content-disposition'] ?? '',
    )
    if (name?.[1] !== undefined) papers.push({ id, mark: name[1], isManifest: name[2] === 'manifest' })
  }
  return papers
}

interface BoardRow {
  id: number
  mark: string
  inForceRevision: number | null
}

/** The one consignment the board finds by a word that is its own. */
async function found(dispatcher: APIRequestContext, key: string, words: string[]): Promise<BoardRow> {
  for (const word of words) {
    const query = new URLSearchParams({ find: word, closed: '1' })
    const { rows } = (await (await dispatcher.get(`/api/consignments?${query}`)).json()) as {
      rows: BoardRow[]
    }
    if (rows.length === 1 && rows[0] !== undefined) return rows[0]
  }
  throw new Error(`The board finds no one consignment for ${key} by ${words.join(', ')}.`)
}
