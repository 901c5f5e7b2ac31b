import { SteadfoldError } from '../errors'
import { KELVIN, VAPOUR_GAS } from './constants'
import { exp, ln, pow } from './elementary'

/*
 * Moist air after the ASHRAE Handbook, Fundamentals 2017, chapter 1 (SI). These are the exact forms for set-up, output and tests;
 * the integrator reads saturation from a table built from them (saturation.ts).
 */

/** Saturation pressure, Pa, over ice below 0 °C, over water above; Hyland & Wexler 1983 (ch. 1 eq. 5–6), −100 to 200 °C. */
export function saturationPressurePa(tempC: number): number {
  if (!(tempC >= -100 && tempC <= 200)) {
    throw new SteadfoldError(
      'refused',
      `Saturation pressure is known from −100 to 200 °C, not at ${tempC} °C.`,
    )
  }
  const t = tempC + KELVIN
  if (tempC < 0) {
    const power = -9.677843e-3 + t * (6.2215701e-7 + t * (2.0747825e-9 + t * -9.484024e-13))
    return exp(-5.6745359e3 / t + 6.3925247 + t * power + 4.1635019 * ln(t))
  }
  const power = -4.8640239e-2 + t * (4.1764768e-5 + t * -1.4452093e-8)
  return exp(-5.8002206e3 / t + 1.3914993 + t * power + 6.5459673 * ln(t))
}

/** Vapour density at saturation, kg/m³ (ideal gas). */
export function saturationDensityKgM3(tempC: number): number {
  return saturationPressurePa(tempC) / (VAPOUR_GAS * (tempC + KELVIN))
}

/** kg of water per kg of dry air, from vapour and total pressure in Pa (ch. 1 eq. 20). */
export function humidityRatio(vapourPa: number, pressurePa: number): number {
  return (0.621945 * vapourPa) / (pressurePa - vapourPa)
}

/** Enthalpy, J per kg of dry air (ch. 1 eq. 30). */
export function moistEnthalpyJKg(tempC: number, ratio: number): number {
  return 1006 * tempC + ratio * (2.501e6 + 1860 * tempC)
}

/** Moist air density, kg/m³ (ch. 1 eq. 26). */
export function moistDensityKgM3(tempC: number, ratio: number, pressurePa: number): number {
  return (pressurePa * (1 + ratio)) / (287.042 * (tempC + KELVIN) * (1 + 1.607858 * ratio))
}

/** Humidity ratio from dry and thermodynamic wet bulb above freezing (ch. 1 eq. 33). */
export function ratioFromWetBulb(tempC: number, wetBulbC: number, pressurePa: number): number {
  const saturated = humidityRatio(saturationPressurePa(wetBulbC), pressurePa)
  return (
    ((2501 - 2.326 * wetBulbC) * saturated - 1.006 * (tempC - wetBulbC)) /
    (2501 + 1.86 * tempC - 4.186 * wetBulbC)
  )
}

/** Wet bulb, °C, above freezing, by bisection to 1e-6 K. */
export function wetBulbC(tempC: number, relHumidity: number, pressurePa: number): number {
  const ratio = humidityRatio(relHumidity * saturationPressurePa(tempC), pressurePa)
  return bisect(-40, tempC, (t) => ratioFromWetBulb(tempC, t, pressurePa) - ratio)
}

/** Dew point, °C, by bisection to 1e-6 K. */
export function dewPointC(tempC: number, relHumidity: number): number {
  const vapourPa = relHumidity * saturationPressurePa(tempC)
  return bisect(-99, tempC, (t) => saturationPressurePa(t) - vapourPa)
}

/** Standard atmosphere, Pa (ch. 1 eq. 3), −5,000 to 11,000 m. */
export function pressureAtAltitudePa(altitudeM: number): number {
  return 101325 * pow(1 - 2.25577e-5 * altitudeM, 5.2559)
}

/** Heat of vaporisation, J/kg, 0–60 °C, within 0.03 % of the steam tables. */
export function latentHeatJKg(tempC: number): number {
  return 2.501e6 - 2361 * tempC
}

function bisect(low: number, high: number, rising: (x: number) => number): number {
  let a = low
  let b = high
  // 30 halvings of at most 300 K leave under 1e-6 K.
  for (let i = 0; i < 30; i++) {
    const middle = 0.5 * (a + b)
    if (rising(middle) < 0) a = middle
    else b = middle
  }
  return 0.5 * (a + b)
}
