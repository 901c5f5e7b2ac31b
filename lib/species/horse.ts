import { fitted, judged, limitC, memory } from './figures'
import type { Profile } from './profile'
import { MAMMAL_BANDS, NOSE_MAMMAL, Q10_MAMMAL, SHELL, TWO_THIRDS, WIND_SHORT } from './shared'

export const horse: Profile = {
  key: 'horse',
  commonName: 'Horse',
  scientificName: 'Equus caballus',
  version: 1,
  thermoregulation: 'endotherm',
  bodyPlan: 'mammal',
  posture: 'standing',
  altricial: false,
  massMinKg: judged(150, 'kg', 'small ponies have other lines'),
  massMaxKg: judged(900, 'kg', 'draught horses'),
  setPointC: memory(38, '°C', 'rectal, adult at rest'),
  limits: {
    criticalLowC: limitC(35.5, 'above shivering failure'),
    alarmLowC: limitC(36.8, '1.3 °C above critical'),
    alarmHighC: limitC(39.5, '1 °C under critical'),
    criticalHighC: limitC(
      40,
      'hard-worked horses are stopped at 41 °C; fatal heat stroke is recorded from 41.5 °C',
    ),
  },
  airFloorC: judged(
    -20,
    '°C',
    'house backstop for crate air: a clipped or unused horse needs shelter; an animal this large does not meet a limit within 45 min',
  ),
  airCeilingC: judged(
    38,
    '°C',
    'house backstop for crate air: under the hottest stable a resting horse is left in; an animal this large does not meet a limit within 45 min',
  ),
  metabolicLine: memory('farm-horse' as const, '', 'total heat of a housed horse, 6.1 kg^0.75 W, CIGR 2002'),
  activityAtRest: fitted(1.1, '× line', '142 W/m² over 5–25 °C, five horses, Morgan 1997/98'),
  maxOverBasal: memory(2.5, '× line', 'severely cold horses +70 % (Cymbaluk 1994)'),
  q10: Q10_MAMMAL,
  respiratoryQuotient: memory(0.95, '', 'fed herbivore 0.95–1.0'),
  meehCoefficient: memory(0.1, 'm²/kg^⅔', 'horse 0.10–0.105'),
  meehExponent: TWO_THIRDS,
  conductance: {
    model: 'coat',
    tissueMinWm2K: fitted(15, 'W/m²K', 'constricted; slope and level of Morgan 1997/98'),
    tissueMaxWm2K: memory(40, 'W/m²K', 'dilated 20–60 (Monteith, Mount, Webster ranges)'),
    bareShare: judged(0.12, '', 'belly, legs, ears and face'),
  },
  coatDepthMm: memory(6, 'mm', 'summer 5, winter 15–20'),
  coatConductivityWmK: memory(0.045, 'W/mK', 'fur 0.036–0.055'),
  windPenalty: WIND_SHORT,
  oxygenExtraction: memory(0.25, '', '0.20–0.25'),
  pantingMultiple: judged(2, '× breath at rest', 'a horse hardly pants at rest'),
  pantingCost: judged(0.05, '× basal', 'hardly pants'),
  exhaled: NOSE_MAMMAL,
  wettednessBase: judged(0.12, '', 'skin of a fed horse, evaporation flat under 20 °C'),
  wettednessMax: judged(0.8, '', 'sweats freely'),
  sweatCapGm2h: memory(300, 'g/m²h', '150–400 at rest in heat'),
  bands: MAMMAL_BANDS,
  shellShare: SHELL,
  remarks: [
    'Published loss, slope and lower critical temperature of the same five horses do not fit one another; the row meets each within its band.',
  ],
}
