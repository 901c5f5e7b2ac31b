import { exp, ln, pow } from './elementary'
import type { Activity, MetabolicLine } from './scenario'

/** Basal (lines for pets, wild birds) or standard fed (farm lines) heat of an endotherm, W. Reptiles: see `ectothermHeatW`. */
export function lineHeatW(line: MetabolicLine, massKg: number): number {
  switch (line) {
    case 'kleiber':
      // 70 kcal/d kg^0.75 (Kleiber 1947). Exponents of 2/3 to 3/4 are defended: ±30 % at the ends of the scale.
      return 3.4 * pow(massKg, 0.75)
    case 'bird':
      // All birds, McKechnie & Wolf 2004; low for birds over 1 kg.
      return pow(10, -1.461) * pow(massKg * 1000, 0.669)
    case 'farm-horse':
      // Total heat of a housed, fed horse, CIGR 2002 (from memory).
      return 6.1 * pow(massKg, 0.75)
    case 'chick':
      // Fasting heat of day-old chicks, 77 kcal/d kg^0.75: Xin & Harmon 1996, Trans. ASAE 39:2249.
      return 3.73 * pow(massKg, 0.75)
    case 'squamate':
    case 'boid':
      return ectothermHeatW(line, massKg, 30)
  }
}

/** Resting heat of a reptile at its body temperature, W; the temperature is held inside 1–50 °C. */
export function ectothermHeatW(line: MetabolicLine, massKg: number, bodyTempC: number): number {
  return ectothermBaseW(line, massKg) * exp(ectothermSlope(line) * Math.min(50, Math.max(1, bodyTempC)))
}

/** Resting heat extrapolated to 0 °C, W: what `exp(slope × °C)` multiplies. */
export function ectothermBaseW(line: MetabolicLine, massKg: number): number {
  const perMlH = 20.1 / 3600
  // Andrews & Pough 1985, eq. 2: 0.013 g^0.80 10^(0.038 T) 10^(0.14 s) mL O2/h with s = 1, resting (the 0.14 from memory).
  const squamate = (grams: number) => 0.013 * pow(10, 0.14) * pow(grams, 0.8) * perMlH
  const grams = massKg * 1000
  if (line !== 'boid') return squamate(grams)
  // Boids: mass exponent 0.806 and Q10 2.61 (34 species, Chappell & Ellis 1987); level 0.7 of the squamate line at 1 kg and 30 °C (memory).
  return (
    (0.7 * squamate(1000) * pow(10, 0.038 * 30) * pow(grams / 1000, 0.806)) / exp(ectothermSlope(line) * 30)
  )
}

/** d ln(heat) / dT, 1/K. */
export function ectothermSlope(line: MetabolicLine): number {
  return line === 'boid' ? ln(2.61) / 10 : 0.038 * ln(10)
}

/** Multiplier on resting heat by the word for what the animal is doing (judgement). */
export const ACTIVITY_MULTIPLE: Record<Activity, number> = {
  asleep: 0.6,
  resting: 1,
  alert: 1.25,
  distressed: 1.5,
}

/** Whole-body conductance lines, W/K. */
export function conductanceLineWK(line: 'mammal' | 'bird' | 'chick-group', massKg: number): number {
  if (line === 'mammal') {
    // Minimum whole body, 192 species: Bradley & Deavers 1980 (via Peters 1983).
    return 0.224 * pow(massKg, 0.574)
  }
  // Herreid & Kessel 1967, birds: 0.848 g^-0.508 mL/g h K (from memory; agrees with budgerigars within 2 %).
  return 4.73e-3 * pow(massKg * 1000, 0.492)
}
