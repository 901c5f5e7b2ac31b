/**
 * RODAS (Hairer & Wanner, Solving Ordinary Differential Equations II, 2nd ed., section IV.10): six stages, order 4 with an embedded order 3, both
 * L-stable and stiffly accurate. Coefficients in the transformed form that needs no product with the Jacobian.
 */
export interface Tableau {
  stages: number
  gamma: number
  /** Row n: weights of the earlier stages in the state stage n is taken at, and in its right-hand side (over h). */
  a: readonly (readonly number[])[]
  c: readonly (readonly number[])[]
  /** Weights of the new state. The embedded one differs by the last stage alone, which is therefore the error. */
  m: readonly number[]
  /** Time of each stage, and its share of the rates' change with time. */
  alpha: readonly number[]
  gammas: readonly number[]
}

const LAST = [1.221224509226641, 6.019134481288629, 12.53708332932087, -0.687886036105895] as const

export const TABLEAU: Tableau = {
  stages: 6,
  gamma: 0.25,
  a: [
    [],
    [1.544],
    [0.9466785280815826, 0.2557011698983284],
    [3.314825187068521, 2.896124015972201, 0.9986419139977817],
    LAST,
    [...LAST, 1],
  ],
  c: [
    [],
    [-5.6688],
    [-2.430093356833875, -0.2063599157091915],
    [-0.1073529058151375, -9.594562251023355, -20.47028614809616],
    [7.496443313967647, -10.24680431464352, -33.99990352819905, 11.7089089320616],
    [8.083246795921522, -7.981132988064893, -31.52159432874371, 16.31930543123136, -6.058818238834054],
  ],
  m: [...LAST, 1, 1],
  alpha: [0, 0.386, 0.21, 0.63, 1, 1],
  gammas: [0.25, -0.1043, 0.1035, -0.03620000000000023, 0, 0],
}

/** Error to the power 1/4: how much a step must shrink. */
export function stepRoot(error: number): number {
  return Math.sqrt(Math.sqrt(error))
}
