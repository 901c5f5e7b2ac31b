import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { rampStep } from '@/lib/tokens'
import { loggerStrip } from '@/lib/views/charts/air'
import { ledger, ledgerAt } from '@/lib/views/charts/ledger'
import type { HeatTrack } from '@/lib/views/charts/types'
import { endMin, heat, input, legs } from './journey-2417'

const written = (value: string) => Number(value.replace('−', '-').replace('+', ''))

describe('heat ledger', () => {
  it('prints a storage that is the sum of the printed terms', () => {
    const watts = fc.double({ min: -400, max: 400, noNaN: true })
    fc.assert(
      fc.property(fc.tuple(watts, watts, watts, watts, watts), ([a, b, c, d, e]) => {
        const track: HeatTrack = {
          minutes: [0],
          metabolismW: [a],
          conductionW: [b],
          convectionW: [c],
          radiationW: [d],
          evaporationW: [e],
          storageW: [a + b + c + d + e],
        }
        const { accounts, storage } = ledgerAt(track, 0)
        const thousandths = accounts.reduce((sum, row) => sum + Math.round(written(row.value) * 1000), 0)
        expect(Math.round(written(storage.value) * 1000)).toBe(thousandths)
      }),
    )
  })

  it('draws gains above their line in ink and losses below it in grey', () => {
    const picture = ledger({ heat, legs, endMin }, { width: 1392, left: 72, right: 170 })
    const inks = picture.marks.filter((mark) => mark.kind === 'path' && mark.stroke === undefined)
    expect(new Set(inks.map((mark) => mark.kind === 'path' && mark.fill))).toEqual(new Set(['ink', 'rule']))
    expect(JSON.stringify(picture)).not.toContain('NaN')
    expect(picture.baselines).toHaveLength(6)
  })

  it('shows three figures that count for a chick of half a watt, and bars one can see', () => {
    const tiny = (values: readonly number[]) => values.map((value) => value / 60)
    const chick: HeatTrack = {
      minutes: heat.minutes,
      metabolismW: tiny(heat.metabolismW),
      conductionW: tiny(heat.conductionW),
      convectionW: tiny(heat.convectionW),
      radiationW: tiny(heat.radiationW),
      evaporationW: tiny(heat.evaporationW),
      storageW: tiny(heat.storageW),
    }
    expect(ledgerAt(chick, 0).accounts[0]?.value).toBe('+0.400')
    const bars = (track: HeatTrack) => {
      const { marks } = ledger({ heat: track, legs, endMin }, { width: 1392, left: 72, right: 170 })
      const [gain] = marks.filter(
        (mark) => mark.kind === 'path' && mark.fill === 'ink' && mark.stroke === undefined,
      )
      const [, base, top] =
        /^M[\d.]+ ([\d.]+)V([\d.]+)/.exec(gain?.kind === 'path' ? gain.d : '')?.map(Number) ?? []
      return (base ?? 0) - (top ?? 0)
    }
    expect(bars(chick)).toBeGreaterThan(10)
    expect(bars(heat)).toBeCloseTo(24 * 1.7, 0)
  })

  it('stays on the page for an animal a hundred times as heavy', () => {
    const times40 = (values: readonly number[]) => values.map((value) => value * 40)
    const heavy: HeatTrack = {
      minutes: heat.minutes,
      metabolismW: times40(heat.metabolismW),
      conductionW: times40(heat.conductionW),
      convectionW: times40(heat.convectionW),
      radiationW: times40(heat.radiationW),
      evaporationW: times40(heat.evaporationW),
      storageW: times40(heat.storageW),
    }
    expect(ledger({ heat: heavy, legs, endMin }, { width: 1392, left: 72, right: 170 }).height).toBeLessThan(
      420,
    )
  })
})

describe('logger strip', () => {
  it('prints the hottest of each hour on the step of the ramp it belongs to', () => {
    const time = { fromMin: 0, toMin: endMin, x0: 72, x1: 1222 }
    const marks = loggerStrip(time, { x: 72, y: 0, width: 1150, height: 26 }, input)
    const numbers = marks.flatMap((mark) => (mark.kind === 'text' ? [mark] : []))
    expect(numbers.length).toBeGreaterThanOrEqual(23)
    const crate = input.crateAir
    if (!crate) throw new Error('no crate air')
    numbers.forEach((mark, hour) => {
      const inHour = crate.tempC.filter((_, index) => {
        const minute = crate.minutes[index] ?? 0
        return minute >= hour * 60 && minute <= (hour + 1) * 60
      })
      expect(written(mark.text)).toBe(Math.round(Math.max(...inHour)))
      expect(mark.ink).toBe(`${rampStep(written(mark.text))}t`)
    })
  })
})
