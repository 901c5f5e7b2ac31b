import type { Crate, Face, Opening } from '@/lib/thermal'
import type { Finding } from '../../result'
import type { Subject } from '../../subject'
import { percent, signed } from '../../wording'
import type { LawView } from '../pack'
import { lawFinding } from './finding'

const WALLS: readonly Face[] = ['front', 'back', 'left', 'right']
const TOTAL_PCT = 14
const UPPER_SHARE_PCT = 100 / 3
/** The text leads with 0.75 in and prints 1.9 cm. */
const RIM_MM = { inches: 19.05, printed: 19 }
const ROUNDING = 1e-9

/** Openings and rims of the crate an animal travels in; stalls and pens are not enclosures of this kind. */
export function enclosureFindings(view: LawView, subject: Subject): Finding[] {
  const { crate } = subject
  if (crate.form !== 'crate') return []
  return [
    totalOpen(view, subject, crate),
    upperHalf(view, subject, crate),
    byFace(view, subject, crate),
    rims(view, subject, crate),
  ]
}

function totalOpen(view: LawView, subject: Subject, crate: Crate): Finding {
  const value = (100 * openM2(crate, WALLS)) / wallM2(crate)
  const status = value < TOTAL_PCT - ROUNDING ? 'breach' : 'met'
  const asked = `Openings at least ${percent(TOTAL_PCT)} of all four walls together.`
  return lawFinding(view, 'openings', subject, {
    status,
    side: 'low',
    limit: TOTAL_PCT,
    value,
    unit: '%',
    asked,
    note: `Openings make ${signed(value, 1)} % of the walls.`,
  })
}

function upperHalf(view: LawView, subject: Subject, crate: Crate): Finding {
  const asked = 'At least a third of the open area in the upper half.'
  const shared = { side: 'low' as const, limit: UPPER_SHARE_PCT, unit: '%', asked }
  const openings = crate.openings.filter(({ face }) => WALLS.includes(face))
  const total = openM2(crate, WALLS)
  const upper = openings.map((opening) => upperM2(opening, crate))
  if (upper.includes(undefined))
    return lawFinding(view, 'openingsUpperHalf', subject, {
      ...shared,
      status: 'unknown',
      note: 'The sill and height of an opening are not given.',
    })
  const value = total === 0 ? 0 : (100 * upper.reduce<number>((sum, area) => sum + (area ?? 0), 0)) / total
  const status = value < UPPER_SHARE_PCT - ROUNDING ? 'breach' : 'met'
  return lawFinding(view, 'openingsUpperHalf', subject, {
    ...shared,
    status,
    value,
    note: `${signed(value, 0)} % of the open area lies in the upper half.`,
  })
}

/** Two opposite walls 16 % each, three walls 8 % of the opposite two and half of the third, or four walls 8 % each. */
function byFace(view: LawView, subject: Subject, crate: Crate): Finding {
  const share = (face: Face) => (100 * openM2(crate, [face])) / faceM2(crate, face)
  const opposite: [Face, Face][] = [
    ['left', 'right'],
    ['front', 'back'],
  ]
  const both = (faces: readonly Face[], atLeast: number) =>
    faces.every((face) => share(face) >= atLeast - ROUNDING)
  const two = opposite.some((pair) => both(pair, 16))
  const three = opposite.some(
    (pair) => both(pair, 8) && WALLS.some((face) => !pair.includes(face) && share(face) >= 50 - ROUNDING),
  )
  const met = two || three || both(WALLS, 8)
  return lawFinding(view, 'openingsByFace', subject, {
    status: met ? 'met' : 'breach',
    asked: 'Openings of two opposite walls 16 % each, or three walls 8, 8 and 50 %, or four walls 8 % each.',
    note: `Open share: ${WALLS.map((face) => `${face} ${signed(share(face), 0)} %`).join(', ')}.`,
  })
}

function rims(view: LawView, subject: Subject, crate: Crate): Finding {
  const asked = 'Rims or the like that keep 0.75 in (1.9 cm) of air before every opening.'
  const shared = { side: 'low' as const, limit: RIM_MM.inches, unit: 'mm', asked }
  const known = crate.openings.map(({ rimMm }) => rimMm)
  if (known.includes(undefined))
    return lawFinding(view, 'rims', subject, {
      ...shared,
      status: 'unknown',
      note: 'The rim of an opening is not given.',
    })
  const value = Math.min(...known.map((rimMm) => rimMm ?? 0))
  const status =
    value < RIM_MM.printed - ROUNDING ? 'breach' : value < RIM_MM.inches - ROUNDING ? 'judgement' : 'met'
  const note =
    status === 'judgement'
      ? `Rim ${signed(value, 1)} mm: enough in centimetres as printed, not in inches.`
      : `Rim ${signed(value, 1)} mm.`
  return lawFinding(view, 'rims', subject, { ...shared, status, value, note })
}

function upperM2({ areaM2, sillHeightM, heightM }: Opening, crate: Crate): number | undefined {
  if (sillHeightM === undefined || heightM === undefined || heightM <= 0) return undefined
  const middle = crate.heightM / 2
  const above = Math.max(0, sillHeightM + heightM - Math.max(middle, sillHeightM))
  return (areaM2 * above) / heightM
}

function openM2({ openings }: Crate, faces: readonly Face[]): number {
  return openings.filter(({ face }) => faces.includes(face)).reduce((sum, { areaM2 }) => sum + areaM2, 0)
}

function wallM2({ lengthM, widthM, heightM }: Crate): number {
  return 2 * (lengthM + widthM) * heightM
}

function faceM2({ lengthM, widthM, heightM }: Crate, face: Face): number {
  return (face === 'front' || face === 'back' ? widthM : lengthM) * heightM
}
