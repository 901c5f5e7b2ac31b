'use client'

import { createContext, useCallback, useContext, useState } from 'react'
import type { ReactNode } from 'react'

const Context = createContext<(words: string) => void>(() => {})

/** One polite live region for the page. */
export function LiveRegionProvider({ children }: { children: ReactNode }) {
  const [said, setSaid] = useState({ words: '', turn: 0 })
  const say = useCallback((words: string) => setSaid((before) => ({ words, turn: before.turn + 1 })), [])
  return (
    <Context value={say}>
      {children}
      <div aria-live="polite" aria-atomic="true" className="sr-only">
        {/* The key makes a repeated sentence a new node, so that it is read again. */}
        <span key={said.turn}>{said.words}</span>
      </div>
    </Context>
  )
}

/** Says a sentence to people who can't see the page change: "Saved 22:14", "Leg 5 of 7". */
export function useSay(): (words: string) => void {
  return useContext(Context)
}
