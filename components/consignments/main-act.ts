import type { FindingView } from '@/lib/views/sheet'
import type { ConsignmentState } from '@/lib/states/consignment'
import type { DeskAct } from './status-view'

/** The act that moves a consignment on from its state; null where the move is somebody else's. */
export function mainAct(
  state: ConsignmentState,
  acts: readonly DeskAct[],
  { needsAssessment, absolute }: { needsAssessment: boolean; absolute: boolean },
): DeskAct | null {
  const next = nextOf(state, needsAssessment)
  if (next === 'submit' && absolute) return acts.includes('save') ? 'save' : null
  return next !== null && acts.includes(next) ? next : null
}

function nextOf(state: ConsignmentState, needsAssessment: boolean): DeskAct | null {
  switch (state) {
    case 'draft':
    case 'returned':
      return 'assess'
    case 'assessed':
      return needsAssessment ? 'assess' : 'submit'
    case 'approved':
      return needsAssessment ? 'assess' : 'release'
    case 'in_review':
      return needsAssessment ? 'assess' : null
    case 'released':
    case 'under_way':
    case 'delivered':
    case 'stopped':
    case 'cancelled':
      return null
  }
}

/** The first breach nobody may override, in words; null where there is none. */
export function absoluteWords(findings: readonly FindingView[]): string | null {
  const absolute = findings.find(({ status, overridable }) => status === 'breach' && !overridable)
  return absolute === undefined ? null : `${absolute.whoLegWords}: ${absolute.asked}`
}
