import { airTemp, dayDate, localTime } from '../format'
import { airPart } from './air'
import type { AirInput } from './air'
import { words } from './marks'
import type { Picture } from './marks'
import { ruledZones, ruler, zoneAt } from './ruler'
import type { RulerInput } from './ruler'
import { extreme, stretchOf, valueAt } from './series'

export interface AirPictureInput extends AirInput, RulerInput {
  endMin: number
}

/** Rulers, crate air and logger strip, without a body track. */
export function airPicture(
  input: AirPictureInput,
  { width, size = 12 }: { width: number; size?: number },
): Picture {
  const left = size > 12 ? 50 : 72
  const time = { fromMin: 0, toMin: input.endMin, x0: left, x1: width - 12 }
  const zones = ruledZones(input.zones)
  const top = 22 + (zones.length - 1) * 24 + 12
  const air = airPart(time, input, top, { size, axisX: left - 9 })
  return {
    width,
    height: air.strip.y + air.strip.height + 4,
    marks: [
      ...zones.flatMap((zone, index) => ruler(time, zone, input, { y: 22 + index * 24, nameX: 0, size })),
      ...air.marks,
      words(left - 10, air.strip.y + 18, input.unit === 'c' ? '°C' : '°F', {
        size,
        ink: 'mute',
        anchor: 'end',
      }),
    ],
  }
}

/** The same figures by the hour, and one sentence with the extremes. */
export function airTable(input: AirPictureInput): {
  summary: string
  rows: { key: string; time: string; crate: string; outside: string }[]
} {
  const { crateAir, outsideAir, unit } = input
  if (!crateAir) return { summary: 'No crate air is known.', rows: [] }
  const all = stretchOf(crateAir.minutes, crateAir.tempC, 0, input.endMin)
  const least = extreme(all, -1)?.value ?? 0
  const most = extreme(all, 1)?.value ?? 0
  const rows = Array.from({ length: Math.ceil(input.endMin / 60) }, (_, hour) => {
    const from = hour * 60
    const to = Math.min(input.endMin, from + 60)
    const worst = extreme(
      stretchOf(crateAir.minutes, crateAir.tempC, from, to),
      input.extreme === 'hottest' ? 1 : -1,
    )
    const zone = zoneAt(input.zones, from)
    const ms = input.departureMs + from * 60_000
    return {
      key: String(from),
      time: `${dayDate(ms, zone)} ${localTime(ms, zone)}`,
      crate: worst ? airTemp(worst.value, unit) : '',
      outside: outsideAir ? airTemp(valueAt(outsideAir.minutes, outsideAir.tempC, from), unit) : '',
    }
  })
  return {
    summary: `Crate air between ${airTemp(least, unit)} and ${airTemp(most, unit)} over the journey.`,
    rows,
  }
}
