import type { Confidence, Figure } from './profile'

const figure =
  (confidence: Confidence) =>
  <T>(value: T, unit: string, source: string): Figure<T> => ({ value, unit, source, confidence })

/** Read at the source named. */
export const sourced = figure('sourced')
/** Fitted here to the published trials named. */
export const fitted = figure('fitted')
/** From a source known but not opened when the row was written. */
export const memory = figure('memory')
/** Decided, with the reason. */
export const judged = figure('judgement')

const VET = 'judgement, to be confirmed by the responsible vet'

/** A core limit nobody has published as a limit. */
export const limitC = (value: number, reason: string): Figure => judged(value, '°C', `${reason}; ${VET}`)
