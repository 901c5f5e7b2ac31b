'use client'

import Link from 'next/link'
import { Cell, Head, Ledger, RowHead } from '@/components/ui/ledger'
import { useUnit } from '@/components/ui/preferences'
import { UNIT_SIGN, limitFigure } from '@/lib/views/format'
import type { SpeciesRow } from '@/lib/views/species'
import { SpeciesRuler } from './species-ruler'

/** All species rows in force, with their limits in one look. */
export function SpeciesTable({ rows }: { rows: readonly SpeciesRow[] }) {
  const unit = useUnit()
  return (
    <>
      <Ledger caption="Species rows in force" folds>
        <thead>
          <tr>
            <Head>Species</Head>
            <Head>Body limits</Head>
            <Head numeric>Alarms, {UNIT_SIGN[unit]}</Head>
            <Head numeric>Criticals, {UNIT_SIGN[unit]}</Head>
            <Head>In force</Head>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.key}>
              <RowHead>
                <Link href={`/species/${row.key}`} className="link font-semibold">
                  {row.commonName}
                </Link>
                <span className="block text-small font-normal italic text-mute">{row.scientificName}</span>
              </RowHead>
              <Cell>{row.limits ? <SpeciesRuler limits={row.limits} unit={unit} small /> : 'No limits'}</Cell>
              <Cell label="Alarms" numeric>
                {row.limits &&
                  `${limitFigure(row.limits.alarmLowC, 'low', unit)} to ${limitFigure(row.limits.alarmHighC, 'high', unit)}`}
              </Cell>
              <Cell label="Criticals" numeric>
                {row.limits &&
                  `${limitFigure(row.limits.criticalLowC, 'low', unit)} to ${limitFigure(row.limits.criticalHighC, 'high', unit)}`}
              </Cell>
              <Cell label="In force" attention={row.refused !== ''}>
                Version {row.version}
                {row.refused && <span className="block text-small font-semibold">cannot be assessed</span>}
              </Cell>
            </tr>
          ))}
        </tbody>
      </Ledger>
      <p className="mt-1.5 text-small text-mute">
        Thick line critical, thin line alarm, bare paper between the alarms. Each ruler has its own scale.
        Without four limits nothing can be assessed.
      </p>
    </>
  )
}
