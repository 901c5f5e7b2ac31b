import { renderToBuffer } from '@react-pdf/renderer'
import { cloneElement } from 'react'
import type { ManifestView } from '@/lib/views/manifest'
import type { SheetView } from '@/lib/views/sheet'
import { registerFreshFonts } from './fonts'
import { runsOver } from './laid-out'
import { manifest } from './manifest'
import { assertPrintable } from './printable'
import { goNoGoSheet } from './sheet'

export interface RenderedDocument {
  bytes: Buffer
  pages: number
}

/** The go/no-go sheet as PDF. Throws "invalid" where a text cannot be shown on paper. */
export function renderSheet(view: SheetView): Promise<RenderedDocument> {
  return renderPlanned(view, goNoGoSheet)
}

/** The manifest as PDF, not sealed yet. Throws "invalid" where a text cannot be shown on paper. */
export function renderManifest(view: ManifestView): Promise<RenderedDocument> {
  return renderPlanned(view, manifest)
}

type Plan<View> = (
  view: View,
  slack: number,
) => { document: Parameters<typeof renderToBuffer>[0]; sheets: number }

/** Room given up on each sheet where the planned heights were too small for what was drawn. */
const SLACKS = [1, 0.94, 0.88]

const shared = globalThis as { steadfoldPress?: Promise<unknown> }

/** One document at a time in a process: see registerFreshFonts. */
function renderPlanned<View extends object>(view: View, plan: Plan<View>): Promise<RenderedDocument> {
  const before = shared.steadfoldPress ?? Promise.resolve()
  const ours = before.then(() => renderNow(view, plan))
  shared.steadfoldPress = ours.catch(() => undefined)
  return ours
}

async function renderNow<View extends object>(view: View, plan: Plan<View>): Promise<RenderedDocument> {
  assertPrintable(view)
  for (const slack of SLACKS) {
    registerFreshFonts()
    const { document, sheets } = plan(view, slack)
    let over = false
    const onRender = (said: object) => {
      over = runsOver(said)
    }
    const bytes = await renderToBuffer(cloneElement(document, { onRender }))
    if (!over) return { bytes, pages: sheets }
  }
  throw new Error('The document does not fit the sheets planned for it.')
}
