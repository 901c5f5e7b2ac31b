import { airDensityKgM3, conductivityWmK, PRANDTL, viscosityPaS } from './air'
import { GRAVITY, KELVIN } from './constants'
import { cbrt, exp, ln, pow } from './elementary'
import { smoothAbs } from './smooth'

/*
 * Film over a body of any shape, length scale the cube root of its volume (Mitchell 1976):
 * forced Nu = 0.37 Re^0.6, free Nu = 2 + 0.60 Gr^¼ Pr^⅓ (sphere), joined as (free³ + forced³)^⅓.
 * Constants by shape spread by a factor of 1.6 at equal Reynolds number: h is good to ±25 %, dry loss through 10 mm of coat to ±6 %.
 */

/** What of the film depends on the air alone: h = film × the body's own powers of length. */
export interface Film {
  /** Times length^−0.4: forced film, W/m²K. */
  forced: number
  /** Times length^−0.25 |ΔT|^0.25: free film, W/m²K. */
  free: number
  /** Over length: still film, W/m²K. */
  still: number
}

const FREE_CONSTANT = 0.6 * pow(PRANDTL, 1 / 3)

export function setFilm(film: Film, airTempC: number, speedMs: number, pressureKPa: number): void {
  const conductivity = conductivityWmK(airTempC)
  const kinematic = viscosityPaS(airTempC) / airDensityKgM3(airTempC, pressureKPa)
  film.forced = 0.37 * conductivity * exp(0.6 * ln(speedMs / kinematic))
  film.free =
    FREE_CONSTANT *
    conductivity *
    Math.sqrt(Math.sqrt(GRAVITY / ((airTempC + KELVIN) * kinematic * kinematic)))
  film.still = 2 * conductivity
}

/** Powers of a body's length scale, worked out once. */
export interface FilmLength {
  perLength: number
  forcedPower: number
  freePower: number
}

export function filmLength(lengthM: number): FilmLength {
  return { perLength: 1 / lengthM, forcedPower: pow(lengthM, -0.4), freePower: pow(lengthM, -0.25) }
}

/** Film coefficient, W/m²K, for a surface `excessK` above the air. */
export function filmWm2K(film: Film, length: FilmLength, excessK: number): number {
  const forced = film.forced * length.forcedPower
  const free =
    film.still * length.perLength +
    film.free * length.freePower * Math.sqrt(Math.sqrt(smoothAbs(excessK, 0.02)))
  return cbrt(forced * forced * forced + free * free * free)
}

/** Nu = a Re^n of Mitchell 1976, table 1, by shape. */
export const MITCHELL_SHAPES = {
  sphere: [0.37, 0.6],
  cylinder: [0.615, 0.466],
  frog: [0.258, 0.667],
  lizardOnSurface: [1.36, 0.39],
} as const

export function mitchellWm2K(
  shape: keyof typeof MITCHELL_SHAPES,
  speedMs: number,
  lengthM: number,
  conductivity: number,
  kinematic: number,
): number {
  const [a, n] = MITCHELL_SHAPES[shape]
  return (a * pow((speedMs * lengthM) / kinematic, n) * conductivity) / lengthM
}

/** Cylinder across a stream, Churchill & Bernstein 1977; Re Pr over 0.2. */
export function churchillBernstein(reynolds: number, prandtl: number): number {
  const tail = pow(1 + pow(reynolds / 282000, 5 / 8), 4 / 5)
  const damping = pow(1 + pow(0.4 / prandtl, 2 / 3), 0.25)
  return 0.3 + ((0.62 * Math.sqrt(reynolds) * cbrt(prandtl)) / damping) * tail
}

/** Free convection about a horizontal cylinder, Churchill & Chu 1975; Ra under 1e12. */
export function churchillChu(rayleigh: number, prandtl: number): number {
  const damping = pow(1 + pow(0.559 / prandtl, 9 / 16), 8 / 27)
  const root = 0.6 + (0.387 * pow(rayleigh, 1 / 6)) / damping
  return root * root
}
