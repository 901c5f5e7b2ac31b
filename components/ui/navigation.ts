export interface NavLink {
  href: string
  words: string
}

export type NavRole = 'dispatcher' | 'vet' | 'driver' | 'shipper' | 'admin'

/** The head's links for each role, in the order they are used. */
export const NAVIGATION: Record<NavRole, readonly NavLink[]> = {
  dispatcher: [
    { href: '/consignments', words: 'Consignments' },
    { href: '/limits', words: 'Limits' },
    { href: '/manifests', words: 'Manifests' },
  ],
  vet: [
    { href: '/review', words: 'Crate set-ups' },
    { href: '/consignments', words: 'Consignments' },
    { href: '/limits', words: 'Limits' },
  ],
  driver: [{ href: '/runs', words: 'Your runs' }],
  shipper: [
    { href: '/portal', words: 'Your consignments' },
    { href: '/portal/documents', words: 'Your documents' },
  ],
  admin: [
    { href: '/consignments', words: 'Consignments' },
    { href: '/limits', words: 'Limits' },
    { href: '/manifests', words: 'Manifests' },
    { href: '/admin', words: 'Admin' },
  ],
}

export const ROLE_WORDS: Record<NavRole, string> = {
  dispatcher: 'dispatcher',
  vet: 'vet',
  driver: 'driver',
  shipper: 'shipper',
  admin: 'admin',
}
