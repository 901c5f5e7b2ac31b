'use client'

import { Fragment } from 'react'
import type { ReactNode } from 'react'
import { useFieldArray, useFormContext } from 'react-hook-form'
import { Ledger, Head } from '@/components/ui/ledger'
import { CellLabel } from './cell-label'
import { MAX_WEATHER_ROWS } from './limits'
import type { Plan } from '@/lib/schemas/plan'
import { PlanNumber, PlanTemperature } from './plan-fields'
import type { PlanPath } from './plan-fields'
import { RowErrors } from './row-errors'

/** Where open air stands in the plan: a leg's own surroundings, or what lies outside them. */
export type AirBase = `legs.${number}.surroundings` | `legs.${number}.surroundings.outside`

/** What of the weather reaches the crates: in the open all of it, round a closed space no wind, round a held room no sun. */
export type WeatherReach = 'open' | 'closed' | 'held'

const COLUMNS = [
  { field: 'minute', head: 'Minute', sign: 'min', reaches: ['open', 'closed', 'held'] },
  { field: 'airTempC', head: 'Air', sign: '', reaches: ['open', 'closed', 'held'] },
  { field: 'relHumidityPct', head: 'Humidity', sign: '%', reaches: ['open', 'closed', 'held'] },
  { field: 'windMs', head: 'Wind', sign: 'm/s', reaches: ['open'] },
  { field: 'solarWm2', head: 'Sun', sign: 'W/m²', reaches: ['open', 'closed'] },
] as const satisfies readonly {
  field: string
  head: string
  sign: string
  reaches: readonly WeatherReach[]
}[]

/** Open air as people read it from a forecast: a row for each moment, straight lines between, the last row holds on. */
export function WeatherRows({ base, words, reach }: { base: AirBase; words: string; reach: WeatherReach }) {
  const columns = COLUMNS.filter(({ reaches }) => (reaches as readonly WeatherReach[]).includes(reach))
  const { control, getValues } = useFormContext<Plan>()
  // The union of surroundings has rows on one branch only; the caller stands on that branch.
  const name = `${base}.rows` as 'legs.0.surroundings.outside.rows'
  const { fields, append, remove } = useFieldArray({ control, name, keyName: 'rowKey' })
  const at = (row: number, field: string) => `${base}.rows.${row}.${field}` as PlanPath
  const add = () => {
    const last = getValues(name).at(-1)
    append({
      minute: typeof last?.minute === 'number' ? last.minute + 60 : 0,
      airTempC: null,
      relHumidityPct: null,
      windMs: last?.windMs ?? null,
      solarWm2: last?.solarWm2 ?? null,
    })
  }
  return (
    <div>
      <Ledger caption={words} folds>
        <thead>
          <tr>
            {columns.map(({ head, sign }) => (
              <Head key={head} numeric className="!px-1.5">
                {head} <span className="font-normal">{sign}</span>
              </Head>
            ))}
            <Head className="!px-1.5">
              <span className="sr-only">Take out</span>
            </Head>
          </tr>
        </thead>
        <tbody>
          {fields.map((field, row) => (
            <Fragment key={field.rowKey}>
              <tr className="align-top max-desk:!grid max-desk:grid-cols-2 max-desk:items-end max-desk:px-2">
                {columns.map(({ field: key, head, sign }) => (
                  <td
                    key={key}
                    style={{ width: `${92 / columns.length}%` }}
                    className="border-t border-hair px-0.5 py-1 align-top max-desk:!w-auto max-desk:!px-1"
                  >
                    <WeatherFigure
                      path={at(row, key)}
                      label={<CellLabel row={`Row ${row + 1}`} words={head.toLowerCase()} unit={sign} />}
                    />
                  </td>
                ))}
                <td className="border-t border-hair px-1.5 py-1 text-right">
                  {fields.length > 1 && (
                    <button
                      type="button"
                      className="link text-small max-desk:min-h-11"
                      onClick={() => remove(row)}
                    >
                      Out<span className="sr-only">: take out row {row + 1}</span>
                    </button>
                  )}
                </td>
              </tr>
              <RowErrors paths={columns.map(({ field: key }) => at(row, key))} columns={columns.length + 1} />
            </Fragment>
          ))}
        </tbody>
      </Ledger>
      <div className="mt-2 flex flex-wrap items-end justify-between gap-3">
        {fields.length < MAX_WEATHER_ROWS && (
          <button type="button" className="link text-small max-desk:min-h-11" onClick={add}>
            Add a row
          </button>
        )}
        {reach !== 'held' && (
          <PlanNumber className="w-28" path={`${base}.shadePct` as PlanPath} label="Shade" unit="%" />
        )}
      </div>
    </div>
  )
}

function WeatherFigure({ path, label }: { path: PlanPath; label: ReactNode }) {
  return path.endsWith('TempC') ? (
    <PlanTemperature bare path={path} label={label} />
  ) : (
    <PlanNumber bare path={path} label={label} unit="" />
  )
}
