import type { ReactNode } from 'react'
import { BoxedFacts, Fact } from '@/components/ui/boxed-facts'
import { Brand } from '@/components/ui/brand'
import { Mark } from '@/components/ui/mark'
import { Stamp } from '@/components/ui/stamp'
import { counted, dayDate, dayDateYear, duration, localTimeWithOffset } from '@/lib/views/format'
import type { Moment, SheetView } from '@/lib/views/sheet'
import { AnimalBoxes } from './animal-boxes'
import { ConditionsTable } from './conditions-table'
import { FindingsTable } from './findings-table'
import { PaperLegs } from './legs-table'
import { Cautions, Overrides, Provenance } from './provenance'
import { Signatures } from './signatures'
import { SheetCorridors } from './sheet-corridors'
import { StopLimits } from './stop-limits'

/** So many findings stand on the sheet; it says how many it left out. */
const MOST_FINDINGS = 9

/** The go/no-go sheet as it prints: the same view as the PDF, in the same order. */
export function GoNoGoSheet({ view }: { view: SheetView }) {
  const left = view.findings.length - MOST_FINDINGS
  return (
    <article className="relative mx-auto max-w-[820px] border border-rule bg-sheet py-6 pl-12 pr-6 print:max-w-none print:border-0 print:p-0 print:[zoom:.84] max-desk:px-3">
      {view.edgeWords !== '' && (
        <p className="absolute left-2 top-6 font-head font-bold [writing-mode:vertical-rl] rotate-180 max-desk:static max-desk:rotate-0 max-desk:[writing-mode:horizontal-tb] print:static print:rotate-0 print:[writing-mode:horizontal-tb]">
          {view.edgeWords}
        </p>
      )}
      <header className="mb-3 flex flex-wrap items-end gap-4 border-b-4 border-ink pb-2">
        <Mark size="l" label="Consignment">
          {view.mark}
        </Mark>
        <div>
          <h1 className="text-section">Go/no-go sheet</h1>
          <p className="text-small">{view.revisionWords}</p>
        </div>
        <div className="ml-auto flex min-w-0 flex-col items-end text-small">
          <Brand />
          <span>
            Shown {dayDateYear(view.made.ms, view.made.zone)},{' '}
            {localTimeWithOffset(view.made.ms, view.made.zone)}
          </span>
          <span>{view.firm.name}</span>
        </div>
      </header>
      <SheetFacts view={view} />
      <div className="my-3 flex flex-wrap items-center gap-x-5 gap-y-2">
        <span className="max-desk:hidden print:inline">
          <Stamp {...view.stamp} size="l" />
        </span>
        <span className="desk:hidden print:hidden">
          <Stamp {...view.stamp} size="phone" />
        </span>
        <div className="min-w-0 flex-1 basis-72">
          <p className="font-semibold">{view.headline}</p>
          {view.headlineMore.map((words) => (
            <p key={words}>{words}</p>
          ))}
          <Overrides overrides={view.overrides} />
        </div>
      </div>
      {view.assessed === null ? (
        <p className="border-2 border-ink px-3 py-2">
          This plan has not been assessed: there is nothing to print yet.
        </p>
      ) : (
        <>
          <AnimalBoxes animals={view.animals} />
          <Part
            title="Legs"
            words="In the frame minutes to spare, beside it outside air; below the limit that decides, then body"
          >
            <PaperLegs legs={view.legs} animals={view.animals} outOfDate={view.stamp.outOfDate} />
          </Part>
          <Part title="Conditions" words={view.conditionsWords}>
            <ConditionsTable conditions={view.conditions} />
          </Part>
          <div className="mt-4 break-inside-avoid">
            <StopLimits
              limits={view.stopLimits}
              telephone={view.firm.deskTelephone}
              hours={view.firm.deskHours}
            />
          </div>
          <Part title="Corridors" breaks>
            <SheetCorridors view={view} />
          </Part>
          <Part
            title="Findings"
            words={
              left > 0
                ? `The ${MOST_FINDINGS} that decide or were asked about, of ${view.findings.length}; the page holds them all`
                : undefined
            }
          >
            <FindingsTable findings={view.findings.slice(0, MOST_FINDINGS)} />
          </Part>
          {view.approvals.length > 0 && (
            <Part title="Vet’s approval">
              <Signatures approvals={view.approvals} />
            </Part>
          )}
          <Part title="What this sheet speaks of">
            <Provenance view={view} />
          </Part>
          <div className="mt-3 border-t border-ink pt-2">
            <Cautions cautions={view.cautions} />
          </div>
        </>
      )}
    </article>
  )
}

function SheetFacts({ view }: { view: SheetView }) {
  return (
    <BoxedFacts columns="1.5fr 1.4fr 1fr .9fr">
      <Fact caption="From">
        <b>{view.from || 'not given'}</b>
      </Fact>
      <Fact caption="Leaves">
        <When moment={view.leaves} />
      </Fact>
      <Fact caption="Shipper">{view.shipper}</Fact>
      <Fact caption="Animals, crates">
        {counted(view.animalCount, 'animal')} in {counted(view.crateCount, 'crate')}
      </Fact>
      <Fact caption="To">
        <b>{view.to || 'not given'}</b>
      </Fact>
      <Fact caption="Arrives">
        <When moment={view.arrives} />
      </Fact>
      <Fact caption="Flight">{view.flight || 'none'}</Fact>
      <Fact caption="Time in crate">{duration(view.journeyMin)}</Fact>
    </BoxedFacts>
  )
}

function When({ moment: { ms, zone } }: { moment: Moment }) {
  return (
    <>
      {dayDate(ms, zone)}, {localTimeWithOffset(ms, zone)}
    </>
  )
}

function Part({
  title,
  words,
  breaks = false,
  children,
}: {
  title: string
  words?: string
  /** Begins a new sheet of paper. */
  breaks?: boolean
  children: ReactNode
}) {
  return (
    <section className={breaks ? 'mt-4 print:break-before-page' : 'mt-4'}>
      <div className="mb-1 flex flex-wrap items-baseline gap-x-3 break-after-avoid">
        <h2 className="text-sub">{title}</h2>
        {words && <p className="text-small text-mute">{words}</p>}
      </div>
      {children}
    </section>
  )
}
