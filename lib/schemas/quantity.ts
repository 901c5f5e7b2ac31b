import { z } from 'zod'
import { lettersNotOnPaper, notOnPaperWords } from './paper-letters'

export interface Range {
  label: string
  unit: string
  min: number
  max: number
}

/**
 * A number with a name, a range and a unit. Its message always says which field, what stood there,
 * and what is allowed: "Mass 31 kg: put 1 to 7 kg."
 */
export function quantity({ label, unit, min, max }: Range) {
  const allowed = `put ${spell(min)} to ${spell(max)}${unit === '' ? '' : ` ${unit}`}.`
  return z
    .number({
      error: (issue) =>
        isBlank(issue.input)
          ? `${label} is missing: ${allowed}`
          : `${label} “${String(issue.input)}” is not a number: ${allowed}`,
    })
    .refine((value) => value >= min && value <= max, {
      error: (issue) => `${label} ${spell(Number(issue.input))}${unit === '' ? '' : ` ${unit}`}: ${allowed}`,
    })
}

/** As quantity, but may still be empty in a draft; what is missing then is said when the plan is assessed. */
export function draftQuantity(range: Range) {
  return quantity(range).nullable()
}

/** Free text with a name and a longest length; trimmed. */
export function text(label: string, max = 200) {
  return z
    .string({ error: `${label} is missing.` })
    .trim()
    .max(max, {
      error: (issue) => `${label} is ${String(issue.input).length} characters long: put at most ${max}.`,
    })
}

/** Text that may not be empty. */
export function requiredText(label: string, max = 200) {
  return text(label, max).min(1, { error: `${label} is missing.` })
}

/** Text that goes on a paper as it is: every letter must be one the paper's fonts show. */
export function printed(words: z.ZodString) {
  return words.refine((value) => lettersNotOnPaper(value).length === 0, {
    error: ({ input }) => notOnPaperWords(String(input), lettersNotOnPaper(String(input))),
  })
}

function isBlank(input: unknown) {
  return input === null || input === undefined || input === ''
}

function spell(value: number) {
  return String(value).replace('-', '−')
}
