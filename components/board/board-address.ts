import { boardQueryOf } from '@/lib/schemas/board'
import type { BoardQuery } from '@/lib/schemas/board'

/*
 * The whole state of the board stands in the address: a link to it, the back button and a reload all show the same rows.
 */

/** What the board shows besides the query itself. */
export interface BoardAddress {
  query: BoardQuery
  /** Keys of the pages before this one, oldest first; the way back to earlier rows. */
  trail: readonly string[]
}

export function boardAddressOf(search: URLSearchParams): BoardAddress {
  return { query: boardQueryOf(search), trail: search.getAll('trail').slice(0, 40) }
}

/** The address of a board as a query string, without what stands at its default. */
export function boardSearch({ query, trail }: BoardAddress): string {
  const search = new URLSearchParams()
  if (query.find !== '') search.set('find', query.find)
  for (const state of query.state) search.append('state', state)
  for (const verdict of query.verdict) search.append('verdict', verdict)
  if (query.holder !== null) search.set('holder', query.holder)
  if (query.leavesFrom !== null) search.set('leavesFrom', query.leavesFrom)
  if (query.closed) search.set('closed', '1')
  if (query.sort !== 'departure') search.set('sort', query.sort)
  if (query.descending) search.set('descending', '1')
  if (query.limit !== 50) search.set('limit', String(query.limit))
  if (query.after !== null) search.set('after', query.after)
  for (const key of trail) search.append('trail', key)
  return search.toString()
}

/** Another question begins at its first rows again. */
export function asked(address: BoardAddress, change: Partial<BoardQuery>): BoardAddress {
  return { query: { ...address.query, ...change, after: null }, trail: [] }
}

/** The rows after this page. */
export function laterPage({ query, trail }: BoardAddress, after: string): BoardAddress {
  return { query: { ...query, after }, trail: query.after === null ? [] : [...trail, query.after] }
}

/** The rows before this page; null on the first one. */
export function earlierPage({ query, trail }: BoardAddress): BoardAddress | null {
  if (query.after === null) return null
  return { query: { ...query, after: trail.at(-1) ?? null }, trail: trail.slice(0, -1) }
}

/** True where something narrows the board: then "none" means "none like that". */
export function isNarrowed({ find, state, verdict, holder, leavesFrom }: BoardQuery): boolean {
  return find !== '' || state.length > 0 || verdict.length > 0 || holder !== null || leavesFrom !== null
}
