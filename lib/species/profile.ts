import { SteadfoldError } from '@/lib/errors'
import type { MetabolicLine, ProfileValues } from '@/lib/thermal/scenario'

/** How far a figure can be trusted: read at its source; fitted here to published trials; recalled from a source not opened; or decided. */
export type Confidence = 'sourced' | 'fitted' | 'memory' | 'judgement'

export interface Figure<T = number> {
  value: T
  unit: string
  source: string
  confidence: Confidence
}

/** A species row: everything the engine needs, each figure with its unit, its source and how far it can be trusted. */
export interface Profile {
  key: string
  commonName: string
  scientificName: string
  version: number
  thermoregulation: ProfileValues['thermoregulation']
  bodyPlan: ProfileValues['bodyPlan']
  posture: NonNullable<ProfileValues['posture']>
  altricial: boolean
  massMinKg: Figure
  massMaxKg: Figure
  setPointC: Figure
  /** Core limits: all four, or the row cannot be used. */
  limits: {
    criticalLowC?: Figure
    alarmLowC?: Figure
    alarmHighC?: Figure
    criticalHighC?: Figure
  }
  airFloorC: Figure
  airCeilingC: Figure
  metabolicLine: Figure<MetabolicLine>
  activityAtRest: Figure
  /** Maximum thermogenesis over basal; reptiles have none. */
  maxOverBasal?: Figure
  q10: Figure
  respiratoryQuotient: Figure
  meehCoefficient: Figure
  meehExponent: Figure
  conductance: LineConductance | CoatConductance | EctothermConductance
  coatDepthMm: Figure
  coatConductivityWmK: Figure
  windPenalty: Figure
  oxygenExtraction: Figure
  pantingMultiple: Figure
  pantingCost: Figure
  exhaled: Figure<'mammal' | 'small'>
  wettednessBase: Figure
  wettednessMax: Figure
  sweatCapGm2h?: Figure
  bands: Figure<ProfileValues['bands']>
  shellShare: Figure
  specificHeatJkgK?: Figure
  snubNosedFactor?: Figure
  solarAbsorptance?: Figure
  /** What a reader of the row must know: where it was refitted and why, what it does not meet. */
  remarks: string[]
}

export interface LineConductance {
  model: 'line'
  line: 'mammal' | 'bird' | 'chick-group'
  minMultiple: Figure
  maxMultiple: Figure
}

export interface CoatConductance {
  model: 'coat'
  tissueMinWm2K: Figure
  tissueMaxWm2K: Figure
  bareShare: Figure
}

export interface EctothermConductance {
  model: 'ectotherm'
  wholeBodyWm2K: Figure
}

/** The bare figures of a row for the engine. Refuses a row that lacks one of its four core limits, or whose limits are out of order. */
export function profileValues(profile: Profile): ProfileValues {
  return {
    thermoregulation: profile.thermoregulation,
    bodyPlan: profile.bodyPlan,
    posture: profile.posture,
    altricial: profile.altricial,
    massMinKg: profile.massMinKg.value,
    massMaxKg: profile.massMaxKg.value,
    limits: coreLimits(profile),
    airFloorC: profile.airFloorC.value,
    airCeilingC: profile.airCeilingC.value,
    setPointC: profile.setPointC.value,
    metabolism: {
      line: profile.metabolicLine.value,
      activityAtRest: profile.activityAtRest.value,
      ...(profile.maxOverBasal && { maxOverBasal: profile.maxOverBasal.value }),
      q10: profile.q10.value,
      respiratoryQuotient: profile.respiratoryQuotient.value,
    },
    surface: { meehCoefficient: profile.meehCoefficient.value, exponent: profile.meehExponent.value },
    conductance: conductanceValues(profile.conductance),
    coat: {
      depthMm: profile.coatDepthMm.value,
      conductivityWmK: profile.coatConductivityWmK.value,
      windPenalty: profile.windPenalty.value,
    },
    respiration: {
      oxygenExtraction: profile.oxygenExtraction.value,
      pantingMultiple: profile.pantingMultiple.value,
      pantingCost: profile.pantingCost.value,
      exhaled: profile.exhaled.value,
    },
    skin: {
      wettednessBase: profile.wettednessBase.value,
      wettednessMax: profile.wettednessMax.value,
      ...(profile.sweatCapGm2h && { sweatCapGm2h: profile.sweatCapGm2h.value }),
    },
    bands: profile.bands.value,
    shellShare: profile.shellShare.value,
    ...(profile.specificHeatJkgK && { specificHeatJkgK: profile.specificHeatJkgK.value }),
    ...(profile.snubNosedFactor && { snubNosedFactor: profile.snubNosedFactor.value }),
    ...(profile.solarAbsorptance && { solarAbsorptance: profile.solarAbsorptance.value }),
  }
}

function coreLimits(profile: Profile) {
  const { criticalLowC, alarmLowC, alarmHighC, criticalHighC } = profile.limits
  if (!criticalLowC || !alarmLowC || !alarmHighC || !criticalHighC) {
    throw new SteadfoldError(
      'refused',
      `Profile "${profile.key}" lacks one of its four core limits and cannot be assessed.`,
      {
        details: { profile: profile.key },
      },
    )
  }
  const limits = {
    criticalLowC: criticalLowC.value,
    alarmLowC: alarmLowC.value,
    alarmHighC: alarmHighC.value,
    criticalHighC: criticalHighC.value,
  }
  const ordered =
    limits.criticalLowC < limits.alarmLowC &&
    limits.alarmLowC < limits.alarmHighC &&
    limits.alarmHighC < limits.criticalHighC
  if (!ordered) {
    throw new SteadfoldError('refused', `The core limits of profile "${profile.key}" are not in order.`, {
      details: { profile: profile.key, ...limits },
    })
  }
  return limits
}

function conductanceValues(conductance: Profile['conductance']): ProfileValues['conductance'] {
  switch (conductance.model) {
    case 'line':
      return {
        model: 'line',
        line: conductance.line,
        minMultiple: conductance.minMultiple.value,
        maxMultiple: conductance.maxMultiple.value,
      }
    case 'coat':
      return {
        model: 'coat',
        tissueMinWm2K: conductance.tissueMinWm2K.value,
        tissueMaxWm2K: conductance.tissueMaxWm2K.value,
        bareShare: conductance.bareShare.value,
      }
    case 'ectotherm':
      return { model: 'ectotherm', wholeBodyWm2K: conductance.wholeBodyWm2K.value }
  }
}
