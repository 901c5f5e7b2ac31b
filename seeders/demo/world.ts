import { hashPassword } from '@/lib/auth/password'
import { models } from '@/models'
import type { DemoWorld } from './consignments/common'
import { DEMO_PASSWORD, DEMO_PEOPLE, DEMO_SHIPPERS } from './people'
import type { DemoPlaceKey } from './places'
import { DEMO_PLACES } from './places'

/** Finds or makes the demo's shippers, people and places. */
export async function demoWorld(now: Date): Promise<DemoWorld> {
  const shippers: Record<string, number> = {}
  for (const shipper of DEMO_SHIPPERS) {
    const [row] = await models.Shipper.findOrCreate({
      where: { accountNo: shipper.accountNo },
      defaults: { ...shipper },
    })
    shippers[shipper.accountNo] = row.id
  }
  return { shippers, people: await people(shippers, now), places: await places(), now }
}

async function people(shippers: Readonly<Record<string, number>>, now: Date) {
  const ids: Record<string, number> = {}
  const missing = await passwordForNewcomers()
  // The admin comes first: it is the admin who checked the vet's registration.
  const adminFirst = [...DEMO_PEOPLE].sort((a, b) => Number(b.role === 'admin') - Number(a.role === 'admin'))
  for (const { key, name, email, role, telephone, shipperAccount, registration } of adminFirst) {
    const checked = registration && {
      registrationNumber: registration.number,
      registrationCountry: registration.country,
      registrationExpiresOn: `${now.getUTCFullYear() + 2}-03-31`,
      registrationCheckedBy: ids['admin'] ?? null,
      registrationCheckedAt: now,
    }
    const [row] = await models.User.findOrCreate({
      where: { email },
      defaults: {
        name,
        email,
        role,
        telephone,
        passwordHash: missing,
        shipperId: shipperAccount === undefined ? null : (shippers[shipperAccount] ?? null),
        registrationNumber: null,
        registrationCountry: null,
        registrationExpiresOn: null,
        registrationCheckedBy: null,
        registrationCheckedAt: null,
        disabledAt: null,
        ...checked,
      },
    })
    ids[key] = row.id
  }
  return ids
}

const passwordForNewcomers = () => hashPassword(DEMO_PASSWORD)

async function places(): Promise<Record<DemoPlaceKey, number>> {
  const entries = await Promise.all(
    Object.entries(DEMO_PLACES).map(async ([key, place]) => {
      const [row] = await models.Place.findOrCreate({ where: { name: place.name }, defaults: { ...place } })
      return [key, row.id] as const
    }),
  )
  return Object.fromEntries(entries) as Record<DemoPlaceKey, number>
}
