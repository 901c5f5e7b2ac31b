import { readFileSync, readdirSync } from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'
import type { Actor, Role } from '@/lib/policies/actor'
import { ROLES } from '@/lib/policies/actor'
import { actsNow } from '@/lib/policies/acts'
import { VERBS, can, mayEver } from '@/lib/policies/can'
import type { Verb } from '@/lib/policies/can'
import { visibleParts } from '@/lib/policies/consignment'

/*
 * Who may do what, written out by hand from the firm's rules and not from the table: d dispatcher, v vet, r driver,
 * s shipper, a admin. A capital letter may it always, a small one only on own records, nothing else at all.
 */
const MATRIX: Record<Verb, string> = {
  'consignment.list': 'DVSA',
  'consignment.create': 'D',
  'consignment.read': 'DVrsA',
  'consignment.save': 'D',
  'consignment.assess': 'D',
  'consignment.submit': 'D',
  'consignment.release': 'D',
  'consignment.cancel': 'D',
  'consignment.confirm-air': 'D',
  'consignment.confirm-condition': 'D',
  'consignment.record-instruction': 'D',
  'consignment.depart': 'Dr',
  'consignment.deliver': 'Dr',
  'consignment.stop': 'Dr',
  'consignment.acknowledge': 's',
  'consignment.ask-change': 's',
  'approval.queue': 'V',
  'approval.approve': 'V',
  'approval.return': 'V',
  'approval.withdraw': 'V',
  'approval.override': 'V',
  'run.list': 'R',
  'run.enter': 'r',
  'run.hand-over': 'r',
  'document.read': 'DVrsA',
  'user.list': 'A',
  'species.read': 'DVA',
  'certificate.write': 'A',
  'mail.list': 'A',
  'mail.resend': 'A',
  'audit.list': 'A',
}

const LETTER: Record<Role, string> = { dispatcher: 'd', vet: 'v', driver: 'r', shipper: 's', admin: 'a' }
const ACTORS: Record<Role, Actor> = {
  dispatcher: { id: 1, name: 'D', email: 'd@example.org', role: 'dispatcher', shipperId: null },
  vet: { id: 2, name: 'V', email: 'v@example.org', role: 'vet', shipperId: null },
  driver: { id: 3, name: 'R', email: 'r@example.org', role: 'driver', shipperId: null },
  shipper: { id: 4, name: 'S', email: 's@example.org', role: 'shipper', shipperId: 12 },
  admin: { id: 5, name: 'A', email: 'a@example.org', role: 'admin', shipperId: null },
}
/** A record that is the driver's and the shipper's own, and one that is neither's; each serves every verb. */
const OWN = { shipperId: 12, driverIds: [3], driverId: 3, kind: 'manifest' as const }
const OTHER = { shipperId: 98, driverIds: [33], driverId: 33, kind: 'manifest' as const }
const ask = (actor: Actor | null, verb: Verb, facts: unknown) => can(actor, verb, facts as never)

it('speaks of every verb', () => {
  expect(Object.keys(MATRIX).sort()).toEqual([...VERBS].sort())
})

it('holds no verb that nobody asks about', () => {
  const files = ['lib/domain', 'lib/views', 'app', 'components'].flatMap((folder) =>
    readdirSync(folder, { recursive: true, encoding: 'utf8' })
      .filter((name) => /\.tsx?$/.test(name))
      .map((name) => path.join(folder, name)),
  )
  const source = [...files, 'lib/policies/acts.ts'].map((file) => readFileSync(file, 'utf8')).join('\n')
  expect(VERBS.filter((verb) => !source.includes(`'${verb}'`))).toEqual([])
})

describe.each(ROLES)('a %s', (role) => {
  it.each(VERBS)('and %s', (verb) => {
    const always = MATRIX[verb].includes(LETTER[role].toUpperCase())
    const own = always || MATRIX[verb].includes(LETTER[role])
    expect(ask(ACTORS[role], verb, OWN)).toBe(own)
    expect(ask(ACTORS[role], verb, OTHER)).toBe(always)
    expect(ask(ACTORS[role], verb, undefined)).toBe(always)
    expect(mayEver(ACTORS[role], verb)).toBe(own)
  })
})

describe('fails closed', () => {
  it.each(VERBS)('nobody signed in may %s', (verb) => {
    expect(ask(null, verb, OWN)).toBe(false)
  })
  it('for an unknown role, an unknown verb, and names every object has', () => {
    const stranger = { ...ACTORS.admin, role: 'owner' as Role }
    expect(ask(stranger, 'audit.list', undefined)).toBe(false)
    expect(ask({ ...stranger, role: 'toString' as Role }, 'audit.list', undefined)).toBe(false)
    for (const verb of ['consignment.delete', 'toString', 'constructor', '__proto__'] as unknown as Verb[]) {
      expect(ask(ACTORS.admin, verb, OWN)).toBe(false)
    }
  })
  it('for a shipper’s user without a shipper, even on a record without one', () => {
    const nobody = { ...ACTORS.shipper, shipperId: null }
    expect(ask(nobody, 'consignment.read', { shipperId: null, driverIds: [] })).toBe(false)
  })
  it('for a driver before anything is released', () => {
    expect(ask(ACTORS.driver, 'consignment.read', { shipperId: 12, driverIds: [] })).toBe(false)
    expect(ask(ACTORS.driver, 'run.enter', { driverId: null })).toBe(false)
  })
})

it('a driver reads the manifest of an own run and not the go/no-go sheet', () => {
  expect(ask(ACTORS.driver, 'document.read', { ...OWN, kind: 'go_no_go' })).toBe(false)
  expect(ask(ACTORS.shipper, 'document.read', { ...OWN, kind: 'go_no_go' })).toBe(true)
})

it('shows each role its own parts of a consignment, and strangers none', () => {
  expect(visibleParts(ACTORS.driver, OWN)).toEqual(['run', 'documents'])
  expect(visibleParts(ACTORS.shipper, OWN)).toEqual(['documents', 'shipper-contacts'])
  expect(visibleParts(ACTORS.vet, OTHER)).toContain('assessment')
  expect(visibleParts(ACTORS.driver, OTHER)).toEqual([])
  expect(visibleParts(ACTORS.shipper, OTHER)).toEqual([])
})

describe('buttons', () => {
  it('are those of policy and state together', () => {
    const standing = (
      state: 'draft' | 'assessed' | 'approved' | 'released' | 'under_way',
      inForceState: 'released' | 'under_way' | null = null,
    ) => ({ state, inForceState })
    const acts = (role: Role, at: ReturnType<typeof standing>) => actsNow(ACTORS[role], OWN, at)
    expect(acts('dispatcher', standing('draft'))).toEqual(['save', 'assess', 'cancel'])
    expect(acts('dispatcher', standing('assessed'))).toEqual(['save', 'assess', 'submit', 'cancel'])
    expect(acts('dispatcher', standing('approved'))).toEqual(['save', 'assess', 'release', 'cancel'])
    expect(acts('dispatcher', standing('released', 'released'))).toEqual(['save', 'depart', 'cancel'])
    expect(acts('driver', standing('draft', 'released'))).toEqual(['depart'])
    expect(acts('driver', standing('under_way', 'under_way'))).toEqual(['deliver', 'stop'])
    expect(acts('dispatcher', standing('draft', 'under_way'))).toEqual(['deliver', 'stop'])
    expect(acts('vet', standing('approved'))).toEqual([])
    expect(acts('admin', standing('released', 'released'))).toEqual([])
  })
})
