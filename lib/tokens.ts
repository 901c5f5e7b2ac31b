/**
 * The look as data: three inks on zinc-and-lichen stock. Black is fact, violet is the hand, the ramp is a temperature.
 * The page's stylesheet (tailwind.config.ts) and the paper (lib/documents) are both made from this file.
 * Contrast of every pair is computed again in tests/views/tokens.test.ts (WCAG 2: text 4.5, graphics 3).
 */

export type Light = 'day' | 'night' | 'paper'

export const COLOUR_NAMES = [
  'ground',
  'sheet',
  'band',
  'hair',
  'rule',
  'mute',
  'ink',
  'hand',
  'handwash',
  'hand-fill',
  'on-hand',
  'on-ink',
  'no-dim',
  'wall',
  'slat',
] as const
export type ColourName = (typeof COLOUR_NAMES)[number]

/**
 * ground: behind everything. sheet: paper written on. band: filled strips, hatched walls. hair: ledger lines, never the
 * only edge of a control. rule: field edges and hatching, never text. mute: secondary text. hand: pressed, typed, signed.
 * wall and no-dim: hours of a departure window that can't be flown. slat: the rail under the head.
 */
export const COLOURS: Record<Light, Record<ColourName, string>> = {
  day: {
    ground: '#E5EBE6',
    sheet: '#F8FBF9',
    band: '#DAE2DB',
    hair: '#B7C1B8',
    rule: '#6A766C',
    mute: '#48534A',
    ink: '#121813',
    hand: '#59236E',
    handwash: '#EFE6F4',
    'hand-fill': '#59236E',
    'on-hand': '#F8FBF9',
    'on-ink': '#F8FBF9',
    'no-dim': '#C4CDC5',
    wall: '#121813',
    slat: '#121813',
  },
  night: {
    ground: '#0B100C',
    sheet: '#131914',
    band: '#1E251F',
    hair: '#374039',
    rule: '#7F8980',
    mute: '#AAB4AC',
    ink: '#E1E9E2',
    hand: '#D3ABED',
    handwash: '#2A2130',
    'hand-fill': '#573369',
    'on-hand': '#F4ECF8',
    'on-ink': '#131914',
    'no-dim': '#0B100C',
    wall: '#7F8980',
    slat: '#4A544C',
  },
  paper: {
    ground: '#FFFFFF',
    sheet: '#FFFFFF',
    band: '#FFFFFF',
    hair: '#8A8A8A',
    rule: '#444444',
    mute: '#2B2B2B',
    ink: '#000000',
    hand: '#59236E',
    handwash: '#FFFFFF',
    'hand-fill': '#59236E',
    'on-hand': '#FFFFFF',
    'on-ink': '#FFFFFF',
    'no-dim': '#FFFFFF',
    wall: '#000000',
    slat: '#000000',
  },
}

export const RAMP_NAMES = ['k4', 'k3', 'k2', 'k1', 'n0', 'h1', 'h2', 'h3', 'h4'] as const
export type RampName = (typeof RAMP_NAMES)[number]

export interface RampStep {
  name: RampName
  /** Lower edge of the step, °C; the coldest step has none. */
  fromC: number | null
  day: { fill: string; text: string }
  night: { fill: string; text: string }
}

const DARK = '#121813'
const PALE = '#F8FBF9'

/** Fixed breaks: a colour means the same temperature on every page. A swatch always has its printed number beside it. */
export const RAMP: readonly RampStep[] = [
  { name: 'k4', fromC: null, day: { fill: '#19457C', text: PALE }, night: { fill: '#8AC4F8', text: DARK } },
  { name: 'k3', fromC: 0, day: { fill: '#326EAE', text: PALE }, night: { fill: '#5E9DDC', text: DARK } },
  { name: 'k2', fromC: 5, day: { fill: '#659ED0', text: DARK }, night: { fill: '#4171AA', text: PALE } },
  { name: 'k1', fromC: 10, day: { fill: '#A7CDE7', text: DARK }, night: { fill: '#364F6D', text: PALE } },
  { name: 'n0', fromC: 15, day: { fill: '#EFF1E9', text: DARK }, night: { fill: '#343A35', text: PALE } },
  { name: 'h1', fromC: 22, day: { fill: '#EDD7A3', text: DARK }, night: { fill: '#634B2D', text: PALE } },
  { name: 'h2', fromC: 27, day: { fill: '#E7A354', text: DARK }, night: { fill: '#9C6735', text: PALE } },
  { name: 'h3', fromC: 32, day: { fill: '#B6552A', text: PALE }, night: { fill: '#DD8B47', text: DARK } },
  { name: 'h4', fromC: 38, day: { fill: '#7E2F1B', text: PALE }, night: { fill: '#FBBD6E', text: DARK } },
]

/** The step a temperature falls in, °C. */
export function rampStep(tempC: number): RampName {
  let name: RampName = 'k4'
  for (const step of RAMP) if (step.fromC !== null && tempC >= step.fromC) name = step.name
  return name
}

/** Distances in use, px. A class counts in steps of 4 (p-4 is 16 px). Page margin 24, on a phone 16. */
export const SPACE = [2, 4, 8, 12, 16, 24, 32, 48] as const

export type FaceName = 'head' | 'text' | 'fig' | 'crate'

/** Families, with what stands in until a face arrives. Paper registers the same names from fonts/pdf. */
export const FACES: Record<FaceName, { family: string; fallback: string }> = {
  head: { family: 'Aleo', fallback: '"Rockwell","Roboto Slab",Georgia,serif' },
  text: { family: 'Atkinson Hyperlegible Next', fallback: '"Segoe UI",Helvetica,Arial,sans-serif' },
  fig: { family: 'Atkinson Hyperlegible Mono', fallback: '"Consolas","Liberation Mono",monospace' },
  crate: { family: 'Saira Stencil One', fallback: 'Impact,"Arial Narrow",sans-serif' },
}

/** Full TrueType files under fonts/pdf, one for each weight used. */
export const PAPER_FONTS: readonly {
  face: FaceName
  weight: 400 | 600 | 700 | 800
  style: 'normal' | 'italic'
  file: string
}[] = [
  { face: 'head', weight: 600, style: 'normal', file: 'aleo-600.ttf' },
  { face: 'head', weight: 600, style: 'italic', file: 'aleo-600-italic.ttf' },
  { face: 'head', weight: 700, style: 'normal', file: 'aleo-700.ttf' },
  { face: 'head', weight: 800, style: 'normal', file: 'aleo-800.ttf' },
  { face: 'text', weight: 400, style: 'normal', file: 'atkinson-hyperlegible-next-400.ttf' },
  { face: 'text', weight: 600, style: 'normal', file: 'atkinson-hyperlegible-next-600.ttf' },
  { face: 'text', weight: 700, style: 'normal', file: 'atkinson-hyperlegible-next-700.ttf' },
  { face: 'fig', weight: 400, style: 'normal', file: 'atkinson-hyperlegible-mono-400.ttf' },
  { face: 'fig', weight: 600, style: 'normal', file: 'atkinson-hyperlegible-mono-600.ttf' },
  { face: 'crate', weight: 400, style: 'normal', file: 'saira-stencil-one-400.ttf' },
]

/** Size and line, px, on the desk. Smallest: 12 on a screen, 15 on a phone, 7.5 pt on paper. */
export const TYPE = {
  caption: [12, 16],
  small: [13, 18],
  body: [14, 20],
  note: [15, 20],
  long: [16, 24],
  sub: [16, 20],
  phone: [18, 26],
  section: [20, 24],
  page: [26, 32],
  big: [34, 40],
  deadline: [44, 44],
  'mark-s': [17, 20],
  'mark-m': [22, 24],
  'mark-phone': [30, 32],
  'mark-l': [42, 42],
  signature: [24, 32],
  'stamp-s': [12, 16],
  'stamp-m': [15, 16],
  'stamp-l': [26, 30],
} as const satisfies Record<string, readonly [number, number]>
export type TypeName = keyof typeof TYPE

/** What the same names measure under SCREENS.desk, where a sheet is read at arm's length or in a cab. */
export const PHONE_TYPE: Partial<Record<TypeName, readonly [number, number]>> = {
  caption: [15, 20],
  small: [16, 22],
  body: [18, 26],
  note: [16, 22],
  long: [18, 26],
  sub: [18, 24],
  section: [21, 26],
  'stamp-s': [15, 18],
  'stamp-m': [18, 20],
  'stamp-l': [19, 24],
  'mark-s': [22, 24],
  'mark-m': [26, 28],
}

/** And on paper, where a page is printed as it stands; the sheets that count are documents of their own. */
export const PAPER_TYPE: Partial<Record<TypeName, readonly [number, number]>> = {
  caption: [10, 13],
  small: [11, 14],
  body: [12, 15],
  long: [13, 17],
  sub: [13, 17],
  section: [16, 20],
  page: [22, 26],
}

/** Line weights, px: an alarm limit is always half as thick as a critical one. */
export const STROKE = {
  edge: 2,
  box: 1,
  alarm: 2.5,
  critical: 5,
  deciding: 2.5,
  typical: 1,
  reading: 2.5,
} as const

/** Widths at which pages fold, px. */
export const SCREENS = { desk: 760, board: 1260, fold: 1310, wide: 1400 } as const

/** Word space of the mono face: draws "39.4 °C" together. */
export const FIGURE_WORD_SPACE = '-0.28em'
