import type { ReactNode } from 'react'
import { calendarDay } from '@/lib/views/calendar-day'
import { countryName } from '@/lib/views/country-name'
import type { SignerView } from '@/lib/views/review'

/** Who signs, from the record an admin checked; nothing of it can be typed. */
export function SignerFacts({ signer }: { signer: SignerView }) {
  return (
    <dl className="mt-2 grid grid-cols-[92px_1fr] items-baseline gap-x-3 gap-y-0.5 text-small">
      <Row name="Name">
        <span className="font-head text-signature font-semibold italic text-hand">{signer.name}</span>
      </Row>
      <Row name="Registration">
        {signer.registration ? `${signer.registration}, ${countryName(signer.country)}` : 'none kept'}
      </Row>
      <Row name="Valid to">{calendarDay(signer.expiresOn) || 'unknown'}</Row>
      <Row name="Record">{signer.checkedWords || 'not checked by an admin'}</Row>
      <Row name="Time">set by the server when you sign</Row>
    </dl>
  )
}

function Row({ name, children }: { name: string; children: ReactNode }) {
  return (
    <>
      <dt className="text-mute">{name}</dt>
      <dd className="m-0">{children}</dd>
    </>
  )
}
