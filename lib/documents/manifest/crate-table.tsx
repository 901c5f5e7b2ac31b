import { View } from '@react-pdf/renderer'
import type { TableBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { type Column, Ledger, type LedgerRow } from '@/lib/documents/parts/ledger'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { Figure, Mark, px, Words } from '@/lib/documents/parts/words'
import { TwoLines } from '@/lib/documents/sheet/leg-table'
import { figure, kilograms, limitFigure, limitTemp, percent } from '@/lib/views/format'
import type { ManifestCrate } from '@/lib/views/manifest'
import type { BodyLimits } from '@/lib/views/sheet'

const WIDTH = { mark: 118, model: 122, animals: 58, open: 116, below: 76, above: 76 }
const BODY = CONTENT_WIDTH - Object.values(WIDTH).reduce((sum, width) => sum + width, 0)
const HEAD = 29
const COLUMNS: Column[] = [
  { head: 'Mark', width: WIDTH.mark },
  { head: 'Model, inside', width: WIDTH.model },
  { head: 'Animals\nweigh', width: WIDTH.animals, align: 'right' },
  { head: 'Open,\nfour sides', width: WIDTH.open },
  { head: 'Stop if air\nis below', width: WIDTH.below },
  { head: 'Stop if air\nis above', width: WIDTH.above },
  { head: 'Body limits', width: BODY },
]
const NOTE =
  'Air outside the crate, read at its openings; the strictest of the legs planned inside it. °F is rounded to the safe side.'

/** Crates with their marks and the limits that go with them. */
export function crateTable(crates: ManifestCrate[]): TableBlock {
  const note = `${NOTE} ${otherWords(crates)}`.trim()
  const lines = lineCount(note, 'text', 400, 10.5, CONTENT_WIDTH)
  return {
    around: 28 + HEAD + 3 + 3 + 13 * lines,
    rows: crates.map(crateRow),
    draw: (rows, continued) => (
      <View key={`crates-${rows[0]?.key ?? ''}`}>
        <Heading remark={continued ? 'continued' : ''}>Crates and limits</Heading>
        <Ledger columns={COLUMNS} rows={rows} headHeight={HEAD} />
        <Words size={10.5} line={13} style={{ marginTop: px(3) }}>
          {note}
        </Words>
      </View>
    ),
  }
}

function crateRow(crate: ManifestCrate): LedgerRow {
  const open = crate.openPct === null ? 'not given' : percent(crate.openPct, 1)
  return {
    key: crate.crateId,
    height: 43,
    cells: [
      <Mark key="m" size={24} line={26}>
        {crate.crateMark}
      </Mark>,
      <TwoLines key="t" first={crate.modelWords} second={crate.insideWords} />,
      crate.animalsMassKg === null ? '–' : kilograms(crate.animalsMassKg),
      <TwoLines key="o" first={open} second={crate.beddingWords} />,
      <StopCell key="b" c={crate.stop.belowC} f={crate.stop.belowF} />,
      <StopCell key="a" c={crate.stop.aboveC} f={crate.stop.aboveF} />,
      <BodyCell key="l" limits={crate.bodyLimits} />,
    ],
  }
}

function StopCell({ c, f }: { c: number | null; f: number | null }) {
  if (c === null) return <Words size={11}>none found</Words>
  return (
    <View>
      <Figure size={15} line={18} weight={600}>
        {`${figure(c)} °C`}
      </Figure>
      <Words size={10} line={12}>
        {f === null ? '' : `${figure(f)} °F`}
      </Words>
    </View>
  )
}

function BodyCell({ limits }: { limits: BodyLimits | null }) {
  if (limits === null) return <Words size={11}>none</Words>
  const range = (low: number, high: number) =>
    `${limitFigure(low, 'low', 'c')} to ${limitTemp(high, 'high', 'c')}`
  return (
    <TwoLines
      first={`alarm ${range(limits.alarmLowC, limits.alarmHighC)}`}
      second={`critical ${range(limits.criticalLowC, limits.criticalHighC)}`}
    />
  )
}

/** Limits of legs planned outside the strictest ones, by crate and leg. */
function otherWords(crates: ManifestCrate[]): string {
  const others = crates.flatMap(({ crateMark, otherLegs }) =>
    otherLegs.map(({ ordinal, belowC, aboveC }) => {
      const sides = [
        belowC === null ? '' : `below ${figure(belowC)}`,
        aboveC === null ? '' : `above ${figure(aboveC)}`,
      ].filter(Boolean)
      return `${crateMark}, leg ${ordinal}: ${sides.length === 0 ? 'no air keeps its limit' : `${sides.join(' or ')} °C`}`
    }),
  )
  return others.length === 0 ? '' : `Legs with a limit of their own: ${others.join('; ')}.`
}
