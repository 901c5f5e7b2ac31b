import { animal, crate, slatted } from '../animals'
import { journey, outside, van } from '../journey'
import type { DemoConsignment } from './common'
import { dateIn, dayAt, DESK, localAt, HALLMYRE, MOSS_END } from './common'

const low = [56, 40, 41] as const

/**
 * A thin-coated cat in a van without heating on a cool day: keeping warm takes more than the house allows, no limit of the
 * body is near. NO-GO until a vet overrides that finding by name, or the desk finds a heated van.
 */
export const rexHome: DemoConsignment = {
  key: 'rex-home',
  stage: 'in_review',
  preparedHoursAgo: 2,
  plan: ({ places, people, shippers, now }) => {
    const start = dayAt(now, 3, '11:00', 'Europe/London')
    const driverId = people['second-driver']
    return {
      shipperId: shippers['0431'] ?? 0,
      purpose: 'private',
      consignor: MOSS_END,
      consignee: HALLMYRE,
      emergencyContact: { name: 'Matteo Ferrand-Ito', telephone: '+44 7700 900633' },
      handlingNote: 'Travels in his own fleece.',
      animals: [
        animal({
          id: 'animal-1',
          name: 'Vesper',
          profileKey: 'cat',
          massKg: 3.6,
          breedNote: 'Rex, curly short coat',
          sex: 'male',
          ageDays: 1_600,
          identification: 'Chip 999 000 0129 61177',
          coat: { depthMm: 4, clipped: true, wetPct: 0 },
          examinedOn: dateIn(now, -1),
          examinedBy: 'Dr S. Halloway-Odu',
          lastFedLocal: localAt(new Date(start.getTime() - 240 * 60_000)),
          lastWateredLocal: localAt(new Date(start.getTime() - 60 * 60_000)),
        }),
      ],
      crates: [
        crate({
          letter: 'A',
          sizeCm: low,
          occupants: ['animal-1'],
          openings: slatted(low),
          given: { bedding: { material: 'wood-shavings', depthMm: 40, wetPct: 0 } },
        }),
      ],
      legs: journey(start, places, [
        {
          kind: 'road',
          from: 'balfron',
          to: 'peebles',
          minutes: 120,
          surroundings: van(outside(12, 75, 3, 60)),
          inCharge: DESK,
          ...(driverId !== undefined && { driverId }),
          stops: [{ minute: 60, kind: 'look' }],
        },
      ]),
    }
  },
}
