'use client'

import { useState, useTransition } from 'react'
import type { ActionResult, FieldIssue } from '@/lib/errors'

export interface Refused {
  message: string
  issues: FieldIssue[]
}

/** An act that asks for nothing but the consignment: pressed once, done once, and a refusal is told in full. */
export function useSimpleAct(
  consignmentId: number,
  act: (input: { consignmentId: number; requestId: string }) => Promise<ActionResult<unknown>>,
  onDone?: () => void,
) {
  const [pending, start] = useTransition()
  const [refused, setRefused] = useState<Refused | null>(null)
  const run = () =>
    start(async () => {
      setRefused(null)
      try {
        const result = await act({ consignmentId, requestId: crypto.randomUUID() })
        if (result.ok) onDone?.()
        else setRefused({ message: result.message, issues: result.issues })
      } catch {
        setRefused({
          message: 'No answer came. Nothing may have been done: load the page again to see.',
          issues: [],
        })
      }
    })
  return { run, pending, refused, clear: () => setRefused(null) }
}
