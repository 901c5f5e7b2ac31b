import { vapourDiffusivityM2S } from './air'
import type { Compartment } from './compartment'
import type { Box, Outer } from './crate'
import { exp } from './elementary'
import { layoutOf, type Layout } from './layout'
import type { Leg } from './scenario'
import { bodySunWm2, crateSun, type CrateSun } from './crate-sun'
import type { Built, Drink } from './build-leg'
import type { WeatherNode } from './weather'

/** One leg compiled for the integrator: equations' constants, weather as straight lines, switches and the moments they change. */
export interface LegModel {
  leg: Leg
  fromS: number
  toS: number
  layout: Layout
  boxes: Box[]
  spaces: Compartment[]
  /** Outermost air now; air around the crates now; scratch for a space inside a space. */
  boundary: Outer
  outer: Outer
  between: Outer
  /** Moments, ascending, the integrator must stop at. `jump`: a switch, after which it starts small; else a corner of the weather. */
  stops: { s: number; jump: boolean }[]
  /** True when nothing moves with time: weather steady, nobody excited. */
  steady: boolean
  setTime(s: number): void
  /** Switches for the stretch that starts at `s`. */
  setSwitches(s: number, y: Float64Array): void
}

export function legModelOf(built: Built): LegModel {
  const { nodes, boxes, spaces } = built
  const boundary: Outer = { ...(nodes[0] as WeatherNode) }
  const outer = spaces.length > 0 ? { ...boundary } : boundary
  const sun = nodes.map((node) => sunRow(built, node))
  const excited = built.excitement.filter(({ excess }) => excess !== 0)
  let at = 0

  const setTime = (s: number) => {
    while (at > 0 && s < (nodes[at] as WeatherNode).s) at--
    while (at + 2 < nodes.length && s >= (nodes[at + 1] as WeatherNode).s) at++
    const a = nodes[at] as WeatherNode
    const b = nodes[at + 1] ?? a
    const span = b.s - a.s
    const share = span > 0 ? Math.min(1, Math.max(0, (s - a.s) / span)) : 0
    boundary.airTempC = a.airTempC + share * (b.airTempC - a.airTempC)
    boundary.surfaceTempC = a.surfaceTempC + share * (b.surfaceTempC - a.surfaceTempC)
    boundary.deckTempC = a.deckTempC + share * (b.deckTempC - a.deckTempC)
    boundary.waterKgM3 = a.waterKgM3 + share * (b.waterKgM3 - a.waterKgM3)
    boundary.co2Ppm = a.co2Ppm + share * (b.co2Ppm - a.co2Ppm)
    boundary.speedMs = a.speedMs + share * (b.speedMs - a.speedMs)
    if (built.anySun) applySun(built, sun[at] as SunRow, sun[at + 1] ?? (sun[at] as SunRow), share)
    for (const { body, excess, decayS } of excited) body.excess = excess * exp(-(s - built.fromS) / decayS)
  }
  for (const { body, excess } of built.excitement) body.excess = excess
  setTime(built.fromS)
  for (const box of boxes) {
    box.air.diffusivityM2S = vapourDiffusivityM2S(boundary.airTempC, box.pressureKPa)
  }
  const layout = layoutOf(boxes, spaces)
  return {
    leg: built.leg,
    fromS: built.fromS,
    toS: built.toS,
    layout,
    boxes,
    spaces,
    boundary,
    outer,
    between: { ...boundary },
    stops: stopsOf(built),
    steady: nodes.length === 1 && excited.length === 0,
    setTime,
    setSwitches: (s, y) => setSwitches(built, layout, s, y),
  }
}

interface SunRow {
  boxes: CrateSun[]
  spaceW: number
}

function sunRow(built: Built, node: WeatherNode): SunRow {
  const space = built.sunlitSpace
  return {
    boxes: built.crates.map((crate, index) =>
      built.spaces.length > 0
        ? { wallW: 0, bedW: 0, bodyWm2: 0 }
        : built.leg.outOfCrate
          ? { wallW: 0, bedW: 0, bodyWm2: bodySunWm2(node.sun) }
          : crateSun(
              crate,
              built.onLegs[index],
              built.leg,
              node.sun,
              built.exposedM2[index] ?? 0,
              built.albedo,
            ),
    ),
    spaceW: space ? space.apertureM2 * space.transmittance * node.sun.globalWm2 : 0,
  }
}

function applySun(built: Built, a: SunRow, b: SunRow, share: number): void {
  built.boxes.forEach((box, index) => {
    const from = a.boxes[index] as CrateSun
    const to = b.boxes[index] as CrateSun
    box.sunOnWallW = from.wallW + share * (to.wallW - from.wallW)
    box.sunOnBedW = from.bedW + share * (to.bedW - from.bedW)
    const bodyWm2 = from.bodyWm2 + share * (to.bodyWm2 - from.bodyWm2)
    for (const body of box.bodies) body.sunW = body.solarAbsorptance * body.exposedM2 * bodyWm2
  })
  if (built.sunlitSpace) built.sunlitSpace.space.sunW = a.spaceW + share * (b.spaceW - a.spaceW)
}

function stopsOf(built: Built): LegModel['stops'] {
  const { fromS, toS } = built
  const jumps = new Set([...built.switches, ...built.drinks].flatMap((change) => [change.fromS, change.toS]))
  const moments = new Set([...built.nodes.map((node) => node.s), ...jumps, toS])
  return [...moments]
    .filter((s) => s > fromS && s <= toS)
    .sort((a, b) => a - b)
    .map((s) => ({ s, jump: jumps.has(s) }))
}

function setSwitches(built: Built, layout: Layout, s: number, y: Float64Array): void {
  const middle = s + 1e-3
  const active = built.switches.filter((change) => middle >= change.fromS && middle < change.toS)
  for (const space of built.spaces) {
    space.fanOn = !active.some((change) => change.kind === 'fan' && change.space === space)
    space.conditioningOn = !active.some((change) => change.kind === 'conditioning' && change.space === space)
    space.doorM2 = Math.max(
      0,
      ...active.filter((c) => c.kind === 'door' && c.space === space).map((change) => change.openAreaM2),
    )
  }
  for (const drink of built.drinks) {
    if (middle >= drink.fromS && middle < drink.toS) {
      if (drink.kgS < 0) drink.kgS = thirstKgS(layout, drink, y)
      drink.body.drinkKgS = drink.kgS
    } else if (middle >= drink.toS && drink.kgS >= 0) {
      drink.body.drinkKgS = 0
      drink.kgS = -1
    }
  }
}

/** What was lost, at most 2 % of body mass at one offer (judgement), over the time the drink takes. */
function thirstKgS(layout: Layout, drink: Drink, y: Float64Array): number {
  for (const block of layout.blocks) {
    const slot = block.animals.find((animal) => animal.body === drink.body)
    if (!slot) continue
    const lostKg = Math.max(0, y[slot.at + 2] as number)
    return Math.min(lostKg, 0.02 * drink.body.massKg) / (drink.toS - drink.fromS)
  }
  return 0
}
