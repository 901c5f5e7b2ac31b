import { z } from 'zod'
import type { ControlledAir, EnclosedSpace, OpenAir, Surroundings } from '@/lib/thermal/scenario'
import { figure, figureOr, identifier, optionalFigure, word } from './figure'
import { eitherInstant, instantMs, instantText } from './instant'
import type { Same } from './same'

const airTempC = figure({ what: 'Air temperature', unit: '°C', min: -60, max: 60 })
const relHumidityPct = figure({ what: 'Relative humidity', unit: '%', min: 0, max: 100 })

const weatherPointSchema = z.strictObject({
  minute: figure({
    what: 'Minute of the weather point',
    unit: 'min',
    min: 0,
    max: 100_000,
    more: 'Counted from the planned departure',
  }),
  airTempC,
  relHumidityPct,
  windMs: figure({ what: 'Wind', unit: 'm/s', min: 0, max: 60, more: 'At windHeightM' }),
  solarWm2: figure({ what: 'Sun', unit: 'W/m²', min: 0, max: 1_400, more: 'Global horizontal' }),
  diffuseWm2: optionalFigure(
    { what: 'Diffuse sun', unit: 'W/m²', min: 0, max: 1_000 },
    'split from the global figure by the height of the sun',
  ),
  skyTempC: optionalFigure(
    { what: 'Sky temperature', unit: '°C', min: -100, max: 60 },
    'clear sky over this air',
  ),
})

const openAirSchema = z
  .strictObject({
    type: z.literal('open-air'),
    series: z
      .array(weatherPointSchema)
      .min(1, { error: 'Weather: put at least one point.' })
      .describe(
        'Weather by minute from departure, linear between points; a single point holds for the whole journey.',
      ),
    source: word('Source of the weather', ['typed', 'forecast'])
      .optional()
      .describe('Who says so: typed by a person, or a forecast.'),
    issuedAt: instantText('Issue time')
      .optional()
      .describe('When the forecast was issued or the figures typed, ISO 8601, UTC.'),
    issuedAtMs: instantMs('Issue time')
      .optional()
      .describe('The same in milliseconds since 1970, as a stored scenario holds it.'),
    shadePct: figureOr(
      { what: 'Shade', unit: '%', min: 0, max: 100, more: 'Share of the direct sun kept off' },
      0,
      'judgement: no shade unless somebody provides it',
    ),
    groundTempC: optionalFigure(
      { what: 'Ground temperature', unit: '°C', min: -60, max: 90 },
      'from air and sun',
    ),
    groundAlbedo: figureOr(
      { what: 'Ground albedo', unit: '', min: 0, max: 1 },
      0.2,
      'common figure for concrete and short grass',
    ),
    windHeightM: figureOr(
      { what: 'Height of the wind figure', unit: 'm', min: 0.1, max: 100 },
      10,
      'World Meteorological Organization, standard mast',
    ),
  })
  .refine((air) => air.issuedAt === undefined || air.issuedAtMs === undefined, {
    path: ['issuedAtMs'],
    error: 'Issue time stands twice: keep issuedAt or issuedAtMs.',
  })
  .transform(({ issuedAt, issuedAtMs, ...air }) => {
    const ms = eitherInstant(issuedAt, issuedAtMs)
    const when: { issuedAtMs?: number } = ms === undefined ? {} : { issuedAtMs: ms }
    return { ...air, ...when }
  })

const controlledSchema = z
  .strictObject({
    type: z.literal('controlled'),
    airTempC,
    relHumidityPct,
    airSpeedMs: figure({ what: 'Air speed at the crates', unit: 'm/s', min: 0, max: 20 }),
    surfaceTempC: optionalFigure(
      { what: 'Surface temperature', unit: '°C', min: -60, max: 90 },
      'the air temperature',
    ),
    outsideCo2Ppm: figureOr(
      { what: 'Carbon dioxide of the room', unit: 'ppm', min: 300, max: 40_000 },
      420,
      'outdoor air',
    ),
    outside: openAirSchema
      .optional()
      .describe('What lies outside, for a failure of the machine. Absent: endurance is unknown.'),
  })
  .transform((air) => ({ ...air, surfaceTempC: air.surfaceTempC ?? air.airTempC }))

const conditioningSchema = z
  .strictObject({
    setPointC: figure({ what: 'Set-point', unit: '°C', min: -30, max: 45 }),
    coolingW: figure({ what: 'Cooling', unit: 'W', min: 0, max: 500_000 }),
    heatingW: figure({ what: 'Heating', unit: 'W', min: 0, max: 500_000 }),
  })
  .refine(({ coolingW, heatingW }) => coolingW > 0 || heatingW > 0, {
    error:
      'A set-point without cooling or heating holds nothing: put watts for one of them, or take conditioning out.',
  })

const otherLoadSchema = z.strictObject({
  sensibleW: figure({ what: 'Other heat', unit: 'W', min: -50_000, max: 500_000 }),
  moistureGh: figure({ what: 'Other moisture', unit: 'g/h', min: 0, max: 500_000 }),
  co2Lh: figure({ what: 'Other carbon dioxide', unit: 'L/h', min: 0, max: 100_000 }),
})

const enclosedShape = {
  type: z.literal('enclosed'),
  volumeM3: figure({ what: 'Volume', unit: 'm³', min: 0.05, max: 100_000 }),
  heatTransferWK: figure({
    what: 'Heat through walls',
    unit: 'W/K',
    min: 0.1,
    max: 100_000,
    more: 'UA to outside',
  }),
  interiorMassKJK: figure({ what: 'Inside mass', unit: 'kJ/K', min: 0.1, max: 1_000_000 }),
  ventilationM3h: optionalFigure(
    { what: 'Fresh air', unit: 'm³/h', min: 0, max: 1_000_000 },
    'unknown: leakage alone counts, with a judgement',
  ),
  leakageM3h: figure({ what: 'Leakage', unit: 'm³/h', min: 0, max: 100_000 }),
  solarApertureM2: figure({ what: 'Sunlit glass', unit: 'm²', min: 0, max: 1_000 }),
  solarTransmittance: figureOr(
    { what: 'Share of sun let through', unit: '', min: 0, max: 1 },
    0.6,
    'judgement: tinted vehicle glass',
  ),
  crateAirSpeedMs: figure({ what: 'Air speed at the crates', unit: 'm/s', min: 0, max: 20 }),
  initialAirTempC: optionalFigure(
    { what: 'Air at the start', unit: '°C', min: -60, max: 90 },
    'the air outside',
  ),
  initialRelHumidityPct: optionalFigure(
    { what: 'Humidity at the start', unit: '%', min: 0, max: 100 },
    'the vapour of the air outside',
  ),
  wallTempC: optionalFigure(
    { what: 'Walls at the start', unit: '°C', min: -60, max: 90 },
    'the air at the start',
  ),
  conditioning: conditioningSchema
    .optional()
    .describe('Heating and cooling held to a set-point. Absent: none.'),
  otherLoad: otherLoadSchema
    .optional()
    .describe('Heat, moisture and carbon dioxide of other cargo. Absent: none.'),
  compartmentId: identifier('Compartment')
    .optional()
    .describe('Legs that name the same compartment carry its air, walls, vapour and carbon dioxide over.'),
}

const simpleAir = [controlledSchema, openAirSchema] as const

/** A space within a space, a van on a ferry deck for example; no deeper. */
const innerEnclosedSchema = z.strictObject({
  ...enclosedShape,
  outside: z.discriminatedUnion('type', simpleAir, {
    error: 'Outside of the outer space: put controlled or open-air; a space stands in another at most once.',
  }),
})

const enclosedSchema = z.strictObject({
  ...enclosedShape,
  outside: z
    .discriminatedUnion('type', [...simpleAir, innerEnclosedSchema], { error: typeMessage('Outside') })
    .describe('What surrounds the space: any surroundings, enclosed again at most once.'),
})

function typeMessage(what: string) {
  return `${what}: put a type: controlled, open-air or enclosed.`
}

const union = z.discriminatedUnion('type', [...simpleAir, enclosedSchema], {
  error: typeMessage('Surroundings'),
})

/** Air around the crates on one leg. The engine's type nests without end; the schema allows one space within another. */
export const surroundingsSchema: z.ZodType<Surroundings, z.input<typeof union>> = union

const _controlled: Same<z.output<typeof controlledSchema>, ControlledAir> = true
const _openAir: Same<z.output<typeof openAirSchema>, OpenAir> = true
const _enclosed: Same<keyof z.output<typeof enclosedSchema>, keyof EnclosedSpace> = true
const _enclosedValues: Same<
  Omit<z.output<typeof innerEnclosedSchema>, 'outside'>,
  Omit<EnclosedSpace, 'outside'>
> = true
