import { View } from '@react-pdf/renderer'
import type { FixedBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { CONTENT_WIDTH } from '@/lib/documents/parts/paper'
import { Figure, INK, Mark, px, Words } from '@/lib/documents/parts/words'
import { figure } from '@/lib/views/format'
import type { AirStop, SheetFirm, StopLimitView } from '@/lib/views/sheet'
import { overriddenLimitWords } from '@/lib/views/sheet-view/stops'
import { chunk } from './animal-boxes'

const PER_ROW = 4
const HEAD = 26
const BOX = 112

/** The one frame a driver looks for: air at which to stop and ring, each crate, above first. */
export function stopLimits(limits: StopLimitView[], firm: SheetFirm): FixedBlock[] {
  if (limits.length === 0) return []
  const perRow = Math.min(PER_ROW, Math.max(2, limits.length))
  const rows = chunk(limits, perRow)
  const width = (CONTENT_WIDTH - 8) / perRow
  const heights = rows.map((row) => BOX + Math.max(...row.map((limit) => noteHeight(limit, width))))
  const height = HEAD + heights.reduce((sum, one) => sum + one, 0) + 8
  return [
    {
      height: height + 9,
      element: (
        <View
          key="stops"
          style={{ borderWidth: px(4), borderColor: INK.ink, marginTop: px(9), height: px(height) }}
        >
          <View style={top}>
            <Words face="head" weight={700} size={14} line={18}>
              Stop and ring the desk if the air at a crate is
            </Words>
            <Words
              size={11}
            >{`${firm.deskTelephone}, ${firm.deskHours}. Strictest of any leg, read at the openings`}</Words>
          </View>
          {rows.map((row, index) => (
            <View
              key={row[0]?.crateId}
              style={{
                flexDirection: 'row',
                height: px(heights[index] ?? BOX),
                ...(index > 0 ? { borderTopWidth: px(1), borderTopColor: INK.rule } : {}),
              }}
            >
              {row.map((limit, at) => (
                <CrateStops key={limit.crateId} limit={limit} width={width} first={at === 0} />
              ))}
            </View>
          ))}
        </View>
      ),
    },
  ]
}

const top = {
  flexDirection: 'row',
  justifyContent: 'space-between',
  alignItems: 'center',
  height: px(HEAD),
  paddingHorizontal: px(9),
  borderBottomWidth: px(1.5),
  borderBottomColor: INK.ink,
} as const

function CrateStops({ limit, width, first }: { limit: StopLimitView; width: number; first: boolean }) {
  const others = notes(limit)
  return (
    <View
      style={{
        width: px(width),
        paddingHorizontal: px(9),
        paddingTop: px(5),
        ...(first ? {} : { borderLeftWidth: px(1), borderLeftColor: INK.rule }),
      }}
    >
      <Mark size={21} line={22}>
        {limit.crateMark}
      </Mark>
      <Side word="above" c={limit.strictest.aboveC} f={limit.strictest.aboveF} />
      <Side word="below" c={limit.strictest.belowC} f={limit.strictest.belowF} />
      {others === '' ? null : (
        <Words size={10} line={12}>
          {others}
        </Words>
      )}
    </View>
  )
}

function Side({ word, c, f }: { word: string; c: number | null; f: number | null }) {
  return (
    <View style={{ marginTop: px(1) }}>
      <Words size={10.5} line={11}>
        {word}
      </Words>
      {c === null ? (
        <Words size={13} line={30} weight={600}>
          no limit found
        </Words>
      ) : (
        <View style={{ flexDirection: 'row', alignItems: 'flex-end', minHeight: px(30) }}>
          <Figure
            size={33}
            line={30}
            weight={600}
            tight={0.4}
            style={{ minWidth: px(102), marginRight: px(6), letterSpacing: px(-1) }}
          >
            {`${figure(c)} °C`}
          </Figure>
          <Figure size={18} line={22} weight={600} tight={0.35} style={{ marginBottom: px(2) }}>
            {f === null ? '' : `${figure(f)} °F`}
          </Figure>
        </View>
      )}
    </View>
  )
}

function notes(limit: StopLimitView): string {
  return [otherLegs(limit), overriddenLimitWords(limit)].filter(Boolean).join('. ')
}

/** "Own limits: leg 3, −6 to 24 °C": legs planned outside the strictest limits, which have their own. */
function otherLegs({ byLeg }: StopLimitView): string {
  const others = byLeg.filter(({ plannedInside }) => !plannedInside)
  // Where none is planned inside its limit, the strictest of all stands above already.
  if (others.length === 0 || others.length === byLeg.length) return ''
  return `Own limits: ${others.map((leg) => `leg ${leg.ordinal}, ${range(leg)}`).join('; ')}`
}

function range({ aboveC, belowC }: AirStop): string {
  if (aboveC !== null && belowC !== null) return `${figure(belowC)} to ${figure(aboveC)}\u00a0°C`
  if (aboveC !== null) return `above ${figure(aboveC)}\u00a0°C`
  return belowC === null ? 'no air keeps it' : `below ${figure(belowC)}\u00a0°C`
}

function noteHeight(limit: StopLimitView, width: number): number {
  const note = notes(limit)
  return note === '' ? 0 : 3 + 12 * lineCount(note, 'text', 400, 10, width - 20)
}
