import { fromZonedTime, formatInTimeZone } from 'date-fns-tz'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  isKnownZone,
  localMoment,
  resolveLocalTime,
  spellOffset,
  toLocalTime,
  zoneOffsetMin,
} from '@/lib/planning/local-time'

/*
 * Outside authority: date-fns-tz (which reads the same IANA tables by another road), and the published dates of the clock
 * changes: London 29 March and 25 October 2026, 01:00 UTC; New York 8 March and 1 November 2026, 02:00 local.
 */

const ZONES = [
  'Europe/London',
  'America/New_York',
  'Asia/Muscat',
  'Australia/Lord_Howe',
  'America/St_Johns',
] as const

describe('a wall time and its instant', () => {
  it('meets the clocks of London and Muscat in June', () => {
    const leaves = resolveLocalTime('2026-06-09T09:20', 'Europe/London', null)
    expect(leaves).toEqual({ kind: 'instant', instantMs: Date.UTC(2026, 5, 9, 8, 20), offsetMin: 60 })
    const arrives = resolveLocalTime('2026-06-10T11:25', 'Asia/Muscat', null)
    expect(arrives).toEqual({ kind: 'instant', instantMs: Date.UTC(2026, 5, 10, 7, 25), offsetMin: 240 })
    expect(localMoment(Date.UTC(2026, 5, 9, 8, 20), 'Europe/London').text).toBe(
      'Tue 9 Jun, 09:20 BST (UTC+1)',
    )
    expect(localMoment(Date.UTC(2026, 5, 9, 8, 20), 'Asia/Muscat').text).toBe('Tue 9 Jun, 12:20 GST (UTC+4)')
  })

  it.each([
    ['Europe/London', '2026-03-29T01:30', '2026-03-29T02:00', 'GMT (UTC)', 'BST (UTC+1)'],
    ['America/New_York', '2026-03-08T02:15', '2026-03-08T03:00', 'EST (UTC−5)', 'EDT (UTC−4)'],
  ])('%s never shows %s', (zone, local, nextLocal, beforeLabel, afterLabel) => {
    const missing = { kind: 'missing', nextLocal, beforeLabel, afterLabel }
    expect(resolveLocalTime(local, zone, null)).toEqual(missing)
    // A choice of offset cannot make an hour that never was.
    expect(resolveLocalTime(local, zone, 60)).toEqual(missing)
  })

  it.each([
    ['Europe/London', '2026-10-25T01:30', [60, 0], ['BST (UTC+1)', 'GMT (UTC)']],
    ['America/New_York', '2026-11-01T01:30', [-240, -300], ['EDT (UTC−4)', 'EST (UTC−5)']],
  ])('%s shows %s twice, and asks which', (zone, local, offsets, labels) => {
    const asked = resolveLocalTime(local, zone, null)
    expect(asked.kind).toBe('doubled')
    if (asked.kind !== 'doubled') return
    expect(asked.choices.map(({ offsetMin }) => offsetMin)).toEqual(offsets)
    expect(asked.choices.map(({ label }) => label)).toEqual(labels)
    for (const choice of asked.choices) {
      const chosen = resolveLocalTime(local, zone, choice.offsetMin)
      expect(chosen).toEqual({ kind: 'instant', instantMs: choice.instantMs, offsetMin: choice.offsetMin })
    }
    expect(resolveLocalTime(local, zone, 330).kind).toBe('doubled')
  })

  it('ignores an offset left over from an earlier date where the hour comes once', () => {
    expect(resolveLocalTime('2026-06-09T09:20', 'Europe/London', 0)).toMatchObject({
      kind: 'instant',
      offsetMin: 60,
    })
  })

  it('says what it cannot read', () => {
    expect(resolveLocalTime('', 'Europe/London', null).kind).toBe('empty')
    expect(resolveLocalTime('2026-06-31T09:20', 'Europe/London', null).kind).toBe('malformed')
    expect(resolveLocalTime('2026-06-09T24:20', 'Europe/London', null).kind).toBe('malformed')
    expect(resolveLocalTime('9 June', 'Europe/London', null).kind).toBe('malformed')
    expect(resolveLocalTime('2026-06-09T09:20', 'Europe/Nowhere', null).kind).toBe('unknown-zone')
    expect(isKnownZone('')).toBe(false)
  })

  it('spells offsets', () => {
    expect([0, 60, -210, 345].map(spellOffset)).toEqual(['UTC', 'UTC+1', 'UTC−3:30', 'UTC+5:45'])
  })
})

describe('any minute from 2020 to 2035 in any of five zones', () => {
  const minute = fc.integer({ min: Date.UTC(2020, 0, 1) / 60_000, max: Date.UTC(2035, 0, 1) / 60_000 })
  const zone = fc.constantFrom(...ZONES)

  it('shows the wall time that date-fns-tz shows', () => {
    fc.assert(
      fc.property(minute, zone, (m, z) => {
        const ms = m * 60_000
        const wall = formatInTimeZone(ms, z, "yyyy-MM-dd'T'HH:mm")
        expect(toLocalTime(ms, z)).toBe(wall)
        // Its getTimezoneOffset is an hour off in the hours before a change; its wall times are right.
        expect(zoneOffsetMin(ms, z) * 60_000).toBe(Date.parse(`${wall}Z`) - ms)
      }),
      { numRuns: 400 },
    )
  })

  it('comes back from its wall time, at once or with its own offset chosen', () => {
    fc.assert(
      fc.property(minute, zone, (m, z) => {
        const ms = m * 60_000
        const offsetMin = zoneOffsetMin(ms, z)
        expect(resolveLocalTime(toLocalTime(ms, z), z, offsetMin)).toEqual({
          kind: 'instant',
          instantMs: ms,
          offsetMin,
        })
      }),
      { numRuns: 400 },
    )
  })

  it('agrees with date-fns-tz on every wall time that comes once', () => {
    fc.assert(
      fc.property(minute, zone, (m, z) => {
        const local = new Date(m * 60_000).toISOString().slice(0, 16)
        const resolved = resolveLocalTime(local, z, null)
        if (resolved.kind !== 'instant') return
        expect(resolved.instantMs).toBe(fromZonedTime(local, z).getTime())
      }),
      { numRuns: 400 },
    )
  })
})
