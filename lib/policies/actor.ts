export const ROLES = ['dispatcher', 'vet', 'driver', 'shipper', 'admin'] as const
export type Role = (typeof ROLES)[number]

/** Who is asking. Read from the database at each request, so that a changed role or a disabled account counts at once. */
export interface Actor {
  id: number
  name: string
  email: string
  role: Role
  /** Only a shipper's user has one: the firm this person speaks for. */
  shipperId: number | null
  /** Where the request came from, for the audit trail alone: no policy reads it. */
  ip?: string | null
}

export const ROLE_WORDS: Record<Role, string> = {
  dispatcher: 'Dispatcher',
  vet: 'Vet',
  driver: 'Driver',
  shipper: 'Shipper',
  admin: 'Admin',
}
