'use client'

import { fieldUnit } from './field-words'
import { usePlanPage } from './plan-context'
import { PlanNumber, PlanSelect, PlanText } from './plan-fields'
import type { PlanPath } from './plan-fields'

const PLAIN_TEXT = ['name', 'telephone', 'email', 'breedNote', 'identification', 'medicines', 'partyInCharge']

/** True where the field of a path can stand by itself in a folded part. */
export function standsAlone(path: string): boolean {
  const key = path.split('.').at(-1) ?? ''
  return (
    key === 'profileKey' ||
    PLAIN_TEXT.includes(key) ||
    (fieldUnit(path) !== undefined && !key.endsWith('TempC'))
  )
}

/** One field of a folded part, the one in error, unfolded alone. */
export function LooseField({ path, label }: { path: string; label: string }) {
  const { catalogues } = usePlanPage()
  const at = path as PlanPath
  if (path.endsWith('.profileKey')) {
    return (
      <PlanSelect
        path={at}
        label={label}
        none="Not chosen"
        choices={catalogues.species.map(({ key, commonName }) => ({ value: key, words: commonName }))}
      />
    )
  }
  const unit = fieldUnit(path)
  return unit === undefined ? (
    <PlanText path={at} label={label} />
  ) : (
    <PlanNumber path={at} label={label} unit={unit} />
  )
}
