import type { Scenario } from '@/lib/thermal'
import { beagle, crateOf, legOf, openAirAt, pug, roomAt, scenarioOf, vanIn } from './worlds'

/** Minute from departure, °C over the day's base, sun. */
const DAY = [
  [0, 0, 300],
  [240, 3, 600],
  [480, 4, 500],
  [720, 1, 100],
  [960, -3, 0],
  [2_400, 0, 300],
] as const

/** Nine legs, four crates, six animals: van, shed, ramp, a flight in three legs, ramp, border, van. */
export function nineLegs(): Scenario {
  const delay = { typicalMin: 10, worstMin: 60 }
  const day = (airTempC: number) =>
    openAirAt(airTempC, {
      shadePct: 50,
      series: DAY.map(([minute, warmer, solarWm2]) => ({
        minute,
        airTempC: airTempC + warmer,
        relHumidityPct: 55,
        windMs: 2,
        solarWm2,
      })),
    })
  const van = (airTempC: number) =>
    vanIn(day(airTempC), { conditioning: { setPointC: 18, coolingW: 3_000, heatingW: 2_000 } })
  const hold = (airTempC: number) => ({
    ...vanIn(day(airTempC)),
    volumeM3: 40,
    heatTransferWK: 80,
    interiorMassKJK: 200,
    ventilationM3h: undefined,
    leakageM3h: 4,
    solarApertureM2: 0,
    crateAirSpeedMs: 0.05,
    compartmentId: 'hold',
  })
  return scenarioOf({
    legs: [
      legOf('van-out', { durationMin: 150, surroundings: van(18), delay }),
      legOf('shed-out', { kind: 'shed', durationMin: 120, surroundings: roomAt(18), delay, attended: false }),
      legOf('ramp-out', { kind: 'ramp', durationMin: 30, surroundings: day(18), delay }),
      legOf('doors-out', {
        kind: 'flight',
        flightPhase: 'doors-shut-departure',
        durationMin: 30,
        surroundings: hold(18),
        delay,
        attended: false,
      }),
      legOf('air', {
        kind: 'flight',
        flightPhase: 'airborne',
        durationMin: 420,
        surroundings: roomAt(15, { airSpeedMs: 0.05 }),
        pressureKPa: 75.3,
        delay,
        attended: false,
      }),
      legOf('doors-in', {
        kind: 'flight',
        flightPhase: 'doors-shut-arrival',
        durationMin: 20,
        surroundings: hold(24),
        delay,
        attended: false,
      }),
      legOf('ramp-in', { kind: 'ramp', durationMin: 30, surroundings: day(24), delay }),
      legOf('border', { kind: 'border', durationMin: 90, surroundings: roomAt(20), delay, attended: false }),
      legOf('van-in', { durationMin: 120, surroundings: van(22), delay }),
    ],
    crates: [
      crateOf('a', [beagle('bess')]),
      crateOf('b', [beagle('finn', { massKg: 24 })]),
      crateOf('c', [pug('otto')]),
      crateOf('d', [
        beagle('tib', { profile: 'cat', massKg: 4 }),
        beagle('tab', { profile: 'cat', massKg: 3.6 }),
        beagle('tom', { profile: 'cat', massKg: 5 }),
      ]),
    ],
  })
}
