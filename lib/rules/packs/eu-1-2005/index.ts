import type { Finding } from '../../result'
import { type Subject, isAboard } from '../../subject'
import { minutes, scheduleWords } from '../../wording'
import { lastBefore, longestWithout } from '../intervals'
import { type LawAnswer, lawAnswer } from '../law-finding'
import { type LawView, type RulePack, legsUnder, subjectsUnder } from '../pack'
import { EU_1_2005, GB_1_2005, type TransportRegulation } from './sources'

const DOGS_AND_CATS = ['dog', 'snub-nosed-dog', 'cat', 'snub-nosed-cat']
const EIGHT_WEEKS_DAYS = 56
const ADULT_DAYS = 365
const WATER_EVERY_MIN = 8 * 60
const FOOD_EVERY_MIN = 24 * 60

/**
 * European Union, and Great Britain where the text was kept: dogs and cats. The 5 to 30 °C of Annex I Chapter VI is for
 * long road journeys of farm animals and is not read here.
 */
export const EU_PACK: RulePack = packOf(EU_1_2005)
export const GB_PACK: RulePack = packOf(GB_1_2005)

function packOf(text: TransportRegulation): RulePack {
  return {
    id: text.id,
    title: text.title,
    asOf: '2024-11-15',
    placeWords: text.placeWords,
    countries: text.countries,
    profiles: DOGS_AND_CATS,
    evaluate(view) {
      const legs = legsUnder(view, text.countries)
      return subjectsUnder(view, DOGS_AND_CATS, legs).flatMap((subject) => {
        const answer = (source: keyof TransportRegulation['sources'], parts: LawAnswer) =>
          lawAnswer(view, text.sources[source], subject, parts)
        return [
          young(subject, answer),
          ...fitness(subject, answer),
          interval(view, subject, 'food', FOOD_EVERY_MIN, answer),
          interval(view, subject, 'water', WATER_EVERY_MIN, answer),
          ...byAir(view, subject, legs, answer),
        ]
      })
    },
  }
}

type Answer = (source: keyof TransportRegulation['sources'], parts: LawAnswer) => Finding

function young({ animal, crate }: Subject, answer: Answer): Finding {
  const { ageDays } = animal
  const shared = {
    side: 'low' as const,
    limit: EIGHT_WEEKS_DAYS,
    unit: 'days',
    asked: 'Eight weeks old, unless with the mother.',
  }
  if (ageDays === undefined)
    return answer('young', { ...shared, status: 'unknown', note: 'The age is not given.' })
  const mother = crate.occupants.some(
    (other) => other.id !== animal.id && other.sex === 'female' && (other.ageDays ?? 0) >= ADULT_DAYS,
  )
  if (ageDays < EIGHT_WEEKS_DAYS && mother)
    return answer('young', {
      ...shared,
      status: 'judgement',
      value: ageDays,
      note: `${ageDays} days old, with a grown female: allowed only if she is the mother.`,
    })
  return answer('young', {
    ...shared,
    status: ageDays < EIGHT_WEEKS_DAYS ? 'breach' : 'met',
    value: ageDays,
    note: `${ageDays} days old.`,
  })
}

function fitness({ animal }: Subject, answer: Answer): Finding[] {
  const asks = [
    animal.flags.includes('pregnant') &&
      answer('pregnant', {
        status: 'judgement',
        asked: 'Less than 90 % of gestation passed, and no birth within a week.',
        note: 'Pregnant: how far on is for a veterinarian to say.',
      }),
    animal.flags.includes('sedated') &&
      answer('sedatives', {
        status: 'judgement',
        asked: 'No sedative unless strictly needed, and under a veterinarian.',
        note: 'Sedated: a veterinarian answers for it.',
      }),
  ]
  return asks.filter((finding) => finding !== false)
}

function interval(
  view: LawView,
  subject: Subject,
  what: 'food' | 'water',
  everyMin: number,
  answer: Answer,
): Finding {
  const shared = {
    side: 'high' as const,
    limit: everyMin,
    unit: 'min',
    asked: `${what === 'food' ? 'Fed' : 'Watered'} at least every ${everyMin / 60} hours.`,
  }
  const lastMin = lastBefore(subject, what)
  if (lastMin === undefined)
    return answer(what, {
      ...shared,
      status: 'unknown',
      note: `When ${what} was last offered before departure is not stated.`,
    })
  const { gapMin, fromMin, scheduleId } = longestWithout(view, subject, what, lastMin)
  const breached = gapMin > everyMin
  return answer(what, {
    ...shared,
    status: breached ? 'breach' : 'met',
    value: gapMin,
    scheduleId,
    ...(breached && { minute: fromMin + everyMin }),
    note: `Longest without ${what}: ${minutes(Math.ceil(gapMin))}, ${scheduleWords(scheduleId, view.scenario.legs)}.`,
  })
}

function byAir(
  { scenario }: LawView,
  subject: Subject,
  legIndexes: readonly number[],
  answer: Answer,
): Finding[] {
  const flights = scenario.legs.filter(
    (leg, index) => leg.kind === 'flight' && legIndexes.includes(index) && isAboard(subject, index),
  )
  return flights.map((leg) =>
    answer('air', {
      legId: leg.id,
      status: 'note',
      asked: 'By air in containers and conditions as the air carriers’ live animal regulations have them.',
      note: 'Ask the carrier for its container rules.',
    }),
  )
}
