'use client'

import type { ChecklistItem, ChecklistLeg, ChecklistView } from '@/lib/views/checklist'
import { ConditionAct } from './condition-act'
import { HandoverAct } from './handover-act'
import { ReadingAct } from './reading-act'
import type { NewEntry } from './use-entries'
import { WaterAct } from './water-act'

export type Enter = (kind: NewEntry['kind'], more?: Partial<NewEntry>) => void

/** What an open item asks for besides its tick. */
export function ItemAct({
  item,
  leg,
  view,
  onEnter,
}: {
  item: ChecklistItem
  leg: ChecklistLeg
  view: ChecklistView
  onEnter: Enter
}) {
  switch (item.kind) {
    case 'tick':
      return null
    case 'reading':
      return (
        <ReadingAct
          crates={view.crates}
          onEnter={(airTempC) => onEnter('reading', { value: { airTempC } })}
        />
      )
    case 'water':
      return <WaterAct onEnter={(text) => onEnter('water', { value: { text } })} />
    case 'condition':
      return <ConditionAct onEnter={(allWell, text) => onEnter('condition', { value: { allWell, text } })} />
    case 'handover':
      return <HandoverAct leg={leg} crates={view.crates} onEnter={(more) => onEnter('handover', more)} />
  }
}
