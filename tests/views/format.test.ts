import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { NAMED_ZONES, shortZoneName } from '@/lib/planning/zone-names'
import { zoneOffsetMin } from '@/lib/planning/local-time'
import * as format from '@/lib/views/format'

const NBSP = '\u00a0'
const number = (text: string) => Number(text.replace('−', '-').replace(/\u00a0.*$/, ''))

describe('figures', () => {
  it('write a true minus and never a minus zero', () => {
    expect(format.figure(-0.04, 1)).toBe('0.0')
    expect(format.figure(-0.06, 1)).toBe('−0.1')
    expect(format.signed(27.06, 1)).toBe('+27.1')
    expect(format.signed(-0.01, 1)).toBe('0.0')
  })

  it('hold number and unit together with a no-break space', () => {
    expect(format.withUnit(8.4, 'kg', 1)).toBe(`8.4${NBSP}kg`)
    expect(format.count(48212)).toBe(`48${NBSP}212`)
    expect(format.counted(1, 'condition')).toBe(`1${NBSP}condition`)
    expect(format.counted(3, 'condition')).toBe(`3${NBSP}conditions`)
  })

  it('round halves away from zero, whatever binary makes of them', () => {
    expect(format.figure(1.005, 2)).toBe('1.01')
    expect(format.figure(-2.5)).toBe('−3')
    expect(format.figure(0.285, 2)).toBe('0.29')
  })
})

describe('temperatures', () => {
  // The kelvin scale's own fixed relations: 0 °C is 32 °F, 37 °C is 98.6 °F, 100 °C is 212 °F, −40 is the same in both.
  it.each([
    [0, `32${NBSP}°F`],
    [100, `212${NBSP}°F`],
    [-40, `−40${NBSP}°F`],
  ])('reads %d °C as %s', (tempC, words) => expect(format.airTemp(tempC, 'f')).toBe(words))

  it('reads body heat to a tenth', () => {
    expect(format.bodyTemp(37, 'f')).toBe(`98.6${NBSP}°F`)
    expect(format.bodyTemp(39.46, 'c')).toBe(`39.5${NBSP}°C`)
  })

  it('does not lose a tenth to binary: 38.5 °C is exactly 101.3 °F', () => {
    expect(format.limitTemp(38.5, 'high', 'f')).toBe(`101.3${NBSP}°F`)
    expect(format.limitTemp(38.5, 'low', 'f')).toBe(`101.3${NBSP}°F`)
  })

  it('rounds stop limits to the safe side: 28 °C is 82.4 °F, 8 °C is 46.4 °F', () => {
    expect(format.limitTemp(28, 'high', 'f', 0)).toBe(`82${NBSP}°F`)
    expect(format.limitTemp(8, 'low', 'f', 0)).toBe(`47${NBSP}°F`)
  })

  it('never prints an upper limit higher or a lower limit lower than it is', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -4000, max: 6000 }),
        fc.constantFrom(0 as const, 1 as const),
        (hundredths, decimals) => {
          const tempC = hundredths / 100
          // Exact in integers: °F × 500 = hundredths × 9 + 16 000.
          const exactF500 = hundredths * 9 + 16_000
          const high = Math.round(number(format.limitTemp(tempC, 'high', 'f', decimals)) * 10) * 50
          const low = Math.round(number(format.limitTemp(tempC, 'low', 'f', decimals)) * 10) * 50
          const step = decimals === 0 ? 500 : 50
          expect(high).toBeLessThanOrEqual(exactF500)
          expect(exactF500 - high).toBeLessThan(step)
          expect(low).toBeGreaterThanOrEqual(exactF500)
          expect(low - exactF500).toBeLessThan(step)
        },
      ),
    )
  })

  it('gives a margin no offset and rounds it down, also below zero', () => {
    expect(format.airMargin(2.9, 'c')).toBe(`2${NBSP}°C`)
    expect(format.airMargin(3, 'f')).toBe(`5${NBSP}°F`)
    expect(format.airMargin(-1.5, 'c')).toBe(`−2${NBSP}°C`)
    expect(format.bodyMargin(0.39, 'c')).toBe(`0.3${NBSP}°C`)
    expect(format.bodyMargin(-0.01, 'c')).toBe(`−0.1${NBSP}°C`)
  })

  it('takes typed figures back exactly', () => {
    fc.assert(
      fc.property(fc.integer({ min: -400, max: 600 }), (tenths) => {
        const tempC = tenths / 10
        expect(format.fromUnit(format.inUnit(tempC, 'f'), 'f')).toBe(tempC)
      }),
    )
  })
})

describe('minutes', () => {
  it('round down and stop at four hours', () => {
    expect(format.minutesToSpare(239.9)).toBe(`239${NBSP}min`)
    expect(format.minutesToSpare(240)).toBe(`240+${NBSP}min`)
    expect(format.minutesToSpare(-15.2)).toBe(`−16${NBSP}min`)
    expect(format.enduranceMinutes(null)).toBe('unknown')
    expect(format.enduranceMinutes(0)).toBe('passed')
  })

  it('read as h:min and in words', () => {
    expect(format.hourMin(445)).toBe('7:25')
    expect(format.duration(1385)).toBe(`23${NBSP}h${NBSP}05${NBSP}min`)
    expect(format.duration(35)).toBe(`35${NBSP}min`)
  })
})

describe('times', () => {
  const landing = Date.UTC(2026, 5, 9, 23, 9)

  it('say zone and offset', () => {
    expect(format.localTime(landing, 'Asia/Muscat')).toBe(`03:09${NBSP}GST`)
    expect(format.localTimeWithOffset(landing, 'Asia/Muscat')).toBe(`03:09${NBSP}GST (UTC+4)`)
    expect(format.dayTime(landing, 'Europe/London')).toBe(`Wed${NBSP}10${NBSP}Jun 00:09${NBSP}BST`)
    expect(format.localTime(landing, 'Asia/Kathmandu')).toBe(`04:54${NBSP}UTC+5:45`)
  })

  it('are right on the night the reader’s own clock skips an hour', () => {
    // Wall times of Dubai, told by Intl itself, while Europe/London springs forward.
    for (let minute = 0; minute < 180; minute += 15) {
      const ms = Date.UTC(2026, 2, 28, 21) + minute * 60_000
      const told = new Intl.DateTimeFormat('en-GB', {
        timeZone: 'Asia/Dubai',
        hour: '2-digit',
        minute: '2-digit',
      }).format(ms)
      expect(format.clock(ms, 'Asia/Dubai')).toBe(told)
    }
  })

  it('use the short names the world’s own tables use, wherever those have one', () => {
    const months = [0, 6].map((month) => Date.UTC(2026, month, 15, 12))
    let compared = 0
    for (const zone of NAMED_ZONES) {
      for (const ms of months) {
        const ours = shortZoneName(zone, zoneOffsetMin(ms, zone))
        expect(ours, `${zone} has no name for its offset`).not.toBeNull()
        const theirs = new Set(
          ['en-GB', 'en-US', 'en-AU', 'en-NZ', 'en-CA', 'en-ZA', 'en-IN', 'en-HK', 'en-SG']
            .map((locale) => intlName(ms, zone, locale))
            .filter((name) => /^[A-Z]{2,5}$/.test(name)),
        )
        if (theirs.size === 0) continue
        compared += 1
        expect([...theirs], `${zone}: ${String(ours)}`).toContain(ours)
      }
    }
    expect(compared).toBeGreaterThan(100)
  })
})

function intlName(ms: number, zone: string, locale: string): string {
  const parts = new Intl.DateTimeFormat(locale, { timeZone: zone, timeZoneName: 'short' }).formatToParts(ms)
  return parts.find((part) => part.type === 'timeZoneName')?.value ?? ''
}
