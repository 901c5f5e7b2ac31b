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
/** What a dog of some 8 kg gets; a horse gets less and a chick more, and the mark beside the bars says how much. */
const USUAL_PX_PER_W = 1.7
/** All accounts and storage together never take more height than this, and never less than a third of it. */
const ROOM_PX = 150

const MARKS_W = [0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50, 100, 200, 500, 1000] as const

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
  for (const [index, { name, means }] of accounts.entries()) {
    const up = Math.max(0, ...means) * pxPerW
    const down = Math.max(0, ...means.map((watts) => -watts)) * pxPerW
    // The first account leaves room for the mark of the scale and its words.
    const base = y + Math.max(up, index === 0 ? 36 : 7) + 4
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

/** The accounts at a minute, rounded as they print, and their sum: the printed storage is the sum of the printed terms. */
export function ledgerAt(
  heat: HeatTrack,
  minute: number,
): { accounts: LedgerReading[]; storage: LedgerReading } {
  const decimals = decimalsOf(heat)
  const scale = 10 ** decimals
  const units = ACCOUNTS.map(([key, name]) => ({
    name,
    units: Math.round(valueAt(heat.minutes, heat[key], minute) * scale),
  }))
  const read = (name: string, whole: number) => ({
    name,
    watts: whole / scale,
    value: signed(whole / scale, decimals),
  })
  return {
    accounts: units.map((each) => read(each.name, each.units)),
    storage: read(
      'Storage',
      units.reduce((sum, each) => sum + each.units, 0),
    ),
  }
}

/** A chick turns over half a watt: three figures that count, whatever the animal. */
function decimalsOf(heat: HeatTrack): 1 | 2 | 3 {
  const most = Math.max(...heat.metabolismW.map(Math.abs))
  return most >= 10 ? 1 : most >= 1 ? 2 : 3
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

/** One scale for all accounts: the usual one, unless the bars would outgrow the page or vanish. */
function scaleOf(rows: readonly (readonly number[])[]): number {
  const watts = rows.reduce(
    (sum, row) => sum + Math.max(0, ...row) + Math.max(0, ...row.map((each) => -each)),
    0,
  )
  if (watts <= 0) return USUAL_PX_PER_W
  return Math.min(ROOM_PX / watts, Math.max(USUAL_PX_PER_W, ROOM_PX / 3 / watts))
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
  const watts = MARKS_W.find((each) => each * pxPerW >= 16) ?? 1000
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
    words(left - 12, top + size, `mark: ${figure(watts, watts < 0.1 ? 2 : watts < 1 ? 1 : 0)}\u00a0W`, {
      size,
      ink: 'mute',
      anchor: 'end',
    }),
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
