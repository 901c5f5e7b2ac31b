import { Temperature } from '@/components/ui/temperature'
import { VerdictCell } from '@/components/ui/verdict-cell'
import type { Verdict } from '@/lib/rules/result'
import { minutesToSpare } from '@/lib/views/format'
import type { LegCell, Margin } from '@/lib/views/sheet'

/** Minutes to spare, or what stands for them where no limit is met at all. */
export function minutesWords(margin: Margin): string {
  return margin.minutes === null ? 'none' : minutesToSpare(margin.minutes)
}

/** One animal on one leg: frame with minutes, outside air beside it; under it the limit that decides and body °C. */
export function LegCellFigures({ cell, outOfDate = false }: { cell: LegCell; outOfDate?: boolean }) {
  const { verdict, margin } = cell
  if (verdict === null) return <span className="text-mute">not aboard</span>
  return (
    <span className="block">
      <span className="flex items-center gap-x-2 whitespace-nowrap">
        <VerdictCell verdict={verdict} outOfDate={outOfDate} wide>
          {minutesWords(margin)}
        </VerdictCell>
        {margin.outsideAirC !== null && (
          <b className="fig text-small">
            <Temperature c={margin.outsideAirC} kind="air-margin" />
          </b>
        )}
      </span>
      <span className="block text-small">
        <b>{cell.limitWords}</b>
        {cell.overridden && ', overridden'}
        {margin.bodyC !== null && (
          <>
            , body <Temperature c={margin.bodyC} kind="body-margin" />
          </>
        )}
        {cell.decidedWords && <span className="block">{cell.decidedWords} decides</span>}
      </span>
    </span>
  )
}

/** The narrowest margin in a line: "−16 min, air −9 °C". */
export function MarginLine({ margin, body = false }: { margin: Margin; body?: boolean }) {
  return (
    <>
      {margin.minutes !== null && <span className="whitespace-nowrap">{minutesToSpare(margin.minutes)}</span>}
      {margin.outsideAirC !== null && (
        <>
          {margin.minutes !== null && ', '}air <Temperature c={margin.outsideAirC} kind="air-margin" />
        </>
      )}
      {body && margin.bodyC !== null && (
        <>
          , body <Temperature c={margin.bodyC} kind="body-margin" />
        </>
      )}
    </>
  )
}

/** What a verdict that stands by itself must say beside it: who may change it. */
export function whoMayOverride(verdict: Verdict | 'none', margin: Margin): string {
  if (verdict !== 'no-go') return ''
  if (margin.limitKind === 'critical') return 'Critical limit: nobody can override it.'
  return margin.limitKind === 'alarm' ? 'Alarm limit: a vet may override it by name.' : ''
}
