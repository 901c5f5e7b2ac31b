import { z } from 'zod'
import type { ProfileRow } from '@/lib/thermal/scenario'
import { figure, optionalFigure, word } from './figure'
import type { Same } from './same'

const bodyTemp = (what: string) => figure({ what, unit: '°C', min: -5, max: 50 })
const share = (what: string) => figure({ what, unit: '', min: 0, max: 1 })
const multiple = (what: string) => figure({ what, unit: '', min: 0, max: 50 })
const band = z
  .tuple([
    figure({ what: 'Band start', unit: 'K', min: -100, max: 100 }),
    figure({ what: 'Band end', unit: 'K', min: -100, max: 100 }),
  ])
  .readonly()

const limitsSchema = z.strictObject({
  criticalLowC: bodyTemp('Critical low'),
  alarmLowC: bodyTemp('Alarm low'),
  alarmHighC: bodyTemp('Alarm high'),
  criticalHighC: bodyTemp('Critical high'),
})

const conductanceSchema = z.discriminatedUnion('model', [
  z.strictObject({
    model: z.literal('line'),
    line: word('Conductance line', ['mammal', 'bird', 'chick-group']),
    minMultiple: multiple('Smallest conductance'),
    maxMultiple: multiple('Largest conductance'),
  }),
  z.strictObject({
    model: z.literal('coat'),
    tissueMinWm2K: figure({ what: 'Tissue conductance, constricted', unit: 'W/m²K', min: 0.1, max: 100 }),
    tissueMaxWm2K: figure({ what: 'Tissue conductance, dilated', unit: 'W/m²K', min: 0.1, max: 200 }),
    bareShare: share('Bare share of the skin'),
  }),
  z.strictObject({
    model: z.literal('ectotherm'),
    wholeBodyWm2K: figure({ what: 'Conductance', unit: 'W/m²K', min: 0.1, max: 200 }),
  }),
])

const valuesSchema = z.strictObject({
  thermoregulation: word('Thermoregulation', ['endotherm', 'ectotherm']),
  bodyPlan: word('Body plan', ['mammal', 'bird', 'lizard', 'snake']),
  massMinKg: figure({ what: 'Smallest mass', unit: 'kg', min: 0.001, max: 5_000 }),
  massMaxKg: figure({ what: 'Largest mass', unit: 'kg', min: 0.001, max: 5_000 }),
  limits: limitsSchema.optional(),
  airFloorC: figure({ what: 'Air floor', unit: '°C', min: -60, max: 60 }),
  airCeilingC: figure({ what: 'Air ceiling', unit: '°C', min: -60, max: 60 }),
  setPointC: bodyTemp('Set-point'),
  metabolism: z.strictObject({
    line: word('Metabolic line', ['kleiber', 'bird', 'farm-horse', 'chick', 'squamate', 'boid']),
    activityAtRest: multiple('Activity at rest'),
    maxOverBasal: optionalFigure(
      { what: 'Maximum over basal', unit: '', min: 0, max: 50 },
      'animals that do not regulate',
    ),
    q10: multiple('Q10'),
    respiratoryQuotient: figure({ what: 'Respiratory quotient', unit: '', min: 0.5, max: 1.2 }),
  }),
  surface: z.strictObject({
    meehCoefficient: share('Meeh coefficient'),
    exponent: share('Surface exponent'),
  }),
  conductance: conductanceSchema,
  coat: z.strictObject({
    depthMm: figure({ what: 'Coat depth', unit: 'mm', min: 0, max: 200 }),
    conductivityWmK: figure({ what: 'Coat conductivity', unit: 'W/mK', min: 0.01, max: 1 }),
    windPenalty: multiple('Wind penalty'),
  }),
  respiration: z.strictObject({
    oxygenExtraction: share('Oxygen extraction'),
    pantingMultiple: multiple('Panting multiple'),
    pantingCost: multiple('Panting cost'),
    exhaled: word('Exhaled air', ['mammal', 'small']),
  }),
  skin: z.strictObject({
    wettednessBase: share('Base wettedness'),
    wettednessMax: share('Largest wettedness'),
    sweatCapGm2h: optionalFigure({ what: 'Sweat, at most', unit: 'g/m²h', min: 0, max: 5_000 }, 'no cap'),
  }),
  bands: z.strictObject({ vasomotor: band, cold: band, pant: band, wet: band }),
  shellShare: share('Shell share'),
  posture: word('Posture', ['curled', 'lying', 'standing']).optional().describe('Absent: lying.'),
  specificHeatJkgK: optionalFigure({ what: 'Specific heat', unit: 'J/kgK', min: 1_000, max: 5_000 }, '3470'),
  altricial: z.boolean().optional().describe('Young make little extra heat: age then limits it. Absent: no.'),
  snubNosedFactor: optionalFigure(
    { what: 'Snub-nosed factor', unit: '', min: 0, max: 1 },
    'the flag needs a row of its own',
  ),
  solarAbsorptance: optionalFigure({ what: 'Share of sun taken up', unit: '', min: 0, max: 1 }, '0.7'),
})

/** A species row in force, as lib/species declares it. */
export const profileRowSchema = z.strictObject({
  version: z.number().int().min(1).describe('Version of the row.'),
  values: valuesSchema,
})

const _row: Same<z.output<typeof profileRowSchema>, ProfileRow> = true
