'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useState } from 'react'
import type { BaseSyntheticEvent, Dispatch, SetStateAction } from 'react'
import type { Path, UseFormReturn } from 'react-hook-form'
import { useSay } from '@/components/ui/live-region'
import type { FieldIssue } from '@/lib/errors'
import type { Plan } from '@/lib/schemas/plan'
import { dropTyping, keptTyping } from './kept-typing'
import { mergePlans } from './merge-plans'
import type { OpenConflict } from './plan-conflict-box'
import { savedMeanwhile } from './plan-editor-types'
import type { EditedConsignment, PlanActions } from './plan-editor-types'

export interface SavedNow {
  plan: Plan
  version: number | null
  atMs: number | null
}

export type PlanSaving = ReturnType<typeof usePlanSaving>

/** Saving, the conflict of two savers, and putting back what was typed before an accident. */
export function usePlanSaving({
  form,
  consignment,
  actions,
  saved,
  setSaved,
  judge,
}: {
  form: UseFormReturn<Plan>
  consignment: EditedConsignment | null
  actions: PlanActions
  saved: SavedNow
  setSaved: Dispatch<SetStateAction<SavedNow>>
  judge: () => void
}) {
  const router = useRouter()
  const say = useSay()
  const [pending, setPending] = useState<'save' | 'assess' | null>(null)
  const [conflict, setConflict] = useState<OpenConflict | null>(null)
  const [failure, setFailure] = useState<{ message: string; issues: FieldIssue[] } | null>(null)
  const [note, setNote] = useState<string | null>(null)
  const [keptAtMs, setKeptAtMs] = useState<number | null>(null)
  // Parts hold field arrays of their own: a new turn draws them again from the form's values.
  const [turn, setTurn] = useState(0)
  const id = consignment?.id ?? null

  const show = (plan: Plan) => {
    form.reset(plan, { keepDefaultValues: true })
    setTurn((before) => before + 1)
    judge()
  }

  useEffect(() => {
    const kept = keptTyping(id)
    if (kept === null || same(kept.values, saved.plan)) return
    // eslint-disable-next-line react-hooks/set-state-in-effect -- what a tab kept is known only after the page stands in the browser
    setKeptAtMs(kept.atMs)
    if (kept.version === saved.version) return show(kept.values)
    takeIn(kept.base, kept.values, saved.plan, { by: '', atMs: kept.atMs })
    // eslint-disable-next-line react-hooks/exhaustive-deps -- once, when the page opens
  }, [])

  function takeIn(base: Plan, mine: Plan, theirs: Plan, by: OpenConflict['saved']) {
    const merged = mergePlans(base, mine, theirs)
    show(merged.plan)
    setConflict({ merged, saved: by, picked: [] })
  }

  async function save(): Promise<number | null> {
    if (pending !== null) return null
    const open = conflict?.merged.conflicts.filter(({ path }) => !conflict.picked.includes(path)) ?? []
    if (open.length > 0) {
      setFailure({ message: 'Two values wait for you: pick one for each, then save again.', issues: [] })
      return null
    }
    setPending('save')
    setFailure(null)
    const plan = structuredClone(form.getValues())
    try {
      const result = await actions.save({
        consignmentId: id,
        version: saved.version,
        // New each time: a save whose answer got lost and the save after it may carry different plans.
        requestId: crypto.randomUUID(),
        plan,
      })
      if (result.ok) {
        dropTyping(id)
        setSaved({ plan, version: result.data.version, atMs: Date.now() })
        form.reset(plan, { keepValues: true })
        setConflict(null)
        setKeptAtMs(null)
        setNote(result.data.voided)
        say('Saved.')
        if (id === null) router.replace(`/consignments/${result.data.consignmentId}/plan`)
        else router.refresh()
        return result.data.consignmentId
      }
      const meanwhile = result.code === 'conflict' ? savedMeanwhile(result.details) : null
      if (meanwhile !== null) {
        takeIn(saved.plan, plan, meanwhile.plan, meanwhile)
        setSaved({ plan: meanwhile.plan, version: meanwhile.version, atMs: null })
        return null
      }
      // What the server refuses stands under "plan" in what was sent, and at the same path in the form without it.
      const issues = result.issues.map((issue) => ({ ...issue, path: issue.path.replace(/^plan\./, '') }))
      for (const issue of issues) {
        form.setError(issue.path as Path<Plan>, { type: 'server', message: issue.message })
      }
      setFailure({ message: result.message, issues })
      return null
    } catch {
      setFailure({
        message:
          'The desk could not be reached. Everything typed is kept in this browser: save again in a moment.',
        issues: [],
      })
      return null
    } finally {
      setPending(null)
    }
  }

  return {
    pending,
    conflict,
    failure,
    note,
    keptAtMs,
    turn,
    submit: async (event: BaseSyntheticEvent) => {
      event.preventDefault()
      await save()
    },
    /** Saves what is not saved and asks for an assessment; null where either was refused. */
    saveAndAssess: async (): Promise<number | null> => {
      const consignmentId = form.formState.isDirty || id === null ? await save() : id
      if (consignmentId === null) return null
      setPending('assess')
      try {
        const result = await actions.assess({ consignmentId, requestId: crypto.randomUUID() })
        if (result.ok) return consignmentId
        setFailure({ message: result.message, issues: result.issues })
        return null
      } catch {
        setFailure({
          message: 'The desk could not be reached. The plan is saved; assess it again in a moment.',
          issues: [],
        })
        return null
      } finally {
        setPending(null)
      }
    },
    pick: (path: string, value: unknown) => {
      form.setValue(path as Path<Plan>, value as never, { shouldDirty: true })
      setTurn((before) => before + 1)
      setConflict((before) => before && { ...before, picked: [...before.picked, path] })
      judge()
    },
    /** Leaves what was typed and goes back to the plan as saved. */
    throwAway: () => {
      dropTyping(id)
      form.reset(saved.plan)
      setTurn((before) => before + 1)
      setConflict(null)
      setFailure(null)
      setKeptAtMs(null)
      judge()
    },
  }
}

function same(a: unknown, b: unknown): boolean {
  return JSON.stringify(a) === JSON.stringify(b)
}
