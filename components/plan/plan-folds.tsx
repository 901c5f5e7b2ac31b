'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import type { ReactNode } from 'react'
import type { Plan } from '@/lib/schemas/plan'
import { Fold, Folds } from '@/components/ui/fold'
import { figure } from '@/lib/views/format'
import { BEDDING_WORDS } from './option-words'
import { fieldWords } from './field-words'
import { LooseField, standsAlone } from './loose-field'
import { openSidesPct } from './open-area'
import { usePlanPage, useProblems } from './plan-context'
import type { Problem } from './plan-problems'
import { PART_WORDS, spotOf } from './plan-path'
import type { PlanPart } from './plan-path'

/** Parties, animals and crates folded to a line each; a part with an error unfolds the field in error and no more. */
export function PlanFolds({
  opened,
  onToggle,
}: {
  opened: readonly PlanPart[]
  onToggle: (part: PlanPart) => void
}) {
  const { control } = useFormContext<Plan>()
  const plan = useWatch({ control }) as Plan
  const { problems } = usePlanPage()
  const all = useProblems()
  const part = (name: Exclude<PlanPart, 'legs'>, words: ReactNode) => {
    const open = opened.includes(name)
    const wrong = all.filter(({ path }) => problems.at(path) !== undefined && spotOf(path).part === name)
    return (
      <Fold
        key={name}
        name={PART_WORDS[name]}
        act={
          <button
            type="button"
            className="link max-desk:min-h-11"
            aria-expanded={open}
            onClick={() => onToggle(name)}
          >
            {open ? 'Fold' : 'Open'}
            <span className="sr-only"> {PART_WORDS[name].toLowerCase()}</span>
          </button>
        }
      >
        {words}
        {!open && <WrongFields problems={wrong} plan={plan} />}
      </Fold>
    )
  }
  return (
    <div>
      <h2 className="sr-only">Parties, animals and crates</h2>
      <Folds>
        {part('parties', <PartiesLine plan={plan} />)}
        {part('animals', <AnimalsLine plan={plan} />)}
        {part('crates', <CratesLine plan={plan} />)}
      </Folds>
    </div>
  )
}

function WrongFields({ problems, plan }: { problems: readonly Problem[]; plan: Plan }) {
  const { goTo } = usePlanPage()
  const once = problems.filter(
    ({ path }, index) => problems.findIndex((problem) => problem.path === path) === index,
  )
  return once.map(({ path, message }) =>
    standsAlone(path) ? (
      <div key={path} className="mt-1.5 max-w-[30rem]">
        <LooseField path={path} label={fieldWords(plan, path)} />
      </div>
    ) : (
      <p key={path} className="dbl mt-1.5 pl-2 text-small font-semibold">
        <button
          type="button"
          className="link text-left max-desk:flex max-desk:min-h-11 max-desk:items-center"
          onClick={() => goTo(path)}
        >
          {fieldWords(plan, path)}
        </button>
        <span className="max-desk:hidden">: </span>
        {message}
      </p>
    ),
  )
}

function PartiesLine({ plan }: { plan: Plan }) {
  const { catalogues } = usePlanPage()
  const shipper = catalogues.shippers.find(({ id }) => id === plan.shipperId)?.name ?? 'not chosen'
  const { consignor, consignee, emergencyContact } = plan
  return (
    <span>
      {consignor.name === '' && consignee.name === ''
        ? 'No consignor and no consignee'
        : `${consignor.name || 'No consignor'} to ${consignee.name || 'no consignee'}`}
      . Shipper: {shipper}. Emergency:{' '}
      {[emergencyContact.name, emergencyContact.telephone].filter(Boolean).join(', ') || 'nobody named'}
    </span>
  )
}

function AnimalsLine({ plan }: { plan: Plan }) {
  const { catalogues } = usePlanPage()
  if (plan.animals.length === 0) return <span className="text-mute">None entered</span>
  return (
    <span className="flex flex-wrap gap-x-3">
      {plan.animals.map((animal, index) => {
        const crate = plan.crates.find(({ occupants }) => occupants.includes(animal.id))
        const species = catalogues.species.find(({ key }) => key === animal.profileKey)?.commonName
        const words = [
          animal.name || `Animal ${index + 1}`,
          (animal.breedNote || species)?.toLowerCase(),
          typeof animal.massKg === 'number' &&
            `${figure(animal.massKg, animal.massKg < 100 ? 1 : 0)}\u00a0kg`,
          animal.count > 1 && `${animal.count} of them`,
        ]
        return (
          <span key={animal.id}>
            {crate && <span className="crate mr-1 text-mark-s">{crate.letter}</span>}
            {words.filter(Boolean).join(', ')}
          </span>
        )
      })}
    </span>
  )
}

function CratesLine({ plan }: { plan: Plan }) {
  if (plan.crates.length === 0) return <span className="text-mute">None entered</span>
  return (
    <span className="flex flex-wrap gap-x-3">
      {plan.crates.map((crate) => {
        const size = [crate.lengthCm, crate.widthCm, crate.heightCm]
        const open = openSidesPct(crate)
        const words = [
          size.every((side) => typeof side === 'number') ? `${size.join(' × ')}\u00a0cm` : 'no size yet',
          open !== null && `four sides open ${figure(open, 1)}\u00a0%`,
          crate.bedding.material !== 'none' &&
            `${BEDDING_WORDS[crate.bedding.material].toLowerCase()} ${crate.bedding.depthMm}\u00a0mm`,
        ]
        return (
          <span key={crate.id}>
            <span className="crate mr-1 text-mark-s">{crate.letter}</span>
            {words.filter(Boolean).join(', ')}
          </span>
        )
      })}
    </span>
  )
}
