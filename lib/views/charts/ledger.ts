import { figure, signed } from '../format'
import { minutesPerPx, xAt } from './frame'
import type { TimeFrame } from './frame'
import { line, path, rect, words } from './marks'
import type { Mark, Picture } from './marks'
import { valueAt } from './series'
import type { ChartLeg, HeatTrack } from './types'

/** The five accounts in the order of the balance, and what they sum to. */
export const ACCOUNTS = [
  ['metabolismW', 'Metabolism'],
  ['conductionW', 'Conduction'],
  ['convectionW', 'Convection'],
  ['radiationW', 'Radiation'],
  ['evaporationW', 'Evaporation'],
] as const
export type AccountKey = (typeof ACCOUNTS)[number][0]

const MEANS_MIN = [5, 10, 15, 30, 60, 120] as const
const MOST_PX_PER_W = 1.7
/** All five accounts together never take more height than this. */
const ROOM_PX = 150

export interface LedgerInput {
  heat: HeatTrack
  legs: readonly ChartLeg[]
  endMin: number
}

export interface LedgerPicture extends Picture {
  time: TimeFrame
  /** Baselines of the accounts, then of storage. */
  baselines: number[]
  /** "15 min means", "drawn × 2". */
  meansWords: string
  top: number
}

/**
 * Five accounts under one another on one scale, gains solid upwards, losses grey downwards; a double rule; storage on twice
 * the scale. Means over a slot, so that a bar is never thinner than 9 px.
 */
export function ledger(
  input: LedgerInput,
  { width, left, right, size = 12 }: { width: number; left: number; right: number; size?: number },
): LedgerPicture {
  const time: TimeFrame = { fromMin: 0, toMin: input.endMin, x0: left, x1: width - right }
  const slot = MEANS_MIN.find((minutes) => minutes / minutesPerPx(time) >= 9) ?? 120
  const slots = slotsOf(input.endMin, slot)
  const accounts = ACCOUNTS.map(([key, name]) => ({
    name,
    means: slots.map((each) => meanOf(input.heat, key, each)),
  }))
  // The printed storage is the sum of the printed terms, so its mean is taken from theirs.
  const storage = slots.map((_, index) => accounts.reduce((sum, { means }) => sum + (means[index] ?? 0), 0))
  const pxPerW = scaleOf([...accounts.map(({ means }) => means), storage])
  const marks: Mark[] = []
  const baselines: number[] = []
  const top = 24
  let y = top
  for (const { name, means } of accounts) {
    const up = Math.max(0, ...means) * pxPerW
    const down = Math.max(0, ...means.map((watts) => -watts)) * pxPerW
    const base = y + Math.max(up, 7) + 4
    baselines.push(base)
    marks.push(
      rect(
        { x: left, y, width: time.x1 - left, height: base - y + Math.max(down, 6) + 4 },
        { fill: 'sheet' },
      ),
      ...bars(time, slots, means, base, pxPerW),
      line({ x: left, y: base }, { x: time.x1, y: base }, { stroke: 'rule', strokeWidth: 1 }),
      words(left - 4, base + 4, name, { size, weight: 600, anchor: 'end' }),
    )
    y = base + Math.max(down, 6) + 4
  }
  marks.push(...doubleRule(time, y + 3))
  const storeUp = Math.max(10, Math.max(0, ...storage) * pxPerW * 2)
  const storeDown = Math.max(10, Math.max(0, ...storage.map((watts) => -watts)) * pxPerW * 2)
  const base = y + 12 + storeUp
  baselines.push(base)
  marks.push(
    rect({ x: left, y: y + 8, width: time.x1 - left, height: storeUp + storeDown + 8 }, { fill: 'sheet' }),
    ...bars(time, slots, storage, base, pxPerW * 2),
    line({ x: left, y: base }, { x: time.x1, y: base }, { stroke: 'rule', strokeWidth: 1 }),
    words(left - 4, base + 4, 'Storage', { size, weight: 600, anchor: 'end' }),
    words(left - 4, base + 4 + size + 3, 'drawn × 2', { size, ink: 'mute', anchor: 'end' }),
    ...scaleMark(left, top, pxPerW, size),
    ...legMarks(time, input.legs, top, base + storeDown + 4),
  )
  return {
    width,
    height: base + Math.max(storeDown, size + 8) + 8,
    marks,
    time,
    baselines,
    meansWords: `${slot} min means`,
    top,
  }
}

export interface LedgerReading {
  name: string
  watts: number
  /** "+27.1" */
  value: string
}

/** The accounts at a minute, rounded to a tenth, and their sum: the printed storage is the sum of the printed terms. */
export function ledgerAt(
  heat: HeatTrack,
  minute: number,
): { accounts: LedgerReading[]; storage: LedgerReading } {
  const accounts = ACCOUNTS.map(([key, name]) => {
    const watts = Math.round(valueAt(heat.minutes, heat[key], minute) * 10) / 10
    return { name, watts, value: signed(watts, 1) }
  })
  const sum = Math.round(accounts.reduce((total, { watts }) => total + watts, 0) * 10) / 10
  return { accounts, storage: { name: 'Storage', watts: sum, value: signed(sum, 1) } }
}

interface Slot {
  fromMin: number
  toMin: number
}

function slotsOf(endMin: number, slot: number): Slot[] {
  return Array.from({ length: Math.ceil(endMin / slot) }, (_, index) => ({
    fromMin: index * slot,
    toMin: Math.min(endMin, (index + 1) * slot),
  }))
}

function meanOf(heat: HeatTrack, key: AccountKey, { fromMin, toMin }: Slot): number {
  const inside = heat.minutes.flatMap((minute, index) =>
    minute >= fromMin && minute < toMin ? [heat[key][index] ?? 0] : [],
  )
  if (inside.length === 0) return valueAt(heat.minutes, heat[key], fromMin)
  return inside.reduce((sum, watts) => sum + watts, 0) / inside.length
}

/** One scale for all, 1.7 px to a watt at most: an animal of a tonne gets a smaller one, and the mark says how long 20 W is. */
function scaleOf(rows: readonly (readonly number[])[]): number {
  const tall = rows.reduce(
    (sum, row) => sum + Math.max(0, ...row) + Math.max(0, ...row.map((watts) => -watts)),
    0,
  )
  return tall > 0 ? Math.min(MOST_PX_PER_W, ROOM_PX / tall) : MOST_PX_PER_W
}

function bars(
  time: TimeFrame,
  slots: readonly Slot[],
  means: readonly number[],
  base: number,
  pxPerW: number,
): Mark[] {
  const gains: string[] = []
  const losses: string[] = []
  slots.forEach(({ fromMin, toMin }, index) => {
    const watts = means[index] ?? 0
    const height = Math.abs(watts) * pxPerW
    if (height < 0.3) return
    const x0 = px(xAt(time, fromMin) + 0.5)
    const x1 = px(xAt(time, toMin) - 0.5)
    const box = `M${x0} ${px(base)}V${px(watts > 0 ? base - height : base + height)}H${x1}V${px(base)}Z`
    if (watts > 0) gains.push(box)
    else losses.push(box)
  })
  return [
    ...(gains.length > 0 ? [path(gains.join(''), { fill: 'ink' })] : []),
    ...(losses.length > 0 ? [path(losses.join(''), { fill: 'rule' })] : []),
  ]
}

function doubleRule(time: TimeFrame, y: number): Mark[] {
  return [0, 3].map((shift) =>
    line({ x: time.x0, y: y + shift }, { x: time.x1, y: y + shift }, { stroke: 'ink', strokeWidth: 1.25 }),
  )
}

/** An upright as long as a round number of watts, with the number. */
function scaleMark(left: number, top: number, pxPerW: number, size: number): Mark[] {
  const watts = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000].find((each) => each * pxPerW >= 22) ?? 1000
  const long = watts * pxPerW
  const x = left - 5
  const foot = top + 4 + long
  return [
    path(
      `M${x - 3} ${px(top + 4)}H${x + 1}M${x - 1} ${px(top + 4)}V${px(foot)}M${x - 3} ${px(foot)}H${x + 1}`,
      {
        stroke: 'ink',
        strokeWidth: 1,
        fill: 'none',
      },
    ),
    words(left - 12, top + size, `mark: ${figure(watts)}\u00a0W`, { size, ink: 'mute', anchor: 'end' }),
  ]
}

function legMarks(time: TimeFrame, legs: readonly ChartLeg[], top: number, foot: number): Mark[] {
  return legs.flatMap((leg, index) => {
    const x = xAt(time, leg.startMin)
    const wide = xAt(time, leg.endMin) - x >= 18
    const named = wide ? [words(x + 4, top - 8, String(leg.ordinal), { face: 'head', size: 13 })] : []
    if (index === 0) return named
    return [...named, line({ x, y: top }, { x, y: foot }, { stroke: 'hair', strokeWidth: 1, dash: [2, 3] })]
  })
}

function px(value: number): number {
  return Math.round(value * 10) / 10
}
