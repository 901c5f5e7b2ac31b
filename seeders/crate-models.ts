import type { PlanOpening } from '@/lib/schemas/plan'
import type { CrateModelSpec } from '@/models/crate-model'

/* The firm's own crates; all dimensions inside, in centimetres. Invented, as the firm is. */

type Side = Pick<PlanOpening, 'face' | 'kind' | 'widthCm' | 'heightCm' | 'howMany' | 'sillHeightCm'> & {
  meshOpenPct?: number
}

const openings = (...sides: Side[]): PlanOpening[] =>
  sides.map((side, index) => ({ meshOpenPct: 100, blockedPct: 0, ...side, id: `opening-${index + 1}` }))

const plywood = {
  form: 'crate',
  wallMaterial: 'plywood',
  wallThicknessMm: 9,
  rimMm: 20,
  floorMaterial: 'plywood',
  floorThicknessMm: 12,
  floorOnto: 'deck',
  bedding: { material: 'absorbent-pad', depthMm: 8, wetPct: 0 },
} as const

/** A mesh door in front, slots high and low in the sides, slots high in the back. */
const doorAndSlots = (door: [number, number], sideSlots: number, backSlots: number, highCm: number) =>
  openings(
    {
      face: 'front',
      kind: 'door',
      widthCm: door[0],
      heightCm: door[1],
      howMany: 1,
      sillHeightCm: 8,
      meshOpenPct: 72,
    },
    { face: 'left', kind: 'slots', widthCm: 8, heightCm: 3, howMany: sideSlots, sillHeightCm: highCm },
    { face: 'right', kind: 'slots', widthCm: 8, heightCm: 3, howMany: sideSlots, sillHeightCm: highCm },
    { face: 'back', kind: 'slots', widthCm: 8, heightCm: 3, howMany: backSlots, sillHeightCm: highCm },
  )

export const CRATE_MODELS: readonly { name: string; spec: CrateModelSpec }[] = [
  {
    name: 'Corran 1, small animal box',
    spec: {
      ...plywood,
      lengthCm: 48,
      widthCm: 32,
      heightCm: 34,
      waterContainerL: 0.3,
      bedding: { material: 'wood-shavings', depthMm: 30, wetPct: 0 },
      openings: doorAndSlots([22, 20], 10, 6, 22),
    },
  },
  {
    name: 'Corran 2, cat and small dog crate',
    spec: {
      ...plywood,
      lengthCm: 62,
      widthCm: 42,
      heightCm: 44,
      waterContainerL: 0.5,
      openings: doorAndSlots([30, 30], 14, 10, 30),
    },
  },
  {
    name: 'Corran 3, dog crate',
    spec: {
      ...plywood,
      lengthCm: 92,
      widthCm: 61,
      heightCm: 67,
      waterContainerL: 0.8,
      openings: doorAndSlots([44, 50], 26, 18, 48),
    },
  },
  {
    name: 'Corran 4, large dog crate',
    spec: {
      ...plywood,
      lengthCm: 122,
      widthCm: 76,
      heightCm: 89,
      wallThicknessMm: 12,
      floorThicknessMm: 15,
      waterContainerL: 1.5,
      openings: doorAndSlots([56, 70], 40, 26, 66),
    },
  },
  {
    name: 'Corran 5, chick tray',
    spec: {
      form: 'crate',
      lengthCm: 60,
      widthCm: 48,
      heightCm: 14,
      wallMaterial: 'fibreboard',
      wallThicknessMm: 4,
      rimMm: 15,
      floorMaterial: 'fibreboard',
      floorThicknessMm: 4,
      floorOnto: 'slats',
      bedding: { material: 'wood-shavings', depthMm: 10, wetPct: 0 },
      waterContainerL: null,
      openings: openings(
        { face: 'left', kind: 'holes', widthCm: 2, heightCm: 2, howMany: 14, sillHeightCm: 8 },
        { face: 'right', kind: 'holes', widthCm: 2, heightCm: 2, howMany: 14, sillHeightCm: 8 },
        { face: 'front', kind: 'holes', widthCm: 2, heightCm: 2, howMany: 11, sillHeightCm: 8 },
        { face: 'back', kind: 'holes', widthCm: 2, heightCm: 2, howMany: 11, sillHeightCm: 8 },
        { face: 'top', kind: 'holes', widthCm: 2, heightCm: 2, howMany: 40, sillHeightCm: null },
      ),
    },
  },
  {
    name: 'Corran 6, horse stall',
    spec: {
      form: 'stall',
      lengthCm: 250,
      widthCm: 92,
      heightCm: 220,
      wallMaterial: 'plywood',
      wallThicknessMm: 20,
      rimMm: 0,
      floorMaterial: 'rubber',
      floorThicknessMm: 20,
      floorOnto: 'deck',
      bedding: { material: 'wood-shavings', depthMm: 80, wetPct: 0 },
      waterContainerL: null,
      openings: [],
    },
  },
]
