import { STATE_WORDS } from '@/lib/states/consignment'
import type { ConsignmentState } from '@/lib/states/consignment'

/** A state as its shipper reads it: what goes on at the desk before a release is the desk's. */
export function portalStateWords(state: ConsignmentState): string {
  switch (state) {
    case 'draft':
    case 'assessed':
    case 'returned':
      return 'The desk is planning it'
    case 'in_review':
    case 'approved':
      return 'Being checked before its release'
    case 'released':
    case 'under_way':
    case 'delivered':
    case 'stopped':
    case 'cancelled':
      return STATE_WORDS[state]
  }
}
