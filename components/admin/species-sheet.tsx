'use client'

import { BoxedFacts, Fact } from '@/components/ui/boxed-facts'
import { Cell, Head, Ledger, RowHead } from '@/components/ui/ledger'
import { Notice } from '@/components/ui/notice'
import { useUnit } from '@/components/ui/preferences'
import { Section } from '@/components/ui/section'
import { bodyTemp, dayDateYear, limitTemp } from '@/lib/views/format'
import type { TempUnit } from '@/lib/views/preferences'
import { CONFIDENCE_WORDS } from '@/lib/views/species'
import type { SpeciesFigure, SpeciesView } from '@/lib/views/species'
import { SpeciesRuler } from './species-ruler'

/** One species row: limits, then every figure with where it is from and how far it can be trusted. */
export function SpeciesSheet({ view }: { view: SpeciesView }) {
  const unit = useUnit()
  return (
    <>
      <BoxedFacts columns="1fr 1fr 1fr 1fr">
        <Fact caption="In force">
          <b>Version {view.version}</b>, since {dayDateYear(view.since.ms, view.since.zone)}
        </Fact>
        <Fact caption="Mass it holds for">{view.massWords}</Fact>
        <Fact caption="Body plan">{view.bodyPlan}</Fact>
        <Fact caption="Scientific name">
          <i>{view.scientificName}</i>
        </Fact>
      </BoxedFacts>
      {view.refused && (
        <Notice className="mt-4" title="Nothing can be assessed with this row">
          {view.refused}
        </Notice>
      )}
      <Section
        id="limits"
        title="Limits of body temperature"
        words="product limits: below any recorded fatal value"
      >
        {view.limits && (
          <div
            role="group"
            tabIndex={0}
            aria-label="Limits"
            className="mb-3 overflow-x-auto border border-rule bg-sheet p-3"
          >
            <SpeciesRuler limits={view.limits} unit={unit} />
          </div>
        )}
        <Figures caption="Limits" figures={view.limitFigures} unit={unit} />
        <p className="mt-1.5 text-small text-mute">
          A limit marked judgement is for the responsible vet to confirm. No limit may lie at a recorded fatal
          value.
        </p>
      </Section>
      {view.groups.map((group) => (
        <Section key={group.title} title={group.title}>
          <Figures caption={group.title} figures={group.figures} unit={unit} />
        </Section>
      ))}
      <Section id="remarks" title="What a reader must know">
        <ul className="list-none divide-y divide-hair">
          {view.remarks.length === 0 && (
            <li className="py-1.5 text-mute">No remark is kept with this row.</li>
          )}
          {view.remarks.map((remark) => (
            <li key={remark} className="max-w-[90ch] py-1.5">
              {remark}
            </li>
          ))}
        </ul>
      </Section>
      <Section
        id="versions"
        title="Versions"
        words="nothing old is deleted; each assessment keeps the version it was made with"
      >
        <ul className="list-none">
          {view.versions.map((version) => (
            <li key={version.version}>
              <b>{version.version}</b>, kept since {dayDateYear(version.since.ms, version.since.zone)}
            </li>
          ))}
        </ul>
      </Section>
    </>
  )
}

function Figures({
  caption,
  figures,
  unit,
}: {
  caption: string
  figures: readonly SpeciesFigure[]
  unit: TempUnit
}) {
  return (
    <Ledger caption={caption} folds>
      <thead>
        <tr>
          <Head className="w-[28%]">What</Head>
          <Head numeric>Figure</Head>
          <Head>Where from</Head>
          <Head>Confidence</Head>
        </tr>
      </thead>
      <tbody>
        {figures.map((figure) => (
          <tr key={figure.words}>
            <RowHead className="font-normal">{figure.words}</RowHead>
            <Cell label="Figure" numeric className="font-semibold">
              {figureWords(figure, unit)}
            </Cell>
            <Cell label="Where from">{figure.source}</Cell>
            <Cell label="Confidence">{CONFIDENCE_WORDS[figure.confidence]}</Cell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}

function figureWords({ tempC, value }: SpeciesFigure, unit: TempUnit): string {
  if (tempC === null) return value
  return tempC.side === null ? bodyTemp(tempC.value, unit) : limitTemp(tempC.value, tempC.side, unit)
}
