/*
 * Entries made on the road, kept on the device until the server has acknowledged each of them, and sent in the order they
 * were made. An entry carries an id minted here, so that one sent twice, because an answer was lost, is stored once.
 */

export interface QueuedEntry<Entry extends { clientId: string }> {
  entry: Entry
  /** Why the server will never take it; empty while it waits. It stays in sight until a person takes it off. */
  refused: string
}

export interface EntryStore<Entry extends { clientId: string }> {
  subscribe: (listener: () => void) => () => void
  /** The same array until something changes: made for useSyncExternalStore. */
  read: () => readonly QueuedEntry<Entry>[]
  add: (entry: Entry) => void
  /** The server has it. */
  acknowledge: (clientIds: readonly string[]) => void
  refuse: (clientId: string, why: string) => void
  drop: (clientId: string) => void
}

/** Storage of one person's entries on one consignment. What can't be read is put aside beside it, never overwritten. */
export function entryStore<Entry extends { clientId: string }>(
  key: string,
  storage: Pick<Storage, 'getItem' | 'setItem' | 'removeItem'>,
  isEntry: (value: unknown) => value is Entry,
): EntryStore<Entry> {
  const listeners = new Set<() => void>()
  let text: string | null = null
  let entries: readonly QueuedEntry<Entry>[] = []

  function read() {
    const stored = storage.getItem(key)
    if (stored !== text) {
      text = stored
      const readable = parse(stored, isEntry)
      if (readable === null && stored !== null) storage.setItem(`${key}-unreadable`, stored)
      entries = readable ?? []
    }
    return entries
  }

  function write(next: readonly QueuedEntry<Entry>[]) {
    if (next.length === 0) storage.removeItem(key)
    else storage.setItem(key, JSON.stringify(next))
    listeners.forEach((listener) => listener())
  }

  return {
    subscribe(listener) {
      listeners.add(listener)
      return () => listeners.delete(listener)
    },
    read,
    add: (entry) => write([...read(), { entry, refused: '' }]),
    acknowledge: (clientIds) => write(read().filter(({ entry }) => !clientIds.includes(entry.clientId))),
    refuse: (clientId, why) =>
      write(read().map((one) => (one.entry.clientId === clientId ? { ...one, refused: why } : one))),
    drop: (clientId) => write(read().filter(({ entry }) => entry.clientId !== clientId)),
  }
}

/** What the server says of a batch: which it has, which it will never take. The rest is to be sent again. */
export interface BatchAnswer {
  stored: string[]
  refused: { clientId: string; message: string }[]
}

/**
 * Sends what waits, oldest first, in one batch. False: no answer came, or the server asks for another try; nothing is lost
 * and the next call begins with the same entry.
 */
export async function flush<Entry extends { clientId: string }>(
  store: EntryStore<Entry>,
  send: (entries: Entry[]) => Promise<BatchAnswer>,
): Promise<boolean> {
  const waiting = store.read().filter(({ refused }) => refused === '')
  if (waiting.length === 0) return true
  try {
    const answer = await send(waiting.map(({ entry }) => entry))
    store.acknowledge(answer.stored)
    answer.refused.forEach(({ clientId, message }) => store.refuse(clientId, message))
    return answer.stored.length + answer.refused.length > 0
  } catch {
    return false
  }
}

function parse<Entry extends { clientId: string }>(
  stored: string | null,
  isEntry: (value: unknown) => value is Entry,
): readonly QueuedEntry<Entry>[] | null {
  if (stored === null) return []
  try {
    const value: unknown = JSON.parse(stored)
    if (!Array.isArray(value)) return null
    const readable = value.filter(
      (one: unknown): one is QueuedEntry<Entry> =>
        typeof one === 'object' && one !== null && 'entry' in one && 'refused' in one && isEntry(one.entry),
    )
    return readable.length === value.length ? readable : null
  } catch {
    return null
  }
}
