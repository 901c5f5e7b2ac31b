import { catalogue, catalogueValues } from '@/lib/species'
import type { DemoWorld } from '@/seeders/demo/consignments/common'
import { DEMO_PLACES } from '@/seeders/demo/places'

/* What demo plans are built and judged with, without a database. */
const keys = Object.keys(DEMO_PLACES) as (keyof typeof DEMO_PLACES)[]
export const world: DemoWorld = {
  now: new Date('2026-06-09T09:00:00Z'),
  places: Object.fromEntries(keys.map((key, index) => [key, index + 1])) as DemoWorld['places'],
  people: { driver: 1, 'second-driver': 2 },
  shippers: { '0412': 1, '0431': 2, '0457': 3 },
}
export const places = keys.map((key, index) => {
  const { latitude, longitude, ...place } = DEMO_PLACES[key]
  return { ...place, id: index + 1, latitudeDeg: latitude, longitudeDeg: longitude }
})
export const profiles = Object.values(catalogue).map(({ key, commonName, version }) => {
  const values = catalogueValues[key]
  if (values === undefined) throw new Error(`The catalogue has no values for ${key}.`)
  return { key, commonName, version, values }
})
