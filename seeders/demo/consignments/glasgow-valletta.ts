import { animal, crate, slatted } from '../animals'
import { held, holdShut, journey, outside, van } from '../journey'
import type { DemoConsignment } from './common'
import { dateIn, DESK, DUNMUIR, hoursFrom, localAt, SALINA, SKERROW, MOSS_END } from './common'

const large = [92, 61, 68] as const
const low = [56, 40, 41] as const

export const glasgowValletta: DemoConsignment = {
  key: 'glasgow-valletta',
  stage: 'released',
  preparedHoursAgo: 2,
  vetConditions: ['Water at the cup, from outside, in the shed and at the border post. No food.'],
  plan: ({ places, people, shippers, now }) => {
    const start = hoursFrom(now, 20)
    const driverId = people.driver
    const seen = { examinedOn: dateIn(now, -1), examinedBy: 'Dr S. Halloway-Odu' }
    const fed = {
      lastFedLocal: localAt(new Date(start.getTime() - 240 * 60_000)),
      lastWateredLocal: localAt(new Date(start.getTime() - 30 * 60_000)),
    }
    const scotland = outside(9, 75, 3, 40)
    const malta = outside(19, 65, 3)
    return {
      shipperId: shippers['0412'] ?? 0,
      purpose: 'commercial',
      consignor: MOSS_END,
      consignee: {
        name: 'Bajja House Boarding',
        address: '11 Triq il-Qroll, Marsaxlokk',
        telephone: '+44 7700 900119',
        email: 'stay@bajja-house.example',
      },
      emergencyContact: { name: 'Jorun Strand-Ekdahl', telephone: '+44 7700 900562' },
      handlingNote: 'Load last, unload first. Nothing on top of a crate.',
      animals: [
        animal({
          id: 'animal-1',
          name: 'Moss',
          profileKey: 'dog',
          massKg: 18.6,
          breedNote: 'Border collie',
          sex: 'male',
          ageDays: 1_500,
          identification: 'Chip 999 000 0131 77402',
          ...seen,
          ...fed,
        }),
        animal({
          id: 'animal-2',
          name: 'Quill',
          profileKey: 'cat',
          massKg: 4.1,
          breedNote: 'Domestic shorthair',
          sex: 'female',
          ageDays: 1_800,
          identification: 'Chip 999 000 0129 60318',
          ...seen,
          ...fed,
        }),
        animal({
          id: 'animal-3',
          name: 'Sorrel',
          profileKey: 'rabbit',
          massKg: 2.6,
          breedNote: 'Rex',
          sex: 'female',
          ageDays: 760,
          identification: 'Left ear tattoo K4 117',
          ...seen,
          ...fed,
        }),
      ],
      crates: [
        crate({ letter: 'A', sizeCm: large, occupants: ['animal-1'], openings: slatted(large) }),
        crate({ letter: 'B', sizeCm: low, occupants: ['animal-2'], openings: slatted(low) }),
        crate({
          letter: 'C',
          sizeCm: low,
          occupants: ['animal-3'],
          openings: slatted(low),
          given: { bedding: { material: 'wood-shavings', depthMm: 40, wetPct: 0 } },
        }),
      ],
      legs: journey(start, places, [
        {
          kind: 'road',
          from: 'balfron',
          to: 'glasgowShed',
          minutes: 80,
          surroundings: van(scotland, 17),
          inCharge: DESK,
          ...(driverId !== undefined && { driverId }),
          stops: [{ minute: 60, kind: 'look' }],
          lastPointOfReturn:
            'The services before the bridge: after them there is no turning until the airport.',
          fallback:
            'Inverlomond Boarding, +44 141 496 0178, rung at any hour; vet on call there until 23:00.',
        },
        {
          kind: 'shed',
          from: 'glasgowShed',
          to: 'glasgowShed',
          minutes: 165,
          surroundings: held(18, 55, 0.15, scotland),
          inCharge: DUNMUIR,
          stops: [{ minute: 30, kind: 'water' }],
        },
        {
          kind: 'ramp',
          from: 'glasgowShed',
          to: 'glasgowStand',
          minutes: 25,
          surroundings: outside(10, 78, 3),
          inCharge: DUNMUIR,
          delay: [5, 30],
        },
        {
          kind: 'flight',
          phase: 'doors-shut-departure',
          from: 'glasgowStand',
          to: 'glasgowStand',
          minutes: 25,
          surroundings: holdShut(scotland, 15),
          inCharge: SKERROW,
          carrier: 'Skerrow Air Cargo',
          service: 'SK 238',
          delay: [5, 25],
        },
        {
          kind: 'flight',
          phase: 'airborne',
          from: 'glasgowStand',
          to: 'vallettaStand',
          minutes: 200,
          surroundings: held(18, 30, 0.1),
          inCharge: SKERROW,
          carrier: 'Skerrow Air Cargo',
          service: 'SK 238',
          delay: [10, 40],
        },
        {
          kind: 'flight',
          phase: 'doors-shut-arrival',
          from: 'vallettaStand',
          to: 'vallettaStand',
          minutes: 20,
          surroundings: holdShut(malta, 18),
          inCharge: SALINA,
          carrier: 'Skerrow Air Cargo',
          service: 'SK 238',
          delay: [5, 20],
        },
        {
          kind: 'ramp',
          from: 'vallettaStand',
          to: 'vallettaBorder',
          minutes: 25,
          surroundings: malta,
          inCharge: SALINA,
          delay: [5, 25],
        },
        {
          kind: 'border',
          from: 'vallettaBorder',
          to: 'vallettaBorder',
          minutes: 90,
          surroundings: held(20, 55, 0.15, malta),
          inCharge: SALINA,
          stops: [{ minute: 10, kind: 'water' }],
        },
        {
          kind: 'road',
          from: 'vallettaBorder',
          to: 'marsaxlokk',
          minutes: 40,
          surroundings: van(malta, 18),
          inCharge: ['Delimara Animal Transfer', '+44 7700 900131'],
        },
      ]),
    }
  },
}
