import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { crateDrawing, crateSummary, faceShare, sidesShare } from '@/lib/views/charts/crate'
import type { CrateOpening, CrateShape } from '@/lib/views/charts/crate'
import { openingBoxes } from '@/lib/views/charts/crate-openings'

const opening = (
  face: CrateOpening['face'],
  widthCm: number,
  heightCm: number,
  howMany: number,
  more: Partial<CrateOpening> = {},
): CrateOpening => ({
  face,
  kind: 'slats',
  widthCm,
  heightCm,
  howMany,
  sillHeightCm: null,
  meshOpenPct: 100,
  blockedPct: 0,
  ...more,
})

const crate: CrateShape = {
  mark: '2417-A',
  lengthCm: 66,
  widthCm: 46,
  heightCm: 51,
  waterContainerL: 0.5,
  animalCm: 53,
  openings: [
    opening('front', 34, 38, 1, { kind: 'door', meshOpenPct: 70 }),
    opening('left', 54, 3.2, 4),
    opening('right', 54, 3.2, 4, { blockedPct: 50 }),
    opening('back', 7.2, 4.4, 8),
  ],
}

describe('open share', () => {
  // By hand: front 34 × 38 × 0.7 = 904.4 of 46 × 51 = 2346; left 4 × 54 × 3.2 = 691.2 of 66 × 51 = 3366; right half of
  // that; back 8 × 7.2 × 4.4 = 253.44. Together 2194.64 of 11 424, which is 19.2 %.
  it('is the hand-worked one', () => {
    expect(faceShare(crate, 'front').sharePct).toBeCloseTo(38.55, 2)
    expect(faceShare(crate, 'left').sharePct).toBeCloseTo(20.53, 2)
    expect(faceShare(crate, 'right').sharePct).toBeCloseTo(10.27, 2)
    expect(faceShare(crate, 'back').sharePct).toBeCloseTo(10.8, 2)
    expect(sidesShare(crate)).toMatchObject({ wallCm2: 11_424 })
    expect(sidesShare(crate).openCm2).toBeCloseTo(2194.64, 2)
  })

  it('does not count the top among the sides', () => {
    const vented = { ...crate, openings: [...crate.openings, opening('top', 2, 2, 20)] }
    expect(sidesShare(vented)).toEqual(sidesShare(crate))
  })
})

describe('drawing', () => {
  it('keeps every opening on its face, as many as typed and as large', () => {
    const face = { x: 30, y: 22, width: 200, height: 150 }
    fc.assert(
      fc.property(
        fc.record({
          widthCm: fc.integer({ min: 1, max: 60 }),
          heightCm: fc.integer({ min: 1, max: 20 }),
          howMany: fc.integer({ min: 1, max: 12 }),
        }),
        fc.option(fc.integer({ min: 0, max: 20 })),
        ({ widthCm, heightCm, howMany }, sillHeightCm) => {
          const row = opening('left', widthCm, heightCm, howMany, { sillHeightCm })
          // What can't fit at all is refused by the plan; here only rows that do.
          fc.pre(
            Math.ceil(howMany / Math.max(1, Math.floor(188 / (widthCm * 2 * 1.12)))) * heightCm * 2 <
              (sillHeightCm === null ? 150 : 150 - sillHeightCm * 2),
          )
          const boxes = openingBoxes(row, face, 2, { index: 0, of: 1 })
          expect(boxes).toHaveLength(howMany)
          for (const box of boxes) {
            expect(box.width).toBeCloseTo(widthCm * 2, 6)
            expect(box.x).toBeGreaterThanOrEqual(face.x - 0.01)
            expect(box.x + box.width).toBeLessThanOrEqual(face.x + face.width + 0.01)
            expect(box.y).toBeGreaterThanOrEqual(face.y - 0.01)
            expect(box.y + box.height).toBeLessThanOrEqual(face.y + face.height + 0.01)
          }
        },
      ),
    )
  })

  it('is to one scale and fits its width', () => {
    for (const width of [320, 364, 520]) {
      const picture = crateDrawing(crate, { width, notes: ['Ply 9 mm, rim bars 20 mm'] })
      const frames = picture.marks.flatMap((mark) =>
        mark.kind === 'rect' && mark.strokeWidth === 1.5 && mark.fill === 'band' ? [mark] : [],
      )
      expect(frames).toHaveLength(4)
      const [left, front] = frames
      expect((left?.width ?? 0) / (front?.width ?? 1)).toBeCloseTo(66 / 46, 2)
      expect((left?.width ?? 0) / (left?.height ?? 1)).toBeCloseTo(66 / 51, 2)
      for (const mark of picture.marks)
        if (mark.kind === 'rect') expect(mark.x + mark.width).toBeLessThanOrEqual(width)
    }
  })

  it('has words for who can’t see it', () => {
    expect(crateSummary(crate)).toContain('19.2\u00a0% of the four sides')
  })
})
