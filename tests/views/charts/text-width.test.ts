import path from 'node:path'
import * as fontkit from 'fontkit'
import { describe, expect, it } from 'vitest'
import { PAPER_FONTS } from '@/lib/tokens'
import { textWidth } from '@/lib/views/charts/text-width'

const SAMPLES = [
  'Critical high 40.2 °C',
  'heat-prone, decides',
  'Border post, 5:25',
  '0123456789',
  'Wed 10 Jun',
  'Łódź, Tromsø',
]

/** The table against the font files themselves, laid out with kerning and tabular figures by fontkit. */
describe('text widths', () => {
  for (const { face, weight, style, file } of PAPER_FONTS) {
    if (style === 'italic' || (face === 'head' && weight === 600) || (face === 'text' && weight === 700))
      continue
    it(`${file}: never narrower than the words, and at most a tenth wider`, () => {
      const font = fontkit.openSync(path.join(process.cwd(), 'fonts/pdf', file))
      if (!('layout' in font)) throw new Error('a font collection')
      for (const sample of SAMPLES) {
        const spaces = face === 'fig' ? (sample.match(/ /g)?.length ?? 0) * 280 : 0
        const real = ((font.layout(sample, ['tnum']).advanceWidth - spaces) * 12) / font.unitsPerEm
        const ours = textWidth(sample, face, 12, weight)
        expect(ours, sample).toBeGreaterThanOrEqual(real * 0.985)
        expect(ours, sample).toBeLessThanOrEqual(real * 1.1)
      }
    })
  }
})
