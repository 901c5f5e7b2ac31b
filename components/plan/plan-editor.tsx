'use client'

import { useRouter } from 'next/navigation'
import { useCallback, useEffect, useMemo, useState } from 'react'
import { FormProvider } from 'react-hook-form'
import type { Plan } from '@/lib/schemas/plan'
import { AnimalsPart } from './animals-part'
import { CratesPart } from './crates-part'
import { LegsPart } from './legs-part'
import { PlanCommands } from './plan-commands'
import { PlanConflictBox } from './plan-conflict-box'
import { PlanPageProvider } from './plan-context'
import type { PlanCatalogues } from './plan-context'
import type { EditedConsignment, PlanActions } from './plan-editor-types'
import { PlanFolds } from './plan-folds'
import { PlanHead } from './plan-head'
import { PlanReasons } from './plan-reasons'
import { PartyFields } from './party-fields'
import { useOpenParts } from './use-open-parts'
import { usePlanForm } from './use-plan-form'
import { usePlanSaving } from './use-plan-saving'

/** The plan of a consignment: parts folded to a line each, legs on one true time scale, and why it can't be assessed. */
export function PlanEditor({
  consignment,
  plan,
  catalogues,
  actions,
  nowMs,
  zone,
}: {
  /** null: a new one. */
  consignment: EditedConsignment | null
  plan: Plan
  catalogues: PlanCatalogues
  actions: PlanActions
  nowMs: number
  /** The desk's own zone, for times of saving. */
  zone: string
}) {
  const router = useRouter()
  const [saved, setSaved] = useState({
    plan,
    version: consignment?.version ?? null,
    atMs: null as number | null,
  })
  const { form, problems, judge } = usePlanForm({
    plan,
    version: saved.version,
    consignmentId: consignment?.id ?? null,
    base: saved.plan,
    catalogues,
  })
  const parts = useOpenParts(plan)
  const saving = usePlanSaving({ form, consignment, actions, saved, setSaved, judge })
  const { goTo } = parts

  const page = useMemo(
    () => ({ catalogues, problems, goTo, mark: consignment?.mark ?? null }),
    [catalogues, problems, goTo, consignment?.mark],
  )
  useLeaveWarning(form.formState.isDirty)

  const assess = useCallback(async () => {
    judge()
    const wrong = problems.all()
    if (wrong.length > 0) {
      problems.ask()
      document.getElementById('why')?.focus()
      return
    }
    const consignmentId = await saving.saveAndAssess()
    if (consignmentId !== null) router.push(`/consignments/${consignmentId}`)
  }, [judge, problems, saving, router])

  const names = {
    ...catalogues,
    species: catalogues.species.map(({ key, commonName }) => ({ key, commonName })),
  }
  return (
    <FormProvider {...form}>
      <PlanPageProvider page={page}>
        <form method="post" noValidate onSubmit={(event) => void saving.submit(event)}>
          <PlanHead consignment={consignment} nowMs={nowMs} />
          <PlanCommands
            mark={consignment?.mark ?? null}
            savedAtMs={saved.atMs}
            zone={zone}
            saving={saving}
            onAssess={() => void assess()}
            onPart={parts.open}
          />
          {saving.conflict && (
            <div className="mb-3">
              <PlanConflictBox
                conflict={saving.conflict}
                plan={form.getValues()}
                names={names}
                zone={zone}
                onPick={saving.pick}
              />
            </div>
          )}
          <div className="grid items-start gap-6 board:grid-cols-[1fr_400px]" key={saving.turn}>
            <PlanFolds opened={parts.opened} onToggle={parts.toggle} />
            <PlanReasons />
          </div>
          <LegsPart key={`legs ${saving.turn}`} chosen={parts.leg} onChoose={parts.chooseLeg} />
          {parts.opened.includes('parties') && (
            <OpenedPart id="parties" title="Parties, opened" onFold={() => parts.toggle('parties')}>
              <PartyFields key={saving.turn} />
            </OpenedPart>
          )}
          {parts.opened.includes('animals') && (
            <OpenedPart id="animals" title="Animals, opened" onFold={() => parts.toggle('animals')}>
              <AnimalsPart key={saving.turn} chosen={parts.animal} onChoose={parts.chooseAnimal} />
            </OpenedPart>
          )}
          {parts.opened.includes('crates') && (
            <OpenedPart id="crates" title="Crates, opened" onFold={() => parts.toggle('crates')}>
              <CratesPart key={saving.turn} chosen={parts.crate} onChoose={parts.chooseCrate} />
            </OpenedPart>
          )}
        </form>
      </PlanPageProvider>
    </FormProvider>
  )
}

function OpenedPart({
  id,
  title,
  onFold,
  children,
}: {
  id: string
  title: string
  onFold: () => void
  children: React.ReactNode
}) {
  return (
    <section id={`open-${id}`} aria-labelledby={`open-${id}-title`} className="mt-6">
      <div className="mb-2 flex items-baseline gap-4 border-t-2 border-ink pt-2">
        <h2 id={`open-${id}-title`} className="text-section">
          {title}
        </h2>
        <button type="button" className="link ml-auto max-desk:min-h-11" onClick={onFold}>
          Fold
        </button>
      </div>
      {children}
    </section>
  )
}

/** The browser asks before the tab is closed while something is not saved; links within the page keep a copy anyway. */
function useLeaveWarning(dirty: boolean) {
  useEffect(() => {
    if (!dirty) return
    const ask = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', ask)
    return () => window.removeEventListener('beforeunload', ask)
  }, [dirty])
}
