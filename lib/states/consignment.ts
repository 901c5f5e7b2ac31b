/** The life of a consignment's working revision, as a table: from → verb → to. Nothing moves along any other line. */
export const CONSIGNMENT_STATES = [
  'draft',
  'assessed',
  'in_review',
  'returned',
  'approved',
  'released',
  'under_way',
  'delivered',
  'stopped',
  'cancelled',
] as const
export type ConsignmentState = (typeof CONSIGNMENT_STATES)[number]

export type ConsignmentMove =
  | 'save'
  | 'assess'
  | 'submit'
  | 'approve'
  | 'return'
  | 'withdraw'
  | 'lapse'
  | 'release'
  | 'depart'
  | 'deliver'
  | 'stop'
  | 'cancel'

export const MOVES: Record<ConsignmentMove, Partial<Record<ConsignmentState, ConsignmentState>>> = {
  /** Saving a released plan starts the next revision; the released one stays in force. */
  save: {
    draft: 'draft',
    assessed: 'draft',
    returned: 'draft',
    in_review: 'draft',
    approved: 'draft',
    released: 'draft',
  },
  /** A plan under review or approved is run again where a species row or a version has moved on: it keeps its state. */
  assess: {
    draft: 'assessed',
    returned: 'assessed',
    assessed: 'assessed',
    in_review: 'in_review',
    approved: 'approved',
  },
  submit: { assessed: 'in_review' },
  approve: { in_review: 'approved' },
  return: { in_review: 'returned' },
  /** A vet takes an approval back before the journey starts; the manifest, if any, is void. */
  withdraw: { approved: 'returned', released: 'returned' },
  /** A later run of the same plan ended a signature: the desk looks before a vet does. */
  lapse: { approved: 'assessed' },
  release: { approved: 'released' },
  depart: { released: 'under_way' },
  deliver: { under_way: 'delivered' },
  stop: { under_way: 'stopped' },
  cancel: {
    draft: 'cancelled',
    assessed: 'cancelled',
    returned: 'cancelled',
    in_review: 'cancelled',
    approved: 'cancelled',
    released: 'cancelled',
  },
}

/** The state a move leads to, or undefined where the table has no such line. */
export function nextState(from: ConsignmentState, move: ConsignmentMove): ConsignmentState | undefined {
  return MOVES[move][from]
}

export const CLOSED_STATES: readonly ConsignmentState[] = ['delivered', 'stopped', 'cancelled']

/** Words for a state, as pages and mails say them. */
export const STATE_WORDS: Record<ConsignmentState, string> = {
  draft: 'Draft',
  assessed: 'Assessed',
  in_review: 'In review',
  returned: 'Returned',
  approved: 'Approved',
  released: 'Released',
  under_way: 'Under way',
  delivered: 'Delivered',
  stopped: 'Stopped',
  cancelled: 'Cancelled',
}
