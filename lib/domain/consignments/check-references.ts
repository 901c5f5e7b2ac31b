import 'server-only'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import type { FieldIssue } from '@/lib/errors'
import type { Plan } from '@/lib/schemas/plan'
import { models } from '@/models'

/**
 * What a plan points to must exist, and no part may stand twice: the database could not hold it. Everything else a draft
 * may leave open. Throws `invalid` with all of it at once.
 */
export async function checkReferences(tx: Transaction, plan: Plan): Promise<{ shipperName: string }> {
  const shipper = await models.Shipper.findByPk(plan.shipperId, { transaction: tx })
  const issues: FieldIssue[] = [
    ...(shipper === null ? [{ path: 'shipperId', message: 'There is no such shipper.' }] : []),
    ...repeated(plan),
    ...crowded(plan),
    ...(await missingPlaces(tx, plan)),
    ...(await missingDrivers(tx, plan)),
    ...(await missingCrateModels(tx, plan)),
  ]
  if (shipper === null || issues.length > 0) {
    throw new SteadfoldError('invalid', 'The plan was not saved: put right what is marked.', { issues })
  }
  return { shipperName: shipper.name }
}

function repeated(plan: Plan): FieldIssue[] {
  return (['animals', 'crates', 'legs'] as const).flatMap((list) => {
    const seen = new Set<string>()
    return plan[list].flatMap(({ id }, index) => {
      if (!seen.has(id)) {
        seen.add(id)
        return []
      }
      return [
        {
          path: `${list}.${index}.id`,
          message: 'This part stands twice: take one of them out.',
          received: id,
        },
      ]
    })
  })
}

function crowded(plan: Plan): FieldIssue[] {
  const known = new Set(plan.animals.map(({ id }) => id))
  const where = new Map<string, string>()
  return plan.crates.flatMap((crate, index) => {
    const openings = new Set(crate.openings.map(({ id }) => id))
    const twice =
      openings.size === crate.openings.length ? [] : ['An opening stands twice: take one of them out.']
    const occupants = crate.occupants.flatMap((id) => {
      const name = plan.animals.find((animal) => animal.id === id)?.name ?? id
      const other = where.get(id)
      where.set(id, crate.letter)
      if (other !== undefined) return [`${name} is in crate ${other} already: an animal stands in one crate.`]
      return known.has(id) ? [] : [`Crate ${crate.letter} holds an animal that is not in the plan.`]
    })
    return [
      ...twice.map((message) => ({ path: `crates.${index}.openings`, message })),
      ...occupants.map((message) => ({ path: `crates.${index}.occupants`, message })),
    ]
  })
}

async function missingPlaces(tx: Transaction, plan: Plan): Promise<FieldIssue[]> {
  const named = plan.legs.flatMap((leg, index) => [
    { path: `legs.${index}.fromPlaceId`, id: leg.fromPlaceId },
    { path: `legs.${index}.toPlaceId`, id: leg.toPlaceId },
  ])
  const rows = await models.Place.findAll({ where: { id: ids(named) }, attributes: ['id'], transaction: tx })
  return absent(named, rows, 'There is no such place.')
}

async function missingDrivers(tx: Transaction, plan: Plan): Promise<FieldIssue[]> {
  const named = plan.legs.map((leg, index) => ({ path: `legs.${index}.driverId`, id: leg.driverId }))
  const rows = await models.User.findAll({
    where: { id: ids(named), role: 'driver', disabledAt: null },
    attributes: ['id'],
    transaction: tx,
  })
  return absent(named, rows, 'This person is not one of our drivers.')
}

async function missingCrateModels(tx: Transaction, plan: Plan): Promise<FieldIssue[]> {
  const named = plan.crates.map((crate, index) => ({
    path: `crates.${index}.crateModelId`,
    id: crate.crateModelId,
  }))
  const rows = await models.CrateModel.findAll({
    where: { id: ids(named) },
    attributes: ['id'],
    transaction: tx,
  })
  return absent(named, rows, 'There is no such crate model.')
}

interface Named {
  path: string
  id: number | null
}

function ids(named: readonly Named[]): number[] {
  return [...new Set(named.flatMap(({ id }) => (id === null ? [] : [id])))]
}

function absent(named: readonly Named[], rows: readonly { id: number }[], message: string): FieldIssue[] {
  const known = new Set(rows.map(({ id }) => id))
  return named
    .filter(({ id }) => id !== null && !known.has(id))
    .map(({ path, id }) => ({ path, message, received: id }))
}
