import { dayDate, duration, localTime, localTimeWithOffset } from '@/lib/views/format'
import type { SheetView } from '@/lib/views/sheet'
import { printedCode } from './code'
import type { Block } from './flow'
import { Facts, factsHeight } from './parts/facts'
import { CONTENT_WIDTH } from './parts/paper'
import { sheetsOf } from './parts/sheets'
import { stampRow } from './parts/stamp-row'
import { animalBoxes } from './sheet/animal-boxes'
import { conditionTable } from './sheet/condition-table'
import { corridors } from './sheet/corridors'
import { findingTable } from './sheet/finding-table'
import { legTables } from './sheet/leg-table'
import { overrideNotes } from './sheet/override-notes'
import { signatures } from './sheet/signatures'
import { speaksOf } from './sheet/speaks-of'
import { stopLimits } from './sheet/stop-limits'

const TITLE = 'Go/no-go sheet'

/** The go/no-go sheet as a document, and how many sheets were planned. `slack` under 1 plans less on each sheet. */
export function goNoGoSheet(view: SheetView, slack = 1) {
  const { mark, revision, revisionWords, edgeWords, firm, made } = view
  const code = view.documentCode === null ? 'none' : printedCode(view.documentCode)
  const head = { title: TITLE, mark, revision, revisionWords, edgeWords, code, firmName: firm.name, made }
  return sheetsOf(head, blocksOf(view), slack)
}

function blocksOf(view: SheetView): Block[] {
  return [
    factsBlock(view),
    stampRow(view),
    ...overrideNotes(view.overrides),
    ...animalBoxes(view.animals),
    ...legTables(view),
    ...conditionTable(view.conditions, view.conditionsWords),
    ...stopLimits(view.stopLimits, view.firm),
    ...corridors(view),
    ...findingTable(view.findings),
    ...signatures(view.approvals),
    ...speaksOf(view),
  ]
}

function factsBlock(view: SheetView): Block {
  const { leaves, arrives } = view
  const rows = [
    [
      { caption: 'From', value: view.from, bold: true },
      {
        caption: 'Leaves',
        value: `${dayDate(leaves.ms, leaves.zone)}, ${localTime(leaves.ms, leaves.zone)}`,
      },
      { caption: 'Shipper', value: view.shipper },
      {
        caption: 'Animals, crates',
        value: `${view.animalCount} in ${view.crateCount} ${view.crateCount === 1 ? 'crate' : 'crates'}`,
      },
    ],
    [
      { caption: 'To', value: view.to, bold: true },
      {
        caption: 'Arrives',
        value: `${dayDate(arrives.ms, arrives.zone)}, ${localTimeWithOffset(arrives.ms, arrives.zone)}`,
      },
      { caption: 'Flight', value: view.flight === '' ? 'none' : view.flight },
      { caption: 'Time in crate', value: duration(view.journeyMin) },
    ],
  ]
  return {
    height: factsHeight(FACT_WIDTHS, rows),
    element: <Facts key="facts" widths={FACT_WIDTHS} rows={rows} />,
  }
}

const FACT_WIDTHS = [211, 180, 156, CONTENT_WIDTH - 3 - 211 - 180 - 156]
