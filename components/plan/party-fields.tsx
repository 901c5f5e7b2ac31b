'use client'

import { PURPOSE_OPTIONS } from './option-words'
import { usePlanPage } from './plan-context'
import { PlanRecordSelect, PlanSelect, PlanText, PlanTextArea } from './plan-fields'

/** Who sends, who receives, whose account it is, and who is reachable for the whole journey. */
export function PartyFields() {
  const { catalogues } = usePlanPage()
  return (
    <div className="grid border-2 border-ink bg-sheet max-board:divide-y max-board:divide-rule board:grid-cols-3 board:divide-x board:divide-rule [&>*]:px-3.5 [&>*]:pb-3.5 [&>*]:pt-2.5">
      <Party party="consignor" title="Consignor" />
      <Party party="consignee" title="Consignee" />
      <div className="flex flex-col gap-2.5">
        <h3 className="text-sub">Account and emergency</h3>
        <PlanRecordSelect path="shipperId" label="Shipper" records={catalogues.shippers} />
        <PlanSelect path="purpose" label="Purpose" choices={PURPOSE_OPTIONS} />
        <PlanText
          path="emergencyContact.name"
          label="Emergency contact"
          hint="Reachable for the whole journey."
        />
        <PlanText path="emergencyContact.telephone" label="Emergency telephone" type="tel" />
        <PlanTextArea path="handlingNote" label="Handling note" hint="Stands on every paper that travels." />
      </div>
    </div>
  )
}

function Party({ party, title }: { party: 'consignor' | 'consignee'; title: string }) {
  return (
    <div className="flex flex-col gap-2.5">
      <h3 className="text-sub">{title}</h3>
      <PlanText path={`${party}.name`} label="Name" />
      <PlanTextArea path={`${party}.address`} label="Address" rows={2} />
      <PlanText path={`${party}.telephone`} label="Telephone" type="tel" />
      <PlanText path={`${party}.email`} label="E-mail" type="email" />
    </div>
  )
}
