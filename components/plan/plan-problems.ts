import type { FieldIssue } from '@/lib/errors'
import { reasonsNotAssessable } from '@/lib/planning/reasons'
import type { PlanningKnowledge } from '@/lib/planning/reasons'
import { planSchema } from '@/lib/schemas/plan'
import type { Plan } from '@/lib/schemas/plan'
import { valueAt } from './plan-path'

export interface Problem extends FieldIssue {
  /** form: it cannot even be saved. assess: it saves, but cannot be assessed. */
  kind: 'form' | 'assess'
  /** Nothing stands at the path: said in the list, and at the field only once somebody asked to assess. */
  empty: boolean
}

/**
 * Everything that keeps a plan from being assessed, by the same two functions the server asks: the schema and the
 * reasons. Figures that cannot be read are left out of the second, so that one slip does not hide the rest.
 */
export function problemsOf(values: Plan, knowledge: PlanningKnowledge): Problem[] {
  const parsed = planSchema.safeParse(values)
  const issues = parsed.success ? [] : parsed.error.issues
  const form = issues.map((issue) => ({
    path: issue.path.map(String).join('.'),
    message: issue.message,
    kind: 'form' as const,
    empty: false,
  }))
  const readable = parsed.success ? parsed.data : withoutUnreadable(values, issues)
  const said = new Set(form.map(({ path }) => path))
  const assess = reasonsNotAssessable(readable, knowledge)
    .filter(({ path }) => !said.has(path))
    .map((reason) => ({ ...reason, kind: 'assess' as const, empty: isEmpty(valueAt(values, reason.path)) }))
  return [...form, ...assess]
}

/** The same plan with what cannot be read left empty, or at nothing where the plan cannot hold an empty figure. */
function withoutUnreadable(values: Plan, issues: readonly Issue[]): Plan {
  const copy = structuredClone(values)
  put(copy, issues, null)
  const still = planSchema.safeParse(copy)
  if (!still.success) put(copy, still.error.issues, 0)
  return copy
}

interface Issue {
  code?: string
  path: PropertyKey[]
}

function put(plan: Plan, issues: readonly Issue[], value: null | 0): void {
  for (const { code, path } of issues) {
    if (code !== 'invalid_type' && code !== 'invalid_union') continue
    const holder = path
      .slice(0, -1)
      .reduce<unknown>((inner, key) => (inner as Record<PropertyKey, unknown> | null)?.[key], plan)
    const key = path.at(-1)
    if (typeof holder === 'object' && holder !== null && key !== undefined) {
      ;(holder as Record<PropertyKey, unknown>)[key] = value
    }
  }
}

function isEmpty(value: unknown): boolean {
  return value === null || value === undefined || value === '' || (Array.isArray(value) && value.length === 0)
}

/** The problems as they stand, outside React's state: a keystroke re-renders the fields it concerns and no others. */
export class PlanProblems {
  private list: readonly Problem[] = []
  private asked = false
  private readonly listeners = new Set<() => void>()

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener)
    return () => this.listeners.delete(listener)
  }

  readonly all = (): readonly Problem[] => this.list

  /** The sentence at one field; what is merely missing waits until somebody asks to assess. */
  at(path: string): string | undefined {
    return this.list.find((problem) => problem.path === path && (this.asked || !problem.empty))?.message
  }

  set(list: readonly Problem[]): void {
    this.list = list
    this.tell()
  }

  /** From now on every missing field says so itself. */
  ask(): void {
    this.asked = true
    // A new list, so that whoever shows it draws it again.
    this.list = [...this.list]
    this.tell()
  }

  private tell(): void {
    for (const listener of this.listeners) listener()
  }
}
