'use client'

import { useEffect, useRef, useState } from 'react'
import { Marks } from '@/components/charts/marks'
import { zoneOffsetMin } from '@/lib/planning/local-time'
import { hatch } from '@/lib/views/charts/hatch'
import { clock, dayDate, hourMin, zoneName } from '@/lib/views/format'
import { PATTERN_OF_KIND } from '@/components/charts/pattern-of-kind'
import { legName } from './option-words'
import { usePlanLegs } from './plan-timeline'
import { figuresUnder, rulerLayout, rulerTicks } from './ruler-layout'
import type { RulerLayout } from './ruler-layout'

const BAR = { top: 46, height: 40 }
/** Rows of words under the bar: numbers of legs too narrow to hold theirs, then gaps. */
const NUMBERS_Y = BAR.top + BAR.height + 14
const GAPS_Y = BAR.top + BAR.height + 30
/** Least room for the figure of a leg inside its bar, and between two figures under it. */
const FIGURE_PX = 22

/** All legs on one true time scale, on the clocks of both ends of the journey; time that belongs to no leg stands open. */
export function LegsRuler({ chosen, onChoose }: { chosen: number; onChoose: (index: number) => void }) {
  const { legs, timeline } = usePlanLegs()
  const frame = useRef<HTMLDivElement>(null)
  const width = useWidth(frame)
  const zones = [...new Set([timeline.departureZone, timeline.arrivalZone])].filter((zone) => zone !== null)
  const departureMs = timeline.departureMs ?? 0
  const longest = Math.max(0, ...zones.map((zone) => zoneName(departureMs, zone).length))
  // Room for the zone's name and half the figures of a tick that stands at the very start.
  const left = longest * 8 + 30
  const inner = width - left - 8
  const layout = width > 0 ? rulerLayout(timeline.legs, inner) : null
  return (
    <div ref={frame} className="mb-1 max-desk:hidden">
      {layout !== null && (
        <svg width={width} height={122} role="img" aria-label={summary(legs.length, layout)}>
          {zones.map((zone, row) => (
            <ZoneRuler
              key={zone}
              layout={layout}
              zone={zone}
              y={14 + row * 18}
              left={left}
              inner={inner}
              first={row === 0}
            />
          ))}
          <g transform={`translate(${left} 0)`}>
            {layout.legs.map(({ index, fromPx, toPx }) => {
              const leg = legs[index]
              if (leg === undefined) return null
              const box = { x: fromPx, y: BAR.top, width: toPx - fromPx, height: BAR.height }
              return (
                <g key={leg.id} onClick={() => onChoose(index)} className="cursor-pointer">
                  <rect {...box} className={index === chosen ? 'fill-handwash' : 'fill-band'} />
                  <Marks marks={[hatch(PATTERN_OF_KIND[leg.kind], box)]} />
                  <rect
                    {...box}
                    strokeWidth={index === chosen ? 2.5 : 1.25}
                    className={index === chosen ? 'fill-none stroke-hand' : 'fill-none stroke-ink'}
                  />
                  <LegLabel box={box} index={index} name={legName(leg)} />
                </g>
              )
            })}
            {figuresUnder(layout.legs, FIGURE_PX).map(({ index, atPx, legPx }) => (
              <g key={index} onClick={() => onChoose(index)} className="cursor-pointer">
                <line
                  x1={legPx}
                  x2={atPx}
                  y1={BAR.top + BAR.height}
                  y2={NUMBERS_Y - 10}
                  strokeWidth="1"
                  className="stroke-rule"
                />
                <text
                  x={atPx}
                  y={NUMBERS_Y}
                  textAnchor="middle"
                  fontSize="14"
                  fontWeight="700"
                  style={{ fontFamily: 'var(--f-head)' }}
                >
                  {index + 1}
                </text>
              </g>
            ))}
            {layout.gaps.map((gap) => (
              <g key={gap.after}>
                <rect
                  x={gap.fromPx}
                  y={BAR.top - 3}
                  width={Math.max(3, gap.toPx - gap.fromPx)}
                  height={BAR.height + 6}
                  strokeWidth="2"
                  className="fill-sheet stroke-ink"
                />
                <text
                  x={(gap.fromPx + gap.toPx) / 2}
                  y={GAPS_Y}
                  textAnchor="middle"
                  fontSize="12"
                  fontWeight="600"
                >
                  {hourMin(gap.minutes)} {gap.overlap ? 'in two legs' : 'in no leg'}
                </text>
              </g>
            ))}
          </g>
        </svg>
      )}
      {layout !== null && layout.untimed.length > 0 && (
        <p className="text-small text-mute">
          Not on the ruler, because a time or a place is missing: leg{' '}
          {layout.untimed.map((index) => index + 1).join(', ')}.
        </p>
      )}
    </div>
  )
}

interface Bar {
  x: number
  y: number
  width: number
  height: number
}

/** Number and name on a label pasted on the hatching, as much as fits. */
function LegLabel({ box, index, name }: { box: Bar; index: number; name: string }) {
  const short = String(index + 1)
  const room = Math.floor((box.width - 22) / 7.2)
  const words = room >= name.length ? name : ''
  const width = words === '' ? 8 + short.length * 9 : 22 + name.length * 6.8
  if (box.width < FIGURE_PX) return null
  const x = words === '' ? box.x + (box.width - width) / 2 : box.x + 6
  return (
    <>
      <rect x={x} y={box.y + 11} width={width} height={18} className="fill-sheet" />
      <text x={x + 4} y={box.y + 25} fontSize="14" fontWeight="700" style={{ fontFamily: 'var(--f-head)' }}>
        {short}
      </text>
      {words !== '' && (
        <text x={x + 17} y={box.y + 25} fontSize="12">
          {words}
        </text>
      )}
    </>
  )
}

function ZoneRuler({
  layout,
  zone,
  y,
  left,
  inner,
  first,
}: {
  layout: RulerLayout
  zone: string
  y: number
  left: number
  inner: number
  first: boolean
}) {
  const ticks = rulerTicks(layout, inner, zoneOffsetMin(layout.startMs, zone))
  return (
    <g className={first ? '' : 'opacity-90'}>
      <text x={0} y={y} fontSize="12" fontWeight={first ? 600 : 400}>
        {zoneName(layout.startMs, zone)}
      </text>
      <line x1={left} x2={left + inner} y1={y + 5} y2={y + 5} strokeWidth="1" className="stroke-rule" />
      {ticks.map((ms) => {
        const words = clock(ms, zone)
        const x = left + layout.at(ms)
        return (
          <g key={ms}>
            <line x1={x} x2={x} y1={y + 2} y2={y + 8} strokeWidth="1" className="stroke-ink" />
            <text
              x={Math.min(x, left + inner - 16)}
              y={y}
              textAnchor="middle"
              fontSize="12"
              fontWeight={first ? 600 : 400}
              className={first ? '' : '!fill-mute'}
              style={{ fontFamily: words === '00:00' ? undefined : 'var(--f-fig)' }}
            >
              {words === '00:00' ? dayDate(ms, zone) : words}
            </text>
          </g>
        )
      })}
    </g>
  )
}

function summary(many: number, layout: RulerLayout): string {
  const gaps = layout.gaps.length
  const hours = hourMin((layout.endMs - layout.startMs) / 60_000)
  return `${many} legs over ${hours} hours and minutes on one time scale${gaps > 0 ? `, with ${gaps} places where they do not join` : ''}.`
}

function useWidth(frame: React.RefObject<HTMLElement | null>): number {
  const [width, setWidth] = useState(0)
  useEffect(() => {
    const element = frame.current
    if (element === null) return
    const watch = new ResizeObserver(([entry]) => setWidth(Math.floor(entry?.contentRect.width ?? 0)))
    watch.observe(element)
    return () => watch.disconnect()
  }, [frame])
  return width
}
