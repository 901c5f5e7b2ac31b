import { controlOf, controlWords } from '@/lib/planning/climate-control'
import type { Control } from '@/lib/planning/climate-control'
import { timelineOf } from '@/lib/planning/timeline'
import type { Plan, PlanLeg, PlanOpenAir, PlanPlace, PlanSurroundings } from '@/lib/schemas/plan'
import { figure } from '../format'
import type { Moment, SurroundingsPattern } from '../sheet'

/** A leg on the clock, with its air in figures and words. */
export interface JourneyLeg {
  leg: PlanLeg
  ordinal: number
  fromPlace: string
  toPlace: string
  title: string
  pattern: SurroundingsPattern
  start: Moment
  end: Moment
  durationMin: number
  air: PlannedAir
}

export interface PlannedAir {
  /** Range of air outside the crates as planned; null where nobody typed it. */
  minC: number | null
  maxC: number | null
  words: string
}

/** The legs of a plan with their times. A wall time that names no instant stands at the leg before it, never at zero. */
export function journeyOf(plan: Plan, places: readonly PlanPlace[], homeZone: string): JourneyLeg[] {
  const { legs } = timelineOf(plan, places)
  let before: Moment = { ms: 0, zone: homeZone }
  return plan.legs.map((leg, index) => {
    const timed = legs[index]
    const fromZone = timed?.from?.zone ?? before.zone
    const start = { ms: timed?.startMs ?? before.ms, zone: fromZone }
    const end = { ms: timed?.endMs ?? start.ms, zone: timed?.to?.zone ?? fromZone }
    before = end
    const fromPlace = timed?.from?.name ?? ''
    const toPlace = timed?.to?.name ?? ''
    return {
      leg,
      ordinal: index + 1,
      fromPlace,
      toPlace,
      title: titleOf(leg, fromPlace, toPlace),
      pattern: PATTERN[leg.kind],
      start,
      end,
      durationMin: Math.round((end.ms - start.ms) / 60_000),
      air: plannedAir(leg),
    }
  })
}

const PATTERN: Record<PlanLeg['kind'], SurroundingsPattern> = {
  road: 'van',
  shed: 'shed',
  ramp: 'ramp',
  flight: 'hold',
  sea: 'sea',
  rail: 'rail',
  border: 'customs',
  rest: 'rest',
}

const KIND_WORDS: Record<PlanLeg['kind'], string> = {
  road: 'Road',
  shed: 'Shed',
  ramp: 'Ramp',
  flight: 'Flight',
  sea: 'Sea',
  rail: 'Rail',
  border: 'Border post',
  rest: 'Rest',
}

function titleOf(leg: PlanLeg, from: string, to: string): string {
  const service = [leg.carrier, leg.serviceNumber].filter(Boolean).join(' ')
  if (leg.kind === 'flight') {
    if (leg.flightPhase === 'doors-shut-departure') return joined('Doors shut', from)
    if (leg.flightPhase === 'doors-shut-arrival') return joined('Doors shut', to)
    return joined('Airborne', service)
  }
  const goes = leg.kind === 'road' || leg.kind === 'sea' || leg.kind === 'rail'
  if (goes && from !== '' && to !== '' && from !== to) return `${KIND_WORDS[leg.kind]}, ${from} to ${to}`
  return joined(KIND_WORDS[leg.kind], from === '' ? to : from)
}

function joined(first: string, second: string): string {
  return second === '' ? first : `${first}, ${second}`
}

function plannedAir(leg: PlanLeg): PlannedAir {
  const { surroundings } = leg
  switch (surroundings.type) {
    case 'controlled':
      return known(
        surroundings.airTempC,
        surroundings.airTempC,
        `${roomOf(leg)} ${degrees(surroundings.airTempC)}`,
      )
    case 'open-air':
      return outside(surroundings)
    case 'enclosed':
      return enclosed(leg, surroundings)
  }
}

function enclosed(leg: PlanLeg, space: Extract<PlanSurroundings, { type: 'enclosed' }>): PlannedAir {
  const air = outside(space.outside)
  const setPointC = space.conditioning?.setPointC ?? null
  const control = controlOf(space.conditioning)
  const words = controlWords(control, degrees(setPointC))
  if (setPointC !== null && words !== null)
    return { ...driven(control, setPointC, air), words: `${spaceOf(leg)} ${words}` }
  return space.ventilationM3h === null ? { ...air, words: `no fresh air known, ${air.words}` } : air
}

/** A machine that only cools leaves cold air as cold as it is outside, and one that only heats leaves it as hot. */
function driven(control: Control, setPointC: number, { minC, maxC }: PlannedAir): Omit<PlannedAir, 'words'> {
  switch (control) {
    case 'cooling':
      return { minC: minC === null ? null : Math.min(minC, setPointC), maxC: setPointC }
    case 'heating':
      return { minC: setPointC, maxC: maxC === null ? null : Math.max(maxC, setPointC) }
    case 'both':
    case 'none':
      return { minC: setPointC, maxC: setPointC }
  }
}

function outside({ rows }: PlanOpenAir): PlannedAir {
  const temps = rows.flatMap(({ airTempC }) => (airTempC === null ? [] : [airTempC]))
  if (temps.length === 0) return { minC: null, maxC: null, words: 'air not given' }
  const [minC, maxC] = [Math.min(...temps), Math.max(...temps)]
  const low = figure(minC)
  return known(minC, maxC, `outside ${low === figure(maxC) ? '' : `${low} to `}${degrees(maxC)}`)
}

function known(minC: number | null, maxC: number | null, words: string): PlannedAir {
  return minC === null ? { minC, maxC, words: 'air not given' } : { minC, maxC, words }
}

function degrees(tempC: number | null): string {
  return tempC === null ? '' : `${figure(tempC)}\u00a0°C`
}

/** Air that somebody else's machine holds. */
function roomOf({ kind }: PlanLeg): string {
  if (kind === 'flight') return 'hold at'
  if (kind === 'road') return 'van at'
  return kind === 'border' || kind === 'rest' ? 'room at' : 'air'
}

function spaceOf({ kind }: PlanLeg): string {
  if (kind === 'flight') return 'hold'
  if (kind === 'road') return 'van'
  if (kind === 'rail') return 'wagon'
  return kind === 'sea' ? 'deck' : 'room'
}
