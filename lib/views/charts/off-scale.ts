import { bodyTemp, clock, zoneName } from '../format'
import { offScale } from './body-frame'
import { xAt } from './frame'
import type { TempFrame, TimeFrame } from './frame'
import { label } from './labels'
import type { Placed } from './labels'
import { zoneAt } from './ruler'
import type { CorridorInput } from './types'

/** "to 48.3 °C at 11:01 GST" at the edge where the deciding track has left the picture. */
export function offScaleLabels(time: TimeFrame, temp: TempFrame, input: CorridorInput, size = 12): Placed {
  const made = offScale(time, temp, input.deciding).map(({ sample, side }) => {
    const zone = zoneAt(input.zones, sample.minute)
    const ms = input.departureMs + sample.minute * 60_000
    const y = side === 'high' ? temp.top + 4 : temp.foot - size - 12
    const text = `at ${clock(ms, zone)} ${zoneName(ms, zone)}`
    const { box } = label(0, y, `to ${bodyTemp(sample.value, input.unit)}`, text, size)
    const x = Math.max(
      time.x0 + 4,
      Math.min(time.x1 - box.width - 4, xAt(time, sample.minute) - box.width / 2),
    )
    return label(x, y, `to ${bodyTemp(sample.value, input.unit)}`, text, size)
  })
  return { marks: made.flatMap((each) => each.marks), taken: made.map((each) => each.box) }
}
