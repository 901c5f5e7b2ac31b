import { UNIT_SIGN, inUnit, withUnit } from '@/lib/views/format'
import type { TempUnit } from '@/lib/views/preferences'
import type { ChecklistView, EntryView } from '@/lib/views/checklist'

/** What an entry says, without its time: "Air at A 17 °C, at B 18 °C", "Not done: battery flat". */
export function entryWords(entry: EntryView, crates: ChecklistView['crates'], unit: TempUnit): string {
  const said = words(entry.value, 'text')
  switch (entry.kind) {
    case 'tick':
      return join('Ticked', said)
    case 'not_done':
      return join('Not done', words(entry.value, 'reason'))
    case 'reading':
      return join(`Air ${readings(entry, crates, unit)}`, said)
    case 'water':
      return join('Water given', said)
    case 'condition':
      return join(entry.value['allWell'] === true ? 'All well' : 'Not all well', said)
    case 'handover':
      return `Handed over to ${words(entry.value, 'to')}${entry.place ? `, ${entry.place}` : ''}: ${entry.alive ?? 0} alive, ${entry.dead ?? 0} dead, ${entry.short ?? 0} short`
    case 'note':
      return said
    case 'close_leg':
      return 'Leg closed'
  }
}

function readings(entry: EntryView, crates: ChecklistView['crates'], unit: TempUnit): string {
  const byCrate = entry.value['airTempC']
  if (typeof byCrate !== 'object' || byCrate === null) return 'read'
  return Object.entries(byCrate)
    .map(([crateId, tempC]) => {
      const letter = crates.find((crate) => crate.crateId === crateId)?.letter ?? crateId
      return `at ${letter} ${typeof tempC === 'number' ? reading(tempC, unit) : 'unknown'}`
    })
    .join(', ')
}

function words(value: EntryView['value'], key: string): string {
  const said = value[key]
  return typeof said === 'string' ? said.trim() : ''
}

function join(first: string, more: string): string {
  return more === '' ? first : `${first}: ${more}`
}

/** As it was typed: a decimal stays one. */
function reading(tempC: number, unit: TempUnit): string {
  const value = inUnit(tempC, unit)
  return withUnit(value, UNIT_SIGN[unit], Number.isInteger(value) ? 0 : 1)
}
