import type { Basis, Finding } from '@/lib/rules/result'
import { airMargin, bodyTemp, count, minutesToSpare, percent } from '../format'
import type { Margin } from '../sheet'

/** "A", "A and B", "A, B and C". */
export function listed(items: readonly (string | number)[]): string {
  const last = String(items.at(-1) ?? '')
  return items.length < 2 ? last : `${items.slice(0, -1).join(', ')} and ${last}`
}

/** "leg 7", "legs 7 and 8", "legs 4 to 6". */
export function legsInWords(ordinals: readonly number[]): string {
  return ordinals.length === 0 ? '' : `${ordinals.length === 1 ? 'leg' : 'legs'} ${ordinalRange(ordinals)}`
}

/** "7", "7 and 8", "4 to 6", "1, 4 and 6". */
export function ordinalRange(ordinals: readonly number[]): string {
  const sorted = [...new Set(ordinals)].sort((a, b) => a - b)
  const [first, last] = [sorted[0], sorted.at(-1)]
  const unbroken = first !== undefined && last !== undefined && last - first === sorted.length - 1
  return unbroken && sorted.length > 2 ? `${first} to ${last}` : listed(sorted)
}

export const BASIS_WORDS: Record<Basis, string> = {
  law: 'Law',
  standard: 'Standard',
  carrier: 'Carrier',
  house: 'House',
  physiology: 'Physiology',
}

/** The limit or rule a finding speaks of, said beside every verdict: "alarm", "alarm low", "critical", "cold effort", "law". */
export function limitWords({ limitKind, side, basis, rule, status }: Finding): string {
  switch (limitKind) {
    case 'critical':
    case 'alarm':
      return side === 'low' ? `${limitKind} low` : limitKind
    case 'cold-effort':
      return 'cold effort'
    case 'other':
      return OTHER_LIMITS[rule] ?? 'physiology'
    default:
      return status === 'judgement' ? 'judgement' : basis === 'physiology' ? 'physiology' : basis
  }
}

const OTHER_LIMITS: Record<string, string> = {
  'carbon-dioxide': 'carbon dioxide',
  'water-loss': 'water loss',
}

export function marginOf(finding: Finding | undefined): Margin {
  return {
    minutes: finding?.marginMin ?? null,
    outsideAirC: finding?.marginOutsideAirC ?? null,
    bodyC: finding?.marginBodyC ?? null,
    limitKind: finding?.limitKind ?? null,
    side: finding?.side ?? null,
  }
}

/** "−6 min, −2 °C": minutes and outside air, as far as known. */
export function spareWords({ minutes, outsideAirC }: Margin): string {
  const words = [
    minutes === null ? '' : minutesToSpare(minutes),
    outsideAirC === null ? '' : airMargin(outsideAirC, 'c'),
  ]
  return words.filter(Boolean).join(', ')
}

/** What the plan gives, with its unit; empty where the finding has no figure. */
export function valueWords({ value, unit }: Pick<Finding, 'value' | 'unit'>): string {
  if (value === undefined) return ''
  if (unit === '°C') return bodyTemp(value, 'c')
  if (unit === '%') return percent(value)
  if (unit === '% of mass') return `${percent(value, 1)} of mass`
  return [count(Math.round(value)), unit ?? ''].filter(Boolean).join('\u00a0')
}

/** "leg 7 at its worst delay", "all legs at their typical delay", "all legs on time". */
export function scheduleInWords(
  scheduleId: string | undefined,
  ordinalOf: (legId: string) => number | undefined,
): string {
  if (scheduleId === undefined || scheduleId === 'on-time') return 'all legs on time'
  if (scheduleId === 'typical') return 'all legs at their typical delay'
  const ordinal = ordinalOf(scheduleId.slice('worst:'.length))
  return ordinal === undefined ? 'one leg at its worst delay' : `leg ${ordinal} at its worst delay`
}

/** "Heat-prone decides.", "Cold effort 42 %. Cold-prone decides." The body margin stands beside it, in the reader's unit. */
export function trackWords(finding: Finding | undefined): string {
  if (finding === undefined) return ''
  const { limitKind, variant } = finding
  const effort =
    limitKind === 'alarm' || limitKind === 'critical' || valueWords(finding) === ''
      ? ''
      : `${capital(limitWords(finding))} ${valueWords(finding)}.`
  const track = variant === undefined ? '' : `${capital(variant)} decides.`
  return [effort, track].filter(Boolean).join(' ')
}

export function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1)
}

/** The finding with least room among those that have a margin; a law or a judgement has none. */
export function narrowest(findings: readonly Finding[]): Finding | undefined {
  const room = ({ marginOutsideAirC = 99, marginMin = 999 }: Finding) => marginOutsideAirC * 1000 + marginMin
  return findings
    .filter(({ marginMin }) => marginMin !== undefined)
    .reduce<Finding | undefined>(
      (best, one) => (best === undefined || room(one) < room(best) ? one : best),
      undefined,
    )
}
