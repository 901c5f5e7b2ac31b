/** A stretch of time laid on a stretch of paper. */
export interface TimeFrame {
  fromMin: number
  toMin: number
  x0: number
  x1: number
}

export function xAt(frame: TimeFrame, minute: number): number {
  return frame.x0 + ((minute - frame.fromMin) * (frame.x1 - frame.x0)) / (frame.toMin - frame.fromMin)
}

/** The minute under x, kept inside the frame. */
export function minuteAt(frame: TimeFrame, x: number): number {
  const minute = frame.fromMin + ((x - frame.x0) * (frame.toMin - frame.fromMin)) / (frame.x1 - frame.x0)
  return Math.min(frame.toMin, Math.max(frame.fromMin, minute))
}

export function minutesPerPx(frame: TimeFrame): number {
  return (frame.toMin - frame.fromMin) / (frame.x1 - frame.x0)
}

/** A stretch of temperature laid on a height; hot is up. */
export interface TempFrame {
  lowC: number
  highC: number
  top: number
  foot: number
}

export function yAt(frame: TempFrame, tempC: number): number {
  return frame.foot - ((tempC - frame.lowC) * (frame.foot - frame.top)) / (frame.highC - frame.lowC)
}

/** yAt, held inside the frame: what lies beyond the axis is drawn at its edge. */
export function yInside(frame: TempFrame, tempC: number): number {
  return Math.min(frame.foot, Math.max(frame.top, yAt(frame, tempC)))
}

const STEPS = [0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50] as const

/** Round values between low and high, so far apart that a label of `roomPx` fits; `minor` halves the step. */
export function roundTicks(
  low: number,
  high: number,
  lengthPx: number,
  roomPx: number,
): { step: number; values: number[]; minor: number[] } {
  const step = STEPS.find((candidate) => (candidate * lengthPx) / (high - low) >= roomPx) ?? 50
  return { step, values: multiplesOf(step, low, high), minor: multiplesOf(step / 2, low, high) }
}

function multiplesOf(step: number, low: number, high: number): number[] {
  const first = Math.ceil(low / step - 1e-9)
  const last = Math.floor(high / step + 1e-9)
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, index) =>
    Number(((first + index) * step).toPrecision(12)),
  )
}
