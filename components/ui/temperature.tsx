'use client'

import { airMargin, airTemp, bodyMargin, bodyTemp, limitTemp } from '@/lib/views/format'
import { rampStep } from '@/lib/tokens'
import { useUnit } from './preferences'

const RAMP_CLASS = {
  k4: 'bg-k4',
  k3: 'bg-k3',
  k2: 'bg-k2',
  k1: 'bg-k1',
  n0: 'bg-n0',
  h1: 'bg-h1',
  h2: 'bg-h2',
  h3: 'bg-h3',
  h4: 'bg-h4',
} as const

export type TemperatureKind =
  | 'air'
  | 'body'
  | 'limit-high'
  | 'limit-low'
  | 'air-limit-high'
  | 'air-limit-low'
  | 'air-margin'
  | 'body-margin'

/** A temperature in °C or °F as the session asks; limits and margins round to the animal's side. */
export function Temperature({ c, kind = 'air' }: { c: number; kind?: TemperatureKind }) {
  const unit = useUnit()
  return <span className="whitespace-nowrap">{inWords(c, kind, unit)}</span>
}

/** A ramp swatch with its printed number: the colour never stands alone. */
export function TemperatureChip({ c }: { c: number }) {
  return (
    <span className="whitespace-nowrap">
      <span
        aria-hidden="true"
        className={`keep-ink mr-[5px] inline-block size-[11px] border border-rule align-[-1px] ${RAMP_CLASS[rampStep(Math.round(c))]}`}
      />
      <Temperature c={c} kind="air" />
    </span>
  )
}

function inWords(c: number, kind: TemperatureKind, unit: 'c' | 'f'): string {
  switch (kind) {
    case 'air':
      return airTemp(c, unit)
    case 'body':
      return bodyTemp(c, unit)
    case 'limit-high':
      return limitTemp(c, 'high', unit)
    case 'limit-low':
      return limitTemp(c, 'low', unit)
    case 'air-limit-high':
      return limitTemp(c, 'high', unit, 0)
    case 'air-limit-low':
      return limitTemp(c, 'low', unit, 0)
    case 'air-margin':
      return airMargin(c, unit)
    case 'body-margin':
      return bodyMargin(c, unit)
  }
}
