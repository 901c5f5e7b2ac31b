import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import type { UserRow } from '@/lib/views/administration'
import { models } from '@/models'
import { authorize } from '../authorize'
import { deskMoment } from '../firm'

export interface UserList {
  rows: UserRow[]
  total: number
}

/** The people of the firm and of its shippers, by role and name. */
export async function listUsers(
  actor: Actor,
  { offset = 0, limit = 100 }: { offset?: number; limit?: number } = {},
): Promise<UserList> {
  authorize(actor, 'user.list')
  const { rows, count } = await models.User.findAndCountAll({
    attributes: { exclude: ['passwordHash'] },
    include: [{ association: 'shipper', attributes: ['name'] }],
    order: ['role', 'name', 'id'],
    offset,
    limit,
  })
  return {
    total: count,
    rows: rows.map((user) => ({
      id: user.id,
      name: user.name,
      email: user.email,
      telephone: user.telephone,
      role: user.role,
      shipperName: user.shipper?.name ?? null,
      since: deskMoment(user.createdAt),
      offSince: user.disabledAt && deskMoment(user.disabledAt),
      registration:
        user.registrationNumber === null || user.registrationExpiresOn === null
          ? null
          : {
              number: user.registrationNumber,
              country: user.registrationCountry ?? '',
              expiresOn: user.registrationExpiresOn,
              checked: user.registrationCheckedAt && deskMoment(user.registrationCheckedAt),
            },
    })),
  }
}
