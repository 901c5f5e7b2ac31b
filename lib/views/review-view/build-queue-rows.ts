import { crateMark } from '@/lib/planning/crate-mark'
import type { Finding } from '@/lib/rules/result'
import { weightOf, worstOf } from '@/lib/rules/verdicts'
import type { ReviewQueueRow } from '../review'
import type { Moment, Stamp } from '../sheet'

/** What the queue shows of one consignment, and no more: nothing of its plan but names, nothing of its result but weights. */
export interface QueueFacts {
  consignmentId: number
  mark: string
  fromPlace: string
  toPlace: string
  leaves: Moment
  outOfDate: boolean
  /** null: no finished assessment. */
  findings: readonly QueueFinding[] | null
  /** A party refused a condition of this plan. */
  refused: boolean
  crates: readonly QueueCrate[]
}

export interface QueueCrate {
  crateId: string
  letter: string
  animals: readonly { animalId: string; name: string; breedNote: string; speciesName: string }[]
  /** When it was signed for this very plan; null while it waits. */
  signed: Moment | null
}

/** Findings of one kind about the same animal, told by their least margin. */
export interface QueueFinding extends Pick<Finding, 'status'> {
  animalId: string | null
  crateId: string | null
  marginOutsideAirC: number | null
}

/** The crate set-ups of one consignment as lines of the vet's queue. */
export function buildQueueRows(facts: QueueFacts): ReviewQueueRow[] {
  const route = `${facts.fromPlace || 'not known'} to ${facts.toPlace || 'not known'}`
  return facts.crates.map((crate) => ({
    consignmentId: facts.consignmentId,
    crateId: crate.crateId,
    crateMark: crateMark(facts.mark, crate.letter),
    crateLetter: crate.letter,
    words: `${crate.animals.map(nameOf).join('; ')}. ${route}`,
    leaves: facts.leaves,
    stamp: crate.signed === null ? stampOf(crate, facts) : null,
    decision: crate.signed === null ? 'waiting' : 'approved',
    signed: crate.signed,
  }))
}

function nameOf({ name, breedNote, speciesName }: QueueCrate['animals'][number]): string {
  return [name, breedNote === '' ? speciesName.toLowerCase() : breedNote].join(', ')
}

/**
 * The verdict on a crate that waits: nothing of it is overridden and no vet has put a condition on it yet, so it is the
 * worst of what was found about it, and NO-GO where somebody refused a condition.
 */
function stampOf({ crateId, animals }: QueueCrate, { findings, refused, outOfDate }: QueueFacts): Stamp {
  if (findings === null) return { verdict: 'none', conditions: 0, outOfDate: false }
  const own = findings.filter(
    (one) =>
      (one.crateId === null || one.crateId === crateId) &&
      (one.animalId === null || animals.some(({ animalId }) => animalId === one.animalId)),
  )
  const weights = own.map(({ status, marginOutsideAirC }) =>
    weightOf({ status, ...(marginOutsideAirC !== null && { marginOutsideAirC }) }),
  )
  return { verdict: refused ? 'no-go' : worstOf(weights), conditions: 0, outOfDate }
}
