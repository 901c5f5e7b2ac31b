'use client'

import { useFormContext } from 'react-hook-form'
import { Notice } from '@/components/ui/notice'
import type { Plan } from '@/lib/schemas/plan'
import { fieldWords, ownerWords } from './field-words'
import { usePlanPage, useProblems } from './plan-context'

/** Every reason why the plan cannot be assessed, all at once, each with a way to its field. */
export function PlanReasons() {
  const problems = useProblems()
  const { goTo } = usePlanPage()
  const { getValues } = useFormContext<Plan>()
  if (problems.length === 0) {
    return (
      <div id="why" tabIndex={-1} className="border-2 border-ink bg-sheet px-4 py-3 outline-none">
        <h2 className="text-sub">Nothing stands in the way</h2>
        <p className="mt-1">The plan can be assessed as it stands.</p>
      </div>
    )
  }
  return (
    <div id="why" tabIndex={-1} className="outline-none">
      <Notice
        title={
          problems.length === 1
            ? '1 reason it can’t be assessed yet'
            : `${problems.length} reasons it can’t be assessed yet`
        }
      >
        <ol className="mt-1.5 max-h-[26rem] list-none overflow-y-auto">
          {problems.map(({ path, message }, index) => {
            const words = fieldWords(getValues(), path)
            return (
              <li
                key={`${path} ${message}`}
                className="grid grid-cols-[28px_1fr] border-t border-hair py-[5px] max-desk:py-2"
              >
                <span className="font-head font-bold">{index + 1}</span>
                <span>
                  <button type="button" className="link text-left" onClick={() => goTo(path)}>
                    {words === '' ? 'The plan' : words}
                  </button>
                  : {withoutOwner(message, ownerWords(getValues(), path))}
                </span>
              </li>
            )
          })}
        </ol>
      </Notice>
    </div>
  )
}

/** The link says whose it is already: "Leg 6, telephone" needs no second "Leg 6 (flight):". */
function withoutOwner(message: string, owner: string): string {
  if (owner === '' || !message.startsWith(owner)) return message
  const rest = message.slice(owner.length).replace(/^(?: \([^)]*\))?[,:]? ?/, '')
  return rest === '' ? message : rest
}
