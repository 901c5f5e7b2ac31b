import { Document, renderToBuffer, View } from '@react-pdf/renderer'
import { describe, expect, it } from 'vitest'
import { registerFreshFonts } from '@/lib/documents/fonts'
import { runsOver } from '@/lib/documents/laid-out'
import { Paper, roomOn } from '@/lib/documents/parts/paper'
import { px } from '@/lib/documents/parts/words'
import { renderManifest, renderSheet } from '@/lib/documents/render'
import { manifest2433 } from './fixtures/manifest-2433'
import { sheet2441 } from './fixtures/sheet-2441'
import { pdfInfo } from './support/pdf-tools'

async function twoSheets(heights: [number, number]) {
  let over: boolean | undefined
  registerFreshFonts()
  const bytes = await renderToBuffer(
    <Document onRender={(said) => (over = runsOver(said))}>
      {heights.map((height, index) => (
        <Paper
          key={height}
          mark="2433"
          title="Manifest"
          revision={1}
          revisionWords="Revision 1"
          edgeWords="Original"
          code="R4XT-96KW"
          madeWords="Thu 11 Jun 2026"
          sheet={index + 1}
          sheets={2}
        >
          <View style={{ height: px(height), flexShrink: 0 }} />
        </Paper>
      ))}
    </Document>,
  )
  return { over, pages: (await pdfInfo(bytes)).Pages }
}

describe('a sheet that was planned', () => {
  it('holds all the room it is said to have, and not a line more', { timeout: 60_000 }, async () => {
    expect(await twoSheets([roomOn(1), roomOn(2)])).toEqual({ over: false, pages: '2' })
    expect(await twoSheets([roomOn(1) + 12, 100])).toEqual({ over: true, pages: '2' })
    expect(await twoSheets([100, roomOn(2) + 12])).toEqual({ over: true, pages: '2' })
  })
})

describe('a document', () => {
  it('does not depend on those printed before it', { timeout: 60_000 }, async () => {
    const first = (await renderSheet(sheet2441)).bytes
    await renderManifest(manifest2433)
    expect(undated((await renderSheet(sheet2441)).bytes)).toBe(undated(first))
  })
})

/** All of a file but when it was made, and the identity that is made from that. */
function undated(bytes: Buffer): string {
  const text = bytes.toString('latin1')
  const stamped = /\(D:\d{14}Z\)|\/ID \[[^\]]*\]/g
  expect(text.match(stamped)).toHaveLength(2)
  return text.replace(stamped, '')
}
