import { animal, crate } from '../animals'
import { journey, outside, van } from '../journey'
import type { DemoConsignment } from './common'
import { dateIn, DESK, hoursFrom, localAt, HALLMYRE } from './common'

const stall = [240, 90, 230] as const

/** Two horses on the road: what a driver's day looks like. */
export const peeblesUtrecht: DemoConsignment = {
  key: 'peebles-utrecht',
  stage: 'under_way',
  preparedHoursAgo: 20,
  vetConditions: ['Offer water at every stop; hay net within reach at all times.'],
  plan: ({ places, people, shippers, now }) => {
    const start = hoursFrom(now, -1.5)
    const driverId = people['second-driver']
    const ours = driverId === undefined ? {} : { driverId }
    const seen = { examinedOn: dateIn(now, -2), examinedBy: 'Dr S. Halloway-Odu' }
    const fed = {
      lastFedLocal: localAt(new Date(start.getTime() - 60 * 60_000)),
      lastWateredLocal: localAt(new Date(start.getTime() - 20 * 60_000)),
    }
    const road = outside(8, 75, 4, 80)
    return {
      shipperId: shippers['0431'] ?? 0,
      purpose: 'commercial',
      consignor: HALLMYRE,
      consignee: {
        name: 'Weidehof stables',
        address: 'Weidelaan 12, Utrecht',
        telephone: '+44 7700 900141',
        email: 'stal@weidehof.example',
      },
      emergencyContact: { name: 'Matteo Ferrand-Ito', telephone: '+44 7700 900633' },
      handlingNote: 'Mare in front. Partition stays closed on the ferry.',
      animals: [
        animal({
          id: 'animal-1',
          name: 'Fennel',
          profileKey: 'horse',
          massKg: 520,
          breedNote: 'Warmblood mare',
          sex: 'female',
          ageDays: 3_300,
          identification: 'Chip 999 000 0140 22017',
          ...seen,
          ...fed,
        }),
        animal({
          id: 'animal-2',
          name: 'Juno',
          profileKey: 'horse',
          massKg: 480,
          breedNote: 'Warmblood gelding',
          sex: 'male',
          ageDays: 2_900,
          identification: 'Chip 999 000 0140 22031',
          ...seen,
          ...fed,
        }),
      ],
      crates: [
        crate({
          letter: 'A',
          sizeCm: stall,
          occupants: ['animal-1'],
          openings: [],
          given: {
            form: 'stall',
            wallMaterial: 'plywood',
            wallThicknessMm: 22,
            floorMaterial: 'rubber',
            floorThicknessMm: 20,
            bedding: { material: 'wood-shavings', depthMm: 80, wetPct: 5 },
            waterContainerL: 10,
          },
        }),
        crate({
          letter: 'B',
          sizeCm: stall,
          occupants: ['animal-2'],
          openings: [],
          given: {
            form: 'stall',
            wallMaterial: 'plywood',
            wallThicknessMm: 22,
            floorMaterial: 'rubber',
            floorThicknessMm: 20,
            bedding: { material: 'wood-shavings', depthMm: 80, wetPct: 5 },
            waterContainerL: 10,
          },
        }),
      ],
      legs: journey(start, places, [
        {
          kind: 'road',
          from: 'peebles',
          to: 'newcastle',
          minutes: 150,
          surroundings: horsebox(road),
          inCharge: DESK,
          ...ours,
          stops: [
            { minute: 90, kind: 'water' },
            { minute: 90, kind: 'look' },
          ],
        },
        {
          kind: 'sea',
          from: 'newcastle',
          to: 'amsterdam',
          minutes: 930,
          surroundings: horsebox(outside(10, 80, 1)),
          inCharge: ['North Shields Ferries', '+44 141 496 0377'],
          ...ours,
          carrier: 'North Shields Ferries',
          service: 'NS 2',
          stops: [
            { minute: 240, kind: 'water' },
            { minute: 480, kind: 'water' },
            { minute: 720, kind: 'water' },
          ],
        },
        {
          kind: 'road',
          from: 'amsterdam',
          to: 'utrecht',
          minutes: 75,
          surroundings: horsebox(outside(7, 80, 4)),
          inCharge: DESK,
          ...ours,
        },
      ]),
    }
  },
}

function horsebox(around: ReturnType<typeof outside>) {
  const space = van(around)
  return space.type === 'enclosed'
    ? {
        ...space,
        spaceName: 'horsebox',
        volumeM3: 38,
        heatTransferWK: 140,
        interiorMassKJK: 600,
        ventilationM3h: 1_200,
        leakageM3h: 60,
        solarApertureM2: 0.8,
      }
    : space
}
