import { z } from 'zod'
import type { Leg } from '@/lib/thermal/scenario'
import { figure, figureOr, flag, identifier, optionalFigure, word } from './figure'
import type { Same } from './same'
import { surroundingsSchema } from './surroundings'

const MAX_LEG_MIN = 20_160

const country = (what: string) =>
  z
    .string()
    .regex(/^[A-Z]{2}$/, {
      error: (issue) =>
        `${what} “${String(issue.input)}”: put the two capital letters of ISO 3166-1, for example GB.`,
    })
    .optional()
    .describe(
      `${what}, ISO 3166-1 alpha-2. A legal rule reads only legs in its country. Absent: no country's law is read here.`,
    )

const placeSchema = z.strictObject({
  latitudeDeg: optionalFigure(
    { what: 'Latitude', unit: '°', min: -90, max: 90 },
    'the sun stands overhead in proportion to the figure given',
  ),
  longitudeDeg: optionalFigure({ what: 'Longitude', unit: '°', min: -180, max: 180 }, 'as latitude'),
  headingDeg: optionalFigure(
    { what: 'Heading', unit: '°', min: 0, max: 360, more: 'Clockwise from north' },
    'no face is favoured by the sun',
  ),
  fromCountry: country('Country of the start'),
  toCountry: country('Country of the end'),
})

const eventSchema = z.strictObject({
  minute: figure({
    what: 'Minute of the event',
    unit: 'min',
    min: 0,
    max: MAX_LEG_MIN,
    more: 'Counted from the start of the leg',
  }),
  durationMin: figure({ what: 'Duration of the event', unit: 'min', min: 0.1, max: MAX_LEG_MIN }),
  kind: word('Event', ['door', 'fan', 'conditioning']).describe(
    'door: opened; fan and conditioning: off for the duration.',
  ),
  openAreaM2: optionalFigure(
    { what: 'Open area of the door', unit: 'm²', min: 0, max: 100 },
    'the engine’s figure for a door',
  ),
})

const delaySchema = z
  .strictObject({
    typicalMin: figure({ what: 'Delay, typical', unit: 'min', min: 0, max: 10_080 }),
    worstMin: figure({ what: 'Delay, worst', unit: 'min', min: 0, max: 10_080 }),
  })
  .refine((delay) => delay.worstMin >= delay.typicalMin, {
    path: ['worstMin'],
    error: 'Delay, worst: put at least the typical delay.',
  })

const plainLegSchema = z.strictObject({
  id: identifier('Leg id'),
  kind: word('Leg kind', ['road', 'shed', 'ramp', 'flight', 'sea', 'rail', 'border', 'rest']).describe(
    'What the leg is.',
  ),
  flightPhase: word('Phase of the flight', ['doors-shut-departure', 'airborne', 'doors-shut-arrival'])
    .optional()
    .describe('Only on a flight, which is three legs.'),
  durationMin: figure({
    what: 'Duration',
    unit: 'min',
    min: 1,
    max: MAX_LEG_MIN,
    more: 'As planned, without delay',
  }),
  surroundings: surroundingsSchema,
  pressureKPa: figureOr(
    { what: 'Air pressure', unit: 'kPa', min: 50, max: 110 },
    101.325,
    'standard atmosphere at sea level',
  ),
  delay: delaySchema
    .default({ typicalMin: 0, worstMin: 0 })
    .describe('Allowance for delay, minutes. Default none in a file; the form asks for both.'),
  outOfCrate: flag(
    'outOfCrate',
    'Animals stand in the surroundings’ air, out of the crate; only on a rest leg. Water, rest and state restart from there.',
  ),
  attended: flag('attended', 'One of ours is beside the crate.'),
  place: placeSchema
    .optional()
    .describe('Where, for the sun and the law. Absent: no law is read on this leg.'),
  events: z.array(eventSchema).default([]).describe('Doors opened, fans and machines off. Default none.'),
})

/** One leg; legs follow each other without gap or overlap. */
export const legSchema = plainLegSchema
  .refine((leg) => leg.flightPhase === undefined || leg.kind === 'flight', {
    path: ['flightPhase'],
    error: 'Phase of the flight: only a leg of kind flight has one.',
  })
  .refine((leg) => !leg.outOfCrate || leg.kind === 'rest', {
    path: ['outOfCrate'],
    error: 'Out of the crate: only a leg of kind rest can say so.',
  })
  .refine((leg) => leg.events.every((event) => event.minute < leg.durationMin), {
    path: ['events'],
    error: 'Events: each must start before the leg ends.',
  })

const _leg: Same<z.output<typeof legSchema>, Leg> = true
