import 'server-only'
import { isDeepStrictEqual } from 'node:util'
import type { CreationAttributes, Transaction } from 'sequelize'
import type { Plan, PlanCrate, PlanLeg } from '@/lib/schemas/plan'
import type { TimedLeg, Timeline } from '@/lib/planning/timeline'
import { models } from '@/models'
import type { Animal, Crate, Leg } from '@/models'

/** Who typed the air that is new or changed, and when. */
export interface AirStamp {
  at: Date
  by: number
}

/**
 * Puts a plan in the place of the working one. Ids of animals, crates and legs are the plan's own; the air of a leg keeps
 * the stamp of whoever typed it for as long as it stays as it was.
 */
export async function writePlan(
  tx: Transaction,
  consignmentId: number,
  plan: Plan,
  timeline: Timeline,
  stamp: AirStamp,
): Promise<void> {
  const before = await models.Leg.findAll({ where: { consignmentId }, transaction: tx })
  await clear(tx, consignmentId)
  const animalIds = await writeAnimals(tx, consignmentId, plan)
  await writeCrates(tx, consignmentId, plan, animalIds)
  await models.Leg.bulkCreate(
    plan.legs.map((leg, position) =>
      legRow(consignmentId, leg, position, timeline.legs[position], before, stamp),
    ),
    { transaction: tx },
  )
}

async function clear(tx: Transaction, consignmentId: number) {
  const where = { consignmentId }
  // Occupants and openings go with the crate and the animal they belong to.
  await models.Crate.destroy({ where, transaction: tx })
  await models.Animal.destroy({ where, transaction: tx })
  await models.Leg.destroy({ where, transaction: tx })
}

async function writeAnimals(
  tx: Transaction,
  consignmentId: number,
  plan: Plan,
): Promise<Map<string, number>> {
  const rows = plan.animals.map(({ id, coat, ...animal }, position): CreationAttributes<Animal> => ({
    ...animal,
    consignmentId,
    ref: id,
    position,
    coatDepthMm: coat.depthMm,
    coatClipped: coat.clipped,
    coatWetPct: coat.wetPct,
  }))
  await models.Animal.bulkCreate(rows, { transaction: tx })
  return idsByRef(
    await models.Animal.findAll({ where: { consignmentId }, attributes: ['id', 'ref'], transaction: tx }),
  )
}

async function writeCrates(
  tx: Transaction,
  consignmentId: number,
  plan: Plan,
  animalIds: ReadonlyMap<string, number>,
) {
  await models.Crate.bulkCreate(
    plan.crates.map((crate, position) => crateRow(consignmentId, crate, position)),
    { transaction: tx },
  )
  const crateIds = idsByRef(
    await models.Crate.findAll({ where: { consignmentId }, attributes: ['id', 'ref'], transaction: tx }),
  )
  const inside = plan.crates.flatMap((crate) => {
    const crateId = crateIds.get(crate.id)
    return crateId === undefined ? [] : [{ crate, crateId }]
  })
  await models.Opening.bulkCreate(
    inside.flatMap(({ crate, crateId }) =>
      crate.openings.map(({ id, ...opening }, position) => ({ ...opening, ref: id, crateId, position })),
    ),
    { transaction: tx },
  )
  await models.Occupant.bulkCreate(
    inside.flatMap(({ crate, crateId }) =>
      crate.occupants.flatMap((ref, position) => {
        const animalId = animalIds.get(ref)
        return animalId === undefined ? [] : [{ animalId, crateId, position }]
      }),
    ),
    { transaction: tx },
  )
}

function crateRow(
  consignmentId: number,
  { id, bedding, openings: _openings, occupants: _occupants, ...crate }: PlanCrate,
  position: number,
): CreationAttributes<Crate> {
  return {
    ...crate,
    consignmentId,
    ref: id,
    position,
    beddingMaterial: bedding.material,
    beddingDepthMm: bedding.depthMm,
    beddingWetPct: bedding.wetPct,
  }
}

function legRow(
  consignmentId: number,
  { id, ...leg }: PlanLeg,
  position: number,
  timed: TimedLeg | undefined,
  before: readonly Leg[],
  stamp: AirStamp,
): CreationAttributes<Leg> {
  return {
    ...leg,
    consignmentId,
    ref: id,
    position,
    startZone: timed?.from?.zone ?? null,
    startsAt: instant(timed?.startMs),
    endZone: timed?.to?.zone ?? null,
    endsAt: instant(timed?.endMs),
    ...airStamp(id, leg.surroundings, before, stamp),
  }
}

function airStamp(
  ref: string,
  surroundings: PlanLeg['surroundings'],
  before: readonly Leg[],
  stamp: AirStamp,
): { airEnteredAt: Date | null; airEnteredBy: number | null } {
  const last = before.find((leg) => leg.ref === ref)
  // The columns of JSON come back as the text they were kept as, so compare what that text says.
  const same = last !== undefined && isDeepStrictEqual(plain(last.surroundings), plain(surroundings))
  return same
    ? { airEnteredAt: last.airEnteredAt, airEnteredBy: last.airEnteredBy }
    : { airEnteredAt: stamp.at, airEnteredBy: stamp.by }
}

function plain(value: unknown): unknown {
  return JSON.parse(JSON.stringify(value))
}

function instant(ms: number | null | undefined): Date | null {
  return ms == null ? null : new Date(ms)
}

function idsByRef(rows: readonly { id: number; ref: string }[]): Map<string, number> {
  return new Map(rows.map(({ id, ref }) => [ref, id]))
}
