import type { Metadata } from 'next'
import { openPage, queryText } from '@/app/open-page'
import { AdminPages } from '@/components/admin/admin-pages'
import { FilterBar } from '@/components/admin/filter-bar'
import { PageLinks } from '@/components/admin/page-links'
import { UsersTable } from '@/components/admin/users-table'
import { SelectField } from '@/components/forms/select-field'
import { TextInput } from '@/components/forms/text-input'
import { Empty } from '@/components/ui/notice'
import { Page, PageTitle } from '@/components/ui/section'
import { FIRM_ZONE } from '@/lib/domain/firm'
import { listUsers } from '@/lib/domain/users/list'
import { toLocalTime } from '@/lib/planning/local-time'
import { ROLES, ROLE_WORDS } from '@/lib/policies/actor'
import { userQuerySchema } from '@/lib/schemas/administration'
import { counted } from '@/lib/views/format'
import type { UserRow } from '@/lib/views/administration'
import { addressOf } from '../address'

export const metadata: Metadata = { title: 'Users' }
export const dynamic = 'force-dynamic'

export default async function UsersPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const actor = await openPage('/admin/users', '/admin/users')
  const asked = await searchParams
  const role = queryText(asked['role'])
  const after = queryText(asked['after'])
  const query = userQuerySchema.parse({
    find: queryText(asked['find']),
    role: role === '' ? null : role,
    after: after === '' ? null : after,
  })
  const { rows, total, after: next } = await listUsers(actor, query)
  const filters = { find: query.find, role: query.role }
  return (
    <Page>
      <PageTitle>Users</PageTitle>
      <AdminPages current="/admin/users" />
      <FilterBar action="/admin/users" words="Find">
        <TextInput id="find" name="find" label="Find name or address" defaultValue={query.find} />
        <SelectField
          id="role"
          name="role"
          label="Role"
          none="All roles"
          defaultValue={query.role ?? ''}
          choices={ROLES.map((one) => ({ value: one, words: ROLE_WORDS[one] }))}
        />
      </FilterBar>
      {rows.length === 0 ? (
        <Empty>Nobody by this name, address or role.</Empty>
      ) : (
        <>
          <UsersTable rows={rows} today={toLocalTime(new Date().getTime(), FIRM_ZONE).slice(0, 10)} />
          <p className="mt-1.5 text-small text-mute">
            Double rule: something for you to do. A vet whose registration has ended, or was not checked,
            can’t sign.
          </p>
          <PageLinks
            words={spanWords(rows, total)}
            before={{
              href: query.after === null ? null : addressOf('/admin/users', filters),
              words: 'From the first name',
              none: 'These are the first names',
            }}
            after={{
              href: next === null ? null : addressOf('/admin/users', { ...filters, after: next }),
              words: next === null ? 'Names after' : `Names after ${rows.at(-1)?.name ?? ''}`,
              none: 'These are the last names',
            }}
          />
        </>
      )}
    </Page>
  )
}

/** "12 users, Adeyemi-Ross to Varden-Lisle, of 33" */
function spanWords(rows: readonly UserRow[], total: number): string {
  return `${counted(rows.length, 'user')}, ${rows[0]?.name ?? ''} to ${rows.at(-1)?.name ?? ''}, of ${total}`
}
