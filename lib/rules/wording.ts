import type { Leg, LegKind } from '@/lib/thermal'

/** Figures as findings spell them: one decimal, a true minus sign, the unit. Rounding here is for eyes only. */
export function degrees(tempC: number): string {
  return `${signed(tempC, 1)} °C`
}

export function fahrenheit(tempF: number): string {
  return `${signed(tempF, 1)} °F`
}

export function percent(value: number): string {
  return `${signed(value, 0)} %`
}

export function minutes(value: number): string {
  return `${signed(value, 0)} min`
}

export function signed(value: number, decimals: number): string {
  const text = value.toFixed(decimals)
  const bare = text.startsWith('-') ? text.slice(1) : text
  return text.startsWith('-') && Number(bare) !== 0 ? `−${bare}` : bare
}

/** "A", "A and B", "A, B and C". */
export function list(names: readonly string[]): string {
  const last = names.at(-1) ?? ''
  return names.length < 2 ? last : `${names.slice(0, -1).join(', ')} and ${last}`
}

type NamedLeg = Pick<Leg, 'id' | 'kind'> & { flightPhase?: Leg['flightPhase'] | null }

/** Words for a schedule: "on time", "all typical delays", "worst delay of leg 7 (ramp)". */
export function scheduleWords(scheduleId: string, legs: readonly NamedLeg[]): string {
  if (scheduleId === 'on-time') return 'on time'
  if (scheduleId === 'typical') return 'all typical delays'
  return `worst delay of ${legWords(scheduleId.slice('worst:'.length), legs)}`
}

/** "leg 7 (ramp)": its place in the journey and what it is. An id is for the engine, never for people. */
export function legWords(legId: string, legs: readonly NamedLeg[]): string {
  const index = legs.findIndex(({ id }) => id === legId)
  const leg = legs[index]
  return leg === undefined ? 'a leg' : `leg ${index + 1} (${kindWords(leg)})`
}

function kindWords({ kind, flightPhase }: NamedLeg): string {
  if (kind !== 'flight' || !flightPhase) return LEG_KIND_WORDS[kind]
  return flightPhase === 'airborne' ? 'airborne' : 'doors shut'
}

const LEG_KIND_WORDS: Record<LegKind, string> = {
  road: 'road',
  shed: 'shed',
  ramp: 'ramp',
  flight: 'flight',
  sea: 'sea',
  rail: 'rail',
  border: 'border post',
  rest: 'rest',
}

/** "snub-nosed dog": a profile's key is for the engine, never for people. */
export function speciesWords(profile: string): string {
  return profile.replace(/-(?=[^-]*$)/, ' ')
}

/** "Species row snub-nosed dog, version 2": where a figure of a species comes from. */
export function rowWords({ profile, version }: { profile: string; version: number }): string {
  return `Species row ${speciesWords(profile)}, version ${version}`
}

/** Code-point order: the same in every engine and locale. */
export function compare(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0
}
