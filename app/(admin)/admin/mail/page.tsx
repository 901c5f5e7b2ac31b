import { randomUUID } from 'node:crypto'
import type { Metadata } from 'next'
import { openPage, orNotFound, queryText, rowIdOf } from '@/app/open-page'
import { AdminPages } from '@/components/admin/admin-pages'
import { FilterBar } from '@/components/admin/filter-bar'
import { MailPreview } from '@/components/admin/mail-preview'
import { MAIL_STATE_WORDS } from '@/components/admin/mail-state'
import { MailTable } from '@/components/admin/mail-table'
import { PageLinks } from '@/components/admin/page-links'
import { ResendMail } from '@/components/admin/resend-mail'
import { TextInput } from '@/components/forms/text-input'
import { FieldSet } from '@/components/forms/field'
import { Tick } from '@/components/forms/ticks'
import { Empty } from '@/components/ui/notice'
import { Page, PageTitle } from '@/components/ui/section'
import { listMail, loadMail } from '@/lib/domain/mail/list'
import { MAIL_STATES, mailQuerySchema } from '@/lib/schemas/administration'
import { counted } from '@/lib/views/format'
import { addressOf } from '../address'
import { resend } from './actions'

export const metadata: Metadata = { title: 'Mail queue' }
export const dynamic = 'force-dynamic'

export default async function MailPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const actor = await openPage('/admin/mail', '/admin/mail')
  const asked = await searchParams
  const before = Number(queryText(asked['before']))
  const query = mailQuerySchema.parse({
    find: queryText(asked['find']),
    states: [asked['state'] ?? []].flat(),
    before: before > 0 ? before : null,
  })
  const { rows, counts, before: older } = await listMail(actor, query)
  const chosen = queryText(asked['mail'])
  const mail = chosen === '' ? null : await orNotFound(loadMail(actor, { mailId: rowIdOf(chosen) }))
  const filters = { find: query.find, state: query.states }
  const here = { ...filters, before: query.before }
  return (
    <Page>
      <PageTitle words={`${counts.uncertain + counts.failed} to decide, ${counts.waiting} waiting`}>
        Mail queue
      </PageTitle>
      <AdminPages current="/admin/mail" />
      <div className={mail ? 'grid items-start gap-6 board:grid-cols-[minmax(0,1fr)_376px]' : undefined}>
        <div className="min-w-0">
          <FilterBar action="/admin/mail">
            <TextInput id="find" name="find" label="Find mark or address" defaultValue={query.find} />
            <FieldSet id="states" legend="State; none ticked means all" className="pb-1.5">
              <span className="flex flex-wrap gap-x-4 gap-y-1">
                {MAIL_STATES.map((state) => (
                  <Tick
                    key={state}
                    id={`state-${state}`}
                    name="state"
                    value={state}
                    defaultChecked={query.states.includes(state)}
                    label={`${MAIL_STATE_WORDS[state]}, ${counts[state]}`}
                  />
                ))}
              </span>
            </FieldSet>
          </FilterBar>
          {rows.length === 0 ? (
            <Empty>No mail answers these questions.</Empty>
          ) : (
            <>
              <MailTable
                rows={rows}
                chosenId={mail?.id ?? null}
                hrefOf={(row) => addressOf('/admin/mail', { ...here, mail: row.id })}
              />
              <PageLinks
                words={counted(rows.length, 'mail')}
                before={{
                  href: query.before === null ? null : addressOf('/admin/mail', filters),
                  words: 'Newest',
                  none: 'These are the newest',
                }}
                after={{
                  href: older === null ? null : addressOf('/admin/mail', { ...filters, before: older }),
                  words: 'Older',
                  none: 'There is none older',
                }}
              />
            </>
          )}
        </div>
        {mail && (
          <MailPreview mail={mail}>
            <ResendMail
              key={mail.id}
              mailId={mail.id}
              state={mail.state}
              action={resend}
              requestId={randomUUID()}
            />
          </MailPreview>
        )}
      </div>
    </Page>
  )
}
