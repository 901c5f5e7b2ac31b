import { airTemp, bodyMargin, bodyTemp, dayDate, localTime } from '../format'
import { marginAt } from './channel'
import { legIndexAt } from './reading'
import { zoneAt } from './ruler'
import { extreme, stretchOf, valueAt } from './series'
import type { CorridorInput } from './types'

export interface CorridorTableRow {
  key: string
  time: string
  leg: string
  typical: string
  deciding: string
  toAlarm: string
  crateAir: string
}

/**
 * The same figures as the picture: every full hour, every change of leg, and the moment of least room on each leg. Body
 * in °C or °F as the session asks.
 */
export function corridorTable(input: CorridorInput): CorridorTableRow[] {
  const minutes = new Set<number>([0, input.endMin])
  for (let minute = 60; minute < input.endMin; minute += 60) minutes.add(minute)
  for (const leg of input.legs) minutes.add(leg.startMin)
  for (const minute of narrowest(input)) minutes.add(minute)
  return [...minutes].sort((a, b) => a - b).map((minute) => row(input, minute))
}

function row(input: CorridorInput, minute: number): CorridorTableRow {
  const index = legIndexAt(input, minute)
  const leg = input.legs[index]
  const limits = input.limits[index]
  const zone = zoneAt(input.zones, minute)
  const ms = input.departureMs + minute * 60_000
  const room = limits && input.deciding ? marginAt(input.deciding, limits, minute) : null
  return {
    key: String(minute),
    time: `${dayDate(ms, zone)} ${localTime(ms, zone)}`,
    leg: leg ? `${leg.ordinal} ${leg.name}` : '',
    typical: input.typical
      ? bodyTemp(valueAt(input.typical.minutes, input.typical.bodyC, minute), input.unit)
      : '',
    deciding: input.deciding
      ? bodyTemp(valueAt(input.deciding.minutes, input.deciding.bodyC, minute), input.unit)
      : '',
    toAlarm: room ? `${bodyMargin(room.marginC, input.unit)}, ${room.side}` : '',
    crateAir: input.crateAir
      ? airTemp(valueAt(input.crateAir.minutes, input.crateAir.tempC, minute), input.unit)
      : '',
  }
}

function narrowest(input: CorridorInput): number[] {
  const { deciding } = input
  if (!deciding) return []
  return input.legs.flatMap((leg, index) => {
    const limits = input.limits[index]
    if (!limits) return []
    const rooms = stretchOf(deciding.minutes, deciding.bodyC, leg.startMin, leg.endMin).map(
      ({ minute, value }) => ({
        minute,
        value: Math.min(limits.alarmHighC - value, value - limits.alarmLowC),
      }),
    )
    const least = extreme(rooms, -1)
    return least ? [Math.round(least.minute)] : []
  })
}
