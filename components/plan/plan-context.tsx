'use client'

import { createContext, useContext, useSyncExternalStore } from 'react'
import type { ReactNode } from 'react'
import type { CrateModelPlan } from '@/lib/planning/new-plan'
import type { ProfileInForce } from '@/lib/planning/reasons'
import type { PlanPlace } from '@/lib/schemas/plan'
import type { PlanProblems } from './plan-problems'

/** What the editor chooses from: catalogues the server read with the plan. */
export interface PlanCatalogues {
  places: readonly PlanPlace[]
  species: readonly ProfileInForce[]
  shippers: readonly { id: number; name: string }[]
  drivers: readonly { id: number; name: string }[]
  crateModels: readonly { id: number; name: string; plan: CrateModelPlan }[]
}

interface PlanPage {
  catalogues: PlanCatalogues
  problems: PlanProblems
  /** Opens the part that holds a path and puts the focus there. */
  goTo: (path: string) => void
  /** What the mark is, where the consignment has one already: crates are called by it. */
  mark: string | null
}

const Context = createContext<PlanPage | null>(null)

export function PlanPageProvider({ page, children }: { page: PlanPage; children: ReactNode }) {
  return <Context value={page}>{children}</Context>
}

/** Catalogues, problems and the way to a field. Throws outside an editor: a part of the plan stands nowhere else. */
export function usePlanPage(): PlanPage {
  const page = useContext(Context)
  if (page === null) throw new Error('A part of the plan was put outside the plan editor.')
  return page
}

/** What is wrong at one path, in a sentence; re-renders only when that sentence changes. */
export function useProblem(path: string): string | undefined {
  const { problems } = usePlanPage()
  return useSyncExternalStore(
    problems.subscribe,
    () => problems.at(path),
    () => undefined,
  )
}

/** Everything that keeps the plan from being saved or assessed, in the order of the page. */
export function useProblems() {
  const { problems } = usePlanPage()
  return useSyncExternalStore(problems.subscribe, problems.all, problems.all)
}
