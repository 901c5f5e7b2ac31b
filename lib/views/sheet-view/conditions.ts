import { dayTime } from '../format'
import type { ConditionView } from '../sheet'
import type { ConditionFact, SheetFacts } from './facts'
import type { JourneyLeg } from './journey'
import { ordinalRange } from './words'

/** Conditions in the order of the journey; the same words to the same party on several legs are one. */
export function conditionViews({ conditions, firm }: SheetFacts, journey: JourneyLeg[]): ConditionView[] {
  const ordinalOf = new Map(journey.map(({ leg, ordinal }) => [leg.id, ordinal]))
  const first = ({ legId }: ConditionFact) => (legId === null ? 0 : (ordinalOf.get(legId) ?? 0))
  const groups = new Map<string, ConditionFact[]>()
  for (const condition of [...conditions].sort((a, b) => first(a) - first(b))) {
    const { text, party, ours, answer, answeredBy, answeredAtMs, kept } = condition
    const key = JSON.stringify([text, party, ours, answer, answeredBy, answeredAtMs, kept])
    groups.set(key, [...(groups.get(key) ?? []), condition])
  }
  return [...groups.values()].flatMap((group, index) => {
    const [condition] = group
    if (condition === undefined) return []
    const legs = group.flatMap(({ legId }) => (legId === null ? [] : (ordinalOf.get(legId) ?? [])))
    const waits = !condition.ours && condition.answer !== 'confirmed'
    return [
      {
        number: index + 1,
        conditionId: condition.id,
        text: condition.text,
        legs,
        legWords: legs.length === 0 ? 'all' : ordinalRange(legs),
        askedOf:
          condition.party === ''
            ? condition.ours
              ? 'ours'
              : 'party in charge'
            : `${condition.party}${condition.ours ? ', ours' : ''}`,
        askedAt: condition.askedAtMs === null ? null : { ms: condition.askedAtMs, zone: firm.zone },
        findingRule: condition.findingRule,
        answer: condition.ours ? 'ours' : (condition.answer ?? 'waiting'),
        answerWords: answerWords(condition, firm.zone),
        kept: condition.kept === null ? null : condition.kept ? 'kept' : 'broken',
        holdsRelease: waits,
      },
    ]
  })
}

/** "3 isn’t confirmed, so no figure on this sheet counts it"; empty where all are. */
export function conditionsRemark(conditions: ConditionView[]): string {
  const open = conditions.filter(({ holdsRelease }) => holdsRelease).map(({ number }) => number)
  if (open.length === 0) return ''
  return `${ordinalRange(open)} ${open.length === 1 ? 'isn’t' : 'aren’t'} confirmed, so no figure on this sheet counts ${open.length === 1 ? 'it' : 'them'}`
}

function answerWords(condition: ConditionFact, zone: string): string {
  const { ours, answer, answeredBy, answeredHow, answeredAtMs, askedAtMs, kept } = condition
  const broken = kept === false ? 'Broken. ' : ''
  if (ours) return `${broken}Ours is there: an item of the checklist`
  if (answer === null)
    return `${broken}Not yet.${askedAtMs === null ? '' : ` Asked ${dayTime(askedAtMs, zone)}`}`
  const how =
    answeredHow === 'writing'
      ? 'in writing'
      : answeredHow === 'telephone'
        ? 'by telephone'
        : (answeredHow ?? '')
  const who = [answeredBy ?? '', answeredAtMs === null ? '' : dayTime(answeredAtMs, zone), how]
    .filter(Boolean)
    .join(', ')
  return `${broken}${answer === 'refused' ? `Refused. ${who}` : who}`
}
