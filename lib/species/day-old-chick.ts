import { fitted, judged, limitC, memory, sourced } from './figures'
import type { Profile } from './profile'
import { BIRD_BANDS, NOSE_SMALL, Q10_MAMMAL, SHELL, TWO_THIRDS, WIND_DENSE } from './shared'

const BOXES = 'day-old chicks in shipping boxes, Xin & Harmon 1996, Trans. ASAE 39:2249'

export const dayOldChick: Profile = {
  key: 'day-old-chick',
  commonName: 'Day-old chick',
  scientificName: 'Gallus gallus domesticus',
  version: 1,
  thermoregulation: 'endotherm',
  bodyPlan: 'bird',
  posture: 'curled',
  altricial: false,
  massMinKg: judged(0.028, 'kg', 'small bantam chicks lie outside'),
  massMaxKg: judged(0.06, 'kg', 'within 72 h of hatching'),
  setPointC: sourced(40.1, '°C', 'cloacal 40.0–40.3 in comfort'),
  limits: {
    criticalLowC: limitC(37, 'chill: huddling chicks smother below'),
    alarmLowC: limitC(39, '2 °C above critical'),
    alarmHighC: limitC(41, '1 °C under critical'),
    criticalHighC: limitC(42, 'panting chicks dry out'),
  },
  airFloorC: judged(
    25,
    '°C',
    'house backstop for crate air at 50 % relative humidity: the cold-prone chick stands at 60 % cold effort within 45 min; air in the box, vans run far cooler',
  ),
  airCeilingC: judged(
    38,
    '°C',
    'house backstop for crate air at 50 % relative humidity: the heat-prone chick meets critical within 45 min',
  ),
  metabolicLine: sourced('chick' as const, '', `fasting 77 kcal/d kg^0.75; ${BOXES}`),
  activityAtRest: sourced(1, '× line', BOXES),
  maxOverBasal: fitted(1.7, '× line', `20 °C against 35 °C; ${BOXES}`),
  q10: Q10_MAMMAL,
  respiratoryQuotient: sourced(0.75, '', BOXES),
  meehCoefficient: memory(0.1, 'm²/kg^⅔', 'chicken'),
  meehExponent: TWO_THIRDS,
  conductance: {
    model: 'line',
    line: 'chick-group',
    minMultiple: fitted(1.35, '× Herreid & Kessel 1967 × max(0.45, n^-0.25)', BOXES),
    maxMultiple: fitted(4.05, '× Herreid & Kessel 1967 × max(0.45, n^-0.25)', BOXES),
  },
  coatDepthMm: memory(6, 'mm', 'down 5–8'),
  coatConductivityWmK: memory(0.042, 'W/mK', 'down'),
  windPenalty: WIND_DENSE,
  oxygenExtraction: memory(0.25, '', 'birds'),
  pantingMultiple: judged(5, '× breath at rest', 'poultry 6–8, chicks less'),
  pantingCost: judged(0.2, '× basal', 'poultry'),
  exhaled: NOSE_SMALL,
  wettednessBase: fitted(0.08, '', `moisture production 3.8–4.6 g/kg h; ${BOXES}`),
  wettednessMax: fitted(0.1, '', BOXES),
  bands: BIRD_BANDS,
  shellShare: SHELL,
  specificHeatJkgK: sourced(3350, 'J/kgK', 'chick tissue with yolk'),
  remarks: ['One entry stands for all chicks of a box: set count to the number in it.'],
}
