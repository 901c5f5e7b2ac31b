import type { Plan, PlanAnimal, PlanCrate, PlanOpening } from '@/lib/schemas/plan'
import type { Crate, Opening } from '@/lib/thermal/scenario'
import { crateMark } from '../crate-mark'
import type { ProfileInForce } from '../reasons'
import type { Timeline } from '../timeline'
import { scenarioAnimal } from './animals'

/** The crates with who is inside, metres for centimetres, sorted by id. */
export function scenarioCrates(
  plan: Plan,
  mark: string,
  profiles: readonly ProfileInForce[],
  timeline: Timeline,
  departureMs: number,
): Crate[] {
  const animals = new Map(plan.animals.map((animal) => [animal.id, animal]))
  return plan.crates
    .map((crate) =>
      scenarioCrate(crate, mark, (id) => {
        const animal = animals.get(id)
        if (animal === undefined) throw new RangeError(`Crate ${crate.letter} holds an unknown animal.`)
        const profile = profiles.find(({ key }) => key === animal.profileKey)
        return scenarioAnimal(plan, animal, profile, timeline, departureMs)
      }),
    )
    .sort(byId)
}

function scenarioCrate(
  crate: PlanCrate,
  mark: string,
  occupant: (id: PlanAnimal['id']) => Crate['occupants'][number],
): Crate {
  const { lengthCm, widthCm, heightCm } = crate
  if (lengthCm === null || widthCm === null || heightCm === null) {
    throw new RangeError(`Crate ${crate.letter} has no size.`)
  }
  return {
    id: crate.id,
    mark: crateMark(mark, crate.letter),
    form: crate.form,
    lengthM: metres(lengthCm),
    widthM: metres(widthCm),
    heightM: metres(heightCm),
    wall: { material: crate.wallMaterial, thicknessMm: crate.wallThicknessMm },
    openings: crate.openings.map((opening) => scenarioOpening(crate, opening)),
    byLeg: [],
    floor: { material: crate.floorMaterial, thicknessMm: crate.floorThicknessMm, onto: crate.floorOnto },
    // What a depth or a wetness of no bedding would be, nobody can say: the form hides them.
    bedding: crate.bedding.material === 'none' ? { ...crate.bedding, depthMm: 0, wetPct: 0 } : crate.bedding,
    medium: 'air',
    occupants: crate.occupants.map(occupant).sort(byId),
  }
}

/** Several alike count as one area at the height of a single one: a row of slots is no taller than a slot. */
function scenarioOpening(crate: PlanCrate, opening: PlanOpening): Opening {
  const [widthCm, heightCm] = lyingFlat(crate, opening)
  return {
    face: opening.face,
    areaM2: (widthCm * heightCm * opening.howMany) / 10_000,
    ...(opening.howMany === 1 ? { widthM: metres(widthCm) } : {}),
    heightM: metres(heightCm),
    ...(opening.sillHeightCm === null || opening.face === 'top'
      ? {}
      : { sillHeightM: metres(opening.sillHeightCm) }),
    rimMm: crate.rimMm,
    meshOpenPct: opening.meshOpenPct,
    blockedPct: opening.blockedPct,
  }
}

/** A roof has no up: its opening's longer side is called the width. */
function lyingFlat(crate: PlanCrate, { face, widthCm, heightCm }: PlanOpening): [number, number] {
  if (face !== 'top' || crate.form !== 'crate') return [widthCm, heightCm]
  return [Math.max(widthCm, heightCm), Math.min(widthCm, heightCm)]
}

function metres(cm: number): number {
  return cm / 100
}

function byId(a: { id: string }, b: { id: string }): number {
  return a.id < b.id ? -1 : a.id > b.id ? 1 : 0
}
