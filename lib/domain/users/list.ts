import 'server-only'
import { Op, literal } from 'sequelize'
import type { WhereOptions } from 'sequelize'
import { z } from 'zod'
import { database } from '@/lib/db/connection'
import type { Actor } from '@/lib/policies/actor'
import type { UserQuery } from '@/lib/schemas/administration'
import type { UserRow } from '@/lib/views/administration'
import { models } from '@/models'
import type { User } from '@/models'
import { authorize } from '../authorize'
import { deskMoment } from '../firm'

export interface UserList {
  rows: UserRow[]
  /** How many the filters let through. */
  total: number
  /** Give it as `after` for the next names; null at the end. */
  after: string | null
}

/** The people of the firm and of its shippers, by name; paged by the last name shown, so that a new one moves nobody. */
export async function listUsers(actor: Actor, query: UserQuery): Promise<UserList> {
  authorize(actor, 'user.list')
  const filter = filterOf(query)
  const users = await models.User.findAll({
    where: { [Op.and]: [filter, ...beyond(query.after)] },
    attributes: { exclude: ['passwordHash'] },
    include: [{ association: 'shipper', attributes: ['name'] }],
    order: ['name', 'id'],
    limit: query.limit + 1,
  })
  const shown = users.slice(0, query.limit)
  const last = shown.at(-1)
  return {
    rows: shown.map(userRow),
    total: await models.User.count({ where: filter }),
    after: users.length > query.limit && last ? JSON.stringify([last.name, last.id]) : null,
  }
}

function filterOf({ find, role }: UserQuery): WhereOptions<User> {
  const words = find.replace(/[\\%_]/g, '\\$&')
  return {
    ...(role === null ? {} : { role }),
    ...(find === ''
      ? {}
      : { [Op.or]: [{ name: { [Op.like]: `%${words}%` } }, { email: { [Op.like]: `%${words}%` } }] }),
  }
}

const keySchema = z.tuple([z.string(), z.number().int()])

/** A key somebody made up shows the first page. */
function beyond(after: string | null): WhereOptions<User>[] {
  const key = keySchema.safeParse(parsed(after))
  if (!key.success) return []
  const [name, id] = key.data.map((value) => database().escape(value))
  return [
    literal(
      `(\`User\`.\`name\` > ${name} OR (\`User\`.\`name\` = ${name} AND \`User\`.\`id\` > ${id}))`,
    ) as unknown as WhereOptions<User>,
  ]
}

function parsed(text: string | null): unknown {
  try {
    return text === null ? null : JSON.parse(text)
  } catch {
    return null
  }
}

function userRow(user: User): UserRow {
  return {
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
  }
}
