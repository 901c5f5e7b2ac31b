import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { visibleParts } from '@/lib/policies/consignment'
import { darkStretches } from '@/lib/views/darkness'
import type { DeskPageView } from '@/lib/views/desk-page'
import { buildSheetView } from '@/lib/views/sheet-view/build-sheet-view'
import { approvalLines } from '../approvals/lines'
import { historyLines } from '../audit/history'
import { documentLines } from '../documents/lines'
import { releaseReadiness } from '../release/readiness'
import { sheetFacts } from './sheet-facts'
import { findConsignment } from './visible'

/** The desk's page of a consignment: the sheet of the revision being worked on, and all that was decided about it. */
export async function loadDeskPage(
  actor: Actor,
  { consignmentId }: { consignmentId: number },
  now: Date,
): Promise<DeskPageView> {
  const { row, facts } = await findConsignment(actor, consignmentId)
  if (!visibleParts(actor, facts).includes('assessment')) {
    throw new SteadfoldError('not_found', 'There is no such consignment.')
  }
  const sheet = await sheetFacts(row, { which: 'working', tracks: true, now })
  return {
    sheet: buildSheetView(sheet),
    approvals: await approvalLines(row),
    documents: await documentLines(row.id),
    history: await historyLines(row.id),
    readiness: row.state === 'approved' ? await releaseReadiness(row, now) : null,
    dark: darkStretches(sheet.plan, sheet.places),
  }
}
