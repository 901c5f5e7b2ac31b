import type { Finding } from '../../result'
import { type Subject, isAboard } from '../../subject'
import { list, minutes } from '../../wording'
import { type LawView, daysOld, papersFor } from '../pack'
import { lawFinding } from './finding'
import { legalPlace } from './places'
import { EIGHT_WEEKS_DAYS, FOUR_MONTHS_DAYS, type SourceKey } from './sources'

const OBSERVE_EVERY_MIN = 240
const ACCEPT_BEFORE_MIN = 240
const ACCEPT_AGREED_MIN = 360
const LITTER_MIN = 1_440
const CERTIFICATE_DAYS = 10

/** Age, looking in, lodging with the carrier, certificates, litter, and the judgement the law asks of anyone who handles. */
export function careFindings(view: LawView, subject: Subject, legIndexes: readonly number[]): Finding[] {
  const aboard = legIndexes.filter((index) => isAboard(subject, index))
  const flies = aboard.some((index) => view.scenario.legs[index]?.kind === 'flight')
  return [
    age(view, subject),
    ...observation(view, subject, aboard),
    ...(flies ? acceptance(view, subject) : []),
    certificate(
      view,
      subject,
      'healthCertificate',
      'health-certificate',
      `Health certificate: inspected by a veterinarian at most ${CERTIFICATE_DAYS} days before delivery.`,
      CERTIFICATE_DAYS,
    ),
    certificate(
      view,
      subject,
      'foodWaterCertificate',
      'consignor-food-water',
      'Consignor’s certification of food and water offered within four hours before delivery, with instructions for 24 hours, on the crate.',
    ),
    ...litter(view, subject),
    ...handling(view, subject),
  ]
}

function age(view: LawView, subject: Subject): Finding {
  const { ageDays } = subject.animal
  const shared = {
    side: 'low' as const,
    limit: EIGHT_WEEKS_DAYS,
    unit: 'days',
    asked: 'At least eight weeks old and weaned.',
  }
  if (ageDays === undefined)
    return lawFinding(view, 'age', subject, { ...shared, status: 'unknown', note: 'The age is not given.' })
  return lawFinding(view, 'age', subject, {
    ...shared,
    status: ageDays < EIGHT_WEEKS_DAYS ? 'breach' : 'met',
    value: ageDays,
    note: `${ageDays} days old.`,
  })
}

/** On a leg without one of ours, looking in is asked of the party in charge; in flight only where the hold can be reached. */
function observation(view: LawView, subject: Subject, aboard: readonly number[]): Finding[] {
  return aboard.flatMap((index) => {
    const leg = view.scenario.legs[index]
    if (leg === undefined) return []
    const longestMin = Math.max(
      ...view.base.schedules.map(
        ({ legStartMin }) => (legStartMin[index + 1] ?? 0) - (legStartMin[index] ?? 0),
      ),
    )
    if (leg.kind === 'flight') {
      const asked = 'Looked at every four hours where the hold can be reached, else at loading and unloading.'
      return [
        lawFinding(view, 'observationAir', subject, {
          legId: leg.id,
          status: 'note',
          asked,
          note: 'Ask the carrier whether the hold can be reached.',
        }),
      ]
    }
    const asked = 'Looked at as often as circumstances allow, at least every four hours.'
    const met = leg.attended || longestMin <= OBSERVE_EVERY_MIN
    const note = leg.attended
      ? 'One of ours is beside the crate.'
      : `Up to ${minutes(longestMin)} without one of ours${met ? '' : ': the party in charge is to look in'}.`
    return [
      lawFinding(view, 'observation', subject, {
        legId: leg.id,
        status: met ? 'met' : 'condition',
        side: 'high',
        limit: OBSERVE_EVERY_MIN,
        value: longestMin,
        unit: 'min',
        asked,
        note,
      }),
    ]
  })
}

/** Lodged with the carrier from the first shed, ramp or doors-shut leg right before a take-off, on the planned times. */
function acceptance(view: LawView, subject: Subject): Finding[] {
  const { legs } = view.scenario
  const starts = view.base.schedules.find(({ id }) => id === 'on-time')?.legStartMin ?? []
  return legs.flatMap((leg, index) => {
    const takesOff =
      leg.kind === 'flight' && (leg.flightPhase ?? 'airborne') === 'airborne' && isAboard(subject, index)
    if (!takesOff) return []
    let first = index
    while (first > 0 && isLodged(legs[first - 1])) first -= 1
    const value = (starts[index] ?? 0) - (starts[first] ?? 0)
    const agreed = papersFor(view, subject.animal.id, 'acceptance-agreement').length > 0
    const limit = agreed ? ACCEPT_AGREED_MIN : ACCEPT_BEFORE_MIN
    const asked = `Accepted at most ${limit / 60} hours before departure${agreed ? ', as agreed with the carrier' : ''}.`
    return [
      lawFinding(view, 'acceptance', subject, {
        legId: leg.id,
        status: value > limit ? 'breach' : 'met',
        side: 'high',
        limit,
        value,
        unit: 'min',
        asked,
        note: `Lodged ${minutes(value)} before departure.`,
      }),
    ]
  })
}

function isLodged(leg: LawView['scenario']['legs'][number] | undefined): boolean {
  return (
    leg !== undefined &&
    (leg.kind === 'shed' || leg.kind === 'ramp' || leg.flightPhase === 'doors-shut-departure')
  )
}

/** A paper that can still be brought is a condition, not a broken law. */
function certificate(
  view: LawView,
  subject: Subject,
  source: SourceKey,
  kind: string,
  asked: string,
  mostDays?: number,
): Finding {
  const { departureMs } = view.scenario
  const papers = papersFor(view, subject.animal.id, kind)
  const ages = papers.map((paper) => daysOld(paper, departureMs))
  const valid = papers.some((paper, index) => {
    const days = ages[index]
    const inDate = paper.expiresMs === undefined || paper.expiresMs >= departureMs
    return inDate && (mostDays === undefined || (days !== undefined && days >= 0 && days <= mostDays))
  })
  if (valid) return lawFinding(view, source, subject, { status: 'met', asked, note: 'Attached and in date.' })
  const dated = ages.filter((days) => days !== undefined)
  const why =
    papers.length === 0
      ? 'Not attached.'
      : dated.length === 0
        ? 'Attached without a date of issue.'
        : `Attached, issued ${Math.min(...dated)} days before departure: void.`
  return lawFinding(view, source, subject, {
    status: 'condition',
    asked,
    note: why,
    ...(mostDays !== undefined && { limit: mostDays, unit: 'days' }),
  })
}

function litter(view: LawView, subject: Subject): Finding[] {
  const longestMin = Math.max(
    ...view.base.schedules.map(
      ({ legStartMin }) => (legStartMin[subject.lastLeg + 1] ?? 0) - (legStartMin[subject.firstLeg] ?? 0),
    ),
  )
  if (longestMin <= LITTER_MIN) return []
  const asked = 'More than 24 hours in transit: clean and replace the litter, or move to a clean enclosure.'
  return [
    lawFinding(view, 'litter', subject, {
      status: 'note',
      limit: LITTER_MIN,
      value: longestMin,
      unit: 'min',
      asked,
      note: `Up to ${minutes(longestMin)} in transit.`,
    }),
  ]
}

/** Passing the numbers is not enough for these: temperature, humidity and time together may still harm them. */
function handling(view: LawView, subject: Subject): Finding[] {
  const { animal } = subject
  const reasons = [
    (animal.profile.startsWith('snub-nosed-') || animal.flags.includes('snub-nosed')) && 'snub-nosed',
    (animal.flags.includes('juvenile') ||
      (animal.ageDays !== undefined && animal.ageDays < FOUR_MONTHS_DAYS)) &&
      'young',
    animal.flags.includes('elderly') && 'elderly',
    animal.flags.includes('ill') && 'ill',
  ].filter((reason) => reason !== false)
  if (reasons.length === 0) return []
  const legs = view.scenario.legs.filter(
    (leg, index) => isAboard(subject, index) && legalPlace(leg) !== undefined,
  )
  return [
    lawFinding(view, 'handling', subject, {
      status: 'judgement',
      asked:
        'No combination of temperature, humidity and time that harms the animal, given its age, breed and health.',
      note: `This animal is ${list(reasons)}: a veterinarian judges all ${legs.length} legs.`,
    }),
  ]
}
