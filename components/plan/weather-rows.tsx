'use client'

import { useFieldArray, useFormContext } from 'react-hook-form'
import { Ledger, Head } from '@/components/ui/ledger'
import { MAX_WEATHER_ROWS } from './limits'
import type { Plan } from '@/lib/schemas/plan'
import { PlanNumber, PlanTemperature } from './plan-fields'
import type { PlanPath } from './plan-fields'

/** Where open air stands in the plan: a leg's own surroundings, or what lies outside them. */
export type AirBase = `legs.${number}.surroundings` | `legs.${number}.surroundings.outside`

const HEADS = [
  ['Minute', 'min'],
  ['Air', ''],
  ['Humidity', '%'],
  ['Wind', 'm/s'],
  ['Sun', 'W/m²'],
] as const

/** Open air as people read it from a forecast: a row for each moment, straight lines between, the last row holds on. */
export function WeatherRows({ base, words }: { base: AirBase; words: string }) {
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
      <Ledger caption={words}>
        <thead>
          <tr>
            {HEADS.map(([head, sign]) => (
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
            <tr key={field.rowKey} className="align-top">
              <WeatherCell>
                <PlanNumber
                  bare
                  path={at(row, 'minute')}
                  label={<Ears>Row {row + 1}, minute</Ears>}
                  unit=""
                />
              </WeatherCell>
              <WeatherCell>
                <PlanTemperature bare path={at(row, 'airTempC')} label={<Ears>Row {row + 1}, air</Ears>} />
              </WeatherCell>
              <WeatherCell>
                <PlanNumber
                  bare
                  path={at(row, 'relHumidityPct')}
                  label={<Ears>Row {row + 1}, humidity</Ears>}
                  unit=""
                />
              </WeatherCell>
              <WeatherCell>
                <PlanNumber bare path={at(row, 'windMs')} label={<Ears>Row {row + 1}, wind</Ears>} unit="" />
              </WeatherCell>
              <WeatherCell>
                <PlanNumber bare path={at(row, 'solarWm2')} label={<Ears>Row {row + 1}, sun</Ears>} unit="" />
              </WeatherCell>
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
          ))}
        </tbody>
      </Ledger>
      <div className="mt-2 flex flex-wrap items-end justify-between gap-3">
        {fields.length < MAX_WEATHER_ROWS && (
          <button type="button" className="link text-small max-desk:min-h-11" onClick={add}>
            Add a row
          </button>
        )}
        <PlanNumber className="w-28" path={`${base}.shadePct` as PlanPath} label="Shade" unit="%" />
      </div>
    </div>
  )
}

function WeatherCell({ children }: { children: React.ReactNode }) {
  return <td className="w-[19%] border-t border-hair px-0.5 py-1 align-top">{children}</td>
}

function Ears({ children }: { children: React.ReactNode }) {
  return <span className="sr-only">{children}</span>
}
