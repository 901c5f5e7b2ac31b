'use client'

import { useState } from 'react'
import { Section } from '@/components/ui/section'
import { Head, Ledger } from '@/components/ui/ledger'
import type { FindingView } from '@/lib/views/sheet'
import { FindingRow } from './finding-row'
import type { ReviewFormState } from './review-desk'

const NEAREST = 4

/** Findings on this crate: breaches first, then what is unknown or near to a limit; the rest on request. */
export function FindingsPart({
  form,
  findings,
  all,
  letters,
  closed,
}: {
  form: ReviewFormState
  /** Those that speak of a crate the signature covers. */
  findings: readonly FindingView[]
  /** Every finding, in the order of the form's rows. */
  all: readonly FindingView[]
  letters: string
  closed: boolean
}) {
  const [whole, setWhole] = useState(false)
  const first = firstShown(findings)
  const shown = whole ? findings : findings.filter((finding) => first.has(finding.number))
  return (
    <Section
      id="findings"
      title={`Findings on ${letters}`}
      words={
        whole
          ? `all ${findings.length}`
          : `${shown.length} of ${findings.length} shown: breaches, and those nearest to one`
      }
      acts={
        findings.length > first.size && (
          <button type="button" className="link" onClick={() => setWhole((before) => !before)}>
            {whole ? 'Breaches and nearest' : `All ${findings.length}`}
          </button>
        )
      }
    >
      <Ledger caption={`Findings on crates ${letters}`} folds>
        <thead>
          <tr>
            <Head className="w-[200px]">Override, by name</Head>
            <Head>Basis</Head>
            <Head>What is asked, where from</Head>
            <Head>Plan gives</Head>
            <Head numeric>To spare</Head>
          </tr>
        </thead>
        <tbody>
          {shown.map((finding) => (
            <FindingRow
              key={finding.number}
              form={form}
              finding={finding}
              index={all.indexOf(finding)}
              closed={closed}
            />
          ))}
        </tbody>
      </Ledger>
    </Section>
  )
}

function firstShown(findings: readonly FindingView[]): Set<number> {
  const pressing = findings.filter((finding) => finding.status !== 'met' && finding.status !== 'note')
  const nearest = findings
    .filter((finding) => finding.status === 'met' && finding.margin.minutes !== null)
    .sort((a, b) => (a.margin.minutes ?? 0) - (b.margin.minutes ?? 0))
    .slice(0, NEAREST)
  return new Set([...pressing, ...nearest].map((finding) => finding.number))
}
