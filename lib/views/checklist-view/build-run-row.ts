import { ownLegs } from '@/lib/planning/checklist'
import type { EntryView, RunRow } from '../checklist'
import { buildSheetView } from '../sheet-view/build-sheet-view'
import type { SheetFacts } from '../sheet-view/facts'

/** One run on a driver's list: own legs of the revision in force. */
export function buildRunRow(
  facts: SheetFacts,
  driverId: number,
  animals: string,
  entries: readonly Pick<EntryView, 'legId' | 'kind'>[],
): RunRow {
  const sheet = buildSheetView(facts)
  const own = new Set(ownLegs(facts.plan, driverId).map(({ id }) => id))
  return {
    consignmentId: sheet.consignmentId,
    mark: sheet.mark,
    revision: sheet.revision,
    from: sheet.legs[0]?.fromPlace ?? '',
    to: sheet.legs.at(-1)?.toPlace ?? '',
    animals,
    state: sheet.state,
    stamp: sheet.stamp,
    legs: sheet.legs
      .filter(({ legId }) => own.has(legId))
      .map(({ legId, ordinal, title, start }) => ({
        ordinal,
        title,
        start,
        closed: entries.some((entry) => entry.kind === 'close_leg' && entry.legId === legId),
      })),
    leaves: sheet.leaves,
  }
}
