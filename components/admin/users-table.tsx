import { Cell, Head, Ledger, RowHead } from '@/components/ui/ledger'
import { Attention } from '@/components/ui/notice'
import { ROLE_WORDS } from '@/lib/policies/actor'
import { calendarDay } from '@/lib/views/calendar-day'
import { countryName } from '@/lib/views/country-name'
import { dayDateYear } from '@/lib/views/format'
import type { RegistrationView, UserRow } from '@/lib/views/administration'
import { registrationTrouble } from './registration-trouble'

/** People of the firm and of its shippers. A double rule: a vet's record that needs somebody. */
export function UsersTable({ rows, today }: { rows: readonly UserRow[]; today: string }) {
  return (
    <Ledger caption="Users by name" folds>
      <thead>
        <tr>
          <Head>Name</Head>
          <Head>Role</Head>
          <Head>State</Head>
          <Head>Telephone</Head>
          <Head>Vet’s registration, end</Head>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.id}>
            <RowHead>
              <span className="block font-semibold">{row.name}</span>
              <span className="block text-small font-normal text-mute">{row.email}</span>
            </RowHead>
            <Cell label="Role">
              {ROLE_WORDS[row.role]}
              {row.shipperName && <span className="block text-small text-mute">{row.shipperName}</span>}
            </Cell>
            <Cell label="State">
              {row.offSince ? 'Off' : 'Active'}
              <span className="block text-small text-mute">
                since {dayDateYear((row.offSince ?? row.since).ms, row.since.zone)}
              </span>
            </Cell>
            <Cell label="Telephone">
              {row.telephone ? (
                <a href={`tel:${row.telephone.replace(/[^+\d]/g, '')}`}>{row.telephone}</a>
              ) : null}
            </Cell>
            <Cell label="Registration">
              {row.role === 'vet' && <Registration registration={row.registration} today={today} />}
            </Cell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}

function Registration({ registration, today }: { registration: RegistrationView | null; today: string }) {
  const trouble = registrationTrouble(registration, today)
  return (
    <>
      {registration && (
        <>
          {registration.number}, {countryName(registration.country)}
          <span className="block text-small text-mute">
            to {calendarDay(registration.expiresOn)}
            {registration.checked &&
              `, checked ${dayDateYear(registration.checked.ms, registration.checked.zone)}`}
          </span>
        </>
      )}
      {trouble && <Attention>{trouble}</Attention>}
    </>
  )
}
