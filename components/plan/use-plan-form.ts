'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import { useCallback, useEffect, useMemo, useState } from 'react'
import { useForm } from 'react-hook-form'
import type { UseFormReturn } from 'react-hook-form'
import type { PlanningKnowledge } from '@/lib/planning/reasons'
import { planSchema } from '@/lib/schemas/plan'
import type { Plan } from '@/lib/schemas/plan'
import { keepTyping } from './kept-typing'
import type { PlanCatalogues } from './plan-context'
import { PlanProblems, problemsOf } from './plan-problems'

/** Typing settles this long before the plan is judged again and a copy is kept. */
const SETTLE_MS = 200

export interface PlanForm {
  form: UseFormReturn<Plan>
  problems: PlanProblems
  /** Judges at once, for an act that cannot wait. */
  judge: () => void
}

/** The plan in the browser: one form over the shared schema, judged as people type by what the server will ask too. */
export function usePlanForm({
  plan,
  version,
  consignmentId,
  base,
  catalogues,
}: {
  plan: Plan
  version: number | null
  consignmentId: number | null
  /** The plan as last saved, beside which typing is kept. */
  base: Plan
  catalogues: PlanCatalogues
}): PlanForm {
  const form = useForm<Plan>({
    defaultValues: plan,
    resolver: zodResolver(planSchema),
    mode: 'onBlur',
    reValidateMode: 'onChange',
    shouldFocusError: false,
  })
  const [problems] = useState(() => new PlanProblems())
  const knowledge = useMemo<PlanningKnowledge>(
    () => ({ places: catalogues.places, profiles: catalogues.species }),
    [catalogues],
  )
  const judge = useCallback(
    () => problems.set(problemsOf(form.getValues(), knowledge)),
    [form, problems, knowledge],
  )

  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined
    const settle = () => {
      judge()
      if (form.formState.isDirty) {
        keepTyping(consignmentId, { version, base, values: form.getValues(), atMs: Date.now() })
      }
    }
    judge()
    const stop = form.subscribe({
      formState: { values: true, isDirty: true },
      callback: () => {
        clearTimeout(timer)
        timer = setTimeout(settle, SETTLE_MS)
      },
    })
    return () => {
      clearTimeout(timer)
      stop()
    }
  }, [form, judge, consignmentId, version, base])

  return { form, problems, judge }
}
