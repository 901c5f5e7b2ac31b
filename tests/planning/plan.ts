import { newAnimal, newCrate, newLeg, emptyPlan } from '@/lib/planning/new-plan'
import type { ProfileInForce } from '@/lib/planning/reasons'
import type { Plan, PlanLeg, PlanPlace } from '@/lib/schemas/plan'
import { catalogue, profileValues } from '@/lib/species'

export const PLACES: readonly PlanPlace[] = [
  {
    id: 1,
    name: 'Moss End Kennels',
    kind: 'kennel',
    country: 'GB',
    zone: 'Europe/London',
    latitudeDeg: 55.8,
    longitudeDeg: -4.2,
  },
  {
    id: 2,
    name: 'Glasgow Airport',
    kind: 'airport',
    country: 'GB',
    zone: 'Europe/London',
    latitudeDeg: 55.87,
    longitudeDeg: -4.43,
  },
  {
    id: 3,
    name: 'Muscat Airport',
    kind: 'airport',
    country: 'OM',
    zone: 'Asia/Muscat',
    latitudeDeg: 23.6,
    longitudeDeg: 58.28,
  },
  {
    id: 4,
    name: 'Wadi Sahm Sanctuary',
    kind: 'address',
    country: 'OM',
    zone: 'Asia/Muscat',
    latitudeDeg: 23.2,
    longitudeDeg: 58.1,
  },
]

export const PROFILES: readonly ProfileInForce[] = Object.values(catalogue).map((profile) => ({
  key: profile.key,
  commonName: profile.commonName,
  version: profile.version,
  values: profileValues(profile),
}))

const outside = (airTempC: number, solarWm2: number | null = 0) => ({
  type: 'open-air' as const,
  rows: [{ minute: 0, airTempC, relHumidityPct: 50, windMs: 2, solarWm2 }],
  shadePct: 0,
})

/** A dog from Glasgow to Muscat: van, ramp, the three legs of a flight, van. Times add up on both clocks. */
export function glasgowToMuscat(): Plan {
  const plan = emptyPlan(1)
  plan.consignor.name = 'Moss End Kennels'
  plan.consignee.name = 'Wadi Sahm Sanctuary'
  plan.emergencyContact = { name: 'I. Quennell', telephone: '+44 7700 900614' }
  plan.animals.push({
    ...newAnimal(plan),
    name: 'Corrie',
    profileKey: 'dog',
    breedNote: 'Border collie',
    massKg: 18.6,
    crateTrained: true,
    temperament: 'calm',
  })
  plan.crates.push({
    ...newCrate(plan, null),
    lengthCm: 100,
    widthCm: 65,
    heightCm: 75,
    occupants: ['animal-1'],
    openings: [
      {
        id: 'opening-1',
        face: 'front',
        kind: 'slats',
        widthCm: 50,
        heightCm: 4,
        howMany: 6,
        sillHeightCm: 20,
        meshOpenPct: 100,
        blockedPct: 0,
      },
    ],
  })
  const legs: [PlanLeg['kind'], PlanLeg['flightPhase'], number, number, string, string][] = [
    ['road', null, 1, 2, '2026-06-09T09:20', '2026-06-09T12:00'],
    ['ramp', null, 2, 2, '2026-06-09T12:00', '2026-06-09T12:50'],
    ['flight', 'doors-shut-departure', 2, 2, '2026-06-09T12:50', '2026-06-09T13:20'],
    ['flight', 'airborne', 2, 3, '2026-06-09T13:20', '2026-06-09T23:40'],
    ['flight', 'doors-shut-arrival', 3, 3, '2026-06-09T23:40', '2026-06-10T00:10'],
    ['road', null, 3, 4, '2026-06-10T00:10', '2026-06-10T02:00'],
  ]
  for (const [kind, flightPhase, fromPlaceId, toPlaceId, startLocal, endLocal] of legs) {
    const leg = newLeg(plan, kind, flightPhase)
    plan.legs.push({
      ...leg,
      fromPlaceId,
      toPlaceId,
      startLocal,
      endLocal,
      surroundings: withAir(leg.surroundings),
      partyInCharge: 'Skerrow Air Cargo',
      partyTelephone: '+44 141 496 0433',
    })
  }
  return plan
}

function withAir(air: PlanLeg['surroundings']): PlanLeg['surroundings'] {
  switch (air.type) {
    case 'open-air':
      return outside(17)
    case 'controlled':
      return { ...air, airTempC: 18, relHumidityPct: 40 }
    case 'enclosed':
      return { ...air, outside: outside(17) }
  }
}
