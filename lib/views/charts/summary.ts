import { bodyTemp, limitTemp, localTime } from '../format'
import { excursions } from './channel'
import { zoneAt } from './ruler'
import { extreme, stretchOf } from './series'
import type { CorridorInput } from './types'

/** One sentence for who can't see the picture: whose corridor, how far, and where it comes nearest or passes. */
export function corridorSummary(input: CorridorInput): string {
  const whose = `Corridor of ${input.animalName} over ${input.legs.length} ${input.legs.length === 1 ? 'leg' : 'legs'}`
  const { deciding } = input
  if (!deciding) return `${whose}: no track was drawn.`
  for (const [name, keyHigh, keyLow] of [
    ['critical', 'criticalHighC', 'criticalLowC'],
    ['alarm', 'alarmHighC', 'alarmLowC'],
  ] as const) {
    for (const [index, leg] of input.legs.entries()) {
      const limits = input.limits[index]
      if (!limits) continue
      const samples = stretchOf(deciding.minutes, deciding.bodyC, leg.startMin, leg.endMin)
      const high = excursions(samples, limits[keyHigh], 1)[0]?.[0]
      const low = excursions(samples, limits[keyLow], -1)[0]?.[0]
      const past = high ?? low
      if (!past) continue
      const side = high ? 'high' : 'low'
      const limit = limitTemp(high ? limits[keyHigh] : limits[keyLow], side, input.unit)
      return `${whose}: the track passes the ${name} limit ${side} of ${limit} on leg ${leg.ordinal} from ${timeAt(input, past.minute)}.`
    }
  }
  return `${whose}: the track stays inside its limits, between ${range(input)}.`
}

function range(input: CorridorInput): string {
  const { deciding } = input
  if (!deciding) return ''
  const samples = stretchOf(deciding.minutes, deciding.bodyC, 0, input.endMin)
  const least = extreme(samples, -1)
  const most = extreme(samples, 1)
  if (!least || !most) return 'unknown figures'
  return `${bodyTemp(least.value, input.unit)} at ${timeAt(input, least.minute)} and ${bodyTemp(most.value, input.unit)} at ${timeAt(input, most.minute)}`
}

function timeAt(input: CorridorInput, minute: number): string {
  return localTime(input.departureMs + minute * 60_000, zoneAt(input.zones, minute))
}
