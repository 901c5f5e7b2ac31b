import { saturationDensityKgM3 } from './psychrometrics'

/*
 * Saturated vapour density as a table of cubic Hermite pieces, a quarter kelvin apart: within 1e-9 of the
 * Hyland–Wexler form it is built from, with a continuous slope, and an order faster than two logarithms.
 */
const LOWEST_C = -90
const HIGHEST_C = 150
const PER_KELVIN = 4
const COUNT = (HIGHEST_C - LOWEST_C) * PER_KELVIN
/** Four polynomial coefficients a piece, in the piece's own 0–1 coordinate. */
const pieces = buildPieces()

/** Saturated vapour density, kg/m³. Beyond −90 and 150 °C it keeps the end value: nothing alive is there. */
export function saturatedVapour(tempC: number): number {
  const position = (tempC - LOWEST_C) * PER_KELVIN
  const index = position <= 0 ? 0 : position >= COUNT ? COUNT - 1 : Math.floor(position)
  const raw = position - index
  const x = raw < 0 ? 0 : raw > 1 ? 1 : raw
  const at = 4 * index
  return (
    (pieces[at] as number) +
    x * ((pieces[at + 1] as number) + x * ((pieces[at + 2] as number) + x * (pieces[at + 3] as number)))
  )
}

/**
 * Vapour that is really gas when `waterKgM3` of water hangs in the air: never above saturation, smooth, exactly 0 at 0.
 * The rest is fog and leaves with the air.
 */
export function vapourOf(waterKgM3: number, saturated: number): number {
  const d = waterKgM3 - saturated
  return 0.5 * (waterKgM3 + saturated - Math.sqrt(d * d + 1e-4 * Math.abs(waterKgM3) * saturated))
}

function buildPieces(): Float64Array {
  const table = new Float64Array(4 * COUNT)
  const step = 1 / PER_KELVIN
  for (let i = 0; i < COUNT; i++) {
    const left = LOWEST_C + i * step
    const f0 = saturationDensityKgM3(left)
    const f1 = saturationDensityKgM3(left + step)
    const m0 = slope(left) * step
    const m1 = slope(left + step) * step
    table[4 * i] = f0
    table[4 * i + 1] = m0
    table[4 * i + 2] = 3 * (f1 - f0) - 2 * m0 - m1
    table[4 * i + 3] = 2 * (f0 - f1) + m0 + m1
  }
  return table
}

function slope(tempC: number): number {
  // Fourth-order central difference; the ice and water branches meet at 0 °C within 0.01 %.
  const d = 0.02
  const near = saturationDensityKgM3(tempC + d) - saturationDensityKgM3(tempC - d)
  const far = saturationDensityKgM3(tempC + 2 * d) - saturationDensityKgM3(tempC - 2 * d)
  return (8 * near - far) / (12 * d)
}
