import { fitted, judged, limitC, memory } from './figures'
import type { Profile } from './profile'
import {
  EXTRACTION_MAMMAL,
  KLEIBER,
  MAMMAL_BANDS,
  MIXED_RQ,
  NOSE_MAMMAL,
  Q10_MAMMAL,
  SHELL,
  TWO_THIRDS,
  WIND_SHORT,
} from './shared'

const TRIALS =
  'one set fitted together to Besch 1984 (PubMed 6727290), FAA AM-87/8 (1987) and the laboratory-animal heat table for dogs'

export const dog: Profile = {
  key: 'dog',
  commonName: 'Dog',
  scientificName: 'Canis lupus familiaris',
  version: 1,
  thermoregulation: 'endotherm',
  bodyPlan: 'mammal',
  posture: 'lying',
  altricial: true,
  massMinKg: judged(0.3, 'kg', 'a puppy of a small breed at weaning'),
  massMaxKg: judged(90, 'kg', 'giant breeds'),
  setPointC: memory(38.7, '°C', 'rectal, adult at rest'),
  limits: {
    criticalLowC: limitC(36, 'above shivering failure'),
    alarmLowC: limitC(37.2, '1.2 °C above critical'),
    alarmHighC: limitC(
      39.7,
      '0.8 °C under critical; beagles at rest reach +1.1 °C only past their thermal limit',
    ),
    criticalHighC: limitC(40.5, 'fatal heat stroke is on record from 41.0 °C in working dogs'),
  },
  airFloorC: judged(
    -3,
    '°C',
    'house backstop for crate air at 50 % relative humidity: the cold-prone dog of 11 kg stands at 60 % cold effort within 45 min',
  ),
  airCeilingC: judged(
    37,
    '°C',
    'house backstop for crate air at 50 % relative humidity: the heat-prone dog of 11 kg meets critical within 45 min',
  ),
  metabolicLine: KLEIBER,
  activityAtRest: fitted(2, '× line', TRIALS),
  maxOverBasal: memory(
    5,
    '× line',
    'summit metabolism 4–5 times basal, 1–20 kg; +80 % at 5 °C seen in adult dogs',
  ),
  q10: Q10_MAMMAL,
  respiratoryQuotient: MIXED_RQ,
  meehCoefficient: memory(0.101, 'm²/kg^⅔', 'dogs 0.101 (small) to 0.112 (large)'),
  meehExponent: TWO_THIRDS,
  conductance: {
    model: 'line',
    line: 'mammal',
    minMultiple: fitted(1.1, '× Bradley & Deavers 1980', TRIALS),
    maxMultiple: fitted(2, '× Bradley & Deavers 1980', TRIALS),
  },
  coatDepthMm: memory(8, 'mm', 'short coat 6–10, double coat 25–50'),
  coatConductivityWmK: memory(0.045, 'W/mK', 'fur 0.036–0.055'),
  windPenalty: WIND_SHORT,
  oxygenExtraction: EXTRACTION_MAMMAL,
  pantingMultiple: fitted(6.2, '× breath at rest', TRIALS),
  pantingCost: fitted(0.5, '× basal', TRIALS),
  exhaled: NOSE_MAMMAL,
  wettednessBase: memory(0.02, '', 'skin, dry'),
  wettednessMax: memory(0.03, '', 'no sweat glands but in the pads'),
  bands: MAMMAL_BANDS,
  shellShare: SHELL,
  snubNosedFactor: judged(1, '', 'not used: a snub-nosed dog takes its own row'),
  remarks: [
    'Limits of thermoneutrality are computed from coat and mass, never looked up: one value for all dogs is wrong.',
  ],
}

export const snubNosedDog: Profile = {
  ...dog,
  key: 'snub-nosed-dog',
  commonName: 'Dog, snub-nosed',
  limits: {
    ...dog.limits,
    alarmHighC: limitC(39.4, '0.8 °C under critical'),
    criticalHighC: limitC(40.2, 'under the plain dog: the airway swells with the effort of panting'),
  },
  airFloorC: judged(
    -1,
    '°C',
    'house backstop for crate air at 50 % relative humidity: the cold-prone snub-nosed dog of 9 kg stands at 60 % cold effort within 45 min',
  ),
  airCeilingC: judged(
    30,
    '°C',
    'house backstop for crate air at 50 % relative humidity: the heat-prone snub-nosed dog of 9 kg meets critical within 45 min',
  ),
  pantingMultiple: judged(3.5, '× breath at rest', 'p_max of snub-nosed dogs 3–5 (from memory)'),
  pantingCost: judged(0.4, '× basal', 'as large as the gain of panting at 30 °C and 50 % allows'),
  snubNosedFactor: judged(1, '', 'the row holds it already'),
  remarks: [
    'A snub-nosed row may never come out better than the plain row.',
    'No calorimetry of snub-nosed dogs was found: the row is the dog’s with less panting, and rests on judgement.',
  ],
}
