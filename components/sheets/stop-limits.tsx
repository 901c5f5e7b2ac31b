import type { AirStop, StopLimitView } from '@/lib/views/sheet'
import { overriddenLimitWords } from '@/lib/views/sheet-view/stops'
import { Mark } from '@/components/ui/mark'

/** Air at which a crate is stopped for and the desk is rung, above first. The strictest of the legs it can meet. */
export function StopLimits({
  limits,
  telephone,
  hours,
}: {
  limits: readonly StopLimitView[]
  telephone: string
  hours: string
}) {
  return (
    <div className="border-4 border-ink bg-sheet">
      <div className="flex flex-wrap items-baseline gap-x-4 border-b border-rule px-3 py-1.5">
        <h3 className="text-sub">Stop and ring the desk if the air at a crate is</h3>
        <p className="text-small">
          {telephone}
          {hours && `, ${hours}`}. Strictest of any leg, read at the slats
        </p>
      </div>
      <div className="grid grid-cols-2 overflow-hidden desk:grid-cols-[repeat(auto-fit,minmax(11rem,1fr))]">
        {limits.map((limit) => (
          <div key={limit.crateId} className="-ml-px -mt-px border-l border-t border-rule px-3 py-1.5">
            <Mark>{limit.crateMark}</Mark>
            <StopFigure words="above" c={limit.strictest.aboveC} f={limit.strictest.aboveF} />
            <StopFigure words="below" c={limit.strictest.belowC} f={limit.strictest.belowF} />
            <OtherLegs limit={limit} />
            <p className="text-small text-mute empty:hidden">{overriddenLimitWords(limit)}</p>
          </div>
        ))}
      </div>
    </div>
  )
}

function StopFigure({ words, c, f }: { words: string; c: number | null; f: number | null }) {
  return (
    <p>
      <span className="block text-small">{words}</span>
      {c === null ? (
        <b>none within reach</b>
      ) : (
        <>
          <b className="fig text-page">{stopWords(c)}&nbsp;°C</b>{' '}
          {f !== null && <span className="fig">{stopWords(f)}&nbsp;°F</span>}
        </>
      )}
    </p>
  )
}

/** Legs with a limit of their own, because their planned air already lies outside the strictest one. */
function OtherLegs({ limit: { byLeg, strictest } }: { limit: StopLimitView }) {
  const other = byLeg.filter((leg) => !leg.plannedInside && !sameStop(leg, strictest))
  const words = [...new Set(other.map(airWords))]
  return words.map((air) => (
    <p key={air} className="text-small text-mute">
      {legsWords(other.filter((leg) => airWords(leg) === air).map(({ ordinal }) => ordinal))}: {air}
    </p>
  ))
}

function legsWords(ordinals: readonly number[]): string {
  return `${ordinals.length === 1 ? 'Leg' : 'Legs'} ${ordinals.join(', ')}`
}

function sameStop(a: AirStop, b: AirStop): boolean {
  return a.aboveC === b.aboveC && a.belowC === b.belowC
}

function airWords({ aboveC, belowC }: AirStop): string {
  const above = aboveC === null ? '' : `above ${stopWords(aboveC)}\u00a0°C`
  const below = belowC === null ? '' : `below ${stopWords(belowC)}\u00a0°C`
  return [above, below].filter(Boolean).join(', ') || 'none within reach'
}

function stopWords(value: number): string {
  return String(value).replace('-', '−')
}
