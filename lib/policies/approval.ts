import { line } from './table'
import type { NoFacts } from './table'

/** Clinical acts are a vet's alone: not a dispatcher's, and not an admin's. */
export const approvalPolicy = {
  'approval.queue': line<NoFacts>({ vet: true }),
  'approval.approve': line<NoFacts>({ vet: true }),
  'approval.return': line<NoFacts>({ vet: true }),
  'approval.withdraw': line<NoFacts>({ vet: true }),
  'approval.override': line<NoFacts>({ vet: true }),
}
