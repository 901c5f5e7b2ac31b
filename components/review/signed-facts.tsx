import type { ReactNode } from 'react'
import { BoxedFacts, Fact } from '@/components/ui/boxed-facts'
import { Attention } from '@/components/ui/notice'
import { calendarDay } from '@/lib/views/calendar-day'
import { countryName } from '@/lib/views/country-name'
import { dayDateYear, localTimeWithOffset } from '@/lib/views/format'
import type { SignedApproval } from '@/lib/views/review'

/** A signature as it stands for good: who, what it means, when; and, where it was ended, by what. */
export function SignedFacts({ approval, act }: { approval: SignedApproval; act?: ReactNode }) {
  const { signedAt, voidedAt } = approval
  return (
    <div>
      <BoxedFacts columns="1fr 1fr">
        <Fact caption="Signed by" whole>
          <span className="block font-head text-signature font-semibold italic text-hand">
            {approval.signerName}
          </span>
        </Fact>
        <Fact caption="Registration" whole>
          {approval.registration}, {countryName(approval.country)}, to {calendarDay(approval.expiresOn)}
        </Fact>
        <Fact caption="What it means" whole>
          <b>{approval.meaning}</b>, {approval.crateMarks.length === 1 ? 'crate' : 'crates'}{' '}
          {approval.crateMarks.join(', ')}, revision {approval.revision}
        </Fact>
        <Fact caption="When" whole>
          {dayDateYear(signedAt.ms, signedAt.zone)}, {localTimeWithOffset(signedAt.ms, signedAt.zone)}
        </Fact>
        <Fact caption="Statement" whole className="desk:col-span-2">
          {approval.statement}
          {approval.reasons && <span className="mt-1 block font-semibold">{approval.reasons}</span>}
        </Fact>
        {approval.earlySigns.length > 0 && (
          <Fact caption="The driver rings at" whole className="desk:col-span-2">
            {approval.earlySigns.join('. ')}.
          </Fact>
        )}
        {approval.overrides.map((override) => (
          <Fact key={override.findingIndex} caption="Overridden by name" whole className="desk:col-span-2">
            <b>{override.findingWords}.</b> {override.reason}
          </Fact>
        ))}
      </BoxedFacts>
      {voidedAt && (
        <div className="mt-1.5">
          <Attention>
            {approval.withdrawn ? 'Withdrawn' : 'Voided'} {dayDateYear(voidedAt.ms, voidedAt.zone)},{' '}
            {localTimeWithOffset(voidedAt.ms, voidedAt.zone)}: {approval.voidedReason}
          </Attention>
        </div>
      )}
      {act && <div className="mt-2 flex flex-wrap gap-2">{act}</div>}
    </div>
  )
}
