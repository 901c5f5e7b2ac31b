'use client'

import { useFieldArray, useFormContext, useWatch } from 'react-hook-form'
import { Head, Ledger } from '@/components/ui/ledger'
import { newOpening } from '@/lib/planning/new-plan'
import type { Plan, PlanCrate, PlanOpening } from '@/lib/schemas/plan'
import { count, percent } from '@/lib/views/format'
import { MAX_OPENINGS } from './limits'
import { openCm2, wallCm2 } from './open-area'
import { FACE_OPTIONS, OPENING_OPTIONS } from './option-words'
import { PlanNumber, PlanSelect } from './plan-fields'

/** Every opening for air, face by face, with what it leaves open. */
export function OpeningsTable({ index }: { index: number }) {
  const { control, getValues } = useFormContext<Plan>()
  const name = `crates.${index}.openings` as const
  const { fields, append, remove } = useFieldArray({ control, name, keyName: 'rowKey' })
  const crate = useWatch({ control, name: `crates.${index}` })
  return (
    <div>
      <Ledger caption={`Openings of crate ${crate?.letter ?? ''}`}>
        <thead>
          <tr>
            <Head className="!px-1.5">Wall</Head>
            <Head className="!px-1.5">Opening</Head>
            <Head numeric className="!px-1.5">
              Wide, cm
            </Head>
            <Head numeric className="!px-1.5">
              High, cm
            </Head>
            <Head numeric className="!px-1.5">
              How many
            </Head>
            <Head numeric className="!px-1.5">
              Sill, cm
            </Head>
            <Head numeric className="!px-1.5">
              Mesh open, %
            </Head>
            <Head numeric className="!px-1.5">
              Blocked, %
            </Head>
            <Head numeric className="!px-1.5">
              Open, cm²
            </Head>
            <Head numeric className="!px-1.5">
              Of wall
            </Head>
            <Head className="!px-1.5">
              <span className="sr-only">Take out</span>
            </Head>
          </tr>
        </thead>
        <tbody>
          {fields.map((field, row) => (
            <tr key={field.rowKey}>
              <OpeningCells index={index} row={row} crate={crate} opening={crate?.openings[row]} />
              <td className="border-t border-hair px-1.5 text-right">
                <button
                  type="button"
                  className="link text-small max-desk:min-h-11"
                  onClick={() => remove(row)}
                >
                  Out<span className="sr-only">: take out opening {row + 1}</span>
                </button>
              </td>
            </tr>
          ))}
          {fields.length === 0 && (
            <tr>
              <td colSpan={11} className="px-2.5 py-2 text-mute">
                No opening yet: a closed crate without one cannot be assessed.
              </td>
            </tr>
          )}
        </tbody>
      </Ledger>
      {fields.length < MAX_OPENINGS && (
        <button
          type="button"
          className="link mt-1.5 text-small max-desk:min-h-11"
          onClick={() => append(newOpening(getValues(`crates.${index}`)))}
        >
          Add an opening
        </button>
      )}
    </div>
  )
}

function OpeningCells({
  index,
  row,
  crate,
  opening,
}: {
  index: number
  row: number
  crate: PlanCrate | undefined
  opening: PlanOpening | undefined
}) {
  const at = <F extends keyof PlanOpening>(field: F) => `crates.${index}.openings.${row}.${field}` as const
  const words = (what: string) => (
    <span className="sr-only">
      Opening {row + 1}, {what}
    </span>
  )
  const open = opening === undefined ? null : openCm2(opening)
  const wall = opening === undefined || crate === undefined ? null : wallCm2(crate, opening.face)
  const figures = [
    ['widthCm', 'width'],
    ['heightCm', 'height'],
    ['howMany', 'how many'],
    ['sillHeightCm', 'sill above floor'],
    ['meshOpenPct', 'mesh open'],
    ['blockedPct', 'blocked'],
  ] as const
  return (
    <>
      <td className="min-w-[5.5rem] border-t border-hair px-0.5 py-1 align-top">
        <PlanSelect bare path={at('face')} label={words('wall')} choices={FACE_OPTIONS} />
      </td>
      <td className="min-w-[6.5rem] border-t border-hair px-0.5 py-1 align-top">
        <PlanSelect bare path={at('kind')} label={words('kind')} choices={OPENING_OPTIONS} />
      </td>
      {figures.map(([field, what]) => (
        <td key={field} className="min-w-[3.75rem] border-t border-hair px-0.5 py-1 align-top">
          {/* A roof has no floor to stand above. */}
          {(field !== 'sillHeightCm' || opening?.face !== 'top') && (
            <PlanNumber bare path={at(field)} label={words(what)} unit="" />
          )}
        </td>
      ))}
      <td className="fig whitespace-nowrap border-t border-hair px-1.5 text-right text-small">
        {open === null ? '' : count(Math.round(open))}
      </td>
      <td className="fig whitespace-nowrap border-t border-hair px-1.5 text-right text-small">
        {open === null || wall === null || wall === 0 ? '' : percent((open / wall) * 100, 1)}
      </td>
    </>
  )
}
