'use client'

import { useId, useState } from 'react'
import { parseFigure } from '@/components/forms/figure'
import { NumberInput } from '@/components/forms/text-input'
import { Button } from '@/components/ui/button'
import { useUnit } from '@/components/ui/preferences'
import { UNIT_SIGN, fromUnit, inUnit } from '@/lib/views/format'
import type { ChecklistView } from '@/lib/views/checklist'

const LOWEST_C = -50
const HIGHEST_C = 70

/** Air at each crate, typed in the unit of the session; kept in °C. One reading is enough to enter. */
export function ReadingAct({
  crates,
  onEnter,
}: {
  crates: ChecklistView['crates']
  onEnter: (airTempC: Record<string, number>) => void
}) {
  const id = useId()
  const unit = useUnit()
  const [typed, setTyped] = useState<Record<string, string>>({})
  const [tried, setTried] = useState(false)
  const readings = crates.map((crate) => ({ crate, ...read(typed[crate.crateId] ?? '', unit) }))
  const entered = readings.flatMap(({ crate, tempC }) =>
    tempC === null ? [] : [[crate.crateId, tempC] as const],
  )
  const wrong = readings.some(({ error }) => error !== undefined)
  return (
    <form
      noValidate
      className="mt-2 grid gap-2.5"
      onSubmit={(event) => {
        event.preventDefault()
        setTried(true)
        if (!wrong && entered.length > 0) onEnter(Object.fromEntries(entered))
      }}
    >
      <div className="grid grid-cols-2 gap-x-2.5 gap-y-2">
        {readings.map(({ crate, error }) => (
          <NumberInput
            key={crate.crateId}
            id={`${id}-${crate.crateId}`}
            label={
              <>
                <span className="crate">{crate.letter}</span> {crate.animals}
              </>
            }
            unit={UNIT_SIGN[unit]}
            value={typed[crate.crateId] ?? ''}
            onChange={(event) => setTyped({ ...typed, [crate.crateId]: event.target.value })}
            error={tried ? error : undefined}
          />
        ))}
      </div>
      <Button type="submit" size="phone">
        Enter the air
      </Button>
      {tried && !wrong && entered.length === 0 && (
        <p role="alert" className="dbl pl-2 text-small font-semibold">
          No figure yet: read the air at one crate at least.
        </p>
      )}
    </form>
  )
}

function read(typed: string, unit: 'c' | 'f'): { tempC: number | null; error?: string } {
  const figure = parseFigure(typed)
  if (figure === null) return { tempC: null }
  const low = Math.round(inUnit(LOWEST_C, unit))
  const high = Math.round(inUnit(HIGHEST_C, unit))
  const range = `put ${String(low).replace('-', '\u2212')} to ${high} ${UNIT_SIGN[unit]}.`
  if (typeof figure === 'string') return { tempC: null, error: `“${figure}” is not a number: ${range}` }
  return figure < low || figure > high
    ? { tempC: null, error: `${typed}: ${range}` }
    : { tempC: fromUnit(figure, unit) }
}
