import type { Plan, PlanAnimal, PlanLeg } from '@/lib/schemas/plan'
import type { Activity, Animal, Coat } from '@/lib/thermal/scenario'
import type { ResolvedTime } from '../local-time'
import { wearsCoat } from '../coats'
import { lastTime } from '../meals'
import type { ProfileInForce } from '../reasons'
import { givenMedicines } from '../sedatives'
import type { Timeline } from '../timeline'

/** One animal as the engine takes it, with the activity that people who did not see it must assume. */
export function scenarioAnimal(
  plan: Plan,
  animal: PlanAnimal,
  profile: ProfileInForce | undefined,
  timeline: Timeline,
  departureMs: number,
): Animal {
  const medicines = givenMedicines(animal.medicines)
  if (animal.massKg === null) throw new RangeError(`${animal.name} has no mass.`)
  return {
    id: animal.id,
    profile: animal.profileKey,
    massKg: animal.massKg,
    count: animal.count,
    ...(animal.ageDays === null ? {} : { ageDays: animal.ageDays }),
    ...(animal.sex === 'unknown' ? {} : { sex: animal.sex }),
    coat: coatOf(animal, profile),
    activity: 'resting',
    activityByLeg: activityByLeg(plan.legs, animal),
    activityDecayMin: 45,
    ...fedAndWatered(plan, animal, timeline, departureMs),
    flags: [...animal.flags].sort(),
    ...(medicines === null ? {} : { medicines }),
  }
}

/** Scales have no depth and are not clipped; wet they may be. */
function coatOf({ coat }: PlanAnimal, profile: ProfileInForce | undefined): Coat {
  if (profile !== undefined && !wearsCoat(profile.values)) return { wetPct: coat.wetPct }
  return {
    ...(coat.depthMm === null ? {} : { depthMm: coat.depthMm }),
    clipped: coat.clipped,
    wetPct: coat.wetPct,
  }
}

/**
 * A judgement of ours where nobody watched the animal: alert when loaded, on the ramp, behind shut doors on the ground and
 * at a border; distressed there when it is anxious or does not know a crate; resting elsewhere.
 */
export function activityByLeg(
  legs: readonly Pick<PlanLeg, 'id' | 'kind' | 'flightPhase'>[],
  animal: Pick<PlanAnimal, 'crateTrained' | 'temperament'>,
): Record<string, Activity> {
  const stirred: Activity = !animal.crateTrained || animal.temperament === 'anxious' ? 'distressed' : 'alert'
  return Object.fromEntries(
    legs.map((leg, index) => [leg.id, index === 0 || isStirring(leg) ? stirred : 'resting'] as const),
  )
}

function isStirring({ kind, flightPhase }: Pick<PlanLeg, 'kind' | 'flightPhase'>): boolean {
  return kind === 'ramp' || kind === 'border' || (kind === 'flight' && flightPhase !== 'airborne')
}

/** Meals and water before departure are told on the clock of the first place, those on the way by the planned stops. */
function fedAndWatered(plan: Plan, animal: PlanAnimal, timeline: Timeline, departureMs: number) {
  const fed = minutesBefore(lastTime(animal, 'lastFedLocal', timeline), departureMs)
  const watered = minutesBefore(lastTime(animal, 'lastWateredLocal', timeline), departureMs)
  const water = [
    ...(watered === null ? [] : [0 - watered]),
    ...offeredOnTheWay(plan, 'water', timeline, departureMs),
  ]
  const food = offeredOnTheWay(plan, 'food', timeline, departureMs)
  return {
    ...(fed === null ? {} : { hoursSinceFed: fed / 60 }),
    ...(water.length === 0 ? {} : { waterOfferedMin: water.sort((a, b) => a - b) }),
    ...(food.length === 0 ? {} : { foodOfferedMin: food.sort((a, b) => a - b) }),
  }
}

function minutesBefore(time: ResolvedTime, departureMs: number): number | null {
  if (time.kind === 'empty' || time.kind === 'unknown-zone') return null
  if (time.kind !== 'instant' || time.instantMs > departureMs)
    throw new RangeError('A last meal or drink lies at no time before the departure.')
  return (departureMs - time.instantMs) / 60_000
}

function offeredOnTheWay(
  plan: Plan,
  wanted: 'water' | 'food',
  timeline: Timeline,
  departureMs: number,
): number[] {
  return plan.legs.flatMap((leg, index) => {
    const startMs = timeline.legs[index]?.startMs
    if (startMs == null) return []
    const startMin = (startMs - departureMs) / 60_000
    return leg.stops.filter(({ kind }) => kind === wanted).map(({ minute }) => startMin + minute)
  })
}
