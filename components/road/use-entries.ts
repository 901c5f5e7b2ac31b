'use client'

import { useCallback, useEffect, useMemo, useRef, useState, useSyncExternalStore } from 'react'
import type { EntryView } from '@/lib/views/checklist'
import { entryStore, flush } from './entry-queue'
import type { BatchAnswer, QueuedEntry } from './entry-queue'
import { mergedEntries } from './item-states'

const NOTHING: readonly QueuedEntry<EntryView>[] = []
const AGAIN_MS = 15_000

export type NewEntry = Omit<EntryView, 'clientId'>

export interface Entries {
  /** The server's and this device's, in order of time. */
  all: EntryView[]
  kept: readonly QueuedEntry<EntryView>[]
  /** Since when nothing gets through; null while the line holds. */
  silentSinceMs: number | null
  add: (entry: NewEntry) => void
  drop: (clientId: string) => void
  sendNow: () => void
}

/**
 * Entries made here are shown at once, kept on the device, and sent one batch at a time in order, again and again until
 * each is acknowledged: when made, when the network returns, when the page is opened again, and every quarter of a minute.
 */
export function useEntries({
  storageKey,
  stored,
  send,
  onStored,
}: {
  storageKey: string
  stored: readonly EntryView[]
  send: (entries: EntryView[]) => Promise<BatchAnswer>
  /** The server took some: the page may fetch what follows from them. */
  onStored: () => void
}): Entries {
  const store = useMemo(
    () => (typeof window === 'undefined' ? null : entryStore(storageKey, window.localStorage, isEntry)),
    [storageKey],
  )
  const kept = useSyncExternalStore(
    useCallback((listener) => store?.subscribe(listener) ?? (() => {}), [store]),
    () => store?.read() ?? NOTHING,
    () => NOTHING,
  )
  // What the server acknowledged stays in sight until the page's own copy holds it.
  const [acknowledged, setAcknowledged] = useState<EntryView[]>([])
  const [silentSinceMs, setSilentSince] = useState<number | null>(null)
  const sending = useRef(false)

  const sendNow = useCallback(async () => {
    if (!store || sending.current || store.read().every(({ refused }) => refused !== '')) return
    sending.current = true
    let reached = true
    // What is made while a batch is on its way goes with the next one, at once.
    while (reached && store.read().some(({ refused }) => refused === '')) {
      const before = store.read().map(({ entry }) => entry)
      reached = await flush(store, send)
      const left = new Set(store.read().map(({ entry }) => entry.clientId))
      const gone = before.filter((entry) => !left.has(entry.clientId))
      if (gone.length > 0) {
        setAcknowledged((earlier) => [...earlier, ...gone])
        onStored()
      }
    }
    sending.current = false
    setSilentSince((since) => (reached ? null : (since ?? Date.now())))
  }, [store, send, onStored])

  useEffect(() => {
    const go = () => void sendNow()
    go()
    const timer = setInterval(go, AGAIN_MS)
    window.addEventListener('online', go)
    document.addEventListener('visibilitychange', go)
    return () => {
      clearInterval(timer)
      window.removeEventListener('online', go)
      document.removeEventListener('visibilitychange', go)
    }
  }, [sendNow])

  return {
    all: mergedEntries(
      mergedEntries(stored, acknowledged),
      kept.filter(({ refused }) => refused === '').map(({ entry }) => entry),
    ),
    kept,
    silentSinceMs,
    add(entry) {
      store?.add({ ...entry, clientId: crypto.randomUUID() })
      void sendNow()
    },
    drop: (clientId) => store?.drop(clientId),
    sendNow: () => void sendNow(),
  }
}

function isEntry(value: unknown): value is EntryView {
  return (
    typeof value === 'object' &&
    value !== null &&
    'clientId' in value &&
    typeof value.clientId === 'string' &&
    'kind' in value &&
    'atMs' in value &&
    typeof value.atMs === 'number'
  )
}
