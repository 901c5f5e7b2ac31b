'use client'

import { useState } from 'react'
import { useUnit } from '@/components/ui/preferences'
import { UNIT_SIGN, differenceIn, fromUnit, inUnit } from '@/lib/views/format'
import { figureText, parseFigure } from './figure'
import { NumberInput } from './text-input'
import type { FieldFace } from './field'

/**
 * A temperature typed in the session's unit and kept in °C. `difference` has no offset: 3 °C is 5.4 °F. What can't be read
 * is handed on as typed, so that the schema's message can name it.
 */
export function TemperatureInput({
  valueC,
  onChangeC,
  difference = false,
  ...face
}: FieldFace & {
  valueC: number | string | null
  onChangeC: (valueC: number | string | null) => void
  difference?: boolean
  onBlur?: () => void
  name?: string
  disabled?: boolean
}) {
  const unit = useUnit()
  const [typed, setTyped] = useState<string | null>(null)
  const shown =
    typeof valueC === 'number'
      ? figureText(difference ? differenceIn(valueC, unit) : inUnit(valueC, unit), 2)
      : (valueC ?? '')
  return (
    <NumberInput
      {...face}
      unit={UNIT_SIGN[unit]}
      value={typed ?? shown}
      onChange={(event) => {
        setTyped(event.target.value)
        const figure = parseFigure(event.target.value)
        onChangeC(typeof figure === 'number' ? toC(figure, unit, difference) : figure)
      }}
      onBlur={() => {
        setTyped(null)
        face.onBlur?.()
      }}
    />
  )
}

function toC(value: number, unit: 'c' | 'f', difference: boolean): number {
  if (!difference) return fromUnit(value, unit)
  return unit === 'c' ? value : Number((value / 1.8).toPrecision(12))
}
