'use client'

import { useRouter } from 'next/navigation'
import { useCallback, useState } from 'react'
import { Stamp } from '@/components/ui/stamp'
import type { ChecklistView, EntryView } from '@/lib/views/checklist'
import { CallBar, CallList } from './calls'
import { CloseLeg } from './close-leg'
import { EarlySigns } from './early-signs'
import { EnduranceTable } from './endurance-table'
import { EntriesList } from './entries-list'
import type { BatchAnswer } from './entry-queue'
import { ItemRow } from './item-row'
import { itemStates, legTally } from './item-states'
import { JourneyActs } from './journey-acts'
import type { JourneyActions, RequestIds } from './journey-acts'
import { LegHead } from './leg-head'
import { LegNotes } from './leg-notes'
import { OwnLegs } from './own-legs'
import { SignalLine } from './signal-line'
import { StopLimits } from './stop-limits'
import { useEntries } from './use-entries'

const ANSWER_MS = 20_000

/** The driver's own legs in a column as wide as a phone, one at a time; works on without a signal. */
export function Checklist({
  view,
  storageKey,
  actions,
  requestIds,
}: {
  view: ChecklistView
  storageKey: string
  actions: JourneyActions
  requestIds: RequestIds
}) {
  const router = useRouter()
  const address = `/api/runs/${view.consignmentId}/entries`
  const entries = useEntries({
    storageKey,
    stored: view.entries,
    send: useCallback((batch) => sendEntries(address, batch), [address]),
    onStored: useCallback(() => router.refresh(), [router]),
  })
  const [chosenId, setChosenId] = useState(() => currentLegId(view))
  const leg = view.legs.find((one) => one.legId === chosenId) ?? view.legs[0]
  if (!leg) return <p className="p-4">No leg of this run names you.</p>

  const states = itemStates(leg.items, entries.all, leg.legId)
  const tally = legTally(leg.items, entries.all, leg.legId)
  const nextKey = leg.items.find((item) => states.get(item.key)?.state === 'open')?.key
  const locked = tally.closed !== null || view.state === 'delivered' || view.state === 'stopped'

  return (
    <div className="no-print mx-auto max-w-[430px] border-rule pb-6 desk:border-x">
      <OwnLegs legs={view.legs} entries={entries.all} chosenId={leg.legId} onChoose={setChosenId} />
      <SignalLine silentSinceMs={entries.silentSinceMs} keptCount={entries.kept.length} zone={leg.end.zone} />
      <LegHead leg={leg} />
      <StopLimits stops={leg.stops} />
      <EnduranceTable rows={leg.endurance} />
      <EarlySigns leg={leg} />
      <LegNotes leg={leg} />
      <CallBar calls={view.calls} />
      <div className="border-b-2 border-ink px-4 pb-2 pt-3.5">
        <h2 className="text-section">
          Leg {leg.ordinal}, {leg.items.length} items
        </h2>
        <p className="text-caption text-mute">
          {tally.ticked} ticked, {tally.notDone} not done, {tally.open} open
        </p>
      </div>
      <ol className="list-none bg-sheet">
        {leg.items.map((item) => (
          <ItemRow
            key={`${leg.legId}-${item.key}`}
            item={item}
            leg={leg}
            view={view}
            state={states.get(item.key) ?? { state: 'open' }}
            next={item.key === nextKey && !locked}
            locked={locked}
            onEntry={entries.add}
          />
        ))}
      </ol>
      <CloseLeg
        leg={leg}
        tally={tally}
        locked={view.state === 'released' ? 'The journey has not begun' : ''}
        onClose={() =>
          entries.add({
            legId: leg.legId,
            itemKey: 'close',
            kind: 'close_leg',
            atMs: Date.now(),
            place: '',
            value: {},
            alive: null,
            dead: null,
            short: null,
          })
        }
      />
      <JourneyActs view={view} actions={actions} requestIds={requestIds} />
      <CallList calls={view.calls} />
      <EntriesList entries={entries} leg={leg} view={view} />
      <footer className="border-t border-rule px-4 pt-3 text-caption text-mute">
        <Stamp {...view.stamp} size="s" />
        <p className="mt-1.5">{view.headline}</p>
        {view.overrides.map((override) => (
          <p key={override.findingIndex} className="mt-1">
            <b>Overridden by {override.vetName}:</b> {override.findingWords}.
          </p>
        ))}
      </footer>
    </div>
  )
}

/** The first leg that isn't closed. */
function currentLegId(view: ChecklistView): string {
  const open = view.legs.find((leg) => legTally(leg.items, view.entries, leg.legId).closed === null)
  return (open ?? view.legs.at(-1))?.legId ?? ''
}

async function sendEntries(address: string, batch: EntryView[]): Promise<BatchAnswer> {
  const response = await fetch(address, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ entries: batch }),
    // A line that has gone dead without saying so must not hold up the next try.
    signal: AbortSignal.timeout(ANSWER_MS),
  })
  if (!response.ok) throw new Error(`The server answered ${response.status}.`)
  return (await response.json()) as BatchAnswer
}
