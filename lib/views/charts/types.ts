import type { Verdict } from '@/lib/rules/result'
import type { TempUnit } from '../preferences'
import type { SurroundingsPattern } from '../sheet'

/** What the pictures are drawn from: plain data, minutes counted from departure, °C and watts. */

export interface ChartLeg {
  legId: string
  ordinal: number
  /** "Ramp", "Shut, arrival": stands in a head of 113 px. */
  name: string
  pattern: SurroundingsPattern
  startMin: number
  endMin: number
  head: LegHead | null
}

/** Room left on a leg, to the limit that decides. */
export interface LegHead {
  verdict: Verdict | null
  minutes: number | null
  outsideAirC: number | null
  bodyC: number | null
  /** "alarm", "alarm low", "critical". */
  limitWords: string
  /** What decides where that is another thing than the limit of the figures. */
  decidedWords: string
}

export interface Track {
  minutes: readonly number[]
  bodyC: readonly number[]
}

export interface AirTrack {
  minutes: readonly number[]
  tempC: readonly number[]
}

/** P5 to P95 of the perturbed runs: drawn grey, and never decides. */
export interface Spread {
  minutes: readonly number[]
  p05C: readonly number[]
  p95C: readonly number[]
}

export interface LegLimits {
  criticalLowC: number
  alarmLowC: number
  alarmHighC: number
  criticalHighC: number
}

/** A freight label pasted on the wall; three at most. */
export interface Callout {
  verdict: 'conditional' | 'no-go'
  minute: number
  tempC: number
  /** "−16 min" */
  figure: string
  title: string
  text: string
}

export interface CorridorInput {
  animalName: string
  departureMs: number
  endMin: number
  /** Zones in the order met; the first and the last get a ruler. */
  zones: readonly { zone: string; fromMin: number }[]
  legs: readonly ChartLeg[]
  /** One entry for each leg: limits step at legs. */
  limits: readonly LegLimits[]
  typical: Track | null
  deciding: (Track & { words: string }) | null
  spread: Spread | null
  /** Air in the crate, and what lies outside it where it is known. */
  crateAir: AirTrack | null
  outsideAir: AirTrack | null
  /** The logger strip shows the hottest of each cell, or the coldest where the cold side decides. */
  extreme: 'hottest' | 'coldest'
  callouts: readonly Callout[]
  /** Stretches in the dark: the ruler is thick there. */
  dark: readonly { fromMin: number; toMin: number }[]
  unit: TempUnit
}

/** Watts per animal, gains positive; the first five sum to storage. */
export interface HeatTrack {
  minutes: readonly number[]
  metabolismW: readonly number[]
  conductionW: readonly number[]
  convectionW: readonly number[]
  radiationW: readonly number[]
  evaporationW: readonly number[]
  storageW: readonly number[]
}
