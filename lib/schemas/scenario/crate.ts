import { z } from 'zod'
import type { Crate } from '@/lib/thermal/scenario'
import { animalSchema } from './animal'
import { figure, figureOr, identifier, optionalFigure, word, words } from './figure'
import type { Same } from './same'

const FACES = ['front', 'back', 'left', 'right', 'top'] as const
const WALL_MATERIALS = ['plywood', 'plastic', 'fibreboard', 'metal-mesh', 'insulated-foam'] as const
const FLOOR_MATERIALS = [...WALL_MATERIALS, 'steel', 'aluminium', 'rubber'] as const
const BEDDINGS = ['none', 'newspaper', 'wood-shavings', 'straw', 'absorbent-pad', 'foam'] as const

const side = (what: string) => figure({ what, unit: 'm', min: 0.05, max: 20, more: 'Inside' })

const wallSchema = z.strictObject({
  material: word('Wall material', WALL_MATERIALS),
  thicknessMm: figure({ what: 'Wall thickness', unit: 'mm', min: 0.2, max: 200 }),
  openPct: optionalFigure(
    {
      what: 'Open share of the wall',
      unit: '%',
      min: 0,
      max: 100,
      more: 'For mesh walls, besides the openings',
    },
    'by material',
  ),
  massKg: optionalFigure(
    { what: 'Mass of the walls', unit: 'kg', min: 0, max: 5_000 },
    'from area, thickness and material',
  ),
  emissivity: optionalFigure({ what: 'Emissivity', unit: '', min: 0.02, max: 1 }, 'by material'),
  solarAbsorptance: optionalFigure(
    { what: 'Share of sun taken up', unit: '', min: 0, max: 1 },
    'by material',
  ),
})

const openingSchema = z.strictObject({
  face: word('Face', FACES),
  areaM2: figure({ what: 'Open area', unit: 'm²', min: 0.000001, max: 100 }),
  widthM: optionalFigure({ what: 'Opening width', unit: 'm', min: 0.001, max: 20 }, 'from area and height'),
  heightM: optionalFigure(
    { what: 'Opening height', unit: 'm', min: 0.001, max: 20 },
    'the smaller of 0.6 of the crate’s height and √area',
  ),
  sillHeightM: optionalFigure(
    { what: 'Sill above the floor', unit: 'm', min: 0, max: 20 },
    'centred on the face',
  ),
  rimMm: optionalFigure(
    { what: 'Rim', unit: 'mm', min: 0, max: 500, more: 'What keeps cargo off the opening' },
    'unknown; rules that ask for it say so',
  ),
  meshMm: optionalFigure({ what: 'Mesh width', unit: 'mm', min: 0, max: 200 }, 'no mesh'),
  meshOpenPct: figureOr({ what: 'Mesh open', unit: '%', min: 1, max: 100 }, 100, 'no mesh'),
  blockedPct: figureOr({ what: 'Blocked', unit: '%', min: 0, max: 100 }, 0, 'nothing in front'),
})

const blockedByFace = z
  .partialRecord(word('Face', FACES), figure({ what: 'Blocked', unit: '%', min: 0, max: 100 }))
  .default({})
  .describe(
    'Share of each face blocked by stacking, nets or blankets. Default none; the larger of this and the opening’s own counts.',
  )

const onLegSchema = z.strictObject({
  legId: identifier('Leg id'),
  blockedPct: blockedByFace,
  clearanceMm: optionalFigure(
    { what: 'Clearance', unit: 'mm', min: 0, max: 10_000, more: 'To whatever stands nearest' },
    'free on all sides',
  ),
  headingDeg: optionalFigure(
    { what: 'Heading of the crate', unit: '°', min: 0, max: 360 },
    'the leg’s heading',
  ),
  shadePct: optionalFigure({ what: 'Shade on the crate', unit: '%', min: 0, max: 100 }, 'the leg’s shade'),
})

const floorSchema = z.strictObject({
  material: word('Floor material', FLOOR_MATERIALS),
  thicknessMm: figure({ what: 'Floor thickness', unit: 'mm', min: 0.2, max: 300 }),
  onto: word('Floor stands on', ['deck', 'slats', 'air']),
  airGapMm: optionalFigure(
    { what: 'Air gap under the floor', unit: 'mm', min: 0, max: 1_000 },
    'by what the floor stands on',
  ),
})

const beddingSchema = z.strictObject({
  material: word('Bedding', BEDDINGS),
  depthMm: figure({ what: 'Bedding depth', unit: 'mm', min: 0, max: 500 }),
  wetPct: figureOr(
    { what: 'Bedding wet', unit: '%', min: 0, max: 100, more: 'Share of what it can hold' },
    0,
    'dry at loading',
  ),
  massKg: optionalFigure(
    { what: 'Bedding mass', unit: 'kg', min: 0, max: 500 },
    'from depth, area and material',
  ),
})

const plainCrateSchema = z.strictObject({
  id: identifier('Crate id'),
  mark: words('Crate mark', 40).describe('What everyone calls the crate by, for example 2417-A.'),
  form: word('Form', ['crate', 'stall', 'pen'])
    .default('crate')
    .describe('Stalls and pens are open at the top. Default crate.'),
  fromLegId: identifier('First leg')
    .optional()
    .describe('The leg at which the crate joins. Absent: the first.'),
  toLegId: identifier('Last leg')
    .optional()
    .describe('The leg at whose end the crate leaves. Absent: the last.'),
  lengthM: side('Length'),
  widthM: side('Width'),
  heightM: side('Height'),
  wall: wallSchema.optional().describe('Required for form crate.'),
  openings: z.array(openingSchema).default([]).describe('Required for form crate.'),
  byLeg: z.array(onLegSchema).default([]).describe('What stands around the crate on a leg. Default: free.'),
  floor: floorSchema.optional().describe('Absent: as the walls, standing on a deck.'),
  bedding: beddingSchema.optional().describe('Absent: none.'),
  medium: z
    .literal('air', {
      error: (issue) => `Medium ${JSON.stringify(issue.input)}: only animals in air can be simulated so far.`,
    })
    .default('air')
    .describe('What the animals are in. Only air so far.'),
  initialAirTempC: optionalFigure(
    { what: 'Crate air at loading', unit: '°C', min: -60, max: 60 },
    'the air around it',
  ),
  initialRelHumidityPct: optionalFigure(
    { what: 'Crate humidity at loading', unit: '%', min: 0, max: 100 },
    'the vapour around it',
  ),
  occupants: z.array(animalSchema).min(1, { error: 'Occupants: put at least one animal in the crate.' }),
})

/** One crate and the animals in it; length runs front to back. */
export const crateSchema = plainCrateSchema.superRefine((crate, context) => {
  if (crate.form === 'crate' && crate.wall === undefined)
    context.addIssue({
      code: 'custom',
      path: ['wall'],
      message: 'Walls are missing: a crate in air needs them.',
    })
  if (crate.form === 'crate' && crate.openings.length === 0 && !isOpenWall(crate))
    context.addIssue({
      code: 'custom',
      path: ['openings'],
      message: 'Openings are missing: a closed crate in air has no openings and cannot be assessed.',
    })
  for (const face of FACES) checkFace(crate, face, context)
})

/** Mesh walls are open all over and need no opening besides. */
function isOpenWall({ wall }: PlainCrate) {
  return wall?.material === 'metal-mesh' || (wall?.openPct ?? 0) > 0
}

type PlainCrate = z.output<typeof plainCrateSchema>

/** Openings of one face together may not be larger than the face, nor one wider or higher than it. */
function checkFace(crate: PlainCrate, face: (typeof FACES)[number], context: z.RefinementCtx) {
  const [widthM, heightM] = faceSize(crate, face)
  const indexes = crate.openings.flatMap((opening, index) => (opening.face === face ? [index] : []))
  const openM2 = indexes.reduce((sum, index) => sum + (crate.openings[index]?.areaM2 ?? 0), 0)
  const last = indexes.at(-1)
  if (last !== undefined && openM2 > widthM * heightM * (1 + 1e-9))
    context.addIssue({
      code: 'custom',
      path: ['openings', last, 'areaM2'],
      message: `Open area of the ${face} ${round(openM2)} m²: the face has only ${round(widthM * heightM)} m².`,
    })
  for (const index of indexes) {
    const opening = crate.openings[index]
    if (opening?.widthM !== undefined && opening.widthM > widthM + 1e-9)
      context.addIssue({
        code: 'custom',
        path: ['openings', index, 'widthM'],
        message: `Opening width ${opening.widthM} m: the ${face} is only ${round(widthM)} m wide.`,
      })
    if (opening?.heightM !== undefined && (opening.sillHeightM ?? 0) + opening.heightM > heightM + 1e-9)
      context.addIssue({
        code: 'custom',
        path: ['openings', index, 'heightM'],
        message: `Opening height ${opening.heightM} m with its sill: the ${face} is only ${round(heightM)} m high.`,
      })
    if (
      opening?.widthM !== undefined &&
      opening.heightM !== undefined &&
      opening.areaM2 > opening.widthM * opening.heightM * (1 + 1e-6)
    )
      context.addIssue({
        code: 'custom',
        path: ['openings', index, 'areaM2'],
        message: `Open area ${round(opening.areaM2)} m²: width by height is only ${round(opening.widthM * opening.heightM)} m².`,
      })
  }
}

/** Width and height of a face as one stands before it; the top is as wide as the crate and as "high" as it is long. */
function faceSize(crate: PlainCrate, face: (typeof FACES)[number]): [number, number] {
  switch (face) {
    case 'front':
    case 'back':
      return [crate.widthM, crate.heightM]
    case 'left':
    case 'right':
      return [crate.lengthM, crate.heightM]
    case 'top':
      return [Math.max(crate.widthM, crate.lengthM), Math.min(crate.widthM, crate.lengthM)]
  }
}

function round(value: number) {
  return Math.round(value * 10_000) / 10_000
}

const _crate: Same<z.output<typeof crateSchema>, Crate> = true
