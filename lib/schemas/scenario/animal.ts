import { z } from 'zod'
import type { Animal } from '@/lib/thermal/scenario'
import { figure, figureOr, identifier, optionalFigure, word, words } from './figure'
import type { Same } from './same'

const ACTIVITIES = ['asleep', 'resting', 'alert', 'distressed'] as const
const FLAGS = [
  'snub-nosed',
  'elderly',
  'juvenile',
  'pregnant',
  'sedated',
  'obese',
  'unacclimated',
  'ill',
] as const

const coatSchema = z.strictObject({
  depthMm: optionalFigure({ what: 'Coat depth', unit: 'mm', min: 0, max: 200 }, 'the profile’s'),
  conductivityWmK: optionalFigure(
    { what: 'Coat conductivity', unit: 'W/mK', min: 0.02, max: 0.3 },
    'the profile’s',
  ),
  wetPct: optionalFigure(
    { what: 'Coat wet', unit: '%', min: 0, max: 100, more: 'Share of full wetting' },
    'dry',
  ),
  waterKgM2: optionalFigure(
    { what: 'Water in the coat', unit: 'kg/m²', min: 0, max: 5 },
    'from the wet share',
  ),
  clipped: z.boolean().optional().describe('Clipped or shorn. Absent: no.'),
})

/** One animal, or several alike. */
export const animalSchema = z.strictObject({
  id: identifier('Animal id'),
  profile: identifier('Species profile').describe(
    'The key of a species profile, for example snub-nosed-dog.',
  ),
  massKg: figure({
    what: 'Mass',
    unit: 'kg',
    min: 0.001,
    max: 5_000,
    more: 'Each; the profile’s own range is narrower',
  }),
  count: z
    .number({ error: (issue) => `Count ${JSON.stringify(issue.input)} is not a number: put 1 to 1000.` })
    .int({ error: (issue) => `Count ${String(issue.input)}: put a whole number.` })
    .min(1, { error: (issue) => `Count ${String(issue.input)}: put 1 to 1000.` })
    .max(1_000, { error: (issue) => `Count ${String(issue.input)}: put 1 to 1000.` })
    .default(1)
    .describe('How many alike, 1 to 1000. Default 1.'),
  ageDays: optionalFigure(
    { what: 'Age', unit: 'days', min: 0, max: 100_000 },
    'adult for the engine; rules on age answer unknown',
  ),
  lengthM: optionalFigure({ what: 'Body length', unit: 'm', min: 0.005, max: 10 }, 'from mass'),
  sex: word('Sex', ['male', 'female'])
    .optional()
    .describe('Read by rules on young animals with their mother; no figure depends on it. Absent: unknown.'),
  bodyTempC: optionalFigure(
    { what: 'Body temperature at loading', unit: '°C', min: 0, max: 45 },
    'the profile’s set-point, or the crate air for animals that do not regulate',
  ),
  coat: coatSchema.optional().describe('Absent: the profile’s coat, dry.'),
  activity: word('Activity', ACTIVITIES)
    .default('resting')
    .describe('How it behaves where activityByLeg says nothing. Default resting.'),
  activityByLeg: z
    .record(z.string(), word('Activity', ACTIVITIES))
    .optional()
    .describe('Activity by leg id. Absent: activity on every leg.'),
  activityDecayMin: figureOr(
    { what: 'Decay of activity', unit: 'min', min: 1, max: 1_440 },
    45,
    'judgement: most animals settle within an hour or two',
  ),
  posture: word('Posture', ['curled', 'lying', 'standing'])
    .optional()
    .describe('Absent: as the warmth of the moment makes it.'),
  hoursSinceFed: optionalFigure(
    { what: 'Hours since fed at departure', unit: 'h', min: 0, max: 240 },
    'unknown; rules on food answer unknown',
  ),
  waterOfferedMin: z
    .array(
      figure({
        what: 'Water offered',
        unit: 'min',
        min: -10_080,
        max: 100_000,
        more: 'From departure; negative is before it',
      }),
    )
    .optional()
    .describe('Minutes at which water is offered. Absent: unknown; rules on water answer unknown.'),
  foodOfferedMin: z
    .array(
      figure({
        what: 'Food offered',
        unit: 'min',
        min: 0,
        max: 100_000,
        more: 'From departure; before it, hoursSinceFed says',
      }),
    )
    .optional()
    .describe('Minutes at which food is offered on the way. Absent: none is.'),
  acclimatedToC: optionalFigure({ what: 'Acclimated down to', unit: '°C', min: -60, max: 40 }, 'unknown'),
  flags: z
    .array(word('Flag', FLAGS))
    .default([])
    .describe('What makes this animal need more care; its age adds young and old. Default none.'),
  medicines: words('Medicines', 300)
    .optional()
    .describe('What it was given: drug, dose, time, prescriber. Asks a vet. Absent: nothing.'),
})

const _animal: Same<z.output<typeof animalSchema>, Animal> = true
