import { z } from 'zod'

const PATTERN = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2}(\.\d{1,3})?)?Z$/

/**
 * A moment that a file writes as ISO 8601 in UTC and the engine reads as milliseconds since the epoch.
 * The engine has no clock and no Date: this is where one turns into the other.
 */
export function instantText(what: string) {
  return z
    .string({
      error: (issue) =>
        `${what} ${JSON.stringify(issue.input)}: put an instant in UTC, for example 2026-06-09T08:20Z.`,
    })
    .refine((value) => PATTERN.test(value) && isRealDay(value), {
      error: (issue) =>
        `${what} “${String(issue.input)}”: put an instant in UTC, for example 2026-06-09T08:20Z.`,
    })
}

/** The same moment already in milliseconds, as a stored scenario holds it. */
export function instantMs(what: string) {
  return z
    .number({ error: (issue) => `${what} ${JSON.stringify(issue.input)}: put milliseconds since 1970, UTC.` })
    .int({ error: (issue) => `${what} ${String(issue.input)}: put whole milliseconds since 1970, UTC.` })
    .min(0, { error: (issue) => `${what} ${String(issue.input)}: put milliseconds since 1970, UTC.` })
}

/** Milliseconds of either form; undefined when neither was given. */
export function eitherInstant(text: string | undefined, ms: number | undefined): number | undefined {
  return text === undefined ? ms : Date.parse(text)
}

/** Date.parse takes 30 February for 2 March; a departure must not. */
function isRealDay(value: string) {
  const ms = Date.parse(value)
  return Number.isFinite(ms) && new Date(ms).toISOString().slice(0, 16) === value.slice(0, 16)
}
