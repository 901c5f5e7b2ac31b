import { limitFigure } from '@/lib/views/format'
import type { TempUnit } from '@/lib/views/preferences'
import type { SpeciesLimits } from '@/lib/views/species'

const PAD_C = 1

/** The four limits on a ruler of body temperature: critical 5 px, alarm 2.5, bare paper between the alarms. */
export function SpeciesRuler({
  limits,
  unit,
  small = false,
}: {
  limits: SpeciesLimits
  unit: TempUnit
  small?: boolean
}) {
  const fromC = Math.floor(limits.criticalLowC - PAD_C)
  const toC = Math.ceil(limits.criticalHighC + PAD_C)
  const [width, height] = small ? [150, 22] : [620, 96]
  const x = (tempC: number) => ((tempC - fromC) / (toC - fromC)) * (width - 10) + 5
  const top = small ? 4 : 34
  const tall = small ? 14 : 40
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      role="img"
      aria-label={summary(limits, unit)}
      className="block max-w-full"
    >
      <rect
        x={x(limits.criticalLowC)}
        y={top}
        width={x(limits.criticalHighC) - x(limits.criticalLowC)}
        height={tall}
        className="fill-band"
      />
      <rect
        x={x(limits.alarmLowC)}
        y={top}
        width={x(limits.alarmHighC) - x(limits.alarmLowC)}
        height={tall}
        className="fill-sheet stroke-hair"
      />
      {[limits.criticalLowC, limits.criticalHighC].map((tempC) => (
        <line
          key={tempC}
          x1={x(tempC)}
          x2={x(tempC)}
          y1={top - 3}
          y2={top + tall + 3}
          strokeWidth={small ? 4 : 5}
          className="stroke-ink"
        />
      ))}
      {[limits.alarmLowC, limits.alarmHighC].map((tempC) => (
        <line
          key={tempC}
          x1={x(tempC)}
          x2={x(tempC)}
          y1={top}
          y2={top + tall}
          strokeWidth={small ? 2 : 2.5}
          className="stroke-ink"
        />
      ))}
      {!small && (
        <>
          <line
            x1={x(limits.setPointC)}
            x2={x(limits.setPointC)}
            y1={top}
            y2={top + tall}
            strokeWidth="1"
            strokeDasharray="2 3"
            className="stroke-ink"
          />
          <Named
            x={x(limits.criticalLowC)}
            words="critical low"
            figure={limitFigure(limits.criticalLowC, 'low', unit)}
            anchor="middle"
          />
          <Named
            x={x(limits.alarmLowC)}
            words="alarm low"
            figure={limitFigure(limits.alarmLowC, 'low', unit)}
            anchor="start"
          />
          <Named
            x={x(limits.alarmHighC)}
            words="alarm"
            figure={limitFigure(limits.alarmHighC, 'high', unit)}
            anchor="end"
          />
          <Named
            x={x(limits.criticalHighC)}
            words="critical"
            figure={limitFigure(limits.criticalHighC, 'high', unit)}
            anchor="start"
          />
          <text x={x(limits.setPointC)} y={top + tall + 16} textAnchor="middle" className="text-caption">
            set-point
          </text>
        </>
      )}
    </svg>
  )
}

function Named({
  x,
  words,
  figure,
  anchor,
}: {
  x: number
  words: string
  figure: string
  anchor: 'start' | 'middle' | 'end'
}) {
  return (
    <>
      <text x={x} y={12} textAnchor={anchor} className="fill-mute text-caption">
        {words}
      </text>
      <text x={x} y={28} textAnchor={anchor} className="fig text-sub font-semibold">
        {figure}
      </text>
    </>
  )
}

function summary(limits: SpeciesLimits, unit: TempUnit): string {
  const sign = unit === 'c' ? '°C' : '°F'
  return `Body limits: critical ${limitFigure(limits.criticalLowC, 'low', unit)} and ${limitFigure(limits.criticalHighC, 'high', unit)} ${sign}, alarm ${limitFigure(limits.alarmLowC, 'low', unit)} and ${limitFigure(limits.alarmHighC, 'high', unit)} ${sign}.`
}
