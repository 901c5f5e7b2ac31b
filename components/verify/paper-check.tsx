'use client'

import { useState } from 'react'
import type { ReactNode } from 'react'
import type { VerificationView } from '@/lib/views/verification'
import { PaperForms } from './paper-forms'
import { Throttled } from './throttled'
import { VerificationResult } from './verification-result'

export type PaperCheckResult =
  | { kind: 'none' }
  | { kind: 'checked'; view: VerificationView }
  | { kind: 'throttled'; endsMs: number; nowMs: number; zone: string }
  /** What was typed or chosen can't be a paper of ours: `field` says where the sentence stands. */
  | { kind: 'refused'; field: 'code' | 'file'; message: string }

/** The whole check: what to check at the left, what became of it at the right (below, on a phone). */
export function PaperCheck({ first, typed = '' }: { first: PaperCheckResult; typed?: string }) {
  const [result, setResult] = useState(first)
  return (
    <div className="border-2 border-ink bg-sheet desk:grid desk:grid-cols-[minmax(0,2fr)_minmax(0,3fr)] desk:divide-x desk:divide-rule">
      <div className="px-4 py-5 desk:px-6">
        <PaperForms typed={typed} refused={result.kind === 'refused' ? result : null} onResult={setResult} />
      </div>
      <div className="px-4 py-5 max-desk:border-t-2 max-desk:border-ink desk:px-6">{face(result)}</div>
    </div>
  )
}

function face(result: PaperCheckResult): ReactNode {
  switch (result.kind) {
    case 'checked':
      return <VerificationResult view={result.view} />
    case 'throttled':
      return <Throttled endsMs={result.endsMs} nowMs={result.nowMs} zone={result.zone} />
    case 'refused':
      return <p className="text-mute">Nothing was checked.</p>
    case 'none':
      return (
        <p className="text-mute">
          Nothing is checked yet. The code is enough to learn whether a paper is in force; the file shows
          besides whether it was altered.
        </p>
      )
  }
}
