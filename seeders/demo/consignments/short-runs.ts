import { animal, crate, opening, slatted } from '../animals'
import { journey, outside, van } from '../journey'
import type { DemoConsignment } from './common'
import { dateIn, dayAt, DESK, localAt, HALLMYRE, MOSS_END } from './common'

const low = [56, 40, 41] as const
const vivarium = [60, 45, 35] as const
const basket = [90, 55, 26] as const

/** Two reptiles in a van that was warmed before loading and is not heated on the way, on a cold morning. */
export const peeblesBalfron: DemoConsignment = {
  key: 'peebles-balfron',
  stage: 'assessed',
  preparedHoursAgo: 5,
  plan: ({ places, people, shippers, now }) => {
    const start = dayAt(now, 1, '10:00', 'Europe/London')
    const driverId = people.driver
    return {
      shipperId: shippers['0431'] ?? 0,
      purpose: 'private',
      consignor: HALLMYRE,
      consignee: MOSS_END,
      emergencyContact: { name: 'Matteo Ferrand-Ito', telephone: '+44 7700 900633' },
      handlingNote: '',
      animals: [
        animal({
          id: 'animal-1',
          name: 'Ember',
          profileKey: 'bearded-dragon',
          massKg: 0.42,
          sex: 'female',
          ageDays: 900,
          identification: 'Photo E-1',
        }),
        animal({
          id: 'animal-2',
          name: 'Skein',
          profileKey: 'ball-python',
          massKg: 1.5,
          sex: 'male',
          ageDays: 1_700,
          identification: 'Chip 999 000 0188 40219',
        }),
      ],
      crates: ['A', 'B'].map((letter, index) =>
        crate({
          letter,
          sizeCm: vivarium,
          occupants: [`animal-${index + 1}`],
          openings: [
            opening('opening-1', 'left', 'holes', 2, 2, 12, 100),
            opening('opening-2', 'right', 'holes', 2, 2, 12, 100),
          ],
          given: {
            wallMaterial: 'insulated-foam',
            wallThicknessMm: 30,
            bedding: { material: 'newspaper', depthMm: 10, wetPct: 0 },
            waterContainerL: null,
          },
        }),
      ),
      legs: journey(start, places, [
        {
          kind: 'road',
          from: 'peebles',
          to: 'balfron',
          minutes: 125,
          surroundings: warmed(outside(3, 85, 3, 60), 28),
          inCharge: DESK,
          ...(driverId !== undefined && { driverId }),
        },
      ]),
    }
  },
}

function warmed(around: ReturnType<typeof outside>, startC: number): ReturnType<typeof van> {
  const space = van(around)
  return space.type === 'enclosed' ? { ...space, initialAirTempC: startC } : space
}

/** A draft with what a dispatcher still has to put right. */
export const obanCarlisle: DemoConsignment = {
  key: 'oban-carlisle',
  stage: 'draft',
  preparedHoursAgo: 0.5,
  plan: ({ places, shippers, now }) => {
    const start = dayAt(now, 4, '05:00', 'Europe/London')
    const legs = journey(start, places, [
      {
        kind: 'road',
        from: 'oban',
        to: 'carlisle',
        minutes: 230,
        surroundings: van(outside(8, 80, 3)),
        inCharge: DESK,
      },
      {
        kind: 'rest',
        from: 'carlisle',
        to: 'carlisle',
        minutes: 60,
        surroundings: outside(9, 75, 3, 80),
        inCharge: ['', ''],
      },
    ])
    return {
      shipperId: shippers['0431'] ?? 0,
      purpose: 'private',
      consignor: {
        name: 'Lorn loft',
        address: 'Glenshellach, Oban',
        telephone: '+44 141 496 0255',
        email: '',
      },
      consignee: { name: 'Liberation field', address: 'Durran Hill, Carlisle', telephone: '', email: '' },
      emergencyContact: { name: '', telephone: '' },
      handlingNote: '',
      animals: [
        animal({
          id: 'animal-1',
          name: 'Racing pigeons, 20',
          profileKey: 'pigeon',
          massKg: null,
          count: 20,
          ageDays: 500,
          identification: 'Rings GB 21 L 401 to 420',
        }),
      ],
      crates: [
        crate({ letter: 'A', sizeCm: basket, occupants: ['animal-1'], openings: [], given: { rimMm: 0 } }),
      ],
      legs,
    }
  },
}

/** A vet returned this one with reasons. */
export const balfronPeebles: DemoConsignment = {
  key: 'balfron-peebles',
  stage: 'returned',
  preparedHoursAgo: 8,
  reasons:
    'The guinea pigs’ box opens on two sides only, and one of them will stand against the bulkhead. Open the front, then send it again.',
  plan: ({ places, people, shippers, now }) => {
    const start = dayAt(now, 2, '14:00', 'Europe/London')
    const driverId = people['second-driver']
    return {
      shipperId: shippers['0412'] ?? 0,
      purpose: 'private',
      consignor: MOSS_END,
      consignee: HALLMYRE,
      emergencyContact: { name: 'Jorun Strand-Ekdahl', telephone: '+44 7700 900562' },
      handlingNote: '',
      animals: [
        animal({
          id: 'animal-1',
          name: 'Thistle and Burr',
          profileKey: 'guinea-pig',
          massKg: 0.9,
          count: 2,
          ageDays: 400,
          identification: 'Cage card 7',
          examinedOn: dateIn(now, -1),
          examinedBy: 'Dr S. Halloway-Odu',
          lastFedLocal: localAt(new Date(start.getTime() - 40 * 60_000)),
          lastWateredLocal: localAt(new Date(start.getTime() - 40 * 60_000)),
        }),
        animal({
          id: 'animal-2',
          name: 'Wren',
          profileKey: 'cat',
          massKg: 3.4,
          breedNote: 'Domestic shorthair',
          sex: 'female',
          ageDays: 2_900,
          identification: 'Chip 999 000 0129 60402',
          examinedOn: dateIn(now, -1),
          examinedBy: 'Dr S. Halloway-Odu',
          lastFedLocal: localAt(new Date(start.getTime() - 240 * 60_000)),
          lastWateredLocal: localAt(new Date(start.getTime() - 60 * 60_000)),
        }),
      ],
      crates: [
        crate({
          letter: 'A',
          sizeCm: [50, 35, 30],
          occupants: ['animal-1'],
          openings: [
            opening('opening-1', 'left', 'slats', 40, 2, 3, 100),
            opening('opening-2', 'right', 'slats', 40, 2, 3, 100),
          ],
          given: { bedding: { material: 'straw', depthMm: 40, wetPct: 0 }, waterContainerL: 0.3 },
        }),
        crate({ letter: 'B', sizeCm: low, occupants: ['animal-2'], openings: slatted(low) }),
      ],
      legs: journey(start, places, [
        {
          kind: 'road',
          from: 'balfron',
          to: 'peebles',
          minutes: 120,
          surroundings: van(outside(9, 75, 3, 60), 19),
          inCharge: DESK,
          ...(driverId !== undefined && { driverId }),
          stops: [{ minute: 60, kind: 'look' }],
        },
      ]),
    }
  },
}
