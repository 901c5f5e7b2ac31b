import type { Body } from './body'
import type { Journey } from './journey'
import type { Layout } from './layout'
import type { AnimalTrack } from './result'
import type { Closure } from './run'
import type { Store } from './store'

/** What stood in animals and crates when each came aboard, to hold the ends of the run against. */
export interface Held {
  animals: Map<string, { heatJ: number }>
  crates: Map<string, { waterKg: number }>
  residualW: number
}

export function holdStart(held: Held, layout: Layout, y: Float64Array, sums: Float64Array): void {
  const at = (index: number) => y[index] as number
  for (const block of layout.blocks) {
    const { box } = block
    if (!held.crates.has(box.id)) {
      const balance =
        (sums[block.sumsAt] as number) -
        (sums[block.sumsAt + 1] as number) -
        (sums[block.sumsAt + 2] as number)
      held.crates.set(box.id, { waterKg: at(block.at + 3) * box.airVolumeM3 + at(block.at + 5) - balance })
    }
    for (const { body, at: i, sumsAt } of block.animals) {
      if (held.animals.has(body.id)) continue
      let heatJ = body.coreHeatJK * at(i) + body.shellHeatJK * at(i + 1)
      for (let n = 0; n < 5; n++) heatJ -= sums[sumsAt + n] as number
      held.animals.set(body.id, { heatJ })
    }
  }
}

/** How well heat and water add up; see `Closure`. */
export function closureOf(
  held: Held,
  store: Store,
  journey: Journey,
  tracks: readonly AnimalTrack[],
): Closure {
  const bodies = new Map(
    journey.crates.flatMap(({ bodies: own }) => own.map((body) => [body.id, body] as const)),
  )
  let accumulatorError = 0
  for (const [id, start] of held.animals) {
    const body = bodies.get(id)
    const animal = store.animals.get(id)
    if (!body || !animal) continue
    const stored = body.coreHeatJK * animal.coreC + body.shellHeatJK * animal.shellC - start.heatJ
    const through = animal.sums.reduce((sum, term) => sum + Math.abs(term), 0)
    const net = animal.sums.reduce((sum, term) => sum + term, 0)
    if (through > 0) accumulatorError = Math.max(accumulatorError, Math.abs(stored - net) / through)
  }
  return {
    ...trackClosure(tracks, bodies),
    accumulatorError,
    waterError: waterError(held, store, journey),
  }
}

function waterError(held: Held, store: Store, journey: Journey): number {
  let worst = 0
  for (const { crate, volumeM3 } of journey.crates) {
    const start = held.crates.get(crate.id)
    const state = store.crates.get(crate.id)
    if (!start || !state) continue
    const [given = 0, vented = 0, condensed = 0] = state.sums
    const kept = state.waterKgM3 * volumeM3 + state.bedWaterKg - start.waterKg
    const turned = Math.abs(given) + Math.abs(vented) + Math.abs(condensed)
    if (turned > 0) worst = Math.max(worst, Math.abs(kept - (given - vented - condensed)) / turned)
  }
  return worst
}

/** From the reported track alone: what anyone who holds only the track can check. */
function trackClosure(tracks: readonly AnimalTrack[], bodies: ReadonlyMap<string, Body>) {
  let maxResidualW = 0
  let energyErrorPct = 0
  for (const track of tracks) {
    const body = bodies.get(track.id)
    const last = track.minutes.length - 1
    if (!body || last < 1) continue
    const { heat } = track
    const terms = [heat.metabolismW, heat.conductionW, heat.convectionW, heat.radiationW, heat.evaporationW]
    let netJ = 0
    let turnedJ = 0
    for (let i = 0; i <= last; i++) {
      const net = terms.reduce((sum, term) => sum + (term[i] as number), 0)
      maxResidualW = Math.max(maxResidualW, Math.abs(net - (heat.storageW[i] as number)))
      if (i === 0) continue
      const seconds = 60 * ((track.minutes[i] as number) - (track.minutes[i - 1] as number))
      for (const term of terms) {
        const a = term[i - 1] as number
        const b = term[i] as number
        netJ += 0.5 * seconds * (a + b)
        turnedJ += 0.5 * seconds * (Math.abs(a) + Math.abs(b))
      }
    }
    const coreK = (track.coreTempC[last] as number) - (track.coreTempC[0] as number)
    const shellK = (track.skinTempC[last] as number) - (track.skinTempC[0] as number)
    const storedJ = body.coreHeatJK * coreK + body.shellHeatJK * shellK
    if (turnedJ > 0) energyErrorPct = Math.max(energyErrorPct, (100 * Math.abs(netJ - storedJ)) / turnedJ)
  }
  return { maxResidualW, energyErrorPct }
}
