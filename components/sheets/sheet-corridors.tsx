import { PictureSvg } from '@/components/charts/picture'
import { corridorPicture } from '@/lib/documents/sheet/corridor-picture'
import { calloutOf, corridorExplanation, decidedLegId, decidingAnimal } from '@/lib/documents/sheet/deciding'
import type { SheetView } from '@/lib/views/sheet'

/** The width of a paper's content, px: the picture on the page is the one that prints. */
const WIDTH = 700

/** All animals on one time scale, the deciding one last and high; the very picture of the paper. */
export function SheetCorridors({ view }: { view: SheetView }) {
  const { charts } = view
  if (charts === null || charts.animals.length === 0) return <p className="text-mute">No tracks are kept.</p>
  const decider = decidingAnimal(view)
  const deciding = charts.animals.find(({ animalId }) => animalId === decider?.animalId) ?? null
  const { picture, cut } = corridorPicture(
    {
      charts,
      animals: charts.animals,
      deciding,
      decidedLegId: decidedLegId(view, decider),
      callout: calloutOf(decider),
    },
    WIDTH,
  )
  return (
    <>
      <p className="mb-1.5 text-small">
        Body °C, true time, {charts.scheduleWords}. Hatching begins at the alarm limit; the thick line in it
        is critical. {corridorExplanation(cut, charts.animals)}
      </p>
      <div role="group" tabIndex={0} aria-label="Corridors" className="overflow-x-auto">
        <PictureSvg
          picture={picture}
          summary={`Body temperature of every animal between its limits. ${view.headline}`}
        />
      </div>
    </>
  )
}
