import { cbrt } from './elementary'

/**
 * Rodas3 (Sandu, Verwer, Blom, Spee, Carmichael & Potra 1997): four stages, order 3 with an embedded order 2, L-stable and stiffly accurate;
 * three evaluations a step. Coefficients in the transformed form that needs no product with the Jacobian.
 */
export const TABLEAU = {
  stages: 4,
  gamma: 0.5,
  a: [[], [0], [2, 0], [2, 0, 1]],
  c: [[], [4], [1, -1], [1, -1, -8 / 3]],
  m: [2, 0, 1, 1],
  e: [0, 0, 0, 1],
  alpha: [0, 0, 1, 1],
  gammas: [0.5, 1.5, 0, 0],
  /** Stage evaluates anew; stage uses the rates at the start. */
  evaluates: [false, false, true, true],
  reuses: [true, true, false, false],
  /** Error to the power 1/order of the step. */
  root: cbrt,
} as const
