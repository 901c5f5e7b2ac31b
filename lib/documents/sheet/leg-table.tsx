import { View } from '@react-pdf/renderer'
import type { ReactNode } from 'react'
import type { TableBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { type Column, Ledger, type LedgerRow, Ordinal } from '@/lib/documents/parts/ledger'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { VerdictCell } from '@/lib/documents/parts/stamp'
import { Swatch } from '@/lib/documents/parts/swatch'
import { Mark, px, Words } from '@/lib/documents/parts/words'
import { bodyMargin, hourMin, localTime } from '@/lib/views/format'
import type { AnimalView, LegCell, LegView, SheetView } from '@/lib/views/sheet'
import { chunk, spareAir } from './animal-boxes'

const PER_TABLE = 4
const REMARK =
  'In the frame minutes to spare, beside it outside air to spare; below the limit that decides, then body °C'
const KEY =
  'Minutes until the limit, at worst delay. Solid frame GO, broken frame GO WITH CONDITIONS, block NO-GO. Low: the cold side. Co.: condition.'
const WIDTH = { leg: 28, swatch: 30, start: 71, conditions: 27 }
const CELL = { least: 99, most: 126 }
const TITLE = 142
const HEAD = 28
const ROW = 30
const UNDER = 16

/** Legs by animals, four animals to a table. */
export function legTables({ animals, legs }: Pick<SheetView, 'animals' | 'legs'>): TableBlock[] {
  const groups = chunk(animals, PER_TABLE)
  return groups.map((group, index) => {
    const first = index * PER_TABLE
    const letters =
      groups.length > 1 ? `, ${group[0]?.crateLetter ?? ''} to ${group.at(-1)?.crateLetter ?? ''}` : ''
    const columns = columnsFor(group)
    const titleWidth = columns[2]?.width ?? 150
    return {
      around: 28 + HEAD + 4 + UNDER,
      rows: legs.map((leg) => legRow(leg, leg.cells.slice(first, first + PER_TABLE), titleWidth)),
      draw: (rows: LedgerRow[], continued: boolean): ReactNode => (
        <View key={`legs-${first}-${rows[0]?.key ?? ''}`}>
          <Heading remark={continued ? 'continued' : REMARK}>{`Legs${letters}`}</Heading>
          <Ledger columns={columns} rows={rows} headHeight={HEAD} />
          <Words size={10.5} line={13} style={{ marginTop: px(3) }}>
            {KEY}
          </Words>
        </View>
      ),
    }
  })
}

function columnsFor(animals: AnimalView[]): Column[] {
  const cell = cellWidth(animals.length)
  const cells = animals.length * cell
  const title = CONTENT_WIDTH - WIDTH.leg - WIDTH.swatch - WIDTH.start - WIDTH.conditions - cells
  return [
    { head: 'Leg', width: WIDTH.leg, pad: 4 },
    { head: 'Surroundings', width: WIDTH.swatch, pad: 2 },
    { head: '', width: title, joined: true, pad: 2 },
    { head: 'Starts\nh:min', width: WIDTH.start, pad: 4 },
    ...animals.map(({ crateLetter, name }) => ({
      head: <AnimalHead letter={crateLetter} name={name} width={cell} />,
      width: cell,
      pad: 4,
    })),
    { head: 'Co.', width: WIDTH.conditions, align: 'center', pad: 2 },
  ]
}

/** Few animals leave room for wider cells and longer titles alike. */
function cellWidth(animals: number): number {
  const room = CONTENT_WIDTH - WIDTH.leg - WIDTH.swatch - WIDTH.start - WIDTH.conditions - TITLE
  return Math.min(CELL.most, Math.max(CELL.least, room / Math.max(1, animals)))
}

function AnimalHead({ letter, name, width }: { letter: string; name: string; width: number }) {
  return (
    <View style={{ flexDirection: 'row', alignItems: 'flex-end' }}>
      <Mark size={15} line={14} style={{ marginRight: px(5) }}>
        {letter}
      </Mark>
      <Words
        size={10}
        line={12}
        weight={600}
        style={{ maxLines: 1, textOverflow: 'ellipsis', width: px(width - 26) }}
      >
        {name}
      </Words>
    </View>
  )
}

function legRow(leg: LegView, cells: LegCell[], titleWidth: number): LedgerRow {
  const lines =
    lineCount(leg.title, 'text', 400, 11, titleWidth - 5) +
    lineCount(leg.airWords, 'text', 400, 10, titleWidth - 5) -
    1
  const width = cellWidth(cells.length) - 7
  return {
    key: leg.legId,
    height: ROW + (lines - 1) * 13.5,
    cells: [
      <Ordinal key="n">{leg.ordinal}</Ordinal>,
      <Swatch key="s" pattern={leg.pattern} />,
      <TwoLines key="t" first={leg.title} second={leg.airWords} />,
      <TwoLines key="w" first={localTime(leg.start.ms, leg.start.zone)} second={hourMin(leg.durationMin)} />,
      ...cells.map((cell) => <SpareCell key={cell.animalId} cell={cell} width={width} />),
      leg.conditionNumbers.join(', '),
    ],
  }
}

/** A fact and, smaller under it, what belongs to it. */
export function TwoLines({ first, second, size = 11 }: { first: string; second: string; size?: number }) {
  return (
    <View>
      <Words size={size} line={13}>
        {first}
      </Words>
      <Words size={10} line={12}>
        {second}
      </Words>
    </View>
  )
}

function SpareCell({ cell, width }: { cell: LegCell; width: number }) {
  if (cell.verdict === null) return <Words size={10.5}>not on this leg</Words>
  return (
    <View>
      <View style={{ flexDirection: 'row', alignItems: 'center' }}>
        <VerdictCell verdict={cell.verdict} minutes={cell.margin.minutes} />
        <Words size={10.5} line={13} weight={600} style={{ marginLeft: px(3) }}>
          {spareAir(cell.margin)}
        </Words>
      </View>
      <Words size={10} line={12}>
        {limitAndBody(cell, width)}
      </Words>
    </View>
  )
}

/** "alarm low, body 0.9"; where that runs over, the column's own remark says what the figure is. */
function limitAndBody({ limitWords, decidedWords, margin: { bodyC } }: LegCell, width: number): string {
  const words = [limitWords, decidedWords].filter(Boolean).join(', ')
  if (bodyC === null) return words
  const figure = bodyMargin(bodyC, 'c').replace(/\u00a0°C$/, '')
  const fits = (line: string) => lineCount(line, 'text', 400, 10, width) === 1
  return [`${words}, body ${figure}`, `${words}, ${figure}`].find(fits) ?? words
}
