import { smoothMin } from './smooth'

/*
 * Evaporation from skin through boundary layer and coat: λ A w (ρs − ρ) / (r_bl + r_coat).
 */

/** Boundary-layer resistance to vapour, s/m, from the film (Spotila et al. 1992: 0.93 ρc/h). */
export function boundaryResistanceSM(rhoCp: number, filmWm2K: number): number {
  return (0.93 * rhoCp) / filmWm2K
}

/** Resistance of a coat, s/m: still air of its depth, half as long again for the hair in the way (from memory). */
export function coatResistanceSM(depthM: number, diffusivity: number): number {
  return (1.5 * depthM) / diffusivity
}

/** Heat the skin gives off as vapour, W; the sweat glands' limit rounds it off. */
export function skinEvaporationW(wettedConductanceW: number, vapourDeficit: number, capW: number): number {
  const free = wettedConductanceW * vapourDeficit
  return smoothMin(free, capW, 0.02 * capW)
}
