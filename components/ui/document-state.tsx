import type { ReactNode } from 'react'

export type DocumentStateKind = 'current' | 'superseded' | 'void' | 'unknown' | 'not-as-issued'

export const DOCUMENT_STATE_WORDS: Record<DocumentStateKind, string> = {
  current: 'Genuine and current',
  superseded: 'Genuine, superseded',
  void: 'Genuine, void',
  unknown: 'Not known here',
  'not-as-issued': 'Not as issued',
}

const PAGE = 'M5 3H54L75 24V97H5Z'
const FOLD = 'M54 3V24H75'
const LINES = 'M17 40H63M17 52H63M17 64H63M17 76H45'
const STROKES = 'M-1 88L78 30M3 97L82 39'
const TORN = 'M5 3H54L75 24V86L66 94L57 85L48 95L39 86L30 96L21 87L13 94L5 88Z'

/** A drawn sheet of paper: whole, under a newer one, struck twice, outlined in dots, or torn. Never a frame round words. */
export function DocumentDrawing({ state, height = 102 }: { state: DocumentStateKind; height?: number }) {
  return (
    <svg
      viewBox="-3 0 90 102"
      width={(height * 90) / 102}
      height={height}
      aria-hidden="true"
      className="block shrink-0"
      strokeLinejoin="miter"
    >
      {DRAWINGS[state]}
    </svg>
  )
}

/** The drawing with its sentence and what follows from it, as the verification page shows it. */
export function DocumentState({
  state,
  title = DOCUMENT_STATE_WORDS[state],
  children,
}: {
  state: DocumentStateKind
  title?: ReactNode
  children?: ReactNode
}) {
  return (
    <div className="grid grid-cols-[auto_1fr] items-start gap-x-5">
      <DocumentDrawing state={state} />
      <div>
        <h2 className="text-page">{title}</h2>
        {children}
      </div>
    </div>
  )
}

const DRAWINGS: Record<DocumentStateKind, ReactNode> = {
  current: <WholeSheet />,
  superseded: (
    <>
      <path
        d={PAGE}
        transform="translate(-3 -1) scale(.84)"
        strokeWidth="2.2"
        className="fill-sheet stroke-rule"
      />
      <g transform="translate(16 16) scale(.84)">
        <path d={PAGE} strokeWidth="10" className="fill-sheet stroke-sheet" />
        <WholeSheet heavy />
      </g>
    </>
  ),
  void: (
    <>
      <path d={PAGE} strokeWidth="2.5" className="fill-sheet stroke-ink" />
      <path d={FOLD} fill="none" strokeWidth="2" className="stroke-ink" />
      <path d={LINES} strokeWidth="2" className="stroke-rule" />
      <path d={STROKES} strokeWidth="7" className="stroke-sheet" />
      <path d={STROKES} strokeWidth="2.5" className="stroke-ink" />
    </>
  ),
  unknown: (
    <g fill="none" strokeWidth="2" strokeDasharray="1 5" strokeLinecap="round" className="stroke-rule">
      <path d={PAGE} />
      <path d={FOLD} />
    </g>
  ),
  'not-as-issued': (
    <>
      <path d={TORN} strokeWidth="2.5" className="fill-sheet stroke-ink" />
      <path d={FOLD} fill="none" strokeWidth="2" className="stroke-ink" />
      <path d="M17 40H63M17 52H63M17 64H63" strokeWidth="2.5" className="stroke-ink" />
    </>
  ),
}

function WholeSheet({ heavy = false }: { heavy?: boolean }) {
  return (
    <>
      <path d={PAGE} strokeWidth={heavy ? 3 : 2.5} className="fill-sheet stroke-ink" />
      <path d={FOLD} fill="none" strokeWidth={heavy ? 2.4 : 2} className="stroke-ink" />
      <path d={LINES} strokeWidth={heavy ? 3 : 2.5} className="stroke-ink" />
    </>
  )
}
