'use client'

import { useMemo, useRef } from 'react'
import type { PointerEvent } from 'react'
import { useReadingKeys } from '@/components/hooks/use-reading-line'
import { join } from '@/components/ui/join'
import { corridor } from '@/lib/views/charts/corridor'
import type { CorridorPicture } from '@/lib/views/charts/corridor'
import { minuteAt, xAt } from '@/lib/views/charts/frame'
import type { TimeFrame } from '@/lib/views/charts/frame'
import { legIndexAt, readingAt } from '@/lib/views/charts/reading'
import type { Reading } from '@/lib/views/charts/reading'
import { corridorSummary } from '@/lib/views/charts/summary'
import type { CorridorInput } from '@/lib/views/charts/types'
import { PictureSvg } from './picture'
import { LineFoot, ReadingLine } from './reading-line'

/** The whole journey in true time, the chosen short leg magnified below, one reading line through all of it. */
export function CorridorWide({
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
  const chosenLegId = input.legs[legIndexAt(input, minute)]?.legId ?? null
  const picture = useMemo(() => corridor(input, { width, chosenLegId }), [input, width, chosenLegId])
  const reading = readingAt(input, minute, picture.temp, picture.air.temp)
  const onKeyDown = useReadingKeys(input, minute, narrowestMin, onMinute)
  const { stretch, air, channelBox } = picture
  const x = xAt(picture.time, minute)
  const foot = air.strip.y + air.strip.height + 6
  const inStretch = stretch !== null && minute >= stretch.time.fromMin && minute <= stretch.time.toMin
  const hold = useHold(onMinute)
  return (
    <div className="relative print:!h-auto print:!w-full" style={{ width, height: picture.height }}>
      <PictureSvg picture={picture} summary={corridorSummary(input)} />
      <div className="absolute inset-0 no-print">
        <Grip frame={picture.time} top={channelBox.y} foot={foot} hold={hold} />
        <HeadButtons picture={picture} input={input} chosenLegId={chosenLegId} onMinute={onMinute} />
        <ReadingLine
          {...{ x, minute, onKeyDown, foot }}
          top={channelBox.y}
          endMin={input.endMin}
          spoken={reading.spoken}
          grip={!inStretch}
          ticks={[(picture.rulerYs.at(-1) ?? 22) + 3]}
        />
        {stretch && (
          <>
            <Grip frame={stretch.time} top={stretch.channelBox.y} foot={stretch.foot} hold={hold} />
            {inStretch && (
              <span
                aria-hidden="true"
                className="pointer-events-none absolute w-6"
                style={{
                  left: xAt(stretch.time, minute) - 12,
                  top: stretch.channelBox.y - 14,
                  height: stretch.channelBox.height + 18,
                }}
              >
                <span className="absolute inset-y-0 left-[11px] w-0.5 bg-hand" />
                <LineFoot />
              </span>
            )}
          </>
        )}
        <ReadingColumn picture={picture} reading={reading} />
      </div>
    </div>
  )
}

/** Values under the reading line, at the right, pushed apart so that none stands on another. */
function ReadingColumn({ picture, reading }: { picture: CorridorPicture; reading: Reading }) {
  const left = picture.time.x1 + 14
  const width = picture.width - left - 2
  return (
    <div aria-hidden="true">
      <div className="absolute text-caption" style={{ left, top: picture.heads.top, width }}>
        <p className="font-semibold text-hand">Reading line</p>
        {reading.times.map((time, index) => (
          <p key={time} className={join('fig', index > 0 && 'text-mute')}>
            {time}
          </p>
        ))}
      </div>
      {[...reading.body, ...reading.air].map((row) => (
        <p
          key={row.name}
          className={join('absolute flex justify-between text-caption', row.strong && 'font-semibold')}
          style={{ left, top: row.y - 8, width }}
        >
          <span>{row.name}</span>
          <span className="text-small">{row.value}</span>
        </p>
      ))}
    </div>
  )
}

/** A head chooses its leg: the line goes to the leg's narrowest minute would hide its start, so it goes to its middle. */
function HeadButtons({
  picture,
  input,
  chosenLegId,
  onMinute,
}: {
  picture: CorridorPicture
  input: CorridorInput
  chosenLegId: string | null
  onMinute: (minute: number) => void
}) {
  return picture.heads.heads.map((head) => {
    const leg = input.legs.find((each) => each.legId === head.legId)
    if (!leg) return null
    return (
      <button
        key={head.legId}
        type="button"
        aria-pressed={head.legId === chosenLegId}
        aria-label={`Leg ${leg.ordinal}, ${leg.name}`}
        onClick={() => onMinute(Math.round((leg.startMin + leg.endMin) / 2))}
        className="absolute cursor-pointer hover:outline-1 hover:-outline-offset-2 hover:outline-hand"
        style={{ left: head.x, top: head.y, width: head.width, height: head.height }}
      />
    )
  })
}

interface Hold {
  down: (event: PointerEvent<HTMLDivElement>, frame: TimeFrame) => void
  move: (event: PointerEvent<HTMLDivElement>, frame: TimeFrame) => void
}

/** Where the line can be put by pointing; dragging is never the only way. */
function Grip({ frame, top, foot, hold }: { frame: TimeFrame; top: number; foot: number; hold: Hold }) {
  return (
    <div
      aria-hidden="true"
      className="absolute cursor-crosshair touch-pan-y"
      style={{ left: frame.x0, top, width: frame.x1 - frame.x0, height: foot - top }}
      onPointerDown={(event) => hold.down(event, frame)}
      onPointerMove={(event) => hold.move(event, frame)}
    />
  )
}

function useHold(onMinute: (minute: number) => void): Hold {
  const held = useRef(false)
  const put = (event: PointerEvent<HTMLDivElement>, frame: TimeFrame) => {
    const box = event.currentTarget.getBoundingClientRect()
    onMinute(Math.round(minuteAt(frame, frame.x0 + event.clientX - box.left)))
  }
  return {
    down: (event, frame) => {
      held.current = true
      event.currentTarget.setPointerCapture(event.pointerId)
      put(event, frame)
    },
    move: (event, frame) => {
      if (event.buttons === 0) held.current = false
      if (held.current) put(event, frame)
    },
  }
}
