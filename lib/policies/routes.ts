import type { Actor, Role } from './actor'

export type Opening = 'public' | 'signed-in' | readonly Role[]

const DESK: readonly Role[] = ['dispatcher', 'vet', 'admin']

/**
 * Who may open each page and handler. A pattern is the folder under app/ without its groups. A page still asks the
 * policy of the record it shows; this table says whose kind of page it is.
 */
export const ROUTE_POLICIES = {
  '/': 'signed-in',
  '/sign-in': 'public',
  '/verify': 'public',
  '/verify/[code]': 'public',

  '/consignments': DESK,
  '/consignments/new': ['dispatcher'],
  '/consignments/[consignmentId]': DESK,
  '/consignments/[consignmentId]/plan': DESK,
  '/consignments/[consignmentId]/sheet': DESK,
  '/species': DESK,
  '/species/[key]': DESK,

  '/review': ['vet'],
  '/review/[consignmentId]': ['vet'],

  '/runs': ['driver'],
  '/runs/[consignmentId]': ['driver'],

  '/portal': ['shipper'],
  '/portal/[consignmentId]': ['shipper'],

  '/admin': ['admin'],
  '/admin/users': ['admin'],
  '/admin/mail': ['admin'],
  '/admin/audit': ['admin'],
  '/admin/certificate': ['admin'],

  '/api/auth/[...nextauth]': 'public',
  '/api/health': 'public',
  '/api/verify': 'public',
  '/api/review': ['vet'],
  '/api/consignments': DESK,
  '/api/consignments/[consignmentId]/status': DESK,
  '/api/documents/[documentId]/pdf': 'signed-in',
  '/api/runs/[consignmentId]/entries': ['driver'],
} as const satisfies Record<string, Opening>

export type RoutePattern = keyof typeof ROUTE_POLICIES

/** Whether somebody may open a page or handler of this kind; null is a visitor who is not signed in. */
export function mayOpen(actor: Actor | null, pattern: RoutePattern): boolean {
  const opening: Opening = ROUTE_POLICIES[pattern]
  if (opening === 'public') return true
  if (actor === null) return false
  return opening === 'signed-in' || opening.includes(actor.role)
}

/** Where each role starts after signing in. */
export const HOME: Record<Role, RoutePattern> = {
  dispatcher: '/consignments',
  vet: '/review',
  driver: '/runs',
  shipper: '/portal',
  admin: '/admin/users',
}
