import { Marks } from '@/components/charts/marks'
import { toLocalTime, zoneOffsetMin } from '@/lib/planning/local-time'
import { swatch } from '@/lib/views/charts/hatch'
import { journeyStrip } from '@/lib/views/charts/journey-strip'
import type { StripLeg } from '@/lib/views/charts/journey-strip'
import type { BoardStrip, BoardView } from '@/lib/views/board'
import type { ConsignmentRow } from '@/lib/views/consignment-row'
import { clock, dayDate, duration, minutesToSpare, zoneName } from '@/lib/views/format'
import { PATTERN_OF_KIND } from '@/components/charts/pattern-of-kind'

const WIDTH = 272
const HOURS = 48
const STEP_H = 12
const HOUR_MS = 3_600_000

/**
 * The common axis of a page of the board: two days from midnight at the desk, today's or, where everything leaves later,
 * the day the first one leaves.
 */
function axisStart({ rows, readMs }: BoardView, zone: string): number {
  const soonest = Math.min(...rows.map(({ leaves }) => leaves?.ms ?? Infinity))
  const from = Number.isFinite(soonest) ? Math.max(readMs, soonest) : readMs
  const local = toLocalTime(from, zone)
  const wallMs = Date.parse(`${local.slice(0, 10)}T00:00:00Z`)
  return wallMs - zoneOffsetMin(from, zone) * 60_000
}

const xOf = (ms: number, startMs: number) => ((ms - startMs) / (HOURS * HOUR_MS)) * WIDTH

/** The axis itself, in the head of the column: days and hours at the desk, and now. */
export function BoardStripHead({ view, zone }: { view: BoardView; zone: string }) {
  const startMs = axisStart(view, zone)
  const now = xOf(view.readMs, startMs)
  const marks = Array.from({ length: HOURS / STEP_H + 1 }, (_, index) => startMs + index * STEP_H * HOUR_MS)
  return (
    <>
      <span className="sr-only">Journey, on one time axis</span>
      <svg width={WIDTH} height="44" aria-hidden="true" className="block overflow-visible">
        {[0, 24].map((hour) => (
          <text
            key={hour}
            x={xOf(startMs + hour * HOUR_MS, startMs) + 3}
            y="10"
            fontSize="12"
            fontWeight="600"
          >
            {dayDate(startMs + hour * HOUR_MS, zone)}
            {hour === 0 && `, ${zoneName(startMs, zone)}`}
          </text>
        ))}
        {marks.map((ms, index) => {
          const x = xOf(ms, startMs)
          return (
            <g key={ms}>
              <line x1={x} x2={x} y1={index % 2 === 0 ? 0 : 30} y2="44" className="stroke-rule" />
              {index < marks.length - 1 && (
                <text
                  x={x + 3}
                  y="26"
                  fontSize="12"
                  className="!fill-mute"
                  style={{ fontFamily: 'var(--f-fig)' }}
                >
                  {clock(ms, zone).slice(0, 2)}
                </text>
              )}
            </g>
          )
        })}
        {now >= 0 && now <= WIDTH && (
          <>
            <rect
              x={Math.min(Math.max(0, now - 36), WIDTH - 72)}
              y="30"
              width="72"
              height="16"
              strokeWidth="1.5"
              className="fill-sheet stroke-ink"
            />
            <text
              x={Math.min(Math.max(36, now), WIDTH - 36)}
              y="42"
              textAnchor="middle"
              fontSize="12"
              fontWeight="600"
            >
              now {clock(view.readMs, zone)}
            </text>
          </>
        )}
      </svg>
    </>
  )
}

/** One journey on that axis: legs in the pattern of their surroundings, the narrowest margin above, now dotted. */
export function BoardStripCell({
  row,
  legs,
  view,
  zone,
}: {
  row: ConsignmentRow
  legs: BoardStrip['legs']
  view: BoardView
  zone: string
}) {
  const startMs = axisStart(view, zone)
  const first = legs[0]
  const last = legs.at(-1)
  const off =
    first === undefined ? null : offTheAxis(first.startMs, last?.endMs ?? first.endMs, startMs, view.readMs)
  const strip = journeyStrip(stripLegs(legs, startMs), {
    width: WIDTH,
    height: 16,
    fromMin: 0,
    toMin: HOURS * 60,
    hatchScale: 0.85,
  })
  return (
    <svg width={WIDTH} height="46" aria-hidden="true" className="mx-2.5 block overflow-visible">
      {[0, 12, 24, 36, 48].map((hour) => {
        const x = xOf(startMs + hour * HOUR_MS, startMs)
        return <line key={hour} x1={x} x2={x} y1="-40" y2="90" className="stroke-hair" />
      })}
      {off === null ? (
        <g transform="translate(0 22)">
          <Marks marks={strip.marks} />
        </g>
      ) : (
        <text
          x={off.late ? WIDTH - 4 : 4}
          y="34"
          fontSize="12"
          textAnchor={off.late ? 'end' : 'start'}
          style={{ paintOrder: 'stroke', stroke: 'var(--sheet)', strokeWidth: 4 }}
        >
          {off.words}
        </text>
      )}
      {off === null && first && row.marginMin !== null && <Flag row={row} legs={legs} startMs={startMs} />}
      <Now x={xOf(view.readMs, startMs)} />
    </svg>
  )
}

/** Minutes to spare over the middle of the part that shows; which leg decides stands in the next column. */
function Flag({ row, legs, startMs }: { row: ConsignmentRow; legs: BoardStrip['legs']; startMs: number }) {
  const leg = legs[decidingLeg(row.deciding) - 1] ?? legs[0]
  if (leg === undefined || row.marginMin === null || row.outOfDate) return null
  const x = xOf((leg.startMs + leg.endMs) / 2, startMs)
  if (x < 0 || x > WIDTH) return null
  const words = minutesToSpare(row.marginMin)
  const width = words.length * 7.2 + 8
  const left = Math.min(Math.max(0, x - width / 2), WIDTH - width)
  const solid = row.verdict === 'no-go'
  return (
    <g>
      <line x1={x} x2={x} y1="17" y2="23" strokeWidth="1.5" className="stroke-ink" />
      <rect x={left} y="2" width={width} height="15" className={solid ? 'keep-ink fill-ink' : 'fill-sheet'} />
      <text
        x={left + width / 2}
        y="14"
        textAnchor="middle"
        fontSize="12"
        fontWeight={solid ? 600 : 400}
        style={{
          fontFamily: 'var(--f-fig)',
          wordSpacing: '-.28em',
          fill: solid ? 'var(--on-ink)' : undefined,
        }}
      >
        {words}
      </text>
    </g>
  )
}

function decidingLeg(deciding: string): number {
  return Number(/leg (\d+)/.exec(deciding)?.[1] ?? 1)
}

function Now({ x }: { x: number }) {
  if (x < 0 || x > WIDTH) return null
  return (
    <line x1={x} x2={x} y1="-40" y2="90" strokeWidth="1.5" strokeDasharray="2 2" className="stroke-ink" />
  )
}

function stripLegs(legs: BoardStrip['legs'], startMs: number): StripLeg[] {
  return legs.map((leg, index) => ({
    legId: String(index),
    ordinal: index + 1,
    name: '',
    pattern: PATTERN_OF_KIND[leg.kind],
    startMin: (leg.startMs - startMs) / 60_000,
    endMin: (leg.endMs - startMs) / 60_000,
  }))
}

function offTheAxis(
  leavesMs: number,
  arrivesMs: number,
  startMs: number,
  nowMs: number,
): { words: string; late: boolean } | null {
  if (leavesMs >= startMs + HOURS * HOUR_MS) {
    return { words: `leaves in ${duration((leavesMs - nowMs) / 60_000)}`, late: true }
  }
  return arrivesMs <= startMs ? { words: 'has run its time', late: false } : null
}

/** What the patterns are, and the dotted line. */
export function PatternKey() {
  const patterns = [
    ['van', 'van'],
    ['shed', 'shed'],
    ['ramp', 'ramp'],
    ['hold', 'hold'],
    ['customs', 'border post'],
  ] as const
  return (
    <p className="flex flex-wrap gap-x-3.5 gap-y-1 max-board:hidden">
      {patterns.map(([pattern, words]) => (
        <span key={pattern} className="inline-flex items-center gap-1.5">
          <svg width="28" height="14" aria-hidden="true">
            <Marks marks={swatch(pattern, { x: 0, y: 0, width: 28, height: 14 }, { scale: 0.85 })} />
          </svg>
          {words}
        </span>
      ))}
      <span>dotted line: now</span>
    </p>
  )
}
