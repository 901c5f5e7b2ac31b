import { animal, crate, slatted } from '../animals'
import { held, holdShut, journey, outside, van } from '../journey'
import type { DemoConsignment } from './common'
import { dateIn, dayAt, DESK, DUNMUIR, localAt, QURM, SKERROW, MOSS_END } from './common'

const small = [66, 46, 51] as const
const large = [92, 61, 68] as const
const low = [56, 40, 41] as const

/** A pug through a hot station: the case the product exists to refuse. */
export const glasgowMuscat: DemoConsignment = {
  key: 'glasgow-muscat',
  stage: 'assessed',
  preparedHoursAgo: 1,
  plan: ({ places, people, shippers, now }) => {
    const start = dayAt(now, 2, '09:20', 'Europe/London')
    const driverId = people.driver
    const seen = { examinedOn: dateIn(now, 0), examinedBy: 'Dr S. Halloway-Odu' }
    const fed = {
      lastFedLocal: localAt(new Date(start.getTime() - 180 * 60_000)),
      lastWateredLocal: localAt(new Date(start.getTime() - 30 * 60_000)),
    }
    const coolDay = outside(6, 80, 4, 60)
    const muscatNight = outside(34, 62, 1.5)
    return {
      shipperId: shippers['0412'] ?? 0,
      purpose: 'commercial',
      consignor: MOSS_END,
      consignee: {
        name: 'Wadi Sahm Sanctuary',
        address: 'Wadi Sahm, Ad Dakhiliyah',
        telephone: '+44 7700 900811',
        email: 'care@wadi-sahm.example',
      },
      emergencyContact: { name: 'Jorun Strand-Ekdahl', telephone: '+44 7700 900562' },
      handlingNote: 'Crate C out of sight and smell of A and B.',
      animals: [
        animal({
          id: 'animal-1',
          name: 'Bramble',
          profileKey: 'snub-nosed-dog',
          massKg: 8.4,
          breedNote: 'Pug',
          sex: 'female',
          ageDays: 2_560,
          identification: 'Chip 999 000 0131 77436',
          flags: ['snub-nosed'],
          temperament: 'anxious',
          ...seen,
          ...fed,
        }),
        animal({
          id: 'animal-2',
          name: 'Corrie',
          profileKey: 'dog',
          massKg: 18.6,
          breedNote: 'Border collie',
          sex: 'male',
          ageDays: 1_480,
          identification: 'Chip 999 000 0131 77418',
          ...seen,
          ...fed,
        }),
        animal({
          id: 'animal-3',
          name: 'Tansy',
          profileKey: 'rabbit',
          massKg: 3.1,
          breedNote: 'Angora',
          sex: 'female',
          ageDays: 730,
          identification: 'Left ear tattoo K4 131',
          ...seen,
          ...fed,
        }),
      ],
      crates: [
        crate({ letter: 'A', sizeCm: small, occupants: ['animal-1'], openings: slatted(small) }),
        crate({ letter: 'B', sizeCm: large, occupants: ['animal-2'], openings: slatted(large) }),
        crate({
          letter: 'C',
          sizeCm: low,
          occupants: ['animal-3'],
          openings: slatted(low, 50),
          given: { bedding: { material: 'wood-shavings', depthMm: 40, wetPct: 0 } },
        }),
      ],
      legs: journey(start, places, [
        {
          kind: 'road',
          from: 'balfron',
          to: 'glasgowShed',
          minutes: 75,
          surroundings: van(coolDay, 14),
          inCharge: DESK,
          ...(driverId !== undefined && { driverId }),
          stops: [{ minute: 60, kind: 'look' }],
        },
        {
          kind: 'shed',
          from: 'glasgowShed',
          to: 'glasgowShed',
          minutes: 185,
          surroundings: held(15, 55, 0.15, coolDay),
          inCharge: DUNMUIR,
          stops: [{ minute: 30, kind: 'water' }],
        },
        {
          kind: 'ramp',
          from: 'glasgowShed',
          to: 'glasgowStand',
          minutes: 30,
          surroundings: outside(6, 82, 3, 20),
          inCharge: DUNMUIR,
        },
        {
          kind: 'flight',
          phase: 'doors-shut-departure',
          from: 'glasgowStand',
          to: 'glasgowStand',
          minutes: 25,
          surroundings: holdShut(coolDay, 14),
          inCharge: SKERROW,
          carrier: 'Skerrow Air Cargo',
          service: 'SK 471',
          delay: [10, 40],
        },
        {
          kind: 'flight',
          phase: 'airborne',
          from: 'glasgowStand',
          to: 'muscatStand',
          minutes: 445,
          surroundings: held(15, 25, 0.1),
          inCharge: SKERROW,
          carrier: 'Skerrow Air Cargo',
          service: 'SK 471',
          delay: [10, 60],
        },
        {
          kind: 'flight',
          phase: 'doors-shut-arrival',
          from: 'muscatStand',
          to: 'muscatStand',
          minutes: 20,
          surroundings: holdShut(muscatNight, 15),
          inCharge: QURM,
          carrier: 'Skerrow Air Cargo',
          service: 'SK 471',
          delay: [10, 40],
        },
        {
          kind: 'ramp',
          from: 'muscatStand',
          to: 'muscatCustoms',
          minutes: 45,
          surroundings: muscatNight,
          inCharge: QURM,
          delay: [10, 40],
        },
        {
          kind: 'border',
          from: 'muscatCustoms',
          to: 'muscatCustoms',
          minutes: 320,
          surroundings: held(25, 55, 0.15, outside(31, 60)),
          inCharge: QURM,
          stops: [{ minute: 15, kind: 'water' }],
        },
        {
          kind: 'road',
          from: 'muscatCustoms',
          to: 'wadiSahm',
          minutes: 165,
          surroundings: van(outside(33, 45, 2, 500), 21),
          inCharge: ['Wadi Sahm Sanctuary', '+44 7700 900811'],
        },
      ]),
    }
  },
}
