/** Value at a minute, straight between samples; the end values beyond them; NaN for an empty series. */
export function valueAt(minutes: readonly number[], values: readonly number[], minute: number): number {
  const after = firstAtOrAfter(minutes, minute)
  const right = values[Math.min(after, values.length - 1)]
  if (right === undefined) return Number.NaN
  const left = values[after - 1]
  const t1 = minutes[after]
  const t0 = minutes[after - 1]
  if (left === undefined || t1 === undefined || t0 === undefined || t1 === t0) return right
  return left + ((right - left) * (minute - t0)) / (t1 - t0)
}

export interface Sample {
  minute: number
  value: number
}

/** Samples inside a stretch, with the values at both its ends. */
export function stretchOf(
  minutes: readonly number[],
  values: readonly number[],
  fromMin: number,
  toMin: number,
): Sample[] {
  const first = minutes[0]
  const last = minutes.at(-1)
  if (first === undefined || last === undefined) return []
  const from = Math.max(fromMin, first)
  const to = Math.min(toMin, last)
  if (to < from) return []
  const samples: Sample[] = [{ minute: from, value: valueAt(minutes, values, from) }]
  for (let index = firstAtOrAfter(minutes, from); index < minutes.length; index += 1) {
    const minute = minutes[index]
    const value = values[index]
    if (minute === undefined || value === undefined || minute >= to) break
    if (minute > from) samples.push({ minute, value })
  }
  if (to > from) samples.push({ minute: to, value: valueAt(minutes, values, to) })
  return samples
}

/**
 * At most four samples for each slot of `slotMin`: first, least, greatest, last. A track of a minute's spacing stays true
 * to its peaks while its path stays short.
 */
export function thinned(samples: readonly Sample[], slotMin: number): Sample[] {
  const kept: Sample[] = []
  for (let start = 0; start < samples.length;) {
    const slot = Math.floor((samples[start]?.minute ?? 0) / slotMin)
    let end = start
    while (end < samples.length && Math.floor((samples[end]?.minute ?? 0) / slotMin) === slot) end += 1
    const inSlot = samples.slice(start, end)
    const least = extreme(inSlot, -1)
    const greatest = extreme(inSlot, 1)
    const chosen = new Set([inSlot[0], least, greatest, inSlot.at(-1)])
    kept.push(...inSlot.filter((sample) => chosen.has(sample)))
    start = end
  }
  return kept
}

/** Greatest (sign 1) or least (sign −1) sample. */
export function extreme(samples: readonly Sample[], sign: 1 | -1): Sample | undefined {
  let best: Sample | undefined
  for (const sample of samples) if (!best || sign * (sample.value - best.value) > 0) best = sample
  return best
}

function firstAtOrAfter(minutes: readonly number[], minute: number): number {
  let low = 0
  let high = minutes.length
  while (low < high) {
    const middle = (low + high) >> 1
    if ((minutes[middle] ?? 0) < minute) low = middle + 1
    else high = middle
  }
  return low
}
