import type { Plan } from '@/lib/schemas/plan'

/*
 * Two people saved the same plan. What only one of them changed is taken; what both changed to different values is put
 * before a person, both values side by side; nothing of either is dropped.
 */

export interface PlanConflict {
  /** Path in the merged plan, which shows mine until somebody picks. */
  path: string
  mine: unknown
  theirs: unknown
}

export interface MergedPlan {
  plan: Plan
  conflicts: PlanConflict[]
  /** What they changed and I did not: already in `plan`. */
  taken: { path: string; before: unknown; after: unknown }[]
}

/** Merges my typing with what somebody else saved since `base`, the plan I had opened. */
export function mergePlans(base: Plan, mine: Plan, theirs: Plan): MergedPlan {
  const notes: Notes = { conflicts: [], taken: [] }
  const plan = mergeValue([], base, withOwnAnimals(base, mine, theirs), theirs, notes) as Plan
  return { plan, ...notes }
}

/** An animal that takes another number keeps its crate. */
function withOwnAnimals(base: Plan, mine: Plan, theirs: Plan): Plan {
  const animals = withOwnIds(
    mine.animals,
    theirs.animals,
    new Map(base.animals.map((item) => [item.id, item])),
  )
  const renamed = new Map(mine.animals.map(({ id }, index) => [id, animals[index]?.id ?? id]))
  const crates = mine.crates.map((crate) => ({
    ...crate,
    occupants: crate.occupants.map((id) => renamed.get(id) ?? id),
  }))
  return { ...mine, animals, crates }
}

type Notes = Pick<MergedPlan, 'conflicts' | 'taken'>
type Keys = readonly string[]

function mergeValue(path: Keys, base: unknown, mine: unknown, theirs: unknown, notes: Notes): unknown {
  if (same(mine, theirs)) return mine
  if (same(base, mine)) {
    if (!mergesDeeper(base, mine, theirs)) {
      notes.taken.push({ path: path.join('.'), before: base, after: theirs })
      return theirs
    }
  } else if (same(base, theirs)) return mine
  if (isItems(mine) && isItems(theirs) && isItems(base ?? [])) {
    return mergeItems(path, (base ?? []) as Item[], mine, theirs, notes)
  }
  if (isRecord(mine) && isRecord(theirs) && sameKind(mine, theirs)) {
    const known = isRecord(base) ? base : {}
    const keys = [...new Set([...Object.keys(mine), ...Object.keys(theirs)])]
    return Object.fromEntries(
      keys.map((key) => [key, mergeValue([...path, key], known[key], mine[key], theirs[key], notes)]),
    )
  }
  notes.conflicts.push({ path: path.join('.'), mine, theirs })
  return mine
}

/** Parts are told field by field; a value or a whole surroundings of another kind is one thing. */
function mergesDeeper(base: unknown, mine: unknown, theirs: unknown): boolean {
  if (isItems(mine) && isItems(theirs)) return isItems(base)
  return isRecord(mine) && isRecord(theirs) && sameKind(mine, theirs)
}

interface Item {
  id: string
}

/**
 * Rows keyed by id. Their order leads and mine are put after the row they followed. A row one of us took out and the
 * other changed stays in: leaving out is the act that loses typing.
 */
function mergeItems(
  path: Keys,
  base: readonly Item[],
  mine: readonly Item[],
  theirs: readonly Item[],
  notes: Notes,
) {
  const before = new Map(base.map((item) => [item.id, item]))
  const ours = withOwnIds(mine, theirs, before)
  const byMine = new Map(ours.map((item) => [item.id, item]))
  const byTheirs = new Map(theirs.map((item) => [item.id, item]))
  const order = theirs.map(({ id }) => id)
  ours.forEach(({ id }, place) => {
    if (byTheirs.has(id)) return
    const after = ours
      .slice(0, place)
      .map((item) => item.id)
      .filter((known) => order.includes(known))
      .at(-1)
    order.splice(after === undefined ? 0 : order.indexOf(after) + 1, 0, id)
  })
  const kept = order.filter((id) => {
    const was = before.get(id)
    if (was === undefined) return true
    if (!byMine.has(id)) return !same(was, byTheirs.get(id))
    if (!byTheirs.has(id)) return !same(was, byMine.get(id))
    return true
  })
  return kept.map((id, index) => {
    const at = [...path, String(index)]
    const [my, their] = [byMine.get(id), byTheirs.get(id)]
    if (my === undefined || their === undefined) {
      if (my === undefined) notes.taken.push({ path: at.join('.'), before: before.get(id), after: their })
      return my ?? their
    }
    return mergeValue(at, before.get(id), my, their, notes)
  })
}

/** Both of us may have added an "animal-4": mine then takes the next free number. */
function withOwnIds<T extends Item>(
  mine: readonly T[],
  theirs: readonly Item[],
  before: ReadonlyMap<string, Item>,
): T[] {
  const taken = new Set([...mine, ...theirs].map(({ id }) => id))
  const added = new Set(theirs.filter(({ id }) => !before.has(id)).map(({ id }) => id))
  return mine.map((item) => {
    const twin = theirs.find(({ id }) => id === item.id)
    if (before.has(item.id) || !added.has(item.id) || same(item, twin)) return item
    const id = freeId(item.id, taken)
    taken.add(id)
    return { ...item, id }
  })
}

function freeId(id: string, taken: ReadonlySet<string>): string {
  const noun = id.replace(/-\d+$/, '')
  let number = 1
  while (taken.has(`${noun}-${number}`)) number += 1
  return `${noun}-${number}`
}

function isItems(value: unknown): value is Item[] {
  return Array.isArray(value) && value.every((item) => isRecord(item) && typeof item.id === 'string')
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
}

function sameKind(mine: Record<string, unknown>, theirs: Record<string, unknown>): boolean {
  return mine.type === theirs.type
}

function same(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true
  if (Array.isArray(a) && Array.isArray(b)) {
    return a.length === b.length && a.every((value, index) => same(value, b[index]))
  }
  if (!isRecord(a) || !isRecord(b)) return false
  const keys = Object.keys(a)
  return keys.length === Object.keys(b).length && keys.every((key) => same(a[key], b[key]))
}
