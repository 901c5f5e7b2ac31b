'use client'

import { useMemo } from 'react'
import { useReadingKeys } from '@/components/hooks/use-reading-line'
import { Button } from '@/components/ui/button'
import { join } from '@/components/ui/join'
import { xAt } from '@/lib/views/charts/frame'
import { legCorridor } from '@/lib/views/charts/leg-corridor'
import { legIndexAt, readingAt } from '@/lib/views/charts/reading'
import { corridorSummary } from '@/lib/views/charts/summary'
import type { CorridorInput } from '@/lib/views/charts/types'
import { LegStepper } from './leg-stepper'
import { PictureSvg } from './picture'
import { ReadingLine } from './reading-line'

/** One leg at a time over a phone's width; the stepper above chooses it, two buttons move the reading line. */
export function CorridorNarrow({
  input,
  width,
  minute,
  narrowestMin,
  onMinute,
}: {
  input: CorridorInput
  width: number
  minute: number
  narrowestMin: number
  onMinute: (minute: number) => void
}) {
  const leg = input.legs[legIndexAt(input, minute)]
  const legId = leg?.legId ?? ''
  const picture = useMemo(() => legCorridor(input, legId, { width }), [input, legId, width])
  const onKeyDown = useReadingKeys(input, minute, narrowestMin, onMinute)
  if (!picture || !leg) return null
  const reading = readingAt(input, minute, picture.temp, picture.air.temp)
  const { strip } = picture.air
  const move = (by: number) => onMinute(Math.min(input.endMin, Math.max(0, minute + by)))
  return (
    <>
      <LegStepper
        legs={input.legs}
        chosenLegId={legId}
        onChoose={(chosen) => {
          const next = input.legs.find((each) => each.legId === chosen)
          if (next) onMinute(Math.round((next.startMin + next.endMin) / 2))
        }}
      />
      <h3 className="mt-2 text-sub">
        {leg.ordinal} {leg.name}
      </h3>
      <div className="relative" style={{ width, height: picture.height }}>
        <PictureSvg picture={picture} summary={corridorSummary(input)} />
        <ReadingLine
          x={xAt(picture.time, minute)}
          top={24}
          foot={strip.y + strip.height + 4}
          endMin={input.endMin}
          spoken={reading.spoken}
          {...{ minute, onKeyDown }}
        />
      </div>
      <div className="grid grid-cols-2 gap-2.5 py-2.5 no-print">
        <Button size="phone" onClick={() => move(-5)}>
          5 min earlier
        </Button>
        <Button size="phone" onClick={() => move(5)}>
          5 min later
        </Button>
      </div>
      <dl className="m-0">
        <ReadingPair name="Reading line" value={reading.times[0] ?? ''} strong hand />
        {[...reading.body, ...reading.air]
          .filter((row) => !/^(Critical|Alarm)/.test(row.name))
          .map((row) => (
            <ReadingPair key={row.name} name={row.name} value={row.value} strong={row.strong} />
          ))}
      </dl>
    </>
  )
}

function ReadingPair({
  name,
  value,
  strong,
  hand = false,
}: {
  name: string
  value: string
  strong: boolean
  hand?: boolean
}) {
  return (
    <div
      className={join(
        'flex justify-between gap-4 border-t border-hair py-1.5 first:border-t-0',
        strong && 'font-semibold',
        hand && 'text-hand',
      )}
    >
      <dt>{name}</dt>
      <dd className="fig m-0 font-semibold">{value}</dd>
    </div>
  )
}
