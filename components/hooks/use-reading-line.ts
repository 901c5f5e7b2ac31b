'use client'

import { useCallback } from 'react'
import type { KeyboardEvent } from 'react'
import type { CorridorInput } from '@/lib/views/charts/types'
import { legIndexAt } from '@/lib/views/charts/reading'

const STEP_MIN = 5

/**
 * Keys of the reading line: arrows 5 min, with Shift (or Page Up and Down) a leg, Home and End the ends, Ctrl+M the
 * narrowest margin.
 */
export function useReadingKeys(
  input: Pick<CorridorInput, 'legs' | 'endMin'>,
  minute: number,
  narrowestMin: number,
  onMinute: (minute: number) => void,
): (event: KeyboardEvent) => void {
  return useCallback(
    (event) => {
      const next = nextMinute(event, input, minute, narrowestMin)
      if (next === null) return
      event.preventDefault()
      onMinute(Math.min(input.endMin, Math.max(0, next)))
    },
    [input, minute, narrowestMin, onMinute],
  )
}

function nextMinute(
  event: KeyboardEvent,
  input: Pick<CorridorInput, 'legs' | 'endMin'>,
  minute: number,
  narrowestMin: number,
): number | null {
  if (event.ctrlKey && event.key.toLowerCase() === 'm') return narrowestMin
  if (event.ctrlKey || event.metaKey || event.altKey) return null
  const leg = legIndexAt(input, minute)
  switch (event.key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return event.shiftKey ? startOf(input, leg + 1, input.endMin) : minute + STEP_MIN
    case 'ArrowLeft':
    case 'ArrowDown':
      return event.shiftKey
        ? startOf(input, minute > startOf(input, leg, 0) ? leg : leg - 1, 0)
        : minute - STEP_MIN
    case 'PageUp':
      return startOf(input, leg + 1, input.endMin)
    case 'PageDown':
      return startOf(input, leg - 1, 0)
    case 'Home':
      return 0
    case 'End':
      return input.endMin
    default:
      return null
  }
}

function startOf(input: Pick<CorridorInput, 'legs'>, index: number, otherwise: number): number {
  return index < 0 ? 0 : (input.legs[index]?.startMin ?? otherwise)
}
