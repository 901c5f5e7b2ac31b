import type { Leg } from '@/lib/thermal'
import type { Finding } from '../../result'
import { outsideAir } from '../../outside-air'
import type { Subject } from '../../subject'
import { fahrenheit } from '../../wording'
import type { LawView } from '../pack'
import { lawFinding } from './finding'
import { legalPlace } from './places'
import { inCelsius, inFahrenheit } from './temperature'

const FAN_F = 85
const COVER_F = 50
const JUST_UNDER_C = 2e-6

/** Fans when the air reaches 85 °F, cover in the open below 50 °F, and aircraft, for which the text has no number. */
export function conveyanceFindings(
  view: LawView,
  subject: Subject,
  legIndexes: readonly number[],
): Finding[] {
  return legIndexes.flatMap((index) => {
    const leg = view.scenario.legs[index]
    if (leg === undefined) return []
    switch (legalPlace(leg)) {
      case 'surface':
        return [ventilation(view, subject, leg, index, 'surfaceVentilation')]
      case 'holding':
        return [ventilation(view, subject, leg, index, 'holdingVentilation')]
      case 'aircraft':
        return [aircraft(view, subject, leg)]
      case 'moving':
        return cover(view, subject, leg, index)
      case undefined:
        return []
    }
  })
}

function ventilation(
  view: LawView,
  subject: Subject,
  leg: Leg,
  index: number,
  source: 'surfaceVentilation' | 'holdingVentilation',
): Finding {
  const hottestC = extremeC(view, leg, index, 'high')
  // "Reaches" is at or above, so the span is looked for from just under the mark.
  const reached = hottestC > inCelsius(FAN_F) - JUST_UNDER_C
  const provided =
    leg.surroundings.type === 'enclosed' &&
    ((leg.surroundings.ventilationM3h ?? 0) > 0 || (leg.surroundings.conditioning?.coolingW ?? 0) > 0)
  const asked = `Fans, blowers or air conditioning when the air reaches ${fahrenheit(FAN_F)}.`
  const shared = {
    legId: leg.id,
    side: 'high' as const,
    limit: FAN_F,
    value: inFahrenheit(hottestC),
    unit: '°F',
    asked,
  }
  if (!reached)
    return lawFinding(view, source, subject, {
      ...shared,
      status: 'met',
      note: `Up to ${fahrenheit(shared.value)}: not reached.`,
    })
  if (provided)
    return lawFinding(view, source, subject, {
      ...shared,
      status: 'met',
      note: `Up to ${fahrenheit(shared.value)}; the plan gives fresh air or air conditioning.`,
    })
  const status = source === 'surfaceVentilation' ? 'condition' : 'note'
  return lawFinding(view, source, subject, {
    ...shared,
    status,
    note: `Up to ${fahrenheit(shared.value)}: fan, blower or air conditioning required, and none stands in the plan.`,
  })
}

/** A rule without a number: where the animal keeps its alarm with 3 °C to spare it is a note, else a judgement. */
function aircraft(view: LawView, subject: Subject, leg: Leg): Finding {
  const holds = view.holdsWithMargin(subject, leg.id)
  return lawFinding(view, 'aircraft', subject, {
    legId: leg.id,
    status: holds ? 'note' : 'judgement',
    asked: 'Aircraft cargo area heated or cooled as the animal’s health needs; the text has no number.',
    note: holds
      ? 'The computed animal stays inside its alarm limits with 3 °C to spare.'
      : 'The computed animal does not keep its alarm limits with 3 °C to spare: a veterinarian judges.',
  })
}

function cover(view: LawView, subject: Subject, leg: Leg, index: number): Finding[] {
  const coldestC = extremeC(view, leg, index, 'low')
  if (leg.surroundings.type !== 'open-air' || coldestC >= inCelsius(COVER_F)) return []
  const answer = {
    legId: leg.id,
    side: 'low' as const,
    limit: COVER_F,
    value: inFahrenheit(coldestC),
    unit: '°F',
    asked: `Crate covered outdoors when the air is below ${fahrenheit(COVER_F)}.`,
  }
  return [
    lawFinding(view, 'cover', subject, {
      ...answer,
      status: 'note',
      note: `Down to ${fahrenheit(answer.value)}: cover the crate.`,
    }),
  ]
}

function extremeC(view: LawView, leg: Leg, index: number, side: 'high' | 'low'): number {
  const temps = view.base.schedules.flatMap(({ id }) =>
    outsideAir(view.base, leg, index, id, side).map(({ tempC }) => tempC),
  )
  return side === 'high' ? Math.max(...temps) : Math.min(...temps)
}
