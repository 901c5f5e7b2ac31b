import { randomBytes } from 'node:crypto'
import { z } from 'zod'
import { hashPassword } from '@/lib/auth/password'
import { closeDatabase } from '@/lib/db/connection'
import { transaction } from '@/lib/db/transaction'
import { record } from '@/lib/domain/audit/record'
import { models } from '@/models'

/*
 * npm run first-admin -- "Name" address@example.org
 * The first account of an installation without the demo: later ones are the admin's to give. Its password is printed once.
 */
const input = z.tuple([z.string().trim().min(1).max(120), z.email()]).safeParse(process.argv.slice(2))

try {
  if (!input.success)
    throw new Error('Put a name and an e-mail address: npm run first-admin -- "Name" name@example.org')
  const [name, email] = input.data
  const password = randomBytes(12).toString('base64url')
  const passwordHash = await hashPassword(password)
  await transaction(async (tx) => {
    const known = await models.User.count({ where: { role: 'admin', disabledAt: null }, transaction: tx })
    if (known > 0)
      throw new Error('There is an admin already: further accounts are made on the admin’s own page.')
    const user = await models.User.create({ name, email, role: 'admin', passwordHash }, { transaction: tx })
    await record(tx, {
      actor: null,
      verb: 'user.first-admin',
      subject: { type: 'user', id: user.id },
      at: new Date(),
      after: { name, email, role: 'admin' },
    })
  })
  console.log(`Made. Sign in as ${email} with the password ${password}`)
} catch (error) {
  console.error(error instanceof Error ? error.message : error)
  process.exitCode = 1
} finally {
  await closeDatabase()
}
