import { countryName } from '@/lib/views/country-name'
import { dayDateYear, localTimeWithOffset } from '@/lib/views/format'
import type { ApprovalView } from '@/lib/views/sheet'

/** What vets signed, word for word: it names the crates and every finding overridden. */
export function Signatures({ approvals }: { approvals: readonly ApprovalView[] }) {
  return (
    <ul className="list-none">
      {approvals.map(({ vetName, registration, registrationCountry, signedAt, crateMarks, statement }) => (
        <li key={`${vetName} ${signedAt.ms} ${crateMarks.join()}`} className="mt-1.5 break-inside-avoid">
          <p>
            <b className="crate">{crateMarks.join(', ')}</b>{' '}
            <span className="font-head font-semibold italic text-hand">{vetName}</span>, registration{' '}
            {registration}, {countryName(registrationCountry)}, {dayDateYear(signedAt.ms, signedAt.zone)},{' '}
            {localTimeWithOffset(signedAt.ms, signedAt.zone)}
          </p>
          <p>{statement}</p>
        </li>
      ))}
    </ul>
  )
}
