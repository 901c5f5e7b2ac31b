import type { Plan, PlanAnimal, PlanLeg } from '@/lib/schemas/plan'
import type { Activity, Animal, Coat } from '@/lib/thermal/scenario'
import { resolveLocalTime } from '../local-time'
import type { Timeline } from '../timeline'

/** One animal as the engine takes it, with the activity that people who did not see it must assume. */
export function scenarioAnimal(
  plan: Plan,
  animal: PlanAnimal,
  timeline: Timeline,
  departureMs: number,
): Animal {
  if (animal.massKg === null) throw new RangeError(`${animal.name} has no mass.`)
  return {
    id: animal.id,
    profile: animal.profileKey,
    massKg: animal.massKg,
    count: animal.count,
    ...(animal.ageDays === null ? {} : { ageDays: animal.ageDays }),
    ...(animal.sex === 'unknown' ? {} : { sex: animal.sex }),
    coat: coatOf(animal),
    activity: 'resting',
    activityByLeg: activityByLeg(plan.legs, animal),
    activityDecayMin: 45,
    ...fedAndWatered(plan, animal, timeline, departureMs),
    flags: [...animal.flags].sort(),
  }
}

function coatOf({ coat }: PlanAnimal): Coat {
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
  const fedMs = instantAtStart(animal.lastFedLocal, timeline)
  const wateredMs = instantAtStart(animal.lastWateredLocal, timeline)
  const hoursSinceFed = fedMs === null ? null : (departureMs - fedMs) / 3_600_000
  const wateredMin = wateredMs === null ? null : (wateredMs - departureMs) / 60_000
  const onTheWay = (wanted: 'water' | 'food') =>
    plan.legs.flatMap((leg, index) => {
      const startMs = timeline.legs[index]?.startMs
      if (startMs == null) return []
      const startMin = (startMs - departureMs) / 60_000
      return leg.stops.filter(({ kind }) => kind === wanted).map(({ minute }) => startMin + minute)
    })
  const water = [...(wateredMin !== null && isBefore(wateredMin) ? [wateredMin] : []), ...onTheWay('water')]
  const food = onTheWay('food')
  return {
    ...(hoursSinceFed !== null && hoursSinceFed >= 0 && hoursSinceFed <= 240 ? { hoursSinceFed } : {}),
    ...(water.length === 0 ? {} : { waterOfferedMin: water.sort((a, b) => a - b) }),
    ...(food.length === 0 ? {} : { foodOfferedMin: food.sort((a, b) => a - b) }),
  }
}

const WEEK_MIN = 10_080

function isBefore(minute: number): boolean {
  return minute <= 0 && minute >= -WEEK_MIN
}

function instantAtStart(local: string, timeline: Timeline): number | null {
  if (timeline.departureZone === null) return null
  const time = resolveLocalTime(local, timeline.departureZone, null)
  return time.kind === 'instant' ? time.instantMs : null
}
