import { newLeg } from '@/lib/planning/new-plan'
import { models } from '@/models'
import { next, orMake, stored } from './given'
import type { Given } from './given'
import { shipper, user } from './people'

export async function consignment(given: Given<'Consignment'> = {}) {
  return stored(models.Consignment, {
    mark: String(2000 + (next() % 8000)),
    purpose: 'private',
    parties: {
      consignor: {
        name: 'Balfron Lodge Kennels',
        address: '3 Mill Brae, Balfron',
        telephone: '+44 141 496 0207',
        email: '',
      },
      consignee: {
        name: 'Bajja House Boarding',
        address: '11 Triq il-Qroll, Marsaxlokk',
        telephone: '',
        email: '',
      },
      emergencyContact: { name: 'J. Strand-Ekdahl', telephone: '+44 7700 900562' },
    },
    ...given,
    shipperId: await orMake(given.shipperId, shipper),
    createdBy: await orMake(given.createdBy, user),
  })
}

export async function animal(given: Given<'Animal'> = {}) {
  const n = next()
  return stored(models.Animal, {
    ref: `animal-${n}`,
    position: 0,
    name: 'Perdita',
    profileKey: 'dog',
    breedNote: 'Lurcher',
    identification: 'chip 900 000 000 000 001',
    sex: 'female',
    ageDays: 900,
    massKg: 11.3,
    count: 1,
    temperament: 'calm',
    crateTrained: true,
    coatDepthMm: 12,
    coatClipped: false,
    coatWetPct: 0,
    flags: [],
    medicines: '',
    examinedOn: '',
    examinedBy: '',
    lastFedLocal: '',
    lastWateredLocal: '',
    ...given,
    consignmentId: await orMake(given.consignmentId, consignment),
  })
}

export async function crate(given: Given<'Crate'> = {}) {
  return stored(models.Crate, {
    ref: `crate-${next()}`,
    position: 0,
    letter: 'A',
    form: 'crate',
    lengthCm: 91.5,
    widthCm: 61,
    heightCm: 66.4,
    wallMaterial: 'plywood',
    wallThicknessMm: 9,
    rimMm: 20,
    floorMaterial: 'plywood',
    floorThicknessMm: 12,
    floorOnto: 'deck',
    beddingMaterial: 'absorbent-pad',
    beddingDepthMm: 5,
    beddingWetPct: 0,
    waterContainerL: 0.5,
    ...given,
    consignmentId: await orMake(given.consignmentId, consignment),
  })
}

export async function opening(given: Given<'Opening'> = {}) {
  return stored(models.Opening, {
    ref: `opening-${next()}`,
    position: 0,
    face: 'front',
    kind: 'slats',
    widthCm: 20,
    heightCm: 10,
    howMany: 2,
    meshOpenPct: 100,
    blockedPct: 0,
    ...given,
    crateId: await orMake(given.crateId, crate),
  })
}

export async function leg(given: Given<'Leg'> = {}) {
  const { id: _id, ...leg } = newLeg({ legs: [] }, given.kind ?? 'road', null)
  return stored(models.Leg, {
    ...leg,
    ref: `leg-${next()}`,
    position: 0,
    startLocal: '2026-06-11T13:40',
    endLocal: '2026-06-11T15:00',
    ...given,
    consignmentId: await orMake(given.consignmentId, consignment),
  })
}
