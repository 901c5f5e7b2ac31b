import { hash } from '@node-rs/argon2'
import type { User } from '@/models'
import { models } from '@/models'

/** Everybody's password in tests. */
export const PASSWORD = 'nine lights at Ardrossan'

export interface Cast {
  dispatcher: User
  otherDispatcher: User
  vet: User
  otherVet: User
  /** A vet whose registration nobody has checked. */
  uncheckedVet: User
  driver: User
  otherDriver: User
  shipper: User
  otherShipper: User
  admin: User
  /** An account that was closed. */
  gone: User
}

const FIRST_ID = 101
const checked = { registrationCheckedBy: 110, registrationCheckedAt: new Date('2026-01-12T09:00:00Z') }
const registration = (registrationNumber: string) => ({
  registrationNumber,
  registrationCountry: 'GB',
  registrationExpiresOn: '2027-03-31',
  ...checked,
})

const PEOPLE = {
  dispatcher: { name: 'I. Quennell', role: 'dispatcher', telephone: '+44 141 496 0388' },
  otherDispatcher: { name: 'N. Adeyemi-Ross', role: 'dispatcher', telephone: '+44 141 496 0388' },
  vet: { name: 'S. Halloway-Odu', role: 'vet', telephone: '+44 7700 900418', ...registration('VR 40 817') },
  otherVet: {
    name: 'T. Ilves-Marr',
    role: 'vet',
    telephone: '+44 7700 900426',
    ...registration('VR 38 204'),
  },
  uncheckedVet: { name: 'M. Rask-Oyelaran', role: 'vet', telephone: '+44 7700 900433' },
  driver: { name: 'C. Bellweather', role: 'driver', telephone: '+44 7700 900387' },
  otherDriver: { name: 'R. Okonjo-Blyth', role: 'driver', telephone: '+44 7700 900391' },
  shipper: { name: 'J. Strand-Ekdahl', role: 'shipper', telephone: '+44 7700 900562', shipperId: 12 },
  otherShipper: { name: 'H. Varden-Lisle', role: 'shipper', telephone: '+44 7700 900614', shipperId: 98 },
  admin: { name: 'A. Penhallow', role: 'admin', telephone: '+44 141 496 0389' },
  gone: { name: 'P. Tolland', role: 'driver', telephone: '', disabledAt: new Date('2026-05-02T08:00:00Z') },
} as const

const SHIPPERS = [
  { id: 12, accountNo: '0412', name: 'J. Strand-Ekdahl', email: 'j.strand@example.org' },
  { id: 98, accountNo: '0398', name: 'Varden-Lisle family', email: 'h.varden@example.org' },
]

let passwordHash: string | undefined

/**
 * The firm's people, always the same, with numbers lower than any row made later. Sign-in addresses are the key of the
 * person: dispatcher@example.org, otherVet@example.org. Call it once per test, on empty tables.
 */
export async function cast(): Promise<Cast> {
  passwordHash ??= await hash(PASSWORD)
  const address = '4 Quay Street, Greenock'
  await models.Shipper.bulkCreate(SHIPPERS.map((one) => ({ ...one, address, telephone: '+44 141 496 0207' })))
  const rows = Object.entries(PEOPLE).map(([key, person], index) => ({
    id: FIRST_ID + index,
    email: `${key}@example.org`,
    passwordHash: passwordHash ?? '',
    ...person,
  }))
  // The admin first: a vet's registration names who checked it.
  await models.User.bulkCreate(
    [...rows].sort((a, b) => Number(b.role === 'admin') - Number(a.role === 'admin')),
  )
  const users = await models.User.findAll({ where: { id: rows.map(({ id }) => id) } })
  const entries = rows.map((row) => [row.email.split('@')[0], users.find(({ id }) => id === row.id)])
  return Object.fromEntries(entries) as Cast
}
