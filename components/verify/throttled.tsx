'use client'

import { useEffect, useState } from 'react'
import { clock, zoneName } from '@/lib/views/format'

/** Too many checks from one place: the wait in large figures, counting down, and the time it ends. */
export function Throttled({ endsMs, nowMs, zone }: { endsMs: number; nowMs: number; zone: string }) {
  const leftS = useSecondsLeft(endsMs, nowMs)
  return (
    <section role="status" aria-label="Wait">
      <h2 className="text-page">Too many checks from one place</h2>
      <p className="mt-2 text-long">
        {leftS > 0 ? 'The page answers again in' : 'The wait is over. Check the code again.'}
      </p>
      {leftS > 0 && (
        <>
          {/* Counting aloud every second helps nobody: the time it ends is said once, below. */}
          <p aria-hidden="true" className="fig text-big font-semibold">
            {minutesAndSeconds(leftS)}
          </p>
          <p className="mt-1">
            at {clock(endsMs, zone)} {zoneName(endsMs, zone)}. A paper can also be checked by ringing the
            desk: the number stands on it under “Ring in this order”.
          </p>
        </>
      )}
    </section>
  )
}

function useSecondsLeft(endsMs: number, nowMs: number): number {
  // The server's clock decides; only the time since the page came is taken from this device.
  const [left, setLeft] = useState(Math.max(0, Math.ceil((endsMs - nowMs) / 1000)))
  useEffect(() => {
    const begun = performance.now()
    const timer = setInterval(() => {
      setLeft(Math.max(0, Math.ceil((endsMs - nowMs - (performance.now() - begun)) / 1000)))
    }, 1000)
    return () => clearInterval(timer)
  }, [endsMs, nowMs])
  return left
}

function minutesAndSeconds(seconds: number): string {
  return `${Math.floor(seconds / 60)}:${String(seconds % 60).padStart(2, '0')}`
}
