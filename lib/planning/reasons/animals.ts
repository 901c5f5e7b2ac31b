import type { Plan, PlanAnimal } from '@/lib/schemas/plan'
import { snubNosedBreed } from '@/lib/species'
import { COUNTED_BACK_HOURS, lastTime } from '../meals'
import type { LastTime } from '../meals'
import { givenMedicines, sedativeIn } from '../sedatives'
import type { Timeline } from '../timeline'
import { animalWords, crateWords, reason, spell } from './reason'
import type { ProfileInForce, Reason } from './reason'

/**
 * Animals without a usable species row, of an impossible mass, sedated without a word of it, fed after they left, or not
 * standing in exactly one crate.
 */
export function animalReasons(plan: Plan, profiles: readonly ProfileInForce[], timeline: Timeline): Reason[] {
  if (plan.animals.length === 0) return [reason('animals', 'No animal is entered.')]
  return plan.animals.flatMap((animal, index) => [
    ...profileReasons(animal, index, profiles),
    ...medicineReasons(animal, index),
    ...mealReasons(animal, index, timeline),
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

/** A sedative by air needs the carrier's consent: one that stands only in a note would pass unread. */
function medicineReasons(animal: PlanAnimal, index: number): Reason[] {
  const name = animalWords(animal, index)
  const at = `animals.${index}.medicines`
  if (animal.flags.includes('sedated')) {
    if (givenMedicines(animal.medicines) !== null) return []
    return [reason(at, `${name} is flagged sedated: put drug, dose, time and prescriber.`)]
  }
  const drug = sedativeIn(animal.medicines)
  if (drug === null) return []
  return [reason(at, `${name}: “${drug}” stands under medicines. Set the flag sedated, or take it out.`)]
}

const MEALS: Record<LastTime, string> = { lastFedLocal: 'last fed', lastWateredLocal: 'last watered' }

/** A meal the rules could not count would be left out without a word. */
function mealReasons(animal: PlanAnimal, index: number, timeline: Timeline): Reason[] {
  return (Object.keys(MEALS) as LastTime[]).flatMap((field) => {
    const words = `${animalWords(animal, index)}, ${MEALS[field]}`
    const at = `animals.${index}.${field}`
    const typed = animal[field].replace('T', ' ')
    const time = lastTime(animal, field, timeline)
    if (time.kind === 'malformed') return [reason(at, `${words}: “${typed}” is not a date and a time.`)]
    if (time.kind === 'missing') {
      const next = time.nextLocal.replace('T', ' ')
      const change = `it goes from ${time.beforeLabel} to ${time.afterLabel} there`
      return [
        reason(at, `${words}: the clock never shows ${typed}, ${change}. The next time it shows is ${next}.`),
      ]
    }
    if (time.kind !== 'instant' || timeline.departureMs === null) return []
    const beforeHours = (timeline.departureMs - time.instantMs) / 3_600_000
    if (beforeHours < 0)
      return [reason(at, `${words}: ${typed} lies after the journey leaves. Put the last time before it.`)]
    const most = COUNTED_BACK_HOURS[field]
    if (beforeHours <= most) return []
    return [
      reason(
        at,
        `${words}: ${typed} is more than ${spell(most / 24)} days before the journey leaves. Put the last time before it.`,
      ),
    ]
  })
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
