'use client'

import { Fragment } from 'react'
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form'
import { join } from '@/components/ui/join'
import { Head, Ledger } from '@/components/ui/ledger'
import { newOpening } from '@/lib/planning/new-plan'
import type { Plan, PlanCrate, PlanOpening } from '@/lib/schemas/plan'
import { count, percent } from '@/lib/views/format'
import { CellLabel } from './cell-label'
import { MAX_OPENINGS } from './limits'
import { openCm2, wallCm2 } from './open-area'
import { FACE_OPTIONS, OPENING_OPTIONS } from './option-words'
import { PlanNumber, PlanSelect } from './plan-fields'
import { RowErrors } from './row-errors'

/** Every opening for air, face by face, with what it leaves open. */
export function OpeningsTable({ index }: { index: number }) {
  const { control, getValues } = useFormContext<Plan>()
  const name = `crates.${index}.openings` as const
  const { fields, append, remove } = useFieldArray({ control, name, keyName: 'rowKey' })
  const crate = useWatch({ control, name: `crates.${index}` })
  return (
    <div>
      <Ledger caption={`Openings of crate ${crate?.letter ?? ''}`} folds>
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
            <Fragment key={field.rowKey}>
              <tr className="max-desk:!grid max-desk:grid-cols-2 max-desk:items-end max-desk:px-2">
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
              <RowErrors paths={FIELDS.map((key) => `${name}.${row}.${key}` as const)} columns={11} />
            </Fragment>
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

const FIELDS = [
  'face',
  'kind',
  'widthCm',
  'heightCm',
  'howMany',
  'sillHeightCm',
  'meshOpenPct',
  'blockedPct',
] as const
const FIGURE = 'fig whitespace-nowrap border-t border-hair px-1.5 text-right text-small'
const CELL = 'border-t border-hair px-0.5 py-1 align-top max-desk:!px-1'

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
  const words = (what: string, unit = '') => <CellLabel row={`Opening ${row + 1}`} words={what} unit={unit} />
  const open = opening === undefined ? null : openCm2(opening)
  const wall = opening === undefined || crate === undefined ? null : wallCm2(crate, opening.face)
  const share = open === null || wall === null || wall === 0 ? null : percent((open / wall) * 100, 1)
  const figures = [
    ['widthCm', 'width', 'cm'],
    ['heightCm', 'height', 'cm'],
    ['howMany', 'how many', ''],
    ['sillHeightCm', 'sill above floor', 'cm'],
    ['meshOpenPct', 'mesh open', '%'],
    ['blockedPct', 'blocked', '%'],
  ] as const
  return (
    <>
      <td className={join(CELL, 'min-w-[5.5rem]')}>
        <PlanSelect bare path={at('face')} label={words('wall')} choices={FACE_OPTIONS} />
      </td>
      <td className={join(CELL, 'min-w-[6.75rem]')}>
        <PlanSelect bare path={at('kind')} label={words('kind')} choices={OPENING_OPTIONS} />
      </td>
      {figures.map(([field, what, unit]) => (
        <td key={field} className={join(CELL, 'min-w-[3.75rem]')}>
          {/* A roof has no floor to stand above. */}
          {(field !== 'sillHeightCm' || opening?.face !== 'top') && (
            <PlanNumber bare path={at(field)} label={words(what, unit)} unit="" />
          )}
        </td>
      ))}
      <td className={join(FIGURE, 'max-desk:col-span-2')}>
        {open !== null && (
          <>
            <span className="max-desk:hidden">{count(Math.round(open))}</span>
            <span className="font-text [word-spacing:normal] desk:hidden">
              {count(Math.round(open))} cm² open{share !== null && `, ${share} of the wall`}
            </span>
          </>
        )}
      </td>
      <td className={join(FIGURE, 'max-desk:!hidden')}>{share}</td>
    </>
  )
}
