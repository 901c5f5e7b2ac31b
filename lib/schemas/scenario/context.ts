import { z } from 'zod'
import type { InitialState, LimitChange, RuleContext } from '@/lib/thermal/scenario'
import { figure, identifier, optionalFigure, word, words } from './figure'
import { eitherInstant, instantMs, instantText } from './instant'
import type { Same } from './same'

const paperSchema = z
  .strictObject({
    kind: identifier('Kind of paper').describe(
      'For example acclimation-certificate, health-certificate, consignor-food-water.',
    ),
    animalIds: z
      .array(identifier('Animal id'))
      .default([])
      .describe('Whom it speaks of. Default: every animal.'),
    issued: instantText('Issued').optional().describe('ISO 8601, UTC.'),
    issuedMs: instantMs('Issued').optional().describe('The same in milliseconds since 1970.'),
    expires: instantText('Expires').optional().describe('ISO 8601, UTC.'),
    expiresMs: instantMs('Expires').optional().describe('The same in milliseconds since 1970.'),
    values: z
      .record(z.string(), z.number())
      .default({})
      .describe('Figures the paper states, for example { "minAirC": 4.4 }.'),
  })
  .transform(({ issued, issuedMs, expires, expiresMs, ...paper }) => {
    const from = eitherInstant(issued, issuedMs)
    const to = eitherInstant(expires, expiresMs)
    const dates: { issuedMs?: number; expiresMs?: number } = {
      ...(from !== undefined && { issuedMs: from }),
      ...(to !== undefined && { expiresMs: to }),
    }
    return { ...paper, ...dates }
  })

/** What the rules need to know beyond the air: absent, only physiology is evaluated. */
export const contextSchema = z.strictObject({
  jurisdictions: z
    .array(words('Jurisdiction', 12))
    .default([])
    .describe('Codes added by hand, for example US: its rules are read on every leg.'),
  carriers: z
    .array(z.strictObject({ id: identifier('Carrier'), rules: z.array(words('Rule', 200)).default([]) }))
    .default([])
    .describe('Carriers and the ids of their rules.'),
  papers: z.array(paperSchema).default([]).describe('Papers attached, with dates and figures.'),
  purpose: word('Purpose', ['commercial', 'research', 'exhibition', 'private']).describe(
    'Why the animals travel: it decides whether some rules apply.',
  ),
})

const core = (what: string) => optionalFigure({ what, unit: '°C', min: -5, max: 50 }, 'unchanged')
const air = (what: string) => optionalFigure({ what, unit: '°C', min: -60, max: 60 }, 'unchanged')

/** A limit made tighter, or an air limit made wider, with the reason. */
export const limitChangeSchema = z.strictObject({
  scope: identifier('Scope').describe('“profile”, a crate id or an animal id.'),
  coreCriticalLowC: core('Critical low'),
  coreAlarmLowC: core('Alarm low'),
  coreAlarmHighC: core('Alarm high'),
  coreCriticalHighC: core('Critical high'),
  airLowC: air('Air floor'),
  airHighC: air('Air ceiling'),
  reason: words('Reason', 500),
})

const temp = (what: string) => figure({ what, unit: '°C', min: -80, max: 120 })
const amount = (what: string, unit: string) => figure({ what, unit, min: 0, max: 1_000_000 })

/** Where an earlier run ended; restarts a journey on the road. */
export const initialStateSchema = z.strictObject({
  variant: word('Variant', ['typical', 'heat-prone', 'cold-prone']),
  crates: z.array(
    z.strictObject({
      id: identifier('Crate id'),
      airTempC: temp('Crate air'),
      wallTempC: temp('Crate wall'),
      beddingTempC: temp('Bedding'),
      waterKgM3: amount('Vapour', 'kg/m³'),
      co2Ppm: amount('Carbon dioxide', 'ppm'),
      beddingWaterKg: amount('Water in the bedding', 'kg'),
    }),
  ),
  animals: z.array(
    z.strictObject({
      id: identifier('Animal id'),
      coreTempC: temp('Core'),
      shellTempC: temp('Shell'),
      coatWaterKgM2: amount('Water in the coat', 'kg/m²'),
      waterLossKg: figure({ what: 'Water lost', unit: 'kg', min: -1_000, max: 1_000 }),
      pantingMin: amount('Panting so far', 'min'),
      minutesSinceLoading: amount('Minutes since loading', 'min'),
    }),
  ),
  compartments: z.array(
    z.strictObject({
      id: identifier('Compartment'),
      airTempC: temp('Air'),
      wallTempC: temp('Wall'),
      waterKgM3: amount('Vapour', 'kg/m³'),
      co2Ppm: amount('Carbon dioxide', 'ppm'),
    }),
  ),
})

const _context: Same<z.output<typeof contextSchema>, RuleContext> = true
const _limit: Same<z.output<typeof limitChangeSchema>, LimitChange> = true
const _initial: Same<z.output<typeof initialStateSchema>, InitialState> = true
