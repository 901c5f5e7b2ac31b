import { fromZonedTime, formatInTimeZone } from 'date-fns-tz'
import type { Plan } from '@/lib/schemas/plan'
import type { PlaceIds } from '../journey'

/** What a demo plan is built from: ids of rows already there, and the moment the demo is made. */
export interface DemoWorld {
  places: PlaceIds
  people: Readonly<Record<string, number>>
  shippers: Readonly<Record<string, number>>
  now: Date
}

/** How far a demo consignment has got. */
export type DemoStage =
  | 'draft'
  | 'assessed'
  | 'in_review'
  | 'returned'
  | 'approved'
  | 'released'
  | 'under_way'
  | 'delivered'
  | 'cancelled'

export interface DemoConsignment {
  key: string
  stage: DemoStage
  plan: (world: DemoWorld) => Plan
  /** Hours before now at which the desk did its work, so that a journey under way was released in time. */
  preparedHoursAgo: number
  /** Conditions the vet puts, where one signs. */
  vetConditions?: readonly string[]
  /** The vet's reasons, where one returns it. */
  reasons?: string
}

/** A wall time some days from today, in a zone: "tomorrow at 09:20 in Glasgow". */
export function dayAt(now: Date, days: number, time: string, zone: string): Date {
  const today = formatInTimeZone(now, zone, 'yyyy-MM-dd')
  const noon = fromZonedTime(`${today}T12:00`, zone)
  const day = formatInTimeZone(new Date(noon.getTime() + days * 86_400_000), zone, 'yyyy-MM-dd')
  return fromZonedTime(`${day}T${time}`, zone)
}

export function hoursFrom(now: Date, hours: number): Date {
  const quarter = 15 * 60_000
  return new Date(Math.round((now.getTime() + hours * 3_600_000) / quarter) * quarter)
}

export const dateIn = (now: Date, days: number, zone = 'Europe/London') =>
  formatInTimeZone(new Date(now.getTime() + days * 86_400_000), zone, 'yyyy-MM-dd')

export const localAt = (instant: Date, zone = 'Europe/London') =>
  formatInTimeZone(instant, zone, "yyyy-MM-dd'T'HH:mm")

export const DESK = ['Corran Animal Couriers', '+44 141 496 0100'] as const
export const DUNMUIR = ['Dunmuir Freight Handling', '+44 141 496 0315'] as const
export const SKERROW = ['Skerrow Air Cargo', '+44 141 496 0342'] as const
export const QURM = ['Qurm Ground Handling', '+44 7700 900166'] as const
export const SALINA = ['Salina Bay Handling', '+44 7700 900266'] as const

/* Two parties that most of the invented journeys run between. */
export const MOSS_END = {
  name: 'Moss End Kennels',
  address: '3 Mill Brae, Balfron',
  telephone: '+44 141 496 0207',
  email: 'kennels@moss-end.example',
}
export const HALLMYRE = {
  name: 'Hallmyre Kennels and Stables',
  address: 'Hallmyre, Peebles',
  telephone: '+44 141 496 0211',
  email: 'yard@hallmyre.example',
}
