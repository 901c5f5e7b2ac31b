export interface NavLink {
  href: string
  words: string
}

export type NavRole = 'dispatcher' | 'vet' | 'driver' | 'shipper' | 'admin'

const CONSIGNMENTS = { href: '/consignments', words: 'Consignments' }
const LIMITS = { href: '/species', words: 'Limits' }
const CHECK = { href: '/verify', words: 'Check a paper' }

/** The head's links for each role, in the order they are used; only pages the role may open (tests/components). */
export const NAVIGATION: Record<NavRole, readonly NavLink[]> = {
  dispatcher: [CONSIGNMENTS, LIMITS, CHECK],
  vet: [{ href: '/review', words: 'Crate set-ups' }, CONSIGNMENTS, LIMITS],
  driver: [{ href: '/runs', words: 'Your runs' }, CHECK],
  shipper: [{ href: '/portal', words: 'Your consignments' }, CHECK],
  admin: [{ href: '/admin', words: 'Admin' }, CONSIGNMENTS, LIMITS, CHECK],
}

export const ROLE_WORDS: Record<NavRole, string> = {
  dispatcher: 'dispatcher',
  vet: 'vet',
  driver: 'driver',
  shipper: 'shipper',
  admin: 'admin',
}
