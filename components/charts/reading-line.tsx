'use client'

import type { KeyboardEvent } from 'react'

/**
 * The violet line as a slider. It stands on its own layer, so that moving it draws nothing else again; the strip one can
 * take hold of is wider than the line.
 */
export function ReadingLine({
  x,
  top,
  foot,
  minute,
  endMin,
  spoken,
  ticks = [],
  grip = true,
  onKeyDown,
}: {
  x: number
  top: number
  foot: number
  minute: number
  endMin: number
  spoken: string
  /** Short marks of the line on the rulers. */
  ticks?: readonly number[]
  /** The triangle under the line; off where a stretch below carries it. */
  grip?: boolean
  onKeyDown: (event: KeyboardEvent) => void
}) {
  return (
    <>
      {ticks.map((y) => (
        <span
          key={y}
          aria-hidden="true"
          className="pointer-events-none absolute w-0.5 bg-hand"
          style={{ left: x - 1, top: y, height: 8 }}
        />
      ))}
      <div
        role="slider"
        tabIndex={0}
        aria-label="Reading line"
        aria-orientation="horizontal"
        aria-valuemin={0}
        aria-valuemax={endMin}
        aria-valuenow={minute}
        aria-valuetext={spoken}
        onKeyDown={onKeyDown}
        className="absolute w-6 cursor-ew-resize touch-pan-y no-print"
        style={{ left: x - 12, top, height: foot - top }}
      >
        <span
          aria-hidden="true"
          className="absolute inset-y-0 left-[11px] w-0.5 bg-hand forced-colors:bg-[Highlight]"
        />
        {grip && <LineFoot />}
      </div>
    </>
  )
}

/** The violet triangle one looks for. */
export function LineFoot() {
  return (
    <svg aria-hidden="true" width="12" height="10" className="absolute -bottom-[10px] left-[6px] fill-hand">
      <path d="M0 10h12L6 0z" />
    </svg>
  )
}
