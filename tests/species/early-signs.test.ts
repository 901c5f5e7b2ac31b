import { describe, expect, it } from 'vitest'
import { catalogue } from '@/lib/species'
import { earlySignsOf } from '@/lib/species/early-signs'
import { earlySignSchema } from '@/lib/schemas/approval'

describe('early signs', () => {
  it.each(Object.keys(catalogue))('are offered for %s, short enough to be signed', (key) => {
    const signs = earlySignsOf(key)
    expect(signs.length).toBeGreaterThanOrEqual(2)
    expect(new Set(signs).size).toBe(signs.length)
    for (const text of signs)
      expect(earlySignSchema.safeParse({ crateId: 'crate-a', text }).success).toBe(true)
  })

  it('are none for a species nobody has written down', () => {
    expect(earlySignsOf('unicorn')).toEqual([])
  })
})
