import type { Confidence, Figure, Profile } from '@/lib/species'
import type { Moment } from './sheet'

/* A species row as people read it: limits first, then every figure with where it is from and how far it can be trusted. */

export interface SpeciesRow {
  key: string
  commonName: string
  scientificName: string
  version: number
  since: Moment
  bodyPlan: Profile['bodyPlan']
  limits: SpeciesLimits | null
  /** Why nothing can be assessed with it; empty where it can. */
  refused: string
}

export interface SpeciesLimits {
  criticalLowC: number
  alarmLowC: number
  alarmHighC: number
  criticalHighC: number
  setPointC: number
}

export interface SpeciesFigure {
  words: string
  /** °C figures are told in the session's unit; others as they stand. */
  tempC: { value: number; side: 'high' | 'low' | null } | null
  value: string
  source: string
  confidence: Confidence
}

export interface SpeciesView extends SpeciesRow {
  massWords: string
  limitFigures: SpeciesFigure[]
  groups: { title: string; figures: SpeciesFigure[] }[]
  remarks: string[]
  versions: { version: number; since: Moment }[]
}

export const CONFIDENCE_WORDS: Record<Confidence, string> = {
  sourced: 'Sourced',
  fitted: 'Fitted',
  memory: 'From memory, check it',
  judgement: 'Judgement',
}

/** The four limits and the set-point; null where one is missing. */
export function limitsOf({ limits, setPointC }: Profile): SpeciesLimits | null {
  const { criticalLowC, alarmLowC, alarmHighC, criticalHighC } = limits
  if (!criticalLowC || !alarmLowC || !alarmHighC || !criticalHighC) return null
  return {
    criticalLowC: criticalLowC.value,
    alarmLowC: alarmLowC.value,
    alarmHighC: alarmHighC.value,
    criticalHighC: criticalHighC.value,
    setPointC: setPointC.value,
  }
}

/** Everything of a row as sentences and figures. */
export function buildSpeciesView(
  row: SpeciesRow,
  profile: Profile,
  versions: SpeciesView['versions'],
): SpeciesView {
  const { criticalLowC, alarmLowC, alarmHighC, criticalHighC } = profile.limits
  return {
    ...row,
    massWords: `${profile.massMinKg.value} to ${profile.massMaxKg.value} kg`,
    limitFigures: [
      told('Critical high', criticalHighC, 'high'),
      told('Alarm high', alarmHighC, 'high'),
      told('Alarm low', alarmLowC, 'low'),
      told('Critical low', criticalLowC, 'low'),
      told('Crate air at most', profile.airCeilingC, 'high'),
      told('Crate air at least', profile.airFloorC, 'low'),
    ].flat(),
    groups: groupsOf(profile).filter(({ figures }) => figures.length > 0),
    remarks: profile.remarks,
    versions,
  }
}

function groupsOf(profile: Profile): SpeciesView['groups'] {
  return [
    {
      title: 'Body',
      figures: [
        told('Mass at least', profile.massMinKg),
        told('Mass at most', profile.massMaxKg),
        told('Set-point, or preferred', profile.setPointC),
        told('Skin area, coefficient', profile.meehCoefficient),
        told('Skin area, exponent', profile.meehExponent),
        told('Share of the shell', profile.shellShare),
        told('Specific heat', profile.specificHeatJkgK),
      ].flat(),
    },
    {
      title: 'Heat production',
      figures: [
        told('Metabolic line', profile.metabolicLine),
        told('Activity at rest', profile.activityAtRest),
        told('Most against cold', profile.maxOverBasal),
        told('Q10', profile.q10),
        told('Respiratory quotient', profile.respiratoryQuotient),
      ].flat(),
    },
    { title: 'Heat through body and coat', figures: [...conductance(profile.conductance), ...coat(profile)] },
    {
      title: 'Breath and skin',
      figures: [
        told('Oxygen taken from the breath', profile.oxygenExtraction),
        told('Panting, most', profile.pantingMultiple),
        told('Panting, what it costs', profile.pantingCost),
        told('Skin wet at rest', profile.wettednessBase),
        told('Skin wet at most', profile.wettednessMax),
        told('Sweat at most', profile.sweatCapGm2h),
        told('Snub-nosed, share of panting', profile.snubNosedFactor),
      ].flat(),
    },
  ]
}

function conductance(form: Profile['conductance']): SpeciesFigure[] {
  switch (form.model) {
    case 'line':
      return [
        told('Conductance at least, of the line', form.minMultiple),
        told('Conductance at most, of the line', form.maxMultiple),
      ].flat()
    case 'coat':
      return [
        told('Tissue, vessels shut', form.tissueMinWm2K),
        told('Tissue, vessels open', form.tissueMaxWm2K),
        told('Bare share', form.bareShare),
      ].flat()
    case 'ectotherm':
      return told('Core to skin', form.wholeBodyWm2K)
  }
}

function coat(profile: Profile): SpeciesFigure[] {
  return [
    told('Coat depth', profile.coatDepthMm),
    told('Coat conductivity', profile.coatConductivityWmK),
    told('Coat in wind', profile.windPenalty),
    told('Sun taken up', profile.solarAbsorptance),
  ].flat()
}

/** A figure as a line of the table; none where the row has none. */
function told(
  words: string,
  figure: Figure<number | string> | undefined,
  side: 'high' | 'low' | null = null,
): SpeciesFigure[] {
  if (!figure) return []
  const { value, unit, source, confidence } = figure
  const spelled = String(value).replace('-', '\u2212')
  return [
    {
      words,
      tempC: typeof value === 'number' && unit === '°C' ? { value, side } : null,
      value: unit === '' ? spelled : `${spelled}\u00a0${unit}`,
      source,
      confidence,
    },
  ]
}
