/** Physical constants, SI. */
export const KELVIN = 273.15
/** Stefan–Boltzmann, W/m²K⁴ (CODATA 2018). */
export const STEFAN_BOLTZMANN = 5.670374e-8
export const GRAVITY = 9.80665
/** Sea-level pressure, kPa. */
export const STANDARD_KPA = 101.325
/** Specific heat of moist air at crate humidity, J/kgK. */
export const AIR_HEAT_JKGK = 1007
/** Gas constants, J/kgK: dry air, water vapour. */
export const DRY_AIR_GAS = 287.042
export const VAPOUR_GAS = 461.5
/** Body tissue, J/kgK, ±3 % (Burton 1935; Gates 1980; from memory). Day-old chicks: 3350, in their row. */
export const BODY_HEAT_JKGK = 3470
export const WATER_HEAT_JKGK = 4186
/** Heat released per m³ of oxygen taken up, J (mixed diet, respiratory quotient 0.8), gas dry at 0 °C and 101.325 kPa. */
export const OXYGEN_ENERGY_JM3 = 20.1e6
export const OXYGEN_SHARE = 0.2095
/** Kinds of long-wave emitters lie close together: fur, skin, wood, plastic 0.90–0.99. */
export const EMISSIVITY = 0.95
