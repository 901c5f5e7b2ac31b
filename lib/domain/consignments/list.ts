import 'server-only'
import { Op, col, fn, literal } from 'sequelize'
import type { Order, WhereOptions } from 'sequelize'
import { z } from 'zod'
import { database } from '@/lib/db/connection'
import type { Actor } from '@/lib/policies/actor'
import type { BoardQuery } from '@/lib/schemas/board'
import { CLOSED_STATES } from '@/lib/states/consignment'
import type { ConsignmentState } from '@/lib/states/consignment'
import type { ConsignmentPage } from '@/lib/views/consignment-row'
import { models } from '@/models'
import type { Consignment } from '@/models'
import { authorize } from '../authorize'
import { searchWords } from './board-figures'
import { SIGNED_AND_CRATES, consignmentRow } from './consignment-row'
import { visibleConsignments } from './visible'

/**
 * A page of the board: filtered, found by the beginnings of words, sorted on indexed columns, paged by the last row's key
 * so that a page stays right while others work.
 */
export async function listConsignments(actor: Actor, query: BoardQuery): Promise<ConsignmentPage> {
  authorize(actor, 'consignment.list')
  const direction = query.descending ? 'DESC' : 'ASC'
  const order: Order = [
    [literal(sortOf(query).column), direction],
    ['id', direction],
  ]
  const rows = await models.Consignment.findAll({
    where: { [Op.and]: [visibleConsignments(actor), ...filters(query), ...afterKey(query)] },
    include: [{ association: 'shipper', attributes: ['name'] }],
    attributes: { include: [...SIGNED_AND_CRATES] },
    order,
    limit: query.limit + 1,
  })
  const shown = rows.slice(0, query.limit)
  return {
    rows: shown.map(consignmentRow),
    after: rows.length > query.limit ? keyOf(shown.at(-1), query) : null,
    counts: await countStates(actor),
  }
}

interface Sort {
  column: string
  valueOf: (row: Consignment) => string | number | null
}

/** Past any margin there is: rows without one stand last, whichever way the board is sorted. */
const NO_MARGIN = 9999.9

function sortOf({ sort, descending }: Pick<BoardQuery, 'sort' | 'descending'>): Sort {
  switch (sort) {
    case 'departure':
      return { column: '`Consignment`.`departs_at`', valueOf: (row) => sqlMoment(row.departsAt) }
    case 'updated':
      return { column: '`Consignment`.`updated_at`', valueOf: (row) => sqlMoment(row.updatedAt) }
    case 'margin':
      return descending
        ? { column: '`Consignment`.`margin_falling`', valueOf: (row) => row.marginOutsideAirC ?? -NO_MARGIN }
        : { column: '`Consignment`.`margin_rising`', valueOf: (row) => row.marginOutsideAirC ?? NO_MARGIN }
    case 'mark':
      return { column: '`Consignment`.`mark`', valueOf: (row) => row.mark }
  }
}

function filters(query: BoardQuery): WhereOptions<Consignment>[] {
  return [
    ...(query.state.length > 0 ? [{ state: query.state }] : []),
    ...(query.state.length === 0 && !query.closed ? [{ state: { [Op.notIn]: [...CLOSED_STATES] } }] : []),
    ...(query.verdict.length > 0 ? [{ [Op.or]: query.verdict.map(verdictFilter) }] : []),
    ...(query.holder === null ? [] : [{ holder: query.holder }]),
    ...(query.leavesFrom === null
      ? []
      : [{ departsAt: { [Op.gte]: new Date(`${query.leavesFrom}T00:00:00.000Z`) } }]),
    ...searchWords(query.find).map(wordFilter),
  ]
}

function verdictFilter(verdict: BoardQuery['verdict'][number]): WhereOptions<Consignment> {
  switch (verdict) {
    case 'none':
      return { verdict: null }
    case 'out-of-date':
      return { outOfDate: true }
    case 'go':
    case 'conditional':
    case 'no-go':
      return { verdict, outOfDate: false }
  }
}

/** Each word typed must begin one of the consignment's words. */
function wordFilter(word: string): WhereOptions<Consignment> {
  const prefix = database().escape(`${word.replace(/[\\%_]/g, '\\$&')}%`)
  return literal(
    `EXISTS (SELECT 1 FROM consignment_words AS found WHERE found.consignment_id = \`Consignment\`.\`id\` AND found.word LIKE ${prefix})`,
  ) as unknown as WhereOptions<Consignment>
}

const keySchema = z.tuple([z.union([z.string(), z.number(), z.null()]), z.number().int()])

/** Rows after the last one shown, in the order of the page. A key somebody made up shows the first page. */
function afterKey(query: BoardQuery): WhereOptions<Consignment>[] {
  if (query.after === null) return []
  const key = keySchema.safeParse(parsed(query.after))
  if (!key.success) return []
  const [value, id] = key.data
  const { column } = sortOf(query)
  const beyond = query.descending ? '<' : '>'
  const same = value === null ? `${column} IS NULL` : `${column} = ${database().escape(value)}`
  const tied = `(${same} AND \`Consignment\`.\`id\` ${beyond} ${database().escape(id)})`
  const others =
    value === null
      ? query.descending
        ? []
        : [`${column} IS NOT NULL`]
      : [
          `${column} ${beyond} ${database().escape(value)}`,
          ...(query.descending ? [`${column} IS NULL`] : []),
        ]
  return [literal(`(${[tied, ...others].join(' OR ')})`) as unknown as WhereOptions<Consignment>]
}

function keyOf(row: Consignment | undefined, query: BoardQuery): string | null {
  return row === undefined ? null : JSON.stringify([sortOf(query).valueOf(row), row.id])
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch {
    return null
  }
}

function sqlMoment(at: Date | null): string | null {
  return at === null ? null : at.toISOString().replace('T', ' ').replace('Z', '')
}

async function countStates(actor: Actor): Promise<ConsignmentPage['counts']> {
  const rows = (await models.Consignment.findAll({
    where: visibleConsignments(actor),
    attributes: ['state', [fn('COUNT', col('id')), 'rows']],
    group: ['state'],
    raw: true,
  })) as unknown as { state: ConsignmentState; rows: number }[]
  return Object.fromEntries(rows.map(({ state, rows: count }) => [state, Number(count)]))
}
