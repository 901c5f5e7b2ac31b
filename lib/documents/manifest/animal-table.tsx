import { View } from '@react-pdf/renderer'
import type { TableBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { type Column, Ledger, LEDGER_HEAD, type LedgerRow } from '@/lib/documents/parts/ledger'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { Mark, Words } from '@/lib/documents/parts/words'
import { clock, dayDate, kilograms, zoneName } from '@/lib/views/format'
import type { AnimalView, Moment } from '@/lib/views/sheet'

const WIDTH = { crate: 35, name: 62, species: 114, sex: 68, mass: 55, identification: 164, coat: 92 }
const FED = CONTENT_WIDTH - Object.values(WIDTH).reduce((sum, width) => sum + width, 0)
const COLUMNS: Column[] = [
  { head: 'Crate', width: WIDTH.crate },
  { head: 'Name', width: WIDTH.name },
  { head: 'Species, breed', width: WIDTH.species },
  { head: 'Sex, age', width: WIDTH.sex },
  { head: 'Mass', width: WIDTH.mass, align: 'right' },
  { head: 'Identification', width: WIDTH.identification },
  { head: 'Coat, flags', width: WIDTH.coat },
  { head: 'Last fed, watered', width: FED },
]

/** The animals with what identifies them. */
export function animalTable(animals: AnimalView[]): TableBlock {
  return {
    around: 28 + LEDGER_HEAD + 3,
    rows: animals.map(animalRow),
    draw: (rows, continued) => (
      <View key={`animals-${rows[0]?.key ?? ''}`}>
        <Heading remark={continued ? 'continued' : ''}>Animals</Heading>
        <Ledger columns={COLUMNS} rows={rows} />
      </View>
    ),
  }
}

function animalRow(animal: AnimalView): LedgerRow {
  const species = [animal.speciesName, animal.breedNote].filter(Boolean).join(', ')
  const name = animal.count > 1 ? `${animal.name}, ${animal.count} animals` : animal.name
  const texts: [string, number][] = [
    [name, WIDTH.name],
    [species, WIDTH.species],
    [[animal.sexWords, animal.ageWords].filter(Boolean).join(', '), WIDTH.sex],
    [
      animal.massKg === null ? '–' : `${kilograms(animal.massKg)}${animal.count > 1 ? ' each' : ''}`,
      WIDTH.mass,
    ],
    [animal.identification === '' ? 'none given' : animal.identification, WIDTH.identification],
    [healthWords(animal), WIDTH.coat],
    [fedWords(animal.lastFed, animal.lastWatered), FED],
  ]
  const lines = Math.max(
    ...texts.map(([text, width], index) => lineCount(text, 'text', index === 0 ? 600 : 400, 11, width - 12)),
  )
  return {
    key: animal.animalId,
    height: Math.max(30, 6 + 13.5 * lines),
    cells: [
      <Mark key="c" size={17} line={18}>
        {animal.crateLetter}
      </Mark>,
      <Words key="n" size={11} line={13.5} weight={600}>
        {name}
      </Words>,
      ...texts.slice(1).map(([text]) => text),
    ],
  }
}

/** "45 mm, dry. elderly. Carprofen 50 mg. Examined 7 Jun 2026 by A. Vane." */
function healthWords({ coatWords, flagWords, medicines, examinedWords }: AnimalView): string {
  const examined = examinedWords === '' ? '' : `Examined ${examinedWords}`
  return [coatWords, flagWords, medicines, examined].filter(Boolean).join('. ')
}

/** "06:30, 13:10 BST", with the day where the two differ in it. */
function fedWords(fed: Moment | null, watered: Moment | null): string {
  if (fed === null && watered === null) return 'not given'
  const zone = fed?.zone ?? watered?.zone ?? 'UTC'
  const ms = fed?.ms ?? watered?.ms ?? 0
  const days = [fed, watered].map((at) => (at === null ? '' : dayDate(at.ms, at.zone)))
  const sameDay = days[0] === days[1] || fed === null || watered === null
  const times = [fed, watered].map((at, index) =>
    at === null ? 'not given' : `${sameDay ? '' : `${days[index] ?? ''} `}${clock(at.ms, at.zone)}`,
  )
  return `${times.join(', ')} ${zoneName(ms, zone)}`
}
