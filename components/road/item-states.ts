import type { ChecklistItem, EntryView } from '@/lib/views/checklist'

export type ItemState =
  { state: 'open' } | { state: 'done'; entry: EntryView } | { state: 'not-done'; entry: EntryView }

/** Where each item of a leg stands: the latest entry on it counts, so that a wrong one is put right by another. */
export function itemStates(
  items: readonly ChecklistItem[],
  entries: readonly EntryView[],
  legId: string,
): Map<string, ItemState> {
  const latest = new Map<string, EntryView>()
  for (const entry of inOrder(entries)) if (entry.legId === legId) latest.set(entry.itemKey, entry)
  return new Map(
    items.map((item): [string, ItemState] => {
      const entry = latest.get(item.key)
      if (!entry) return [item.key, { state: 'open' }]
      return [item.key, { state: entry.kind === 'not_done' ? 'not-done' : 'done', entry }]
    }),
  )
}

export interface LegTally {
  ticked: number
  notDone: number
  open: number
  closed: EntryView | null
}

/** How far a leg is, and the entry that closed it. */
export function legTally(
  items: readonly ChecklistItem[],
  entries: readonly EntryView[],
  legId: string,
): LegTally {
  const states = [...itemStates(items, entries, legId).values()]
  return {
    ticked: states.filter(({ state }) => state === 'done').length,
    notDone: states.filter(({ state }) => state === 'not-done').length,
    open: states.filter(({ state }) => state === 'open').length,
    closed:
      inOrder(entries)
        .filter((entry) => entry.legId === legId && entry.kind === 'close_leg')
        .at(-1) ?? null,
  }
}

/** Entries of the server and of this device as one list: what is in both stands once. */
export function mergedEntries(stored: readonly EntryView[], kept: readonly EntryView[]): EntryView[] {
  const known = new Set(stored.map((entry) => entry.clientId))
  return inOrder([...stored, ...kept.filter((entry) => !known.has(entry.clientId))])
}

/** By the time it happened; two of one moment keep the order they were made in. */
function inOrder(entries: readonly EntryView[]): EntryView[] {
  return entries
    .map((entry, index) => ({ entry, index }))
    .sort((a, b) => a.entry.atMs - b.entry.atMs || a.index - b.index)
    .map(({ entry }) => entry)
}
