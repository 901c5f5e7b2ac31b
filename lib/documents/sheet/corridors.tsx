import { View } from '@react-pdf/renderer'
import type { FixedBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { PaperPicture } from '@/lib/documents/parts/picture'
import { px, Words } from '@/lib/documents/parts/words'
import type { SheetView } from '@/lib/views/sheet'
import { chunk } from './animal-boxes'
import { corridorPicture } from './corridor-picture'
import { calloutOf, corridorExplanation, decidedLegId, decidingAnimal } from './deciding'

/** So many fit on a sheet beside findings. */
const PER_SHEET = 6

/** Corridors of all animals on one time scale, the deciding one last. Absent where the sheet has no tracks. */
export function corridors(view: SheetView): FixedBlock[] {
  const { charts } = view
  if (charts === null || charts.animals.length === 0) return []
  const decider = decidingAnimal(view)
  const deciding = charts.animals.find(({ animalId }) => animalId === decider?.animalId) ?? null
  const ordered = [
    ...charts.animals.filter((one) => one !== deciding),
    ...(deciding === null ? [] : [deciding]),
  ]
  const groups = chunk(ordered, PER_SHEET)
  return groups.map((animals, index) => {
    const last = index === groups.length - 1
    const own = last ? deciding : null
    const { picture, cut } = corridorPicture(
      {
        charts,
        animals,
        deciding: own,
        decidedLegId: decidedLegId(view, decider),
        callout: own === null ? null : calloutOf(decider),
      },
      CONTENT_WIDTH,
    )
    const remark = corridorExplanation(cut, charts.animals)
    const lines = lineCount(remark, 'text', 400, 10.5, CONTENT_WIDTH)
    return {
      height: 28 + lines * 13 + 6 + picture.height,
      element: (
        <View key={`corridors-${index}`}>
          <Heading
            remark={`Body °C, true time, ${charts.scheduleWords}. Hatching begins at the alarm limit; the thick line in it is critical`}
          >
            Corridors
          </Heading>
          <Words size={10.5} line={13} style={{ marginBottom: px(6) }}>
            {remark}
          </Words>
          <PaperPicture picture={picture} />
        </View>
      ),
    }
  })
}
