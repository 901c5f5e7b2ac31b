'use client'

import { Button } from '@/components/ui/button'
import { useUnit } from '@/components/ui/preferences'
import { Stamp } from '@/components/ui/stamp'
import { Temperature } from '@/components/ui/temperature'
import { airMargin, dayDate, hourMin, localTime, minutesToSpare, zoneWithOffset } from '@/lib/views/format'
import type { LegCell, LegView, SheetView } from '@/lib/views/sheet'

/** On a phone: the leg under the reading line, its verdict, and the two figures large; then the way to its neighbours. */
export function PhoneLeg({
  leg,
  cell,
  view,
  startOf,
  onMinute,
}: {
  leg: LegView
  cell: LegCell | undefined
  view: SheetView
  startOf: (index: number) => number | undefined
  onMinute: (minute: number) => void
}) {
  const unit = useUnit()
  const index = leg.ordinal - 1
  const step = (to: number) => {
    const minute = startOf(to)
    const other = view.legs[to]
    if (minute === undefined || other === undefined) return null
    return (
      <Button size="phone" onClick={() => onMinute(minute + 1)}>
        Leg {other.ordinal}, {other.title.split(',')[0]?.toLowerCase()}
      </Button>
    )
  }
  return (
    <section aria-label={`Leg ${leg.ordinal}`} className="mb-4 desk:hidden">
      <h2 className="text-page">
        {leg.ordinal} {leg.title}
      </h2>
      <p>
        {dayDate(leg.start.ms, leg.start.zone)}, {localTime(leg.start.ms, leg.start.zone)} to{' '}
        {localTime(leg.end.ms, leg.end.zone)}, {zoneWithOffset(leg.end.ms, leg.end.zone)},{' '}
        {hourMin(leg.durationMin)}
      </p>
      {cell && cell.verdict !== null && (
        <>
          <div className="my-3 flex flex-wrap items-center gap-3.5">
            <Stamp verdict={cell.verdict} outOfDate={view.stamp.outOfDate} size="phone" />
            <DecidedBy cell={cell} />
          </div>
          <div className="-mx-4 grid grid-cols-2 divide-x divide-rule border-y-2 border-ink bg-sheet">
            <Large
              words="Minutes to spare"
              figure={cell.margin.minutes === null ? 'none' : minutesToSpare(cell.margin.minutes)}
            />
            <Large
              words="Outside air to spare"
              figure={cell.margin.outsideAirC === null ? 'none' : airMargin(cell.margin.outsideAirC, unit)}
            />
          </div>
          {cell.margin.bodyC !== null && (
            <p className="-mx-4 border-b border-rule bg-sheet px-4 py-2">
              <b className="fig">
                <Temperature c={cell.margin.bodyC} kind="body-margin" />
              </b>{' '}
              <span className="text-mute">body, at the delay that decides</span>
            </p>
          )}
        </>
      )}
      <div className="mt-3 grid grid-cols-2 gap-2.5">
        {step(index - 1) ?? <span />}
        {step(index + 1)}
      </div>
    </section>
  )
}

/** "Alarm decides."; where a law or a judgement does, to which limit the figures below are. */
function DecidedBy({ cell: { limitWords, decidedWords } }: { cell: LegCell }) {
  if (limitWords === '') return null
  return (
    <b>
      {capital(decidedWords || limitWords)} decides.
      {decidedWords && ` The figures are to ${limitWords}.`}
    </b>
  )
}

/** A figure at 44 px with its unit small beside it. */
function Large({ words, figure }: { words: string; figure: string }) {
  const [value, unit] = figure.split('\u00a0')
  return (
    <p className="min-w-0 px-4 py-2">
      <span className="block text-note text-mute">{words}</span>
      <span className="whitespace-nowrap">
        <span className="fig text-deadline font-semibold tracking-tight">{value}</span>
        {unit && <span className="ml-2 text-phone">{unit}</span>}
      </span>
    </p>
  )
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1)
}
