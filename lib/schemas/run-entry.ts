import { z } from 'zod'
import { itemId, rowId } from './act'
import { text } from './quantity'

const headcount = (label: string) =>
  z
    .number({ error: `${label}: put a whole number.` })
    .int({ error: `${label}: put a whole number.` })
    .min(0, { error: `${label}: put 0 or more.` })
    .max(60_000, { error: `${label}: put at most 60000.` })
    .nullable()

const OLDEST_MS = Date.UTC(2020, 0, 1)
const NEWEST_MS = Date.UTC(2100, 0, 1)

/** What a driver wrote down, as the device keeps it until it is sent. */
export const runEntrySchema = z
  .object({
    /** Minted on the device: sent twice, stored once. */
    clientId: z.uuid({ error: 'This entry has lost its number.' }),
    legId: itemId.nullable(),
    itemKey: text('Item', 80).min(1, { error: 'This entry is about no item.' }),
    kind: z.enum(['tick', 'not_done', 'reading', 'water', 'condition', 'handover', 'note', 'close_leg']),
    /** By the device's clock. */
    atMs: z.number().int().min(OLDEST_MS).max(NEWEST_MS),
    place: text('Place', 160),
    value: z.record(z.string().max(40), z.json()),
    alive: headcount('Alive'),
    dead: headcount('Dead'),
    short: headcount('Short'),
  })
  .superRefine((entry, context) => {
    const missing = (path: string, message: string) =>
      context.addIssue({ code: 'custom', path: [path], message })
    if (JSON.stringify(entry.value).length > 4_000) missing('value', 'This entry is too long.')
    if (entry.kind === 'reading') checkReadings(entry.value['airTempC'], missing)
    if (entry.kind === 'not_done' && !isText(entry.value['reason']))
      missing('value', 'Say why it was not done.')
    if (entry.kind !== 'handover') return
    if (!isText(entry.value['to'])) missing('value', 'Say who received the crates.')
    if (entry.place === '') missing('place', 'Say where the crates were handed over.')
    if (entry.alive === null || entry.dead === null || entry.short === null) {
      missing('alive', 'Put how many are alive, dead and short.')
    }
  })
export type RunEntry = z.infer<typeof runEntrySchema>

/** A device's queue, oldest first. Entries are looked at one by one: a bad one must not hold up the rest. */
export const runEntriesSchema = z.object({
  entries: z.array(z.unknown()).max(500, { error: 'At most 500 entries at once.' }),
})

export const storeEntriesSchema = runEntriesSchema.extend({ consignmentId: rowId })
export type StoreEntries = z.infer<typeof storeEntriesSchema>

function checkReadings(value: unknown, missing: (path: string, message: string) => void) {
  const readings = typeof value === 'object' && value !== null ? Object.values(value) : []
  if (readings.length === 0) return missing('value', 'Put at least one air temperature.')
  const wrong = readings.find((tempC) => typeof tempC !== 'number' || tempC < -50 || tempC > 70)
  if (wrong !== undefined) missing('value', `Air temperature ${String(wrong)} °C: put −50 to 70 °C.`)
}

function isText(value: unknown): boolean {
  return typeof value === 'string' && value.trim() !== ''
}
