import { readFileSync, readdirSync } from 'node:fs'
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

interface Stands {
  pattern: string
  file: string
}

/** Every page and handler there is, with the pattern of its folder without groups. */
function standsInApp(folder = path.resolve('app'), at = ''): Stands[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const file = path.join(folder, entry.name)
    if (entry.isDirectory()) return standsInApp(file, entry.name.startsWith('(') ? at : `${at}/${entry.name}`)
    return /^(page|route)\.(ts|tsx|js|jsx|mjs|mdx)$/.test(entry.name)
      ? [{ pattern: at === '' ? '/' : at, file }]
      : []
  })
}

const standing = standsInApp()

it('the table names every page and handler there is, and nothing else', () => {
  expect(standing.length).toBeGreaterThan(20)
  expect(standing.map(({ pattern }) => pattern).sort()).toEqual(Object.keys(ROUTE_POLICIES).sort())
})

/** Shows nothing: it only sends each role on to a page that asks for itself. */
const SENDS_ON = '/'

describe.each(standing.filter(({ pattern }) => !mayOpen(null, pattern as RoutePattern)))(
  '$pattern',
  ({ pattern, file }) => {
    it('asks the table about itself before it shows anything', () => {
      const source = readFileSync(file, 'utf8')
      if (pattern === SENDS_ON) {
        expect(source).toContain('redirect(')
        expect(source).not.toContain('return')
        return
      }
      const asked = [
        ...source.matchAll(/\b(?:openPage|mayOpen|jsonRoute|bytesRoute)\(\s*(?:actor,\s*)?'([^']+)'/g),
      ]
      expect(asked.map(([, named]) => named)).toEqual([pattern])
    })
  },
)

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
      if (['consignments', 'species'].includes(first)) expect(mayOpen(actor(role), pattern)).toBe(false)
    }
  })
})

it('a visitor opens sign-in, verification and health, and nothing else', () => {
  const open = (Object.keys(ROUTE_POLICIES) as RoutePattern[]).filter((pattern) => mayOpen(null, pattern))
  expect(open.sort()).toEqual(
    ['/api/auth/[...nextauth]', '/api/health', '/api/verify', '/sign-in', '/verify', '/verify/[code]'].sort(),
  )
})
