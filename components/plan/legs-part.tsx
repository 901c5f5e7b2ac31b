'use client'

import { useFieldArray, useFormContext } from 'react-hook-form'
import { SelectField } from '@/components/forms/select-field'
import { Button } from '@/components/ui/button'
import { Empty } from '@/components/ui/notice'
import { join } from '@/components/ui/join'
import type { Plan, PlanLeg } from '@/lib/schemas/plan'
import { LegCard } from './leg-card'
import { flightAround, withFlightAfter, withLegAfter, withoutLeg } from './leg-edits'
import { LegSwatch } from './leg-swatch'
import { LegsRuler } from './legs-ruler'
import { MAX_LEGS } from './limits'
import { SINGLE_LEG_KINDS, legName } from './option-words'
import { useProblems } from './plan-context'
import { isUnder, planPathId } from './plan-path'
import { usePlanLegs } from './plan-timeline'

/** The legs: all on one true time scale, one of them open below it. */
export function LegsPart({ chosen, onChoose }: { chosen: number; onChoose: (index: number) => void }) {
  const { control } = useFormContext<Plan>()
  const { replace } = useFieldArray({ control, name: 'legs', keyName: 'rowKey' })
  const { legs } = usePlanLegs()
  const index = Math.min(chosen, legs.length - 1)
  const leg = legs[index]

  const add = (kind: string) => {
    if (kind === '') return
    const next =
      kind === 'flight' ? withFlightAfter(legs, index) : withLegAfter(legs, index, kind as PlanLeg['kind'])
    replace(next)
    onChoose(index + 1)
  }
  const flight = flightAround(legs, index)
  return (
    <section id="legs" aria-labelledby="legs-title" className="mt-6">
      <div className="mb-2 flex flex-wrap items-center gap-x-4 gap-y-1 border-t-2 border-ink pt-2">
        <h2 id="legs-title" className="text-section">
          Legs
        </h2>
        <p className="text-small text-mute">
          <span className="max-desk:hidden">True time scale. </span>Where two legs meet, changing one end
          moves the other with it.
        </p>
        <span className="ml-auto">{legs.length < MAX_LEGS && <AddLeg after={index + 1} onAdd={add} />}</span>
      </div>
      <span id={planPathId('legs')} tabIndex={-1} />
      {leg === undefined ? (
        <Empty>No leg is entered yet: add the first one, usually by road from the door.</Empty>
      ) : (
        <>
          <LegsRuler chosen={index} onChoose={onChoose} />
          <LegSteps legs={legs} chosen={index} onChoose={onChoose} />
          <LegCard
            key={leg.id}
            index={index}
            leg={leg}
            swatch={<LegSwatch leg={leg} />}
            acts={
              <>
                {index > 0 && <Button onClick={() => onChoose(index - 1)}>Leg {index}</Button>}
                {index < legs.length - 1 && (
                  <Button onClick={() => onChoose(index + 1)}>Leg {index + 2}</Button>
                )}
                <Button
                  className="ml-auto"
                  onClick={() => {
                    replace(withoutLeg(legs, index))
                    onChoose(Math.max(0, (flight?.[0] ?? index) - 1))
                  }}
                >
                  {flight === null ? `Take out leg ${index + 1}` : 'Take out flight'}
                </Button>
              </>
            }
          />
        </>
      )}
    </section>
  )
}

/** Every leg as a button: number, name, what has to be put right. Narrow legs on the ruler are reached here. */
function LegSteps({
  legs,
  chosen,
  onChoose,
}: {
  legs: readonly PlanLeg[]
  chosen: number
  onChoose: (index: number) => void
}) {
  const problems = useProblems()
  return (
    <ol className="mb-2 flex list-none flex-wrap gap-1.5">
      {legs.map((leg, index) => {
        const wrong = problems.filter(({ path }) => isUnder(path, `legs.${index}`)).length
        return (
          <li key={leg.id}>
            <button
              type="button"
              id={planPathId(`legs.${index}`)}
              aria-pressed={index === chosen}
              onClick={() => onChoose(index)}
              className={join(
                'flex min-h-8 cursor-pointer items-center gap-1.5 border px-2.5 text-left text-small max-desk:min-h-11',
                index === chosen ? 'border-2 border-hand bg-handwash' : 'border-rule bg-sheet',
              )}
            >
              <b className="font-head">{index + 1}</b> {legName(leg)}
              {wrong > 0 && <span className="dbl pl-1.5 font-semibold">{wrong}</span>}
              {wrong > 0 && <span className="sr-only">to put right</span>}
            </button>
          </li>
        )
      })}
    </ol>
  )
}

function AddLeg({ after, onAdd }: { after: number; onAdd: (kind: string) => void }) {
  return (
    <SelectField
      id="plan-add-leg"
      label={<span className="sr-only">Add a leg</span>}
      none={after === 0 ? 'Add the first leg …' : `Add a leg after ${after} …`}
      value=""
      choices={[...SINGLE_LEG_KINDS, { value: 'flight', words: 'Flight, as three legs' }]}
      onChange={(event) => onAdd(event.target.value)}
    />
  )
}
