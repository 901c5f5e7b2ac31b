import { readdirSync } from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'
import type { Actor, Role } from '@/lib/policies/actor'
import { ROLES } from '@/lib/policies/actor'
import { HOME, ROUTE_POLICIES, mayOpen } from '@/lib/policies/routes'
import type { RoutePattern } from '@/lib/policies/routes'

const actor = (role: Role): Actor => ({
  id: 1,
  name: '',
  email: '',
  role,
  shipperId: role === 'shipper' ? 1 : null,
})

/** Every page and handler there is, as the pattern of its folder without groups. */
function patternsOfApp(folder = path.resolve('app'), at = ''): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    if (entry.isDirectory()) {
      const step = entry.name.startsWith('(') ? '' : `/${entry.name}`
      return patternsOfApp(path.join(folder, entry.name), at + step)
    }
    return /^(page|route)\.tsx?$/.test(entry.name) ? [at === '' ? '/' : at] : []
  })
}

it('every page and handler has its line', () => {
  const missing = patternsOfApp().filter((pattern) => !Object.hasOwn(ROUTE_POLICIES, pattern))
  expect(missing).toEqual([])
})

describe.each(ROLES)('a %s', (role) => {
  it('starts on a page it may open', () => {
    expect(mayOpen(actor(role), HOME[role])).toBe(true)
  })
  it.each(Object.keys(ROUTE_POLICIES) as RoutePattern[])('and %s', (pattern) => {
    const first = pattern.split('/')[1] ?? ''
    const owner: Record<string, Role> = { review: 'vet', runs: 'driver', portal: 'shipper', admin: 'admin' }
    const only = owner[first]
    if (only !== undefined) expect(mayOpen(actor(role), pattern)).toBe(role === only)
    if (role === 'driver' || role === 'shipper') {
      if (['consignments', 'species', 'crate-models'].includes(first))
        expect(mayOpen(actor(role), pattern)).toBe(false)
    }
  })
})

it('a visitor opens sign-in, verification and health, and nothing else', () => {
  const open = (Object.keys(ROUTE_POLICIES) as RoutePattern[]).filter((pattern) => mayOpen(null, pattern))
  expect(open.sort()).toEqual(
    ['/api/auth/[...nextauth]', '/api/health', '/api/verify', '/sign-in', '/verify', '/verify/[code]'].sort(),
  )
})
