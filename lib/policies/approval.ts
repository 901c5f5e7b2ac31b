import type { Line, NoFacts } from './table'

/** Clinical acts are a vet's alone: not a dispatcher's, and not an admin's. */
export const approvalPolicy = {
  'approval.queue': { vet: true } satisfies Line<NoFacts>,
  'approval.approve': { vet: true } satisfies Line<NoFacts>,
  'approval.return': { vet: true } satisfies Line<NoFacts>,
  'approval.withdraw': { vet: true } satisfies Line<NoFacts>,
  'approval.override': { vet: true } satisfies Line<NoFacts>,
  'approval.countersign': { vet: true } satisfies Line<NoFacts>,
}
