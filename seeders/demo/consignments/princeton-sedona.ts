import { animal, crate, slatted } from '../animals'
import { held, holdShut, journey, outside, van } from '../journey'
import type { DemoConsignment } from './common'
import { dateIn, dayAt, DESK, localAt } from './common'

const medium = [81, 56, 61] as const
const LARKHAVEN = ['Larkhaven Kennels', '+1 202 555 0143'] as const
const TALUS = ['Talus Air Freight', '+1 202 555 0171'] as const
const SAGUARO = ['Saguaro Ramp Services', '+1 202 555 0188'] as const

/** A beagle inside the United States: the legal pack reads every leg. */
export const princetonSedona: DemoConsignment = {
  key: 'princeton-sedona',
  stage: 'in_review',
  preparedHoursAgo: 3,
  plan: ({ places, shippers, now }) => {
    const start = dayAt(now, 3, '04:30', 'America/New_York')
    const zone = 'America/New_York'
    const seen = { examinedOn: dateIn(now, -1, zone), examinedBy: 'Dr S. Halloway-Odu' }
    const fed = {
      lastFedLocal: localAt(new Date(start.getTime() - 200 * 60_000), zone),
      lastWateredLocal: localAt(new Date(start.getTime() - 60 * 60_000), zone),
    }
    const jersey = outside(14, 70, 2)
    const desert = outside(29, 22, 2, 600)
    return {
      shipperId: shippers['0431'] ?? 0,
      purpose: 'commercial',
      consignor: {
        name: 'Larkhaven Kennels',
        address: '19 Mercer Lane, Princeton',
        telephone: '+1 202 555 0143',
        email: 'hello@larkhaven.example',
      },
      consignee: {
        name: 'Red Butte House',
        address: '7 Juniper Track, Sedona',
        telephone: '+1 202 555 0129',
        email: 'home@red-butte.example',
      },
      emergencyContact: { name: 'Matteo Ferrand-Ito', telephone: '+44 7700 900633' },
      handlingNote: '',
      animals: [
        animal({
          id: 'animal-1',
          name: 'Teasel',
          profileKey: 'dog',
          massKg: 11.2,
          breedNote: 'Beagle',
          sex: 'female',
          ageDays: 1_500,
          identification: 'Chip 999 000 0155 10093',
          ...seen,
          ...fed,
        }),
        animal({
          id: 'animal-2',
          name: 'Otto',
          profileKey: 'cat',
          massKg: 4.6,
          breedNote: 'Shorthair',
          sex: 'male',
          ageDays: 2_100,
          identification: 'Chip 999 000 0155 10101',
          ...seen,
          ...fed,
        }),
      ],
      crates: [
        crate({ letter: 'A', sizeCm: medium, occupants: ['animal-1'], openings: slatted(medium) }),
        crate({
          letter: 'B',
          sizeCm: [56, 40, 41],
          occupants: ['animal-2'],
          openings: slatted([56, 40, 41]),
        }),
      ],
      legs: journey(start, places, [
        {
          kind: 'road',
          from: 'princeton',
          to: 'newark',
          minutes: 70,
          surroundings: van(jersey, 19),
          inCharge: LARKHAVEN,
        },
        {
          kind: 'shed',
          from: 'newark',
          to: 'newark',
          minutes: 150,
          surroundings: held(20, 50, 0.15, jersey),
          inCharge: TALUS,
          delay: [15, 45],
          stops: [{ minute: 120, kind: 'water' }],
        },
        {
          kind: 'ramp',
          from: 'newark',
          to: 'newark',
          minutes: 25,
          surroundings: jersey,
          inCharge: TALUS,
          delay: [5, 20],
        },
        {
          kind: 'flight',
          phase: 'doors-shut-departure',
          from: 'newark',
          to: 'newark',
          minutes: 20,
          surroundings: holdShut(jersey, 18),
          inCharge: TALUS,
          carrier: 'Talus Air Freight',
          service: 'TL 88',
          delay: [5, 25],
        },
        {
          kind: 'flight',
          phase: 'airborne',
          from: 'newark',
          to: 'phoenix',
          minutes: 310,
          surroundings: held(19, 25, 0.1),
          inCharge: TALUS,
          carrier: 'Talus Air Freight',
          service: 'TL 88',
        },
        {
          kind: 'flight',
          phase: 'doors-shut-arrival',
          from: 'phoenix',
          to: 'phoenix',
          minutes: 15,
          surroundings: holdShut(desert, 19),
          inCharge: SAGUARO,
          carrier: 'Talus Air Freight',
          service: 'TL 88',
          delay: [5, 20],
        },
        {
          kind: 'ramp',
          from: 'phoenix',
          to: 'phoenix',
          minutes: 20,
          surroundings: { ...outside(29, 22, 2, 600), shadePct: 80 },
          inCharge: SAGUARO,
          delay: [5, 15],
        },
        {
          kind: 'road',
          from: 'phoenix',
          to: 'sedona',
          minutes: 130,
          surroundings: van(outside(24, 25, 3, 500), 19),
          inCharge: DESK,
          stops: [{ minute: 10, kind: 'water' }],
        },
      ]),
    }
  },
}
