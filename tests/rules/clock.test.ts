import { describe, expect, it } from 'vitest'
import { longestBy, spansBeyond, totalBy } from '@/lib/rules/clock'

describe('stretches beyond a limit', () => {
  it('start and end where the straight line crosses it', () => {
    const spans = spansBeyond(
      [
        { minute: 0, tempC: 20 },
        { minute: 100, tempC: 40 },
        { minute: 200, tempC: 20 },
      ],
      'high',
      30,
    )
    expect(spans[0]?.fromMin).toBeCloseTo(50, 4)
    expect(spans[0]?.toMin).toBeCloseTo(150, 4)
  })

  it('a steady air exactly at the limit is not beyond it', () => {
    const steady = (tempC: number) =>
      spansBeyond(
        [
          { minute: 0, tempC },
          { minute: 60, tempC },
        ],
        'high',
        30,
      )
    expect(steady(30)).toEqual([])
    expect(steady(30.01)).toEqual([{ fromMin: 0, toMin: 60 }])
  })

  it('a jump ends a stretch at once, and touching stretches are one', () => {
    const points = [
      { minute: 0, tempC: 35 },
      { minute: 60, tempC: 35 },
      { minute: 60, tempC: 32 },
      { minute: 90, tempC: 32 },
      { minute: 90, tempC: 20 },
      { minute: 120, tempC: 20 },
    ]
    expect(spansBeyond(points, 'high', 30)).toEqual([{ fromMin: 0, toMin: 90 }])
  })

  it('counts what has run by a minute: in a row, and in all', () => {
    const spans = [
      { fromMin: 0, toMin: 100 },
      { fromMin: 150, toMin: 300 },
    ]
    expect(longestBy(spans, 120, 200)).toBe(50)
    expect(longestBy(spans, 0, 300)).toBe(150)
    expect(totalBy(spans, 200)).toBe(150)
  })

  it('mirrors on the cold side', () => {
    expect(
      spansBeyond(
        [
          { minute: 0, tempC: 0 },
          { minute: 60, tempC: 0 },
        ],
        'low',
        5,
      ),
    ).toEqual([{ fromMin: 0, toMin: 60 }])
    expect(
      spansBeyond(
        [
          { minute: 0, tempC: 6 },
          { minute: 60, tempC: 6 },
        ],
        'low',
        5,
      ),
    ).toEqual([])
  })
})
