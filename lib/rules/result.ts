import type { Schedule, Simulation } from '@/lib/thermal/result'
import type { Variant } from '@/lib/thermal/scenario'

export type Basis = 'law' | 'standard' | 'carrier' | 'house' | 'physiology'
export type FindingStatus = 'met' | 'note' | 'condition' | 'breach' | 'judgement' | 'unknown'
export type Verdict = 'go' | 'conditional' | 'no-go'
export type LimitKind = 'critical' | 'alarm' | 'cold-effort' | 'other'

/** One thing a rule or the physiology says about the plan. Absent animal, crate or leg means all of them. */
export interface Finding {
  /** Stable id of the rule, e.g. "core-alarm-high", "us-9cfr-3.16e-temperature". */
  rule: string
  basis: Basis
  status: FindingStatus
  /** Only for physiology: which limit, and on which side. */
  limitKind?: LimitKind
  side?: 'high' | 'low'
  animalId?: string
  crateId?: string
  legId?: string
  scheduleId?: string
  variant?: Variant
  limit?: number
  value?: number
  unit?: string
  /** Whole minutes to spare, rounded down; 240 means 240 or more; negative: minutes of the leg spent past the limit. */
  marginMin?: number
  /** Largest uniform shift of outside air that still keeps the limit, °C, steps of 0.5, never rounded up. */
  marginOutsideAirC?: number
  marginBodyC?: number
  /** Minute of the journey, on the named schedule, at which it happens. */
  minute?: number
  /** One sentence in trade English; figures carry their unit. */
  note: string
  /** What is asked, in words, e.g. "Body at most 39.4 °C, alarm". */
  asked: string
  citation?: string
  /** How sure the citation is: seen in the text, second-hand, from memory, or a judgement of ours. */
  sourceTag: 'seen' | 'second-hand' | 'memory' | 'judgement'
  /** Never true for critical, law and carrier findings. */
  overridable: boolean
  /** Why a vet may not override a finding whose kind could be: the journey 3 °C warmer (colder) passes critical. */
  overrideRefusedBecause?: string
  /** Breach of a body limit: minutes of the leg past it and the body temperature farthest out, worst schedule. An override holds no further than these. */
  minutesPast?: number
  worstBodyC?: number
}

export interface LegVerdict {
  animalId: string
  legId: string
  verdict: Verdict
  /** Index into findings; absent only when nothing was evaluated. */
  decidedBy?: number
}

export interface AnimalVerdict {
  animalId: string
  verdict: Verdict
  decidedBy?: number
}

export type EnduranceKind = 'climate' | 'ventilation' | 'stays'

/** Minutes to a limit after a failure, from the leg's worst moment; null = unknown, 240 = 240 or more. */
export interface Endurance {
  animalId: string
  legId: string
  kind: EnduranceKind
  worstMinute: number | null
  toAlarmMin: number | null
  toCriticalMin: number | null
}

/** Highest and lowest whole °C of steady air outside the crate that keeps the alarm to the leg's end; null = none in range. */
export interface StopLimit {
  animalId: string
  legId: string
  aboveC: number | null
  belowC: number | null
  /**
   * What takes its place once a vet has overridden the alarm (cold effort) of this leg on that side: air that keeps the
   * critical limit, 3 °C to the safe side. Only where an override is possible.
   */
  ifOverridden?: { aboveC?: number | null; belowC?: number | null }
}

export interface Assessment extends Simulation {
  schema: 'steadfold/result@1'
  rulesVersion: string
  inputHash: string
  rulesEvaluated: boolean
  schedules: Schedule[]
  endurance: Endurance[]
  stopLimits: StopLimit[]
  findings: Finding[]
  verdicts: LegVerdict[]
  animalVerdicts: AnimalVerdict[]
  verdict: { verdict: Verdict; decidedBy?: number }
}
