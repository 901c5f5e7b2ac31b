import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { channel, excursions } from '@/lib/views/charts/channel'
import { corridor } from '@/lib/views/charts/corridor'
import { minuteAt, xAt, yAt } from '@/lib/views/charts/frame'
import { legCorridor } from '@/lib/views/charts/leg-corridor'
import { textWidth } from '@/lib/views/charts/text-width'
import type { Mark, PathMark, TextMark } from '@/lib/views/charts/marks'
import { narrowestMinute, readingAt, spaced } from '@/lib/views/charts/reading'
import { corridorSummary } from '@/lib/views/charts/summary'
import { corridorTable } from '@/lib/views/charts/table'
import type { CorridorInput } from '@/lib/views/charts/types'
import { input, legs } from './journey-2417'

const calm: CorridorInput = {
  ...input,
  callouts: [],
  deciding: input.deciding && { ...input.deciding, bodyC: input.deciding.bodyC.map(() => 38.4) },
}

describe('corridor', () => {
  it.each([712, 800, 990, 1232, 1392])(
    'at %d px holds everything inside its width, with no figure lost',
    (width) => {
      const picture = corridor(input, { width, chosenLegId: 'leg-7' })
      expect(JSON.stringify(picture)).not.toMatch(/NaN|null,null|Infinity/)
      for (const mark of texts(picture.marks)) {
        expect(left(mark), mark.text).toBeGreaterThanOrEqual(-2)
        expect(right(mark), mark.text).toBeLessThanOrEqual(width + 2)
      }
      for (const ordinal of ['1', '9'])
        expect(picture.marks.some((mark) => mark.kind === 'text' && mark.text === ordinal)).toBe(true)
    },
  )

  it('shares the width among heads without gap or overlap, and none is too narrow to read', () => {
    const { heads, time } = corridor(input, { width: 1392, chosenLegId: null })
    expect(heads.heads.map((head) => head.legId)).toEqual(legs.map((leg) => leg.legId))
    heads.heads.forEach((head, index) => {
      const next = heads.heads[index + 1]
      expect(head.width).toBeGreaterThanOrEqual(113)
      expect(head.x + head.width).toBeCloseTo(next?.x ?? time.x1, 6)
    })
  })

  it('keeps the words of a head inside it', () => {
    for (const width of [760, 1000, 1392]) {
      const { heads, marks } = corridor(input, { width, chosenLegId: null })
      const inHeads = texts(marks).filter(
        (mark) => mark.y > heads.top && mark.y < heads.foot && mark.anchor === 'start',
      )
      for (const head of heads.heads) {
        for (const mark of inHeads.filter((each) => each.x >= head.x && each.x < head.x + head.width)) {
          expect(right(mark), `${mark.text} at ${width}`).toBeLessThanOrEqual(head.x + head.width + 4)
        }
      }
    }
  })

  it('draws alarm at 2.5 and critical at 5, critical outside alarm', () => {
    const { temp } = corridor(input, { width: 1392, chosenLegId: null })
    const limits = input.limits[0]
    if (!limits) throw new Error('no limits')
    expect(yAt(temp, limits.criticalHighC)).toBeLessThan(yAt(temp, limits.alarmHighC))
    expect(yAt(temp, limits.criticalLowC)).toBeGreaterThan(yAt(temp, limits.alarmLowC))
    const time = { fromMin: 0, toMin: input.endMin, x0: 0, x1: 1000 }
    const widths = channel(time, temp, input).flatMap((mark) =>
      mark.kind === 'path' ? [mark.strokeWidth ?? 0] : [],
    )
    expect(widths.filter((width) => width === 5)).toHaveLength(2)
    expect(widths.filter((width) => width === 2.5).length).toBeGreaterThanOrEqual(3)
  })

  it('shows every limit of every leg as a level line, also where limits step', () => {
    const stepped: CorridorInput = {
      ...calm,
      limits: legs.map((_, index) => ({
        criticalLowC: 36,
        alarmLowC: index > 3 ? 37.4 : 37.2,
        alarmHighC: index > 3 ? 39.2 : 39.4,
        criticalHighC: 40.2,
      })),
    }
    const { temp, time, marks } = corridor(stepped, { width: 1392, chosenLegId: null })
    const lines = marks.filter(
      (mark): mark is PathMark => mark.kind === 'path' && mark.strokeWidth === 2.5 && mark.fill === 'none',
    )
    for (const [index, leg] of legs.entries()) {
      const y = Math.round(yAt(temp, stepped.limits[index]?.alarmHighC ?? 0) * 10) / 10
      const x = Math.round(xAt(time, leg.endMin) * 10) / 10
      expect(lines.some((line) => line.d.includes(`${x} ${y}`))).toBe(true)
    }
    expect(texts(marks).some((mark) => mark.text.startsWith('39.2'))).toBe(true)
  })
})

describe('a runaway', () => {
  const hot: CorridorInput = {
    ...input,
    deciding: input.deciding && {
      ...input.deciding,
      bodyC: input.deciding.bodyC.map((bodyC, minute) => bodyC + (minute > 860 ? 8 : 0)),
    },
  }

  it('leaves the picture with its figure said, and squeezes no limit', () => {
    const calmScale = corridor(calm, { width: 1392, chosenLegId: null }).temp
    const picture = corridor(hot, { width: 1392, chosenLegId: 'leg-7' })
    const px = (temp: typeof picture.temp) => yAt(temp, 39.4) - yAt(temp, 40.2)
    expect(px(picture.temp)).toBeGreaterThan(0.6 * px(calmScale))
    expect(texts(picture.marks).map((mark) => mark.text)).toContain('to 48.5\u00a0°C')
  })

  it('keeps its callout off the solid part', () => {
    const { marks, time, temp } = corridor(hot, { width: 1392, chosenLegId: null })
    const block = marks.find((mark) => mark.kind === 'rect' && mark.fill === 'sheet' && mark.height === 46)
    if (block?.kind !== 'rect') throw new Error('no callout')
    const from = minuteAt(time, block.x)
    const to = minuteAt(time, block.x + block.width)
    const overSolid = from < 1385 && to > 865 && block.y < yAt(temp, 40.2)
    expect(overSolid).toBe(false)
  })
})

describe('solid ink in a channel', () => {
  const time = { fromMin: 0, toMin: input.endMin, x0: 0, x1: 1000 }
  const temp = { lowC: 35, highC: 42, top: 0, foot: 400 }
  const solid = (drawn: CorridorInput) =>
    channel(time, temp, drawn).filter(
      (mark) => mark.kind === 'path' && mark.fill === 'ink' && mark.fillOpacity === undefined,
    )

  it('is there when the deciding track passes critical', () => expect(solid(input).length).toBeGreaterThan(0))

  it('is never there while the deciding track stays inside, whatever P95 does', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 36.05, max: 40.15, noNaN: true }), { minLength: 2, maxLength: 40 }),
        (values) => {
          const minutes = values.map((_, index) => (index * input.endMin) / (values.length - 1))
          const inside: CorridorInput = {
            ...input,
            deciding: { minutes, bodyC: values, words: 'heat-prone, decides' },
            spread: {
              minutes,
              p05C: values.map((value) => value - 3),
              p95C: values.map((value) => value + 3),
            },
          }
          expect(solid(inside)).toHaveLength(0)
        },
      ),
    )
  })

  it('begins exactly where the track crosses', () => {
    const [run] = excursions(
      [
        { minute: 0, value: 39 },
        { minute: 10, value: 41 },
        { minute: 20, value: 39 },
      ],
      40.5,
      1,
    )
    expect(run?.map(({ minute }) => minute)).toEqual([7.5, 10, 12.5])
  })
})

describe('rulers', () => {
  it('carry the hours a clock in that zone shows, and the day at midnight', () => {
    // The night clocks go back in London; Intl is asked for every label's wall time.
    const back: CorridorInput = {
      ...calm,
      departureMs: Date.UTC(2026, 9, 24, 20, 10),
      zones: [{ zone: 'Europe/London', fromMin: 0 }],
    }
    const { marks, time, rulerYs } = corridor(back, { width: 1392, chosenLegId: null })
    const labels = texts(marks).filter((mark) => mark.y < (rulerYs[0] ?? 0) && mark.anchor === 'middle')
    expect(labels.length).toBeGreaterThan(6)
    let days = 0
    for (const label of labels) {
      const ms = back.departureMs + Math.round(minuteAt(time, label.x)) * 60_000
      const told = new Intl.DateTimeFormat('en-GB', {
        timeZone: 'Europe/London',
        hour: '2-digit',
        minute: '2-digit',
      }).format(ms)
      if (/^\d\d:\d\d$/.test(label.text)) expect(label.text).toBe(told)
      else {
        days += 1
        expect(told).toBe('00:00')
      }
    }
    expect(days).toBe(1)
  })

  it('set the zone the animal is in at 600 and the other at 400', () => {
    const { marks, time, rulerYs } = corridor(calm, { width: 1392, chosenLegId: null })
    const first = texts(marks).filter((mark) => mark.y < (rulerYs[0] ?? 0) && mark.anchor === 'middle')
    for (const label of first) expect(label.weight).toBe(minuteAt(time, label.x) < 845 ? 600 : 400)
  })
})

describe('reading line', () => {
  const picture = corridor(input, { width: 1392, chosenLegId: null })

  it('finds its way back from x to minute', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: input.endMin }), (minute) => {
        expect(minuteAt(picture.time, xAt(picture.time, minute))).toBeCloseTo(minute, 6)
      }),
    )
  })

  it('starts where room is least', () => expect(narrowestMinute(input)).toBe(895))

  it('says time, leg, body and limit', () => {
    const reading = readingAt(input, 895, picture.temp, picture.air.temp)
    expect(reading.spoken).toBe(
      '03:15\u00a0GST, leg 8, body 40.5\u00a0°C, alarm high passed by 1.1\u00a0°C, crate air 35\u00a0°C',
    )
  })

  it('keeps its values 19 px apart and in order of height', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 100, max: 700, noNaN: true }), { minLength: 1, maxLength: 9 }),
        (ys) => {
          const rows = spaced(ys.map((y, index) => ({ name: String(index), value: '', strong: false, y })))
          rows.forEach((row, index) => {
            const next = rows[index + 1]
            if (next) expect(next.y - row.y).toBeGreaterThanOrEqual(18.999)
          })
          const order = [...ys.keys()].sort((a, b) => (ys[a] ?? 0) - (ys[b] ?? 0)).map(String)
          expect(rows.map((row) => row.name)).toEqual(order)
        },
      ),
    )
  })
})

describe('twins of the picture', () => {
  // By hand: 39.75 °C at minute 880 and 40.45 at 895 meet 40.2 at 889.6, which is 23:09 UTC, 03:09 in Muscat.
  it('say in one sentence what passes and when', () => {
    expect(corridorSummary(input)).toMatch(
      /^Corridor of Bramble over 9 legs: the track passes the critical limit high of 40\.2.°C on leg 7 from 03:09.GST\.$/,
    )
    expect(corridorSummary(calm)).toMatch(/stays inside its limits/)
  })

  it('hold the narrowest moment and every change of leg in the table', () => {
    const rows = corridorTable(input)
    for (const leg of legs) expect(rows.some((row) => row.key === String(leg.startMin))).toBe(true)
    expect(rows.some((row) => row.toAlarm === '−1.1\u00a0°C, high')).toBe(true)
    expect(rows.map((row) => Number(row.key))).toEqual(
      [...rows.map((row) => Number(row.key))].sort((a, b) => a - b),
    )
  })
})

describe('one leg on a phone', () => {
  it('shows the leg and four minutes of each neighbour in 15 px words', () => {
    const leg = legs[6]
    const picture = legCorridor(input, 'leg-7', { width: 358 })
    expect(picture?.time).toMatchObject({ fromMin: (leg?.startMin ?? 0) - 4, toMin: (leg?.endMin ?? 0) + 4 })
    for (const mark of texts(picture?.marks ?? [])) {
      expect(mark.size, mark.text).toBeGreaterThanOrEqual(15)
      expect(right(mark), mark.text).toBeLessThanOrEqual(360)
    }
  })
})

function texts(marks: readonly Mark[]): TextMark[] {
  return marks.filter((mark): mark is TextMark => mark.kind === 'text')
}

function width(mark: TextMark): number {
  return textWidth(mark.text, mark.face, mark.size, mark.weight)
}

function left(mark: TextMark): number {
  return mark.x - (mark.anchor === 'end' ? width(mark) : mark.anchor === 'middle' ? width(mark) / 2 : 0)
}

function right(mark: TextMark): number {
  return left(mark) + width(mark)
}
