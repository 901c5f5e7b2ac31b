import { View } from '@react-pdf/renderer'
import type { FixedBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { CONTENT_WIDTH } from '@/lib/documents/parts/paper'
import { VerdictStamp } from '@/lib/documents/parts/stamp'
import { Bold, Figure, INK, Mark, px, Words } from '@/lib/documents/parts/words'
import { airMargin, bodyMargin, minutesToSpare } from '@/lib/views/format'
import type { AnimalView, Margin } from '@/lib/views/sheet'

const PER_ROW = 4
const PAD = 7

/** A box for each animal, four to a row: letter, stamp, room to spare, what decides. */
export function animalBoxes(animals: AnimalView[]): FixedBlock[] {
  const perRow = Math.min(PER_ROW, Math.max(2, animals.length))
  const rows = chunk(animals, perRow)
  return rows.map((row, index) => {
    const width = CONTENT_WIDTH / perRow
    const height = Math.max(...row.map((animal) => boxHeight(animal, width)))
    const gap = index === rows.length - 1 ? 2 : 0
    return {
      height: height + gap,
      element: (
        <View
          key={row[0]?.animalId}
          style={{ ...frame, height: px(height), marginBottom: px(gap), marginTop: px(index > 0 ? -1.5 : 0) }}
        >
          {row.map((animal, at) => (
            <AnimalBox key={animal.animalId} animal={animal} width={width} first={at === 0} />
          ))}
        </View>
      ),
    }
  })
}

const frame = { flexDirection: 'row', borderWidth: px(1.5), borderColor: INK.ink } as const

function AnimalBox({ animal, width, first }: { animal: AnimalView; width: number; first: boolean }) {
  return (
    <View
      style={{
        width: px(width),
        paddingHorizontal: px(PAD),
        paddingTop: px(5),
        ...(first ? {} : { borderLeftWidth: px(0.75), borderLeftColor: INK.rule }),
      }}
    >
      <View
        style={{
          flexDirection: 'row',
          alignItems: 'center',
          marginBottom: px(5),
          height: px(describeHeight(animal, width)),
        }}
      >
        <Mark size={27} line={26} style={{ width: px(26) }}>
          {animal.crateLetter}
        </Mark>
        <View style={{ flexGrow: 1, flexBasis: 0 }}>
          <Words size={13} line={14} weight={600}>
            {nameAndCount(animal)}
          </Words>
          <Words size={10.5} line={12}>
            {animal.describes}
          </Words>
        </View>
      </View>
      <VerdictStamp stamp={animal.stamp} scale="S" />
      <View style={{ flexDirection: 'row', marginTop: px(4), height: px(23) }}>
        <Figure size={20} line={22} weight={600} style={{ letterSpacing: px(-0.6) }}>
          {spareMinutes(animal.margin)}
        </Figure>
        <Figure size={20} line={22} weight={600} style={{ letterSpacing: px(-0.6), marginLeft: px(12) }}>
          {spareAir(animal.margin)}
        </Figure>
      </View>
      <Words size={10.5} line={13} weight={700} style={{ marginTop: px(2) }}>
        {animal.decidedWords}
      </Words>
      <Words size={10.5} line={13} style={{ marginTop: px(2) }}>
        {animal.overridden ? <Bold>Overridden. </Bold> : null}
        {trackLine(animal)}
      </Words>
    </View>
  )
}

function nameAndCount({ name, count }: AnimalView): string {
  return count > 1 ? `${name}, ${count} animals` : name
}

/** "150 min"; a dash where nothing was evaluated. */
export function spareMinutes({ minutes }: Margin): string {
  return minutes === null ? '–' : minutesToSpare(minutes)
}

export function spareAir({ outsideAirC }: Margin): string {
  return outsideAirC === null ? '' : airMargin(outsideAirC, 'c')
}

function describeHeight({ describes }: AnimalView, width: number): number {
  return 14 + 12 * lineCount(describes, 'text', 400, 10.5, width - 2 * PAD - 28)
}

function boxHeight(animal: AnimalView, width: number): number {
  const inner = width - 2 * PAD - 2
  const decided = lineCount(animal.decidedWords, 'text', 700, 10.5, inner)
  const tracks = lineCount(
    `${animal.overridden ? 'Overridden. ' : ''}${trackLine(animal)}`,
    'text',
    400,
    10.5,
    inner,
  )
  return 5 + describeHeight(animal, width) + 5 + 21 + 27 + 2 + 13 * decided + 2 + 13 * tracks + 8
}

function trackLine({ margin: { bodyC }, trackWords }: AnimalView): string {
  return [bodyC === null ? '' : `Body ${bodyMargin(bodyC, 'c')}.`, trackWords].filter(Boolean).join(' ')
}

export function chunk<T>(items: readonly T[], size: number): T[][] {
  return Array.from({ length: Math.ceil(items.length / size) }, (_, index) =>
    items.slice(index * size, (index + 1) * size),
  )
}
