import { crateMark } from '@/lib/planning/crate-mark'
import { crateStamp } from '../crate-stamp'
import type { ReviewQueueRow } from '../review'
import { buildSheetView } from '../sheet-view/build-sheet-view'
import type { SheetFacts } from '../sheet-view/facts'

/** The crate set-ups of one consignment as lines of the vet's queue. */
export function buildQueueRows(facts: SheetFacts): ReviewQueueRow[] {
  const sheet = buildSheetView(facts)
  const place = (name: string | undefined) => name ?? 'not known'
  const route = `${place(sheet.legs[0]?.fromPlace)} to ${place(sheet.legs.at(-1)?.toPlace)}`
  return facts.plan.crates.map((crate) => {
    const animals = sheet.animals.filter(({ crateId }) => crateId === crate.id)
    const signed = facts.approvals.find(
      ({ crateId, inForce, decision }) => crateId === crate.id && inForce && decision !== 'returned',
    )
    const names = animals.map(({ name, breedNote, speciesName }) =>
      [name, breedNote === '' ? speciesName.toLowerCase() : breedNote].join(', '),
    )
    return {
      consignmentId: facts.consignment.id,
      crateId: crate.id,
      crateMark: crateMark(facts.consignment.mark, crate.letter),
      crateLetter: crate.letter,
      words: `${names.join('; ')}. ${route}`,
      leaves: sheet.leaves,
      stamp: crateStamp(animals),
      decision: signed === undefined ? 'waiting' : 'approved',
      signed: signed === undefined ? null : { ms: signed.signedAtMs, zone: facts.firm.zone },
    }
  })
}
