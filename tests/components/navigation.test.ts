import fs from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'
import { NAVIGATION } from '@/components/ui/navigation'
import type { NavRole } from '@/components/ui/navigation'
import { ROUTE_POLICIES } from '@/lib/policies/routes'

describe('links of the head', () => {
  for (const [role, links] of Object.entries(NAVIGATION) as [NavRole, (typeof NAVIGATION)[NavRole]][]) {
    it(`of a ${role} lead only to pages that are there and that a ${role} may open`, () => {
      for (const { href } of links) {
        const opening: unknown = ROUTE_POLICIES[href as keyof typeof ROUTE_POLICIES]
        const open =
          opening === 'public' ||
          opening === 'signed-in' ||
          (Array.isArray(opening) && opening.includes(role))
        expect(open, href).toBe(true)
        expect(pages(), href).toContain(href)
      }
    })
  }
})

/** Addresses of every page under app/, groups left out. */
function pages(): string[] {
  const files = fs.readdirSync(path.join(process.cwd(), 'app'), { recursive: true, encoding: 'utf8' })
  return files
    .filter((file) => path.basename(file) === 'page.tsx')
    .map(
      (file) =>
        `/${path
          .dirname(file)
          .split(path.sep)
          .filter((part) => !part.startsWith('(') && part !== '.')
          .join('/')}`,
    )
}
