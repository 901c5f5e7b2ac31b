import { View } from '@react-pdf/renderer'
import type { TableBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { type Column, Ledger, LEDGER_HEAD, type LedgerRow, Ordinal } from '@/lib/documents/parts/ledger'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { VerdictCell } from '@/lib/documents/parts/stamp'
import { Swatch } from '@/lib/documents/parts/swatch'
import { px, Words } from '@/lib/documents/parts/words'
import { spareAir } from '@/lib/documents/sheet/animal-boxes'
import { TwoLines } from '@/lib/documents/sheet/leg-table'
import { dayDate, hourMin, localTime } from '@/lib/views/format'
import type { ManifestLeg } from '@/lib/views/manifest'

const WIDTH = { leg: 28, swatch: 30, start: 76, length: 40, party: 172, ours: 36, spare: 126, conditions: 36 }
const TITLE = CONTENT_WIDTH - Object.values(WIDTH).reduce((sum, width) => sum + width, 0)
const COLUMNS: Column[] = [
  { head: 'Leg', width: WIDTH.leg },
  { head: 'Surroundings', width: WIDTH.swatch, pad: 2 },
  { head: '', width: TITLE, joined: true, pad: 3 },
  { head: 'Starts', width: WIDTH.start },
  { head: 'h:min', width: WIDTH.length, align: 'right' },
  { head: 'In charge, telephone', width: WIDTH.party },
  { head: 'Ours', width: WIDTH.ours },
  { head: 'To spare', width: WIDTH.spare },
  { head: 'Cond.', width: WIDTH.conditions },
]
const KEY =
  'In the frame: minutes before the first animal meets the limit named under it, at worst delay. Solid frame GO, broken frame GO WITH CONDITIONS. The other figure: how much warmer (low: colder) the outside air may be, and for which crate. Ours: whether one of our people stands beside the crates.'

/** Legs with who is in charge, and the animal that has least to spare on each. */
export function legTable(legs: ManifestLeg[]): TableBlock {
  const lines = lineCount(KEY, 'text', 400, 10.5, CONTENT_WIDTH)
  return {
    around: 28 + LEDGER_HEAD + 3 + 3 + 13 * lines,
    rows: legs.map((leg, index) => legRow(leg, legs[index - 1])),
    draw: (rows, continued) => (
      <View key={`legs-${rows[0]?.key ?? ''}`}>
        <Heading remark={continued ? 'continued' : ''}>Legs</Heading>
        <Ledger columns={COLUMNS} rows={rows} />
        <Words size={10.5} line={13} style={{ marginTop: px(3) }}>
          {KEY}
        </Words>
      </View>
    ),
  }
}

function legRow(leg: ManifestLeg, before: ManifestLeg | undefined): LedgerRow {
  const { start } = leg
  const day = dayDate(start.ms, start.zone)
  const sameDay = before !== undefined && dayDate(before.start.ms, before.start.zone) === day
  const telephone = [leg.partyTelephone, leg.partyHours].filter(Boolean).join(', ')
  const titleLines = lineCount(leg.title, 'text', 400, 11, TITLE - 6)
  const partyLines =
    lineCount(leg.partyInCharge, 'text', 400, 11, WIDTH.party - 12) +
    lineCount(telephone, 'text', 400, 10, WIDTH.party - 12)
  return {
    key: leg.legId,
    height: Math.max(
      32,
      6 + 13 * (titleLines + lineCount(leg.airWords, 'text', 400, 10, TITLE - 6)),
      6 + 13 * partyLines,
    ),
    cells: [
      <Ordinal key="n">{leg.ordinal}</Ordinal>,
      <Swatch key="s" pattern={leg.pattern} />,
      <TwoLines key="t" first={leg.title} second={leg.airWords} />,
      sameDay ? (
        localTime(start.ms, start.zone)
      ) : (
        <TwoLines key="w" first={localTime(start.ms, start.zone)} second={day} />
      ),
      hourMin(leg.durationMin),
      <TwoLines
        key="p"
        first={leg.partyInCharge === '' ? 'nobody named' : leg.partyInCharge}
        second={telephone}
      />,
      leg.attended ? 'Yes' : 'No',
      <SpareCell key="c" leg={leg} />,
      leg.conditionNumbers.join(', '),
    ],
  }
}

function SpareCell({ leg }: { leg: ManifestLeg }) {
  if (leg.verdict === null) return <Words size={11}>not judged</Words>
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center' }}>
      <VerdictCell verdict={leg.verdict} minutes={leg.margin.minutes} width={62} />
      <View style={{ marginLeft: px(6) }}>
        <Words size={11} line={13}>
          {[spareAir(leg.margin), leg.crateLetter].filter(Boolean).join(', ')}
        </Words>
        <Words size={10} line={12}>
          {[leg.limitWords, leg.decidedWords].filter(Boolean).join(', ')}
        </Words>
      </View>
    </View>
  )
}
