import { FACES } from '@/lib/schemas/plan'
import type { Plan, PlanCrate, PlanOpening } from '@/lib/schemas/plan'
import { crateWords, reason, spell } from './reason'
import type { Reason } from './reason'

/** Crates that cannot exist as typed: no size, no way for air, an opening larger than its wall, nobody inside. */
export function crateReasons(plan: Plan): Reason[] {
  if (plan.crates.length === 0) return [reason('crates', 'No crate is entered.')]
  return plan.crates.flatMap((crate, index) => [
    ...letterReasons(plan, crate, index),
    ...sizeReasons(crate, index),
    ...occupantReasons(plan, crate, index),
    ...airWayReasons(crate, index),
    ...faceReasons(crate, index),
  ])
}

function letterReasons(plan: Plan, crate: PlanCrate, index: number): Reason[] {
  const first = plan.crates.findIndex(({ letter }) => letter === crate.letter)
  return first === index
    ? []
    : [
        reason(
          `crates.${index}.letter`,
          `${crateWords(crate)} stands twice: give one of them another letter.`,
        ),
      ]
}

const SIZES = [
  ['lengthCm', 'length'],
  ['widthCm', 'width'],
  ['heightCm', 'height'],
] as const

function sizeReasons(crate: PlanCrate, index: number): Reason[] {
  return SIZES.filter(([field]) => crate[field] === null).map(([field, word]) =>
    reason(`crates.${index}.${field}`, `${crateWords(crate)} has no inside ${word}.`),
  )
}

function occupantReasons(plan: Plan, crate: PlanCrate, index: number): Reason[] {
  const known = new Set(plan.animals.map(({ id }) => id))
  if (crate.occupants.some((id) => !known.has(id))) {
    return [
      reason(
        `crates.${index}.occupants`,
        `${crateWords(crate)} holds an animal that is no longer in the plan.`,
      ),
    ]
  }
  return crate.occupants.length > 0
    ? []
    : [reason(`crates.${index}.occupants`, `${crateWords(crate)} holds no animal.`)]
}

function airWayReasons(crate: PlanCrate, index: number): Reason[] {
  if (crate.form !== 'crate') return []
  if (crate.openings.length === 0) {
    return [reason(`crates.${index}.openings`, `${crateWords(crate)} is closed and has no opening for air.`)]
  }
  const free = crate.openings.some(({ blockedPct }) => blockedPct < 100)
  return free ? [] : [reason(`crates.${index}.openings`, `${crateWords(crate)}: every opening is blocked.`)]
}

function faceReasons(crate: PlanCrate, index: number): Reason[] {
  const single = crate.openings.flatMap((opening, row) => openingReasons(crate, index, opening, row))
  const summed = FACES.flatMap((face) => faceSumReasons(crate, index, face))
  return [...single, ...summed]
}

/** Width and height of a face as somebody standing before it sees them, cm; null while the crate has no size. */
function faceSize(crate: PlanCrate, face: PlanOpening['face']): { acrossCm: number; upCm: number } | null {
  const { lengthCm, widthCm, heightCm } = crate
  if (lengthCm === null || widthCm === null || heightCm === null) return null
  switch (face) {
    case 'front':
    case 'back':
      return { acrossCm: widthCm, upCm: heightCm }
    case 'left':
    case 'right':
      return { acrossCm: lengthCm, upCm: heightCm }
    case 'top':
      return { acrossCm: lengthCm, upCm: widthCm }
  }
}

function openingReasons(crate: PlanCrate, index: number, opening: PlanOpening, row: number): Reason[] {
  const size = faceSize(crate, opening.face)
  if (size === null) return []
  const at = `crates.${index}.openings.${row}`
  const words = `${crateWords(crate)}, opening ${row + 1}`
  const wide = opening.widthCm > size.acrossCm
  // A roof has no up: an opening may lie along it either way.
  const turns = opening.face === 'top' && opening.heightCm <= size.acrossCm && opening.widthCm <= size.upCm
  const top = (opening.face === 'top' ? 0 : (opening.sillHeightCm ?? 0)) + opening.heightCm
  const reasons: Reason[] = []
  if (wide && !turns) {
    reasons.push(
      reason(
        `${at}.widthCm`,
        `${words} is ${spell(opening.widthCm)} cm wide, its face (${opening.face}) ${spell(size.acrossCm)} cm.`,
      ),
    )
  }
  if (top > size.upCm && !turns) {
    reasons.push(
      reason(
        `${at}.heightCm`,
        `${words} reaches ${spell(top)} cm, its face (${opening.face}) ends at ${spell(size.upCm)} cm.`,
      ),
    )
  }
  return reasons
}

function faceSumReasons(crate: PlanCrate, index: number, face: PlanOpening['face']): Reason[] {
  const size = faceSize(crate, face)
  if (size === null) return []
  const openCm2 = crate.openings
    .filter((opening) => opening.face === face)
    .reduce((sum, { widthCm, heightCm, howMany }) => sum + widthCm * heightCm * howMany, 0)
  const faceCm2 = size.acrossCm * size.upCm
  if (openCm2 <= faceCm2) return []
  return [
    reason(
      `crates.${index}.openings`,
      `${crateWords(crate)}: the openings of the face ${face} add up to ${spell(openCm2)} cm², the face has ${spell(faceCm2)} cm².`,
    ),
  ]
}
