import { describe, expect, it } from 'vitest'
import { entryStore, flush } from '@/components/road/entry-queue'
import { itemStates, legTally, mergedEntries } from '@/components/road/item-states'
import { timeLately } from '@/components/road/time-lately'
import type { EntryView } from '@/lib/views/checklist'

const entry = (clientId: string, more: Partial<EntryView> = {}): EntryView => ({
  clientId,
  legId: 'leg-1',
  itemKey: 'openings-a',
  kind: 'tick',
  atMs: 1_000,
  place: '',
  value: {},
  alive: null,
  dead: null,
  short: null,
  ...more,
})
const isEntry = (value: unknown): value is EntryView =>
  typeof value === 'object' && value !== null && 'clientId' in value

function device(start: Record<string, string> = {}) {
  const kept = new Map(Object.entries(start))
  const storage = {
    getItem: (key: string) => kept.get(key) ?? null,
    setItem: (key: string, value: string) => void kept.set(key, value),
    removeItem: (key: string) => void kept.delete(key),
  }
  return { kept, open: () => entryStore('entries', storage, isEntry) }
}

describe('entries kept on the device', () => {
  it('outlive the page and go in the order they were made', async () => {
    const phone = device()
    phone.open().add(entry('a'))
    phone.open().add(entry('b'))
    const sent: string[][] = []
    await flush(phone.open(), async (batch) => {
      sent.push(batch.map(({ clientId }) => clientId))
      return { stored: ['a', 'b'], refused: [] }
    })
    expect(sent).toEqual([['a', 'b']])
    expect(phone.open().read()).toEqual([])
  })

  it('stay until they are acknowledged, and go again with the same id', async () => {
    const store = device().open()
    store.add(entry('a'))
    expect(await flush(store, () => Promise.reject(new Error('no line')))).toBe(false)
    expect(store.read().map((one) => one.entry.clientId)).toEqual(['a'])
    const again: string[] = []
    await flush(store, async (batch) => {
      again.push(...batch.map(({ clientId }) => clientId))
      return { stored: ['a'], refused: [] }
    })
    expect(again).toEqual(['a'])
  })

  it('one that is refused for good holds up nobody and stays in sight', async () => {
    const store = device().open()
    store.add(entry('bad'))
    store.add(entry('good'))
    await flush(store, async () => ({
      stored: ['good'],
      refused: [{ clientId: 'bad', message: 'no such leg' }],
    }))
    expect(store.read()).toEqual([{ entry: entry('bad'), refused: 'no such leg' }])
    let asked = false
    await flush(store, async () => {
      asked = true
      return { stored: [], refused: [] }
    })
    expect(asked).toBe(false)
  })

  it('what cannot be read is put aside, never overwritten', () => {
    const phone = device({ entries: '{half' })
    phone.open().add(entry('a'))
    expect(phone.kept.get('entries-unreadable')).toBe('{half')
    expect(phone.open().read()).toHaveLength(1)
  })
})

describe('items', () => {
  const items = [{ key: 'openings-a', number: 1, kind: 'tick' as const, text: '' }]

  it('the latest entry counts, whatever order they arrive in', () => {
    const entries = [
      entry('later', { kind: 'not_done', atMs: 2_000, value: { reason: 'x' } }),
      entry('first'),
    ]
    expect(itemStates(items, entries, 'leg-1').get('openings-a')?.state).toBe('not-done')
    expect(legTally(items, entries, 'leg-1')).toMatchObject({ ticked: 0, notDone: 1, open: 0, closed: null })
    expect(legTally(items, entries, 'leg-2').open).toBe(1)
  })

  it('an entry known to both sides stands once', () => {
    expect(mergedEntries([entry('a')], [entry('a'), entry('b')]).map(({ clientId }) => clientId)).toEqual([
      'a',
      'b',
    ])
  })
})

describe('a typed time', () => {
  const at = (text: string) => Date.parse(text)

  it('is the last time the clock showed it', () => {
    const now = at('2026-06-12T05:30:00Z')
    expect(timeLately('06:20', 'Europe/London', now)).toBe(at('2026-06-12T05:20:00Z'))
    expect(timeLately('2350', 'Europe/London', now)).toBe(at('2026-06-11T22:50:00Z'))
  })

  it('takes the later of an hour that comes twice, once it has passed', () => {
    // Zürich, 25 October 2026: 02:30 comes at 00:30 and at 01:30 UTC.
    expect(timeLately('02:30', 'Europe/Zurich', at('2026-10-25T03:00:00Z'))).toBe(at('2026-10-25T01:30:00Z'))
    expect(timeLately('02:30', 'Europe/Zurich', at('2026-10-25T00:40:00Z'))).toBe(at('2026-10-25T00:30:00Z'))
  })

  it.each(['24:00', '12:60', 'noon', ''])('refuses “%s”', (typed) => {
    expect(timeLately(typed, 'Europe/London', at('2026-06-12T05:30:00Z'))).toBeNull()
  })
})
