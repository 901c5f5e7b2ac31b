import { z } from 'zod'

export interface Figure {
  /** What it is, as a message names it: "Air temperature". */
  what: string
  /** Empty for a pure number. */
  unit: string
  min: number
  max: number
  /** Anything the range does not say: sign, reference, who reads it. */
  more?: string
}

/** A required number; its message names the field, the value, the range and the unit, its description says the same. */
export function figure(it: Figure) {
  return bounded(it).describe(describe(it))
}

/** A number that may be absent. `absent` says what the engine then takes. */
export function optionalFigure(it: Figure, absent: string) {
  return bounded(it)
    .optional()
    .describe(`${describe(it)} Absent: ${absent}.`)
}

/** A number with a default; `source` says where the default comes from. */
export function figureOr(it: Figure, otherwise: number, source: string) {
  return bounded(it)
    .default(otherwise)
    .describe(`${describe(it)} Default ${otherwise}${it.unit === '' ? '' : ` ${it.unit}`} (${source}).`)
}

/** One of a fixed list of words. */
export function word<const T extends readonly [string, ...string[]]>(what: string, words: T) {
  return z
    .enum(words, { error: (issue) => `${what} ${quote(issue.input)}: put one of ${words.join(', ')}.` })
    .describe(`${what}: ${words.join(', ')}.`)
}

export function flag(what: string, description: string) {
  return z
    .boolean({ error: (issue) => `${what} ${quote(issue.input)}: put true or false.` })
    .default(false)
    .describe(`${description} Default false.`)
}

/** A short name by which other parts of the document refer to this one. */
export function identifier(what: string) {
  return z
    .string({
      error: (issue) =>
        issue.input === undefined ? `${what} is missing.` : `${what} ${quote(issue.input)}: put text.`,
    })
    .regex(/^[A-Za-z0-9][A-Za-z0-9._:-]{0,63}$/, {
      error: (issue) =>
        `${what} ${quote(issue.input)}: put 1 to 64 letters, digits, dots, dashes or underscores.`,
    })
    .describe(`${what}, 1 to 64 letters, digits, dots, dashes or underscores.`)
}

export function words(what: string, max: number) {
  return z
    .string({
      error: (issue) =>
        issue.input === undefined ? `${what} is missing.` : `${what} ${quote(issue.input)}: put text.`,
    })
    .min(1, { error: `${what} is empty.` })
    .max(max, {
      error: (issue) => `${what} is ${String(issue.input).length} characters long: put at most ${max}.`,
    })
    .describe(`${what}, text of at most ${max} characters.`)
}

export function quote(input: unknown) {
  return typeof input === 'string' ? `“${input}”` : String(JSON.stringify(input))
}

function bounded({ what, unit, min, max }: Figure) {
  const allowed = `put ${spell(min)} to ${spell(max)}${unit === '' ? '' : ` ${unit}`}.`
  const outside = (input: unknown) =>
    `${what} ${spell(Number(input))}${unit === '' ? '' : ` ${unit}`}: ${allowed}`
  return z
    .number({
      error: (issue) =>
        issue.input === undefined
          ? `${what} is missing: ${allowed}`
          : `${what} ${quote(issue.input)} is not a number: ${allowed}`,
    })
    .min(min, { error: (issue) => outside(issue.input) })
    .max(max, { error: (issue) => outside(issue.input) })
}

function describe({ what, unit, min, max, more }: Figure) {
  return `${what}${unit === '' ? '' : `, ${unit}`}, ${spell(min)} to ${spell(max)}.${more === undefined ? '' : ` ${more}.`}`
}

function spell(value: number) {
  return String(value).replace('-', '−')
}
