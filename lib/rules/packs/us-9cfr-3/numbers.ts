import type { Animal, Crate } from '@/lib/thermal'
import type { Finding } from '../../result'
import { type Subject, isAboard } from '../../subject'
import type { LawView } from '../pack'
import { lawFinding } from './finding'
import { CATS, DOGS, FOUR_MONTHS_DAYS, SIX_MONTHS_DAYS } from './sources'

const MOST_BY_AIR_YOUNG = 2
const MOST_BY_SURFACE = 4
/** The leaflet leads with 20 lb. */
const YOUNG_MOST_KG = 20 * 0.45359237

/** How many dogs or cats may share an enclosure, by air and by surface, and who may not travel with whom. */
export function numbersFindings(view: LawView, subject: Subject, legIndexes: readonly number[]): Finding[] {
  const aboard = legIndexes.filter((index) => isAboard(subject, index))
  const flies = aboard.some((index) => view.scenario.legs[index]?.kind === 'flight')
  return [flies ? byAir(view, subject) : bySurface(view, subject), ...company(view, subject)]
}

function byAir(view: LawView, subject: Subject): Finding {
  const { crate } = subject
  const count = headCount(crate)
  const asked =
    'By air one animal of six months or more to a crate, or two of eight weeks to six months and at most 20 lb (9 kg) each.'
  const shared = { side: 'high' as const, limit: MOST_BY_AIR_YOUNG, value: count, unit: 'animals', asked }
  if (count <= 1)
    return lawFinding(view, 'numbersAir', subject, {
      ...shared,
      limit: 1,
      status: 'met',
      note: 'One animal in the crate.',
    })
  const ages = crate.occupants.map(({ ageDays }) => ageDays)
  if (ages.includes(undefined))
    return lawFinding(view, 'numbersAir', subject, {
      ...shared,
      status: 'unknown',
      note: `${count} animals in the crate and an age is not given.`,
    })
  const young = ages.every((days) => days !== undefined && days < SIX_MONTHS_DAYS)
  const light = crate.occupants.every(({ massKg }) => massKg <= YOUNG_MOST_KG)
  const status = count > MOST_BY_AIR_YOUNG || !young || !light ? 'breach' : 'met'
  return lawFinding(view, 'numbersAir', subject, {
    ...shared,
    status,
    note: `${count} animals in the crate${young ? '' : ', not all under six months'}${light ? '' : ', not all at most 20 lb'}.`,
  })
}

function bySurface(view: LawView, subject: Subject): Finding {
  const count = headCount(subject.crate)
  const asked = 'By surface at most four animals of eight weeks or more and of similar size to an enclosure.'
  const status = count > MOST_BY_SURFACE ? 'breach' : 'met'
  return lawFinding(view, 'numbersSurface', subject, {
    status,
    side: 'high',
    limit: MOST_BY_SURFACE,
    value: count,
    unit: 'animals',
    asked,
    note: `${count} in the crate.`,
  })
}

function company(view: LawView, subject: Subject): Finding[] {
  const { crate, animal } = subject
  const others = crate.occupants.filter(({ id }) => id !== animal.id)
  const mixed = others.some(
    (other) =>
      DOGS.includes(animal.profile) !== DOGS.includes(other.profile) ||
      CATS.includes(animal.profile) !== CATS.includes(other.profile),
  )
  const withAdult = isYoung(animal) && others.some((other) => other.ageDays !== undefined && !isYoung(other))
  if (!mixed && !withAdult) return []
  const asked = 'Cats and dogs apart; under four months with no adult but the dam.'
  const note = mixed
    ? 'Another species shares the crate.'
    : 'A young animal shares the crate with an adult: allowed only with its dam.'
  return [lawFinding(view, 'company', subject, { status: 'judgement', asked, note })]
}

function isYoung({ ageDays }: Animal): boolean {
  return ageDays !== undefined && ageDays < FOUR_MONTHS_DAYS
}

function headCount({ occupants }: Crate): number {
  return occupants.reduce((sum, { count }) => sum + count, 0)
}
