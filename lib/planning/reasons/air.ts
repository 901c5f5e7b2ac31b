import type { Plan, PlanLeg, PlanOpenAir, PlanSurroundings } from '@/lib/schemas/plan'
import { legWords, reason } from './reason'
import type { Reason } from './reason'

type Enclosed = Extract<PlanSurroundings, { type: 'enclosed' }>

/** Air nobody gave: a plan never runs on an assumed temperature. */
export function airReasons(plan: Plan): Reason[] {
  return [...plan.legs.flatMap((leg, index) => surroundingsReasons(leg, index)), ...sharedSpaceReasons(plan)]
}

function surroundingsReasons(leg: PlanLeg, index: number): Reason[] {
  const at = `legs.${index}.surroundings`
  const words = legWords(leg, index)
  const air = leg.surroundings
  switch (air.type) {
    case 'open-air':
      return openAirReasons(air, at, words, true)
    case 'controlled':
      return [
        ...missing(air.airTempC, `${at}.airTempC`, `${words} has no air temperature.`),
        ...missing(air.relHumidityPct, `${at}.relHumidityPct`, `${words} has no humidity.`),
        ...(air.outside === null
          ? []
          : openAirReasons(air.outside, `${at}.outside`, `${words}, outside,`, false)),
      ]
    case 'enclosed':
      return [
        ...(air.conditioning === null ? [] : controlReasons(air.conditioning, `${at}.conditioning`, words)),
        ...openAirReasons(air.outside, `${at}.outside`, `${words}, outside,`, false),
      ]
  }
}

type Conditioning = NonNullable<Enclosed['conditioning']>

/** A set-point nobody has the watts for would be read as held and computed as not. */
function controlReasons(machine: Conditioning, at: string, words: string): Reason[] {
  const { setPointC, coolingW, heatingW } = machine
  const setPoint = missing(setPointC, `${at}.setPointC`, `${words} has no set-point.`)
  if (!coolingW && !heatingW) {
    const path = coolingW === 0 && heatingW === null ? `${at}.heatingW` : `${at}.coolingW`
    return [
      ...setPoint,
      reason(
        path,
        `${words} has a set-point but no cooling or heating capacity: put its watts, or untick the set-point.`,
      ),
    ]
  }
  return [
    ...setPoint,
    ...missing(
      coolingW,
      `${at}.coolingW`,
      `${words}: cooling is not given. Put its watts, 0 where it cannot cool.`,
    ),
    ...missing(
      heatingW,
      `${at}.heatingW`,
      `${words}: heating is not given. Put its watts, 0 where it cannot heat.`,
    ),
  ]
}

/** Sun may stay empty: it then counts as none, and a finding says so where it is day. Wind is needed only where it blows on crates. */
function openAirReasons(air: PlanOpenAir, at: string, words: string, windNeeded: boolean): Reason[] {
  const reasons = air.rows.flatMap((row, place) => {
    const where = air.rows.length === 1 ? words : `${words} weather row ${place + 1}`
    return [
      ...missing(row.airTempC, `${at}.rows.${place}.airTempC`, `${where} has no air temperature.`),
      ...missing(row.relHumidityPct, `${at}.rows.${place}.relHumidityPct`, `${where} has no humidity.`),
      ...(windNeeded ? missing(row.windMs, `${at}.rows.${place}.windMs`, `${where} has no wind.`) : []),
    ]
  })
  if ((air.rows[0]?.minute ?? 0) !== 0) {
    reasons.push(reason(`${at}.rows.0.minute`, `${words} weather must begin at minute 0 of the leg.`))
  }
  air.rows.forEach((row, place) => {
    const before = air.rows[place - 1]
    if (before !== undefined && row.minute <= before.minute) {
      reasons.push(
        reason(
          `${at}.rows.${place}.minute`,
          `${words} weather row ${place + 1} does not come after row ${place}.`,
        ),
      )
    }
  })
  return reasons
}

function missing(value: number | null, path: string, message: string): Reason[] {
  return value === null ? [reason(path, message)] : []
}

const SHARED = [
  ['volumeM3', 'volume'],
  ['heatTransferWK', 'heat through walls'],
  ['interiorMassKJK', 'inside mass'],
] as const

/** Neighbouring legs in one space are one air: it cannot change size between them. */
function sharedSpaceReasons(plan: Plan): Reason[] {
  const lastByName = new Map<string, { space: Enclosed; index: number }>()
  return plan.legs.flatMap((leg, index) => {
    const space = leg.surroundings
    if (space.type !== 'enclosed' || space.spaceName === '') return []
    const earlier = lastByName.get(space.spaceName)
    lastByName.set(space.spaceName, { space, index })
    if (earlier === undefined || earlier.index !== index - 1) return []
    return SHARED.filter(([field]) => space[field] !== earlier.space[field]).map(([field, word]) =>
      reason(
        `legs.${index}.surroundings.${field}`,
        `${legWords(leg, index)} is in the same space (${space.spaceName}) as leg ${earlier.index + 1}, but its ${word} differs.`,
      ),
    )
  })
}
