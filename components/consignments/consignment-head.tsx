import { Overrides } from '@/components/sheets/provenance'
import { whoMayOverride } from '@/components/sheets/margin-figures'
import { BoxedFacts, Fact } from '@/components/ui/boxed-facts'
import { Mark } from '@/components/ui/mark'
import { Stamp } from '@/components/ui/stamp'
import { STATE_WORDS } from '@/lib/states/consignment'
import { counted, dayDate, dayDateYear, duration, localTime, localTimeWithOffset } from '@/lib/views/format'
import type { Moment, SheetView } from '@/lib/views/sheet'

/** The facts of a consignment in one frame, and beside them the one large stamp with what decides. */
export function ConsignmentHead({
  view,
  inForceRevision,
}: {
  view: SheetView
  inForceRevision: number | null
}) {
  return (
    <div className="grid wide:grid-cols-[1fr_484px]">
      <BoxedFacts columns="132px 1.4fr 1.3fr .8fr 1.1fr .9fr">
        <Fact caption="Consignment" tall whole>
          <h1 className="flex h-full items-end">
            <Mark size="l" label="Consignment">
              {view.mark}
            </Mark>
          </h1>
        </Fact>
        <Fact caption="From">
          <b>{view.from || 'not given'}</b>
        </Fact>
        <Fact caption="Leaves">
          <When moment={view.leaves} full />
        </Fact>
        <Fact caption="Flight">{view.flight || 'none'}</Fact>
        <Fact caption="Air">{view.weatherWords || 'not assessed yet'}</Fact>
        <Fact caption="Animals, crates">
          {counted(view.animalCount, 'animal')}, {counted(view.crateCount, 'crate')}
        </Fact>
        <Fact caption="To">
          <b>{view.to || 'not given'}</b>
        </Fact>
        <Fact caption="Arrives">
          <When moment={view.arrives} />
        </Fact>
        <Fact caption="Time in crate">{duration(view.journeyMin)}</Fact>
        <Fact caption="Assessed">
          {view.assessed === null
            ? 'not yet'
            : `${dayDate(view.assessed.ms, view.assessed.zone)}, ${localTime(view.assessed.ms, view.assessed.zone)}`}
        </Fact>
        <Fact caption="State, revision">
          <b>{STATE_WORDS[view.state]}</b>, {view.revision}
          {inForceRevision !== null && inForceRevision !== view.revision && (
            <span className="block text-small text-mute">Revision {inForceRevision} travels</span>
          )}
        </Fact>
      </BoxedFacts>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2 border-2 border-ink bg-sheet px-4 py-2.5 max-wide:border-t-0 wide:border-l-0">
        <span className="max-desk:hidden">
          <Stamp {...view.stamp} size="l" />
        </span>
        <span className="desk:hidden">
          <Stamp {...view.stamp} size="phone" />
        </span>
        <div className="min-w-0 flex-1 basis-60">
          <StampWords view={view} />
        </div>
      </div>
    </div>
  )
}

function StampWords({ view }: { view: SheetView }) {
  if (view.stamp.verdict === 'none' && !view.stamp.outOfDate) {
    return <p>Nothing is known yet of how the animals fare.</p>
  }
  const who = whoMayOverride(view.stamp.verdict, view.margin)
  return (
    <>
      {view.stamp.outOfDate && (
        <p className="font-semibold">The figures below speak of an earlier plan or version.</p>
      )}
      <p className={view.stamp.outOfDate ? 'text-mute line-through' : 'font-semibold'}>{view.headline}</p>
      {!view.stamp.outOfDate &&
        view.headlineMore.map((words) => (
          <p key={words} className="text-small">
            {words}
          </p>
        ))}
      {who !== '' && !view.headlineMore.some((words) => words.includes('override')) && (
        <p className="text-small">{who}</p>
      )}
      <Overrides overrides={view.overrides} />
    </>
  )
}

function When({ moment: { ms, zone }, full = false }: { moment: Moment; full?: boolean }) {
  return full ? (
    <>
      {dayDateYear(ms, zone)}, {localTimeWithOffset(ms, zone)}
    </>
  ) : (
    <>
      {dayDate(ms, zone)}, {localTimeWithOffset(ms, zone)}
    </>
  )
}
