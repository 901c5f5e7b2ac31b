import { animal, crate, opening } from '../animals'
import { journey, outside, van } from '../journey'
import type { DemoConsignment } from './common'
import { DESK, hoursFrom } from './common'

const box = [60, 50, 16] as const
const holes = [
  opening('opening-1', 'left', 'holes', 2.5, 2.5, 20, 100),
  opening('opening-2', 'right', 'holes', 2.5, 2.5, 20, 100),
  opening('opening-3', 'top', 'holes', 2.5, 2.5, 16, 100),
  opening('opening-4', 'front', 'holes', 2.5, 2.5, 12, 100),
]

/** Day-old chicks, delivered yesterday. */
export const lauderKelso: DemoConsignment = {
  key: 'lauder-kelso',
  stage: 'delivered',
  preparedHoursAgo: 30,
  plan: ({ places, people, shippers, now }) => {
    const start = hoursFrom(now, -26)
    const driverId = people.driver
    return {
      shipperId: shippers['0457'] ?? 0,
      purpose: 'commercial',
      consignor: {
        name: 'Thornfield Hatchery',
        address: 'Thornfield Farm, Lauder',
        telephone: '+44 7700 900277',
        email: 'office@thornfield-hatchery.example',
      },
      consignee: {
        name: 'Cheviot Rearing Barn',
        address: 'Wester Row, Kelso',
        telephone: '+44 7700 900279',
        email: 'barn@cheviot-rearing.example',
      },
      emergencyContact: { name: 'Hatchery office', telephone: '+44 7700 900277' },
      handlingNote: 'Boxes 3 cm apart on all sides; never stacked against the bulkhead.',
      animals: ['A', 'B', 'C'].map((letter, index) =>
        animal({
          id: `animal-${index + 1}`,
          name: `Box ${letter}, 80 chicks`,
          profileKey: 'day-old-chick',
          massKg: 0.04,
          count: 80,
          ageDays: 1,
          breedNote: 'Layer, brown',
          identification: `Batch T-${218 + index}`,
        }),
      ),
      crates: ['A', 'B', 'C'].map((letter, index) =>
        crate({
          letter,
          sizeCm: box,
          occupants: [`animal-${index + 1}`],
          openings: holes,
          given: {
            wallMaterial: 'fibreboard',
            wallThicknessMm: 4,
            floorMaterial: 'fibreboard',
            floorThicknessMm: 4,
            rimMm: 10,
            bedding: { material: 'absorbent-pad', depthMm: 5, wetPct: 0 },
            waterContainerL: null,
          },
        }),
      ),
      legs: journey(start, places, [
        {
          kind: 'road',
          from: 'lauder',
          to: 'kelso',
          minutes: 65,
          surroundings: van(outside(7, 80, 3, 40), 26),
          inCharge: DESK,
          ...(driverId !== undefined && { driverId }),
          stops: [{ minute: 30, kind: 'look' }],
          delay: [10, 30],
        },
      ]),
    }
  },
}
