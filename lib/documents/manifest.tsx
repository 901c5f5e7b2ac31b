import { dayDate, dayDateYear, duration, localTimeWithOffset } from '@/lib/views/format'
import type { ManifestView } from '@/lib/views/manifest'
import { printedCode } from './code'
import type { Block } from './flow'
import { factsHeight, Facts } from './parts/facts'
import { CONTENT_WIDTH } from './parts/paper'
import { sheetsOf } from './parts/sheets'
import { stampRow } from './parts/stamp-row'
import { callTable, handlingList, handoverTable } from './manifest/acts'
import { animalTable } from './manifest/animal-table'
import { approvalBoxes } from './manifest/approval-box'
import { checkPart } from './manifest/check-part'
import { crateTable } from './manifest/crate-table'
import { legTable } from './manifest/leg-table'
import { conditionTable } from './sheet/condition-table'
import { overrideNotes } from './sheet/override-notes'

const TITLE = 'Manifest'

/** The manifest as a document, and how many sheets were planned. Facts come first; the acts begin on a sheet of their own. */
export function manifest(view: ManifestView, slack = 1) {
  const { mark, revision, revisionWords, edgeWords, firm, made } = view
  const code = printedCode(view.documentCode)
  const head = { title: TITLE, mark, revision, revisionWords, edgeWords, code, firmName: firm.name, made }
  return sheetsOf(head, blocksOf(view), slack)
}

function blocksOf(view: ManifestView): Block[] {
  return [
    factsBlock(view),
    stampRow(view),
    ...overrideNotes(view.overrides),
    animalTable(view.animals),
    crateTable(view.crates),
    legTable(view.legs),
    ...approvalBoxes(view),
    ...conditionTable(view.conditions, ''),
    ...handlingList(view.handling),
    callTable(view.calls),
    handoverTable(view.handovers),
    checkPart(view),
  ]
}

const WIDTHS = [178, 186, 152, CONTENT_WIDTH - 3 - 178 - 186 - 152]

function factsBlock(view: ManifestView): Block {
  const { leaves, arrives, consignor, consignee, shipper, emergencyContact } = view
  const crates = `${view.crateCount} ${view.crateCount === 1 ? 'crate' : 'crates'}`
  const animals = `${view.animalCount} ${view.animalCount === 1 ? 'animal' : 'animals'}`
  const rows = [
    [
      { caption: 'Consignor', value: consignor.name, bold: true, more: consignor.lines },
      { caption: 'Consignee', value: consignee.name, bold: true, more: consignee.lines },
      { caption: 'Shipper', value: shipper.name, bold: true, more: shipper.lines },
      {
        caption: 'Emergency contact, whole journey',
        value: emergencyContact.name,
        bold: true,
        more: emergencyContact.lines,
      },
    ],
    [
      {
        caption: 'Leaves',
        value: `${dayDateYear(leaves.ms, leaves.zone)}, ${localTimeWithOffset(leaves.ms, leaves.zone)}`,
      },
      {
        caption: 'Arrives',
        value: `${dayDate(arrives.ms, arrives.zone)}, ${localTimeWithOffset(arrives.ms, arrives.zone)}`,
      },
      { caption: 'Animals, crates', value: `${animals} in ${crates}` },
      {
        caption: 'Time in crate',
        value: duration(view.journeyMin),
      },
    ],
  ]
  return { height: factsHeight(WIDTHS, rows), element: <Facts key="facts" widths={WIDTHS} rows={rows} /> }
}
