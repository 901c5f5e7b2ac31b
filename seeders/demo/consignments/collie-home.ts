import { animal, crate, slatted } from '../animals'
import { journey, outside, van } from '../journey'
import type { DemoConsignment } from './common'
import { dateIn, DESK, hoursFrom, localAt, HALLMYRE, MOSS_END } from './common'

const large = [92, 61, 68] as const

/** One dog in a held van on a mild day: a plain GO, signed and waiting for the desk to release it. */
export const collieHome: DemoConsignment = {
  key: 'collie-home',
  stage: 'approved',
  preparedHoursAgo: 1,
  plan: ({ places, people, shippers, now }) => {
    const start = hoursFrom(now, 26)
    const driverId = people['second-driver']
    return {
      shipperId: shippers['0412'] ?? 0,
      purpose: 'private',
      consignor: HALLMYRE,
      consignee: MOSS_END,
      emergencyContact: { name: 'Jorun Strand-Ekdahl', telephone: '+44 7700 900562' },
      handlingNote: '',
      animals: [
        animal({
          id: 'animal-1',
          name: 'Fern',
          profileKey: 'dog',
          massKg: 17.2,
          breedNote: 'Border collie',
          sex: 'female',
          ageDays: 1_350,
          identification: 'Chip 999 000 0131 77455',
          examinedOn: dateIn(now, -1),
          examinedBy: 'Dr S. Halloway-Odu',
          lastFedLocal: localAt(new Date(start.getTime() - 240 * 60_000)),
          lastWateredLocal: localAt(new Date(start.getTime() - 60 * 60_000)),
        }),
      ],
      crates: [crate({ letter: 'A', sizeCm: large, occupants: ['animal-1'], openings: slatted(large) })],
      legs: journey(start, places, [
        {
          kind: 'road',
          from: 'peebles',
          to: 'balfron',
          minutes: 120,
          surroundings: van(outside(12, 70, 3, 50), 18),
          inCharge: DESK,
          ...(driverId !== undefined && { driverId }),
          stops: [{ minute: 60, kind: 'look' }],
        },
      ]),
    }
  },
}
