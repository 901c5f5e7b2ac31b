'use client'

import { JourneyStrip } from '@/components/charts/journey-strip'
import { useWidth } from '@/components/hooks/use-width'
import { clock } from '@/lib/views/format'
import type { PortalLeg, PortalView } from '@/lib/views/portal'

const HEIGHT = 36
const ROOM_FOR_AN_HOUR = 64
const STEPS_H = [1, 2, 3, 4, 6, 12, 24]

/** The journey as a bar in true time, with the hours of the place it leaves from above it. */
export function Strip({ legs, leaves }: { legs: readonly PortalLeg[]; leaves: PortalView['leaves'] }) {
  const [box, measured] = useWidth<HTMLDivElement>()
  const width = measured ?? 340
  const endMin = legs.at(-1)?.endMin ?? 60
  return (
    <div ref={box}>
      <div className="relative h-5" aria-hidden="true">
        {hours(leaves, endMin, width).map(({ minute, words }) => (
          <span
            key={minute}
            className="fig absolute -translate-x-1/2 text-caption"
            style={{ left: `${(minute / endMin) * 100}%` }}
          >
            {words}
          </span>
        ))}
      </div>
      <JourneyStrip
        legs={legs.map(({ words, ...leg }) => ({ ...leg, name: words }))}
        summary={`The journey: ${legs.map((leg) => `${leg.ordinal} ${leg.words}`).join(', ')}.`}
        width={width}
        height={HEIGHT}
        named
      />
    </div>
  )
}

/** Whole hours with room between them, none at the very edge. */
function hours(
  { ms, zone }: PortalView['leaves'],
  endMin: number,
  width: number,
): { minute: number; words: string }[] {
  const most = Math.max(1, Math.floor(width / ROOM_FOR_AN_HOUR))
  const stepH = STEPS_H.find((step) => endMin / 60 / step <= most) ?? 24
  const first = clock(ms, zone)
  const intoDay = Number(first.slice(0, 2)) * 60 + Number(first.slice(3))
  const toFirst = stepH * 60 - (intoDay % (stepH * 60))
  const edge = (endMin * 18) / width
  const marks: { minute: number; words: string }[] = []
  for (let minute = toFirst % (stepH * 60); minute < endMin - edge; minute += stepH * 60) {
    if (minute >= edge) marks.push({ minute, words: clock(ms + minute * 60_000, zone) })
  }
  return marks
}
