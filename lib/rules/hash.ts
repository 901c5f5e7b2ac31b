import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js'
import canonicalize from 'canonicalize'
import { SteadfoldError } from '@/lib/errors'
import type { OpenAir, ProfileRow, Scenario, Surroundings } from '@/lib/thermal/scenario'
import { compare } from './wording'

/** What people decided about a consignment besides the scenario; texts, never telephones, drivers or notes. */
export interface DecidedFacts {
  animals: {
    id: string
    name: string
    identification: string
    breedNote: string
    medicines: string
    lastExamination: string
  }[]
  legs: { id: string; carrier: string; partyInCharge: string }[]
}

export interface HashedPlan {
  scenario: Scenario
  facts?: DecidedFacts
}

export interface HashedInput extends HashedPlan {
  /** The species rows in force. */
  profiles: Readonly<Record<string, ProfileRow>>
  engineVersion: string
  rulesVersion: string
}

/**
 * SHA-256 over what people decided: the scenario with typed weather, limits and context without papers, and the facts
 * about animals and legs that stand beside it. Fetched weather, papers and versions are left to `inputHash`.
 */
export function planHash({ scenario, facts }: HashedPlan): string {
  const { outputStepS: _step, profiles: _rows, initial: _state, context, legs, ...decided } = scenario
  const { papers: _papers, ...rules } = context ?? { papers: [] }
  return digest({
    ...decided,
    ...(context && { context: rules }),
    legs: legs.map((leg) => ({ ...leg, surroundings: withoutForecast(leg.surroundings) })),
    facts,
  })
}

/** SHA-256 over everything an assessment rests on. */
export function inputHash(input: HashedInput): string {
  const { scenario, profiles, engineVersion, rulesVersion } = input
  const used = new Set(scenario.crates.flatMap((crate) => crate.occupants.map((animal) => animal.profile)))
  return digest({
    plan: planHash(input),
    weather: scenario.legs.map(({ id, surroundings }) => ({ leg: id, series: forecasts(surroundings) })),
    papers: scenario.context?.papers ?? [],
    outputStepS: scenario.outputStepS,
    initial: scenario.initial,
    profiles: Object.fromEntries(
      Object.entries(profiles).filter(([key]) => used.has(key) || usedByFlag(key, used)),
    ),
    engineVersion,
    rulesVersion,
  })
}

/** SHA-256, as hexadecimal, of the canonical form (RFC 8785) of a plain document. */
export function digest(document: unknown): string {
  return bytesToHex(sha256(utf8ToBytes(canonicalText(document))))
}

/** RFC 8785 text after −0, absent members and the order of arrays with ids are made one. */
export function canonicalText(document: unknown): string {
  const text = canonicalize(normalised(document, ''))
  if (text === undefined) throw new SteadfoldError('invalid', 'Nothing to hash.')
  return text
}

/** A plain dog flagged snub-nosed takes the snub-nosed row. */
function usedByFlag(key: string, used: ReadonlySet<string>): boolean {
  return key.startsWith('snub-nosed-') && used.has(key.slice('snub-nosed-'.length))
}

function normalised(value: unknown, key: string): unknown {
  if (typeof value === 'number') {
    if (!Number.isFinite(value)) throw new SteadfoldError('invalid', `“${key}” is not a finite number.`)
    return value === 0 ? 0 : value
  }
  if (Array.isArray(value)) return sorted(value, key).map((item) => normalised(item, key))
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(
    Object.entries(value)
      .filter(([, member]) => member !== undefined)
      .map(([name, member]) => [name, normalised(member, name)]),
  )
}

/** Legs keep their order, which is the journey; what else has an id, and lists of words, are sets. */
function sorted(items: unknown[], key: string): unknown[] {
  if (key === 'legs' || key === 'weather') return items
  if (items.every((item) => typeof item === 'string')) return [...items].sort(compare)
  const ids = items.map(idOf)
  if (!ids.every((id) => id !== undefined)) return items
  return [...items].sort((a, b) => compare(idOf(a) ?? '', idOf(b) ?? ''))
}

function idOf(item: unknown): string | undefined {
  if (typeof item !== 'object' || item === null || !('id' in item)) return undefined
  return typeof item.id === 'string' ? item.id : undefined
}

function withoutForecast(surroundings: Surroundings): unknown {
  switch (surroundings.type) {
    case 'open-air':
      return surroundings.source === 'forecast'
        ? { ...surroundings, series: 'forecast', issuedAtMs: undefined }
        : { ...surroundings, issuedAtMs: undefined }
    case 'controlled':
      return {
        ...surroundings,
        ...(surroundings.outside && { outside: withoutForecast(surroundings.outside) }),
      }
    case 'enclosed':
      return { ...surroundings, outside: withoutForecast(surroundings.outside) }
  }
}

function forecasts(surroundings: Surroundings): Pick<OpenAir, 'series' | 'issuedAtMs'>[] {
  if (surroundings.type !== 'open-air')
    return surroundings.outside === undefined ? [] : forecasts(surroundings.outside)
  const { source, series, issuedAtMs } = surroundings
  return source === 'forecast' ? [{ series, issuedAtMs }] : [{ series: [], issuedAtMs }]
}
