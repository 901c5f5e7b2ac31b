import 'server-only'
import type { Transaction } from 'sequelize'
import type { Plan, PlanAnimal, PlanCrate, PlanLeg } from '@/lib/schemas/plan'
import { models } from '@/models'
import type { Animal, Consignment, Crate, Leg } from '@/models'

/** The working plan of a consignment, exactly as it was typed. */
export async function readPlan(row: Consignment, tx?: Transaction): Promise<Plan> {
  const where = { consignmentId: row.id }
  const transaction = tx ?? null
  const [animals, crates, legs] = await inTurn([
    () => models.Animal.findAll({ where, order: ['position'], transaction }),
    () =>
      models.Crate.findAll({
        where,
        include: [{ association: 'openings' }, { association: 'occupants' }],
        order: ['position'],
        transaction,
      }),
    () => models.Leg.findAll({ where, order: ['position'], transaction }),
  ])
  const refs = new Map(animals.map(({ id, ref }) => [id, ref]))
  return {
    shipperId: row.shipperId,
    purpose: row.purpose,
    ...row.parties,
    handlingNote: row.handlingNote,
    animals: animals.map(planAnimal),
    crates: crates.map((crate) => planCrate(crate, refs)),
    legs: legs.map(planLeg),
  }
}

/** One after the other: queries of one transaction share one connection. */
async function inTurn<A, B, C>([a, b, c]: [() => Promise<A>, () => Promise<B>, () => Promise<C>]): Promise<
  [A, B, C]
> {
  return [await a(), await b(), await c()]
}

function planAnimal(row: Animal): PlanAnimal {
  return {
    id: row.ref,
    name: row.name,
    profileKey: row.profileKey,
    breedNote: row.breedNote,
    identification: row.identification,
    sex: row.sex,
    ageDays: row.ageDays,
    massKg: row.massKg,
    count: row.count,
    temperament: row.temperament,
    crateTrained: row.crateTrained,
    coat: { depthMm: row.coatDepthMm, clipped: row.coatClipped, wetPct: row.coatWetPct },
    flags: row.flags,
    medicines: row.medicines,
    examinedOn: row.examinedOn,
    examinedBy: row.examinedBy,
    lastFedLocal: row.lastFedLocal,
    lastWateredLocal: row.lastWateredLocal,
  }
}

function planCrate(row: Crate, refs: ReadonlyMap<number, string>): PlanCrate {
  return {
    id: row.ref,
    letter: row.letter,
    crateModelId: row.crateModelId,
    form: row.form,
    lengthCm: row.lengthCm,
    widthCm: row.widthCm,
    heightCm: row.heightCm,
    wallMaterial: row.wallMaterial,
    wallThicknessMm: row.wallThicknessMm,
    rimMm: row.rimMm,
    floorMaterial: row.floorMaterial,
    floorThicknessMm: row.floorThicknessMm,
    floorOnto: row.floorOnto,
    bedding: { material: row.beddingMaterial, depthMm: row.beddingDepthMm, wetPct: row.beddingWetPct },
    waterContainerL: row.waterContainerL,
    openings: inOrder(row.openings).map((opening) => ({
      id: opening.ref,
      face: opening.face,
      kind: opening.kind,
      widthCm: opening.widthCm,
      heightCm: opening.heightCm,
      howMany: opening.howMany,
      sillHeightCm: opening.sillHeightCm,
      meshOpenPct: opening.meshOpenPct,
      blockedPct: opening.blockedPct,
    })),
    occupants: inOrder(row.occupants).flatMap(({ animalId }) => refs.get(animalId) ?? []),
  }
}

function inOrder<T extends { position: number }>(rows: T[] | undefined): T[] {
  if (rows === undefined) throw new Error('The crate was loaded without what is in it.')
  return [...rows].sort((a, b) => a.position - b.position)
}

function planLeg(row: Leg): PlanLeg {
  return {
    id: row.ref,
    kind: row.kind,
    flightPhase: row.flightPhase,
    fromPlaceId: row.fromPlaceId,
    toPlaceId: row.toPlaceId,
    startLocal: row.startLocal,
    startOffsetMin: row.startOffsetMin,
    endLocal: row.endLocal,
    endOffsetMin: row.endOffsetMin,
    carrier: row.carrier,
    serviceNumber: row.serviceNumber,
    surroundings: row.surroundings,
    pressureKPa: row.pressureKPa,
    outOfCrate: row.outOfCrate,
    partyInCharge: row.partyInCharge,
    partyTelephone: row.partyTelephone,
    partyHours: row.partyHours,
    attended: row.attended,
    driverId: row.driverId,
    delayTypicalMin: row.delayTypicalMin,
    delayWorstMin: row.delayWorstMin,
    stops: row.stops,
    lastPointOfReturn: row.lastPointOfReturn,
    fallback: row.fallback,
    note: row.note,
  }
}
