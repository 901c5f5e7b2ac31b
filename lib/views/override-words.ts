import type { Finding } from '@/lib/rules/result'
import { signedFigures } from '@/lib/rules/effective-verdict'
import { legWords } from '@/lib/rules/wording'
import type { Plan } from '@/lib/schemas/plan'
import { bodyTemp, withUnit } from './format'

type NamingPlan = Pick<Plan, 'animals' | 'crates' | 'legs'>

/**
 * A finding in full, as it is overridden by name wherever a signature is shown: what is asked, whose and where. "Body at
 * most 39.7 °C, alarm limit, Otto (D), leg 7 (ramp)".
 */
export function findingInFull(finding: Finding, plan: NamingPlan): string {
  const { asked, legId } = finding
  const leg = legId === undefined ? '' : legWords(legId, plan.legs)
  return [asked.replace(/\.$/, ''), whose(finding, plan), leg].filter(Boolean).join(', ')
}

/** The same with the figures a signature is given for: a later run beyond them ends it. */
export function overrideInFull(finding: Finding, plan: NamingPlan): string {
  const { minutesPast, worstBodyC } = signedFigures(finding)
  const figures = [
    minutesPast === 0 ? '' : `${withUnit(minutesPast, 'min')} past`,
    worstBodyC === null ? '' : `body to ${bodyTemp(worstBodyC, 'c')}`,
  ].filter(Boolean)
  const name = findingInFull(finding, plan)
  return figures.length === 0 ? name : `${name}: ${figures.join(', ')}`
}

function whose({ animalId, crateId }: Finding, { animals, crates }: NamingPlan): string {
  const animal = animals.find(({ id }) => id === animalId)
  const crate = crates.find(({ id, occupants }) =>
    animal === undefined ? id === crateId : occupants.includes(animal.id),
  )
  if (animal !== undefined) return crate === undefined ? animal.name : `${animal.name} (${crate.letter})`
  return crate === undefined ? '' : `crate ${crate.letter}`
}
