import type { ReactNode } from 'react'
import { Mark } from '@/components/ui/mark'
import { Sheet } from '@/components/ui/section'
import { Stamp } from '@/components/ui/stamp'
import { countryName } from '@/lib/views/country-name'
import { dayTime, duration, localTimeWithOffset } from '@/lib/views/format'
import type { PortalAnimal, PortalApproval, PortalCondition, PortalView } from '@/lib/views/portal'

/** One consignment as its shipper reads it: verdict, journey, animals, conditions, the vet's approval. */
export function ConsignmentSheet({
  view,
  strip,
  jump,
}: {
  view: PortalView
  strip: ReactNode
  jump?: ReactNode
}) {
  const { leaves, arrives } = view
  return (
    <Sheet className="max-desk:-mx-4 max-desk:border-x-0">
      <header className="flex flex-wrap items-center gap-x-5 gap-y-2">
        <Mark size="l">{view.mark}</Mark>
        <div className="min-w-0 flex-1">
          <h2 className="text-section">
            {view.from} to {view.to}
          </h2>
          <p className="text-mute">
            {names(view.animals)}. Leaves {dayTime(leaves.ms, leaves.zone)}
          </p>
        </div>
      </header>
      <section aria-label="Verdict">
        <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
          <span className="max-desk:hidden">
            <Stamp {...view.stamp} size="l" />
          </span>
          <span className="desk:hidden">
            <Stamp {...view.stamp} size="phone" />
          </span>
          <div className="min-w-[16rem] flex-1">
            {view.headline && <p className="font-semibold">{view.headline}</p>}
            {view.headlineMore.map((sentence) => (
              <p key={sentence}>{sentence}</p>
            ))}
          </div>
        </div>
        {view.overrides.map((override) => (
          <p key={override.findingIndex} className="dbl mt-2 pl-2">
            <b>Overridden by {override.vetName}:</b> {override.findingWords}. {override.reason}
          </p>
        ))}
        {jump}
      </section>
      <section aria-labelledby="journey">
        <h3 id="journey" className="text-sub">
          The journey{' '}
          <span className="font-text text-small font-normal text-mute">{duration(view.journeyMin)}</span>
        </h3>
        <div className="mt-1.5">{strip}</div>
        <p className="mt-2">
          {view.from} {dayTime(leaves.ms, leaves.zone)}; {view.to} {dayTime(arrives.ms, arrives.zone)}. The
          first clock is {localTimeWithOffset(leaves.ms, leaves.zone)}, the last{' '}
          {localTimeWithOffset(arrives.ms, arrives.zone)}.
        </p>
      </section>
      <Animals animals={view.animals} />
      <Conditions conditions={view.conditions} />
      <Approvals approvals={view.approvals} />
    </Sheet>
  )
}

function Animals({ animals }: { animals: readonly PortalAnimal[] }) {
  return (
    <section aria-labelledby="animals">
      <h3 id="animals" className="text-sub">
        Your animals
      </h3>
      <ul className="mt-2 grid list-none gap-y-2.5 desk:grid-cols-[repeat(auto-fill,minmax(14rem,1fr))]">
        {animals.map((animal) => (
          <li
            key={animal.animalId}
            className="max-desk:border-t max-desk:border-hair max-desk:pt-2 desk:border-l desk:border-rule desk:px-3 desk:first:border-l-0 desk:first:pl-0"
          >
            <span className="crate mr-1.5 text-mark-m">{animal.crateLetter}</span>
            <b>{animal.name}</b>, {animal.describes}
            {animal.identification && <span className="block">{animal.identification}</span>}
          </li>
        ))}
      </ul>
    </section>
  )
}

function Conditions({ conditions }: { conditions: readonly PortalCondition[] }) {
  return (
    <section aria-labelledby="conditions">
      <h3 id="conditions" className="text-sub">
        Conditions the verdict rests on
      </h3>
      {conditions.length === 0 && <p className="mt-1">None.</p>}
      <ol className="mt-1 list-none">
        {conditions.map((condition) => (
          <li
            key={condition.number}
            className="grid grid-cols-[26px_1fr] gap-x-2 border-t border-hair py-2 first:border-t-0 desk:grid-cols-[26px_3fr_2fr]"
          >
            <span className="font-head font-bold">{condition.number}</span>
            <span>
              {condition.text}
              <span className="block text-mute">
                {condition.whereWords}, from {dayTime(condition.from.ms, condition.from.zone)}
              </span>
            </span>
            <span className="text-mute max-desk:col-start-2">{answerWords(condition)}</span>
          </li>
        ))}
      </ol>
    </section>
  )
}

function answerWords({ answer, party, answeredAt }: PortalCondition): ReactNode {
  const when = answeredAt ? `, ${dayTime(answeredAt.ms, answeredAt.zone)}` : ''
  switch (answer) {
    case 'ours':
      return 'our own people do it'
    case 'confirmed':
      return `confirmed by ${party}${when}`
    case 'refused':
      return (
        <>
          <b className="text-ink">Refused</b> by {party}
          {when}
        </>
      )
    case 'waiting':
      return (
        <>
          <b className="text-ink">Not yet</b> confirmed by {party}
        </>
      )
  }
}

function Approvals({ approvals }: { approvals: readonly PortalApproval[] }) {
  return (
    <section aria-labelledby="approval">
      <h3 id="approval" className="text-sub">
        Vet’s approval
      </h3>
      {approvals.length === 0 && <p className="mt-1">Not signed yet.</p>}
      {bySignature(approvals).map(({ approval, marks }) => (
        <div key={`${approval.signedAt.ms}-${marks.join()}`} className="mt-1.5">
          <p>
            <span className="font-head text-section font-semibold italic text-hand">{approval.vetName}</span>,
            registration {approval.registration}, {countryName(approval.registrationCountry)},{' '}
            {dayTime(approval.signedAt.ms, approval.signedAt.zone)}, {marks.length === 1 ? 'crate' : 'crates'}{' '}
            {marks.join(', ')}.
          </p>
          <p className="mt-0.5">{approval.statement}</p>
        </div>
      ))}
    </section>
  )
}

/** One signature may cover several crates. */
function bySignature(approvals: readonly PortalApproval[]): { approval: PortalApproval; marks: string[] }[] {
  const groups: { approval: PortalApproval; marks: string[] }[] = []
  for (const approval of approvals) {
    const group = groups.find(
      (one) =>
        one.approval.vetName === approval.vetName &&
        one.approval.signedAt.ms === approval.signedAt.ms &&
        one.approval.statement === approval.statement,
    )
    if (group) group.marks.push(...approval.crateMarks)
    else groups.push({ approval, marks: [...approval.crateMarks] })
  }
  return groups
}

function names(animals: readonly PortalAnimal[]): string {
  const all = animals.map((animal) => animal.name)
  const last = all.at(-1)
  return all.length < 2 || last === undefined ? all.join('') : `${all.slice(0, -1).join(', ')} and ${last}`
}
