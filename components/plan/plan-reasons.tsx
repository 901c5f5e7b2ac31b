'use client'

import { useFormContext } from 'react-hook-form'
import { Notice } from '@/components/ui/notice'
import type { Plan } from '@/lib/schemas/plan'
import { fieldWords, ownerWords } from './field-words'
import { usePlanPage, useProblems } from './plan-context'
import { withoutOwner } from './reason-words'

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
          <span id="why-title">
            {problems.length === 1
              ? '1 reason it can’t be assessed yet'
              : `${problems.length} reasons it can’t be assessed yet`}
          </span>
        }
      >
        <ol className="mt-1.5 list-none board:max-h-[26rem] board:overflow-y-auto">
          {problems.map(({ path, message }, index) => {
            const words = fieldWords(getValues(), path)
            return (
              <li
                key={`${path} ${message}`}
                className="grid grid-cols-[28px_1fr] border-t border-hair py-[5px] max-desk:items-baseline max-desk:py-1"
              >
                <span className="font-head font-bold">{index + 1}</span>
                <span>
                  <button
                    type="button"
                    className="link text-left max-desk:flex max-desk:min-h-11 max-desk:items-center"
                    onClick={() => goTo(path)}
                  >
                    {words === '' ? 'The plan' : words}
                  </button>
                  <span className="max-desk:hidden">: </span>
                  {withoutOwner(message, words, ownerWords(getValues(), path))}
                </span>
              </li>
            )
          })}
        </ol>
      </Notice>
    </div>
  )
}
