'use client'

import type { KeyboardEvent } from 'react'

/** Walking rows: arrows step, Home and End jump, Enter opens. One row is in the tab order. */
export function useRowKeys({
  many,
  chosen,
  onChoose,
  onOpen,
}: {
  many: number
  chosen: number
  onChoose: (index: number) => void
  onOpen: (index: number) => void
}) {
  const target = (key: string): number | null => {
    switch (key) {
      case 'ArrowDown':
        return Math.min(many - 1, chosen + 1)
      case 'ArrowUp':
        return Math.max(0, chosen - 1)
      case 'Home':
        return 0
      case 'End':
        return many - 1
      default:
        return null
    }
  }
  return {
    chosen,
    open: onOpen,
    focused: (index: number) => {
      if (index !== chosen) onChoose(index)
    },
    onKeyDown: (event: KeyboardEvent<HTMLElement>) => {
      const onRow = event.target instanceof HTMLElement && event.target.matches('tr[data-row]')
      if (!onRow || many === 0) return
      if (event.key === 'Enter') return onOpen(chosen)
      const next = target(event.key)
      if (next === null) return
      event.preventDefault()
      onChoose(next)
    },
  }
}
