import type { Plan, PlanLeg } from '@/lib/schemas/plan'
import { localMoment, spellOffset } from '../local-time'
import type { ResolvedTime } from '../local-time'
import type { TimedLeg, Timeline } from '../timeline'
import { legWords, reason, spell } from './reason'
import type { Reason } from './reason'

/** Legs that do not make one journey: no place, no time, out of order, a gap, an overlap, nobody to call. */
export function legReasons(plan: Plan, timeline: Timeline): Reason[] {
  if (plan.legs.length === 0) return [reason('legs', 'No leg is entered.')]
  return plan.legs.flatMap((leg, index) => {
    const timed = timeline.legs[index]
    if (timed === undefined) return []
    const before = timeline.legs[index - 1]
    return [
      ...placeReasons(leg, index, timed),
      ...timeReasons(leg, index, timed),
      ...(before === undefined ? [] : joinReasons(plan, index, before, timed)),
      ...delayReasons(leg, index, timed),
      ...phaseReasons(plan, leg, index),
      ...partyReasons(leg, index),
    ]
  })
}

function placeReasons(leg: PlanLeg, index: number, timed: TimedLeg): Reason[] {
  const words = legWords(leg, index)
  const missing: Reason[] = []
  if (timed.from === null)
    missing.push(reason(`legs.${index}.fromPlaceId`, `${words} has no place to start from.`))
  if (timed.to === null) missing.push(reason(`legs.${index}.toPlaceId`, `${words} has no place to end at.`))
  return missing
}

function timeReasons(leg: PlanLeg, index: number, timed: TimedLeg): Reason[] {
  const words = legWords(leg, index)
  const at = `legs.${index}`
  const reasons = [
    ...clockReasons(
      `${at}.startLocal`,
      `${words}, start`,
      leg.startLocal,
      timed.start,
      timed.from?.name ?? '',
    ),
    ...clockReasons(`${at}.endLocal`, `${words}, end`, leg.endLocal, timed.end, timed.to?.name ?? ''),
  ]
  if (timed.startMs === null || timed.endMs === null) return reasons
  if (timed.endMs < timed.startMs) reasons.push(reason(`${at}.endLocal`, `${words} ends before it starts.`))
  if (timed.endMs === timed.startMs) reasons.push(reason(`${at}.endLocal`, `${words} lasts no time at all.`))
  return reasons
}

function clockReasons(
  path: string,
  words: string,
  local: string,
  time: ResolvedTime,
  place: string,
): Reason[] {
  const typed = local.replace('T', ' ')
  switch (time.kind) {
    case 'instant':
    // The zone is unknown only while the place is, and that is said of the place.
    case 'unknown-zone':
      return []
    case 'empty':
      return [reason(path, `${words}: date and time are missing.`)]
    case 'malformed':
      return [reason(path, `${words}: “${typed}” is not a date and a time.`)]
    case 'missing':
      return [
        reason(
          path,
          `${words}: the clock at ${place} never shows ${typed}, it goes from ${time.beforeLabel} to ${time.afterLabel} there. The next time it shows is ${time.nextLocal.replace('T', ' ')}.`,
        ),
      ]
    case 'doubled':
      return [
        reason(
          path,
          `${words}: the clock at ${place} shows ${typed} twice. Choose ${time.choices.map(({ label }) => label).join(' or ')}.`,
        ),
      ]
  }
}

function joinReasons(plan: Plan, index: number, before: TimedLeg, timed: TimedLeg): Reason[] {
  const leg = plan.legs[index]
  const last = plan.legs[index - 1]
  if (leg === undefined || last === undefined) return []
  const words = legWords(leg, index)
  const lastWords = legWords(last, index - 1).toLowerCase()
  const reasons: Reason[] = []
  if (before.to !== null && timed.from !== null && before.to.id !== timed.from.id) {
    reasons.push(
      reason(
        `legs.${index}.fromPlaceId`,
        `${words} starts at ${timed.from.name}, but ${lastWords} ends at ${before.to.name}.`,
      ),
    )
  }
  if (before.endMs !== null && timed.startMs !== null && before.endMs !== timed.startMs) {
    const minutes = Math.round(Math.abs(timed.startMs - before.endMs) / 60_000)
    const offset = timed.start.kind === 'instant' ? ` (${spellOffset(timed.start.offsetMin)})` : ''
    reasons.push(
      reason(
        `legs.${index}.startLocal`,
        timed.startMs > before.endMs
          ? `${minutes} min between the end of ${lastWords} and the start of ${words.toLowerCase()} belong to no leg.`
          : `${words} starts ${minutes} min before ${lastWords} ends, at ${endWords(before)}; it starts${offset} too early.`,
      ),
    )
  }
  return reasons
}

function endWords(timed: TimedLeg): string {
  return timed.endMs === null || timed.to === null
    ? 'an unknown time'
    : localMoment(timed.endMs, timed.to.zone).text
}

function delayReasons(leg: PlanLeg, index: number, timed: TimedLeg): Reason[] {
  const words = legWords(leg, index)
  const reasons: Reason[] = []
  if (leg.delayTypicalMin > leg.delayWorstMin) {
    reasons.push(
      reason(
        `legs.${index}.delayWorstMin`,
        `${words}: the worst delay (${spell(leg.delayWorstMin)} min) is shorter than the typical one (${spell(leg.delayTypicalMin)} min).`,
      ),
    )
  }
  if (timed.startMs !== null && timed.endMs !== null) {
    const durationMin = (timed.endMs - timed.startMs) / 60_000
    leg.stops.forEach(({ minute }, row) => {
      if (durationMin > 0 && minute > durationMin) {
        reasons.push(
          reason(
            `legs.${index}.stops.${row}.minute`,
            `${words}: a stop stands at minute ${spell(minute)}, the leg lasts ${spell(durationMin)} min.`,
          ),
        )
      }
    })
  }
  return reasons
}

function phaseReasons(plan: Plan, leg: PlanLeg, index: number): Reason[] {
  const words = legWords(leg, index)
  const reasons: Reason[] = []
  if (leg.outOfCrate && leg.kind !== 'rest') {
    reasons.push(reason(`legs.${index}.outOfCrate`, `${words}: animals leave the crate only on a rest stop.`))
  }
  if (leg.kind !== 'flight') return reasons
  if (leg.flightPhase === null) {
    reasons.push(
      reason(
        `legs.${index}.flightPhase`,
        `${words}: say whether it is airborne or on the ground with doors shut.`,
      ),
    )
  }
  if (leg.flightPhase === 'airborne') {
    // An aircraft on the ground with its doors shut is the hottest part of many flights: it may not be left out.
    const phaseAt = (place: number) => plan.legs[place]?.flightPhase ?? null
    if (phaseAt(index - 1) !== 'doors-shut-departure' || phaseAt(index + 1) !== 'doors-shut-arrival') {
      reasons.push(
        reason(
          `legs.${index}.flightPhase`,
          `${words}: an airborne leg needs a leg with doors shut on the stand before it and one with doors shut on arrival after it.`,
        ),
      )
    }
  }
  return reasons
}

function partyReasons(leg: PlanLeg, index: number): Reason[] {
  const words = legWords(leg, index)
  const reasons: Reason[] = []
  if (leg.attended && leg.driverId === null) {
    reasons.push(
      reason(`legs.${index}.driverId`, `${words}: one of ours is to be present, but nobody is named.`),
    )
  }
  if (leg.partyInCharge === '') {
    reasons.push(reason(`legs.${index}.partyInCharge`, `${words}: nobody is named who is in charge.`))
  }
  if (!leg.attended && leg.partyTelephone === '') {
    reasons.push(
      reason(
        `legs.${index}.partyTelephone`,
        `${words}: none of ours is present, and the party in charge has no telephone.`,
      ),
    )
  }
  return reasons
}
