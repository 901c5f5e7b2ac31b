import type { Metadata } from 'next'
import { openPage, queryText } from '@/app/open-page'
import { AdminPages } from '@/components/admin/admin-pages'
import { AuditTable } from '@/components/admin/audit-table'
import { FilterBar } from '@/components/admin/filter-bar'
import { PageLinks } from '@/components/admin/page-links'
import { SelectField } from '@/components/forms/select-field'
import { TextInput } from '@/components/forms/text-input'
import { Tick } from '@/components/forms/ticks'
import { Empty } from '@/components/ui/notice'
import { Page, PageTitle } from '@/components/ui/section'
import { listAudit } from '@/lib/domain/audit/list'
import { FIRM_ZONE } from '@/lib/domain/firm'
import { listUsers } from '@/lib/domain/users/list'
import { auditQuerySchema } from '@/lib/schemas/audit'
import { userQuerySchema } from '@/lib/schemas/administration'
import { count, zoneName } from '@/lib/views/format'
import { addressOf } from '../address'

export const metadata: Metadata = { title: 'Audit trail' }
export const dynamic = 'force-dynamic'

const LINES = 50
const MOST_PEOPLE = 200

export default async function AuditPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const actor = await openPage('/admin/audit', '/admin/audit')
  const asked = await searchParams
  const word = (name: string) => queryText(asked[name])
  const number = (name: string) => (word(name) === '' ? null : Number(word(name)))
  const day = (name: string) => (word(name) === '' ? null : word(name))
  const query = auditQuerySchema.parse({
    actorId: number('who'),
    consignmentId: number('consignment'),
    verb: word('what'),
    refused: word('refused') !== '',
    from: day('from'),
    to: day('to'),
    before: number('before'),
    limit: LINES,
  })
  const { rows, before: older } = await listAudit(actor, query)
  const people = await listUsers(actor, userQuerySchema.parse({ limit: MOST_PEOPLE }))
  const filters = {
    who: query.actorId,
    consignment: query.consignmentId,
    what: query.verb,
    refused: query.refused ? '1' : '',
    from: query.from,
    to: query.to,
  }
  const here = { ...filters, before: query.before }
  const [newest, oldest] = [rows[0], rows.at(-1)]
  return (
    <Page>
      <PageTitle words="append-only: the database refuses to change or remove a row">Audit trail</PageTitle>
      <AdminPages current="/admin/audit" />
      <FilterBar action="/admin/audit">
        <SelectField
          id="who"
          name="who"
          label="Who"
          none="Everybody"
          defaultValue={query.actorId === null ? '' : String(query.actorId)}
          choices={people.rows.map(({ id, name }) => ({ value: String(id), words: name }))}
        />
        <TextInput id="what" name="what" label="What begins with" defaultValue={query.verb} maxLength={60} />
        <TextInput
          id="consignment"
          name="consignment"
          label="Consignment’s number"
          inputMode="numeric"
          defaultValue={query.consignmentId === null ? '' : String(query.consignmentId)}
        />
        <TextInput id="from" name="from" type="date" label="From day, UTC" defaultValue={query.from ?? ''} />
        <TextInput id="to" name="to" type="date" label="To day, UTC" defaultValue={query.to ?? ''} />
        <Tick
          id="refused"
          name="refused"
          value="1"
          defaultChecked={query.refused}
          label="Only what was refused"
        />
      </FilterBar>
      {newest === undefined || oldest === undefined ? (
        <Empty>No row answers these questions.</Empty>
      ) : (
        <>
          <AuditTable
            rows={rows}
            chosenId={number('row')}
            hrefOf={(row) => addressOf('/admin/audit', { ...here, row: row?.id })}
            hrefOfConsignment={(row) => addressOf('/admin/audit', { consignment: row.consignmentId })}
            zoneWords={zoneName(newest.at.ms, FIRM_ZONE)}
          />
          <PageLinks
            words={`${rows.length} rows, ${count(newest.id)} to ${count(oldest.id)}`}
            before={{
              href: query.before === null ? null : addressOf('/admin/audit', filters),
              words: 'Newest',
              none: 'These are the newest',
            }}
            after={{
              href: older === null ? null : addressOf('/admin/audit', { ...filters, before: older }),
              words: `Older than ${count(oldest.id)}`,
              none: 'There is none older',
            }}
          />
        </>
      )}
    </Page>
  )
}
