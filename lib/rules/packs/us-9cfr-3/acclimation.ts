import type { Paper } from '@/lib/thermal'
import type { Finding } from '../../result'
import type { Subject } from '../../subject'
import { fahrenheit } from '../../wording'
import { type LawView, daysOld, papersFor } from '../pack'
import { lawFinding } from './finding'

export const ACCLIMATION_CERTIFICATE = 'acclimation-certificate'
const MOST_DAYS = 10

/** Lowest air, °F, that a valid acclimation certificate allows this animal; undefined without one. */
export function acclimatedFloorF(view: LawView, subject: Subject): number | undefined {
  const floors = papersFor(view, subject.animal.id, ACCLIMATION_CERTIFICATE).flatMap((paper) => {
    const floorF = statedF(paper)
    return floorF !== undefined && isValid(paper, view.scenario.departureMs) ? [floorF] : []
  })
  return floors.length === 0 ? undefined : Math.min(...floors)
}

/** A certificate that is attached and does not hold is said so: it changes nothing. It never touches the high limit. */
export function acclimationFindings(view: LawView, subject: Subject): Finding[] {
  return papersFor(view, subject.animal.id, ACCLIMATION_CERTIFICATE).map((paper) => {
    const floorF = statedF(paper)
    const days = daysOld(paper, view.scenario.departureMs)
    const holds = floorF !== undefined && isValid(paper, view.scenario.departureMs)
    const why =
      floorF === undefined
        ? 'it states no minimum'
        : days === undefined
          ? 'it has no date'
          : days < 0
            ? 'it is dated after departure'
            : `it was signed ${days} days before departure`
    return lawFinding(view, 'acclimation', subject, {
      status: holds ? 'met' : 'note',
      limit: MOST_DAYS,
      value: days,
      unit: 'days',
      asked: `Signed by a veterinarian at most ${MOST_DAYS} days before delivery, stating the lowest air.`,
      note: holds
        ? `Acclimated to air down to ${fahrenheit(floorF)}.`
        : `The acclimation certificate is void: ${why}.`,
    })
  })
}

function isValid(paper: Paper, departureMs: number): boolean {
  const days = daysOld(paper, departureMs)
  const expired = paper.expiresMs !== undefined && paper.expiresMs < departureMs
  return days !== undefined && days >= 0 && days <= MOST_DAYS && !expired
}

function statedF({ values }: Paper): number | undefined {
  if (values.minAirF !== undefined) return values.minAirF
  return values.minAirC === undefined ? undefined : values.minAirC * 1.8 + 32
}
