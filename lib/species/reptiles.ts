import { judged, limitC, memory, sourced } from './figures'
import type { Profile } from './profile'
import { MIXED_RQ, NOSE_SMALL, NO_BANDS, SHELL, TWO_THIRDS, WIND_DENSE } from './shared'

/** What both reptile rows share: no coat, no controller, skin nearly waterproof. */
const reptile = {
  version: 1,
  thermoregulation: 'ectotherm',
  posture: 'lying',
  altricial: false,
  respiratoryQuotient: MIXED_RQ,
  meehExponent: TWO_THIRDS,
  conductance: {
    model: 'ectotherm',
    wholeBodyWm2K: judged(
      60,
      'W/m²K',
      'core to skin, so that the film decides: cooling as published for 8 W/m²K outside',
    ),
  },
  coatDepthMm: memory(0, 'mm', 'scales'),
  coatConductivityWmK: memory(0.2, 'W/mK', 'tissue'),
  windPenalty: { ...WIND_DENSE, value: 0 },
  oxygenExtraction: memory(0.2, '', 'reptiles'),
  pantingMultiple: judged(1, '× breath at rest', 'gaping is not counted'),
  pantingCost: judged(0, '× basal', 'none'),
  exhaled: NOSE_SMALL,
  wettednessBase: memory(0.004, '', 'skin resistance 200–1000 s/cm'),
  wettednessMax: memory(0.004, '', 'skin resistance 200–1000 s/cm'),
  bands: NO_BANDS,
  shellShare: SHELL,
} as const

export const beardedDragon: Profile = {
  ...reptile,
  key: 'bearded-dragon',
  commonName: 'Bearded dragon',
  scientificName: 'Pogona vitticeps',
  bodyPlan: 'lizard',
  massMinKg: judged(0.03, 'kg', 'juvenile'),
  massMaxKg: judged(0.7, 'kg', 'large adult'),
  setPointC: memory(35, '°C', 'preferred body temperature'),
  limits: {
    criticalLowC: limitC(12, 'torpid and unable to right itself'),
    alarmLowC: limitC(16, 'ships at 20–30 °C'),
    alarmHighC: limitC(38, 'over preferred, gaping'),
    criticalHighC: limitC(39.5, 'critical thermal maximum 43–46 °C (from memory)'),
  },
  airFloorC: judged(18, '°C', 'ships at 20–30 °C'),
  airCeilingC: judged(33, '°C', 'ships at 20–30 °C'),
  metabolicLine: sourced('squamate' as const, '', 'Andrews & Pough 1985, resting'),
  activityAtRest: judged(1, '× line', 'resting'),
  q10: memory(2.4, '', '10^0.38, Andrews & Pough 1985'),
  meehCoefficient: memory(0.1, 'm²/kg^⅔', 'lizards'),
  remarks: ['No regulation: body temperature follows the surroundings, so air floor and ceiling bind first.'],
}

export const ballPython: Profile = {
  ...reptile,
  key: 'ball-python',
  commonName: 'Ball python',
  scientificName: 'Python regius',
  bodyPlan: 'snake',
  massMinKg: judged(0.05, 'kg', 'hatchling'),
  massMaxKg: judged(3.5, 'kg', 'large female'),
  setPointC: memory(30, '°C', 'preferred body temperature 29–31'),
  limits: {
    criticalLowC: limitC(14, 'regurgitation and chest infection follow chilling'),
    alarmLowC: limitC(18, 'ships at 21–29 °C'),
    alarmHighC: limitC(34, 'over preferred'),
    criticalHighC: limitC(36, 'critical thermal maximum 38–41 °C (from memory)'),
  },
  airFloorC: judged(19, '°C', 'ships at 21–29 °C'),
  airCeilingC: judged(32, '°C', 'ships at 21–29 °C'),
  metabolicLine: sourced(
    'boid' as const,
    '',
    'mass exponent 0.806, Q10 2.61: 34 boid species (Chappell & Ellis 1987); level from memory',
  ),
  activityAtRest: judged(1, '× line', 'resting'),
  q10: sourced(2.61, '', '20–30 °C, Chappell & Ellis 1987'),
  meehCoefficient: memory(0.125, 'm²/kg^⅔', 'snakes stretched; coiled less'),
  remarks: ['No regulation: body temperature follows the surroundings, so air floor and ceiling bind first.'],
}
