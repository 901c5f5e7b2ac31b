'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { ErrorSummary } from '@/components/ui/error-summary'
import { Hole } from '@/components/ui/holes'
import type { ReleaseReadiness } from '@/lib/views/desk-page'
import { dayDate, localTime } from '@/lib/views/format'
import type { DeskActions } from './acts-bar'
import { useSimpleAct } from './use-simple-act'

const CHECKS = [
  { words: 'The assessment speaks of this plan and these versions', at: ['assessment'] },
  {
    words: 'No breach of law, of a carrier’s rule or of a critical limit; nothing NO-GO is left',
    at: ['findings', 'verdict'],
  },
  { words: 'Every crate set-up is signed for this plan', at: ['crates'] },
  { words: 'Every condition that must be confirmed is confirmed', at: ['conditions'] },
  { words: 'The air of every leg within 48 hours was typed or looked at in the last 12', at: ['legs.air'] },
  { words: 'The departure is not past, and no earlier revision is on the road', at: ['legs.start', 'state'] },
]

/** Release with every check in view; while one is open the button is dotted and says how many. */
export function ReleaseDialog({
  consignmentId,
  mark,
  readiness,
  release,
  confirmAir,
  working,
}: {
  consignmentId: number
  mark: string
  readiness: ReleaseReadiness
  working: boolean
} & Pick<DeskActions, 'release' | 'confirmAir'>) {
  const [open, setOpen] = useState(false)
  const act = useSimpleAct(consignmentId, release, () => setOpen(false))
  const air = useSimpleAct(consignmentId, (input) => confirmAir({ ...input, legIds: [] }))
  const { obstacles, oldestAir } = readiness
  const many = obstacles.length
  const stale = obstacles.some(({ path }) => path.endsWith('.air'))
  return (
    <>
      <Button
        first
        onClick={() => setOpen(true)}
        refused={working ? 'It is being released already.' : undefined}
      >
        Release {mark}
        {many > 0 && `, ${many} in the way`}
      </Button>
      <Dialog
        open={open}
        title={`Release ${mark}`}
        onClose={() => setOpen(false)}
        acts={
          <Button
            first
            onClick={act.run}
            refused={
              act.pending
                ? 'Sending'
                : many > 0
                  ? `${many} ${many === 1 ? 'thing stands' : 'things stand'} in the way.`
                  : undefined
            }
          >
            {act.pending ? 'Sending' : `Release ${mark}`}
          </Button>
        }
      >
        <p className="mb-2">
          The manifest is made, sealed and mailed to the shipper, and the driver gets the checklist.
          Everything is checked again at that moment.
        </p>
        <ul className="list-none">
          {CHECKS.map(({ words, at }) => {
            const wrong = obstacles.filter(({ path }) => at.includes(kindOf(path)))
            return (
              <li key={words} className="grid grid-cols-[24px_1fr] border-t border-hair py-1.5">
                <Hole state={wrong.length === 0 ? 'filled' : 'open'} />
                <span>
                  {words}
                  <span className="sr-only">{wrong.length === 0 ? ': yes' : ': not yet'}</span>
                  {wrong.map(({ message }) => (
                    <span key={message} className="dbl mt-1 block pl-2 text-small font-semibold">
                      {message}
                    </span>
                  ))}
                </span>
              </li>
            )
          })}
        </ul>
        {stale && (
          <p className="mt-3 flex flex-wrap items-center gap-3">
            <Button onClick={air.run} refused={air.pending ? 'Sending' : undefined}>
              I have looked again: the air of all legs still holds
            </Button>
            {oldestAir && (
              <span className="text-small text-mute">
                Oldest: {dayDate(oldestAir.ms, oldestAir.zone)}, {localTime(oldestAir.ms, oldestAir.zone)}
              </span>
            )}
          </p>
        )}
        {(act.refused ?? air.refused) && (
          <div className="mt-3">
            <ErrorSummary
              title={(act.refused ?? air.refused)?.message}
              issues={(act.refused ?? air.refused)?.issues.map(({ message }) => ({ message })) ?? []}
            >
              <p>Nothing was released.</p>
            </ErrorSummary>
          </div>
        )}
      </Dialog>
    </>
  )
}

/** "legs.2.air" is about air, "conditions.41" about conditions. */
function kindOf(path: string): string {
  const [head = '', , field] = path.split('.')
  if (head !== 'legs') return head
  return field === 'air' ? 'legs.air' : 'legs.start'
}
