import type { Plan, PlanAnimal } from '@/lib/schemas/plan'
import { snubNosedBreed } from '@/lib/species'
import { animalWords, crateWords, reason, spell } from './reason'
import type { ProfileInForce, Reason } from './reason'

/** Animals without a usable species row, of an impossible mass, or not standing in exactly one crate. */
export function animalReasons(plan: Plan, profiles: readonly ProfileInForce[]): Reason[] {
  if (plan.animals.length === 0) return [reason('animals', 'No animal is entered.')]
  return plan.animals.flatMap((animal, index) => [
    ...profileReasons(animal, index, profiles),
    ...crateReasons(plan, animal, index),
  ])
}

function profileReasons(animal: PlanAnimal, index: number, profiles: readonly ProfileInForce[]): Reason[] {
  const name = animalWords(animal, index)
  const at = `animals.${index}`
  if (animal.profileKey === '') return [reason(`${at}.profileKey`, `${name} has no species.`)]
  const profile = profiles.find(({ key }) => key === animal.profileKey)
  if (profile === undefined) {
    return [
      reason(`${at}.profileKey`, `${name}: there is no species row “${animal.profileKey}” to assess with.`),
    ]
  }
  return [
    ...limitReasons(at, name, profile),
    ...massReasons(at, name, animal, profile),
    ...breedReasons(at, name, animal),
  ]
}

function limitReasons(at: string, name: string, profile: ProfileInForce): Reason[] {
  if (profile.values.limits !== undefined) return []
  return [
    reason(
      `${at}.profileKey`,
      `${name}: the row ${profile.commonName.toLowerCase()} has no alarm and critical limits, so nothing can be judged by it.`,
    ),
  ]
}

function massReasons(at: string, name: string, animal: PlanAnimal, profile: ProfileInForce): Reason[] {
  const { massMinKg, massMaxKg } = profile.values
  const allowed = `put ${spell(massMinKg)} to ${spell(massMaxKg)} kg for ${profile.commonName.toLowerCase()}.`
  if (animal.massKg === null) return [reason(`${at}.massKg`, `${name} has no mass: ${allowed}`)]
  if (animal.massKg >= massMinKg && animal.massKg <= massMaxKg) return []
  return [reason(`${at}.massKg`, `${name}, mass ${spell(animal.massKg)} kg: ${allowed}`)]
}

/** A snub-nosed dog on the plain dog's row would come out far too well. */
function breedReasons(at: string, name: string, animal: PlanAnimal): Reason[] {
  if (animal.profileKey !== 'dog' || animal.flags.includes('snub-nosed')) return []
  const breed = snubNosedBreed(animal.breedNote)
  if (breed === null) return []
  return [
    reason(
      `${at}.breedNote`,
      `${name}: ${breed} is a snub-nosed breed. Choose the species snub-nosed dog, or set the flag snub-nosed.`,
    ),
  ]
}

function crateReasons(plan: Plan, animal: PlanAnimal, index: number): Reason[] {
  const name = animalWords(animal, index)
  const times = plan.crates.flatMap((crate) =>
    crate.occupants.filter((id) => id === animal.id).map(() => crateWords(crate)),
  )
  if (times.length === 1) return []
  if (times.length === 0) return [reason(`animals.${index}`, `${name} is in no crate.`)]
  return [
    reason(`animals.${index}`, `${name} is entered ${times.length} times: in ${times.join(' and in ')}.`),
  ]
}
