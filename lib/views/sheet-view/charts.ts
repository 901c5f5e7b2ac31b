import type { AnimalTrack } from '@/lib/thermal/result'
import type { Variant } from '@/lib/thermal/scenario'
import type { AnimalChart, AnimalView, BodyTrack, SheetCharts } from '../sheet'
import type { Assessed } from './assessed'
import type { JourneyLeg } from './journey'
import { scheduleInWords } from './words'

/**
 * The pictures, on the schedule that decides the consignment where all tracks are kept for it, else on time. null where
 * the assessment was loaded without its tracks.
 */
export function sheetCharts(
  animals: AnimalView[],
  assessed: Assessed | null,
  journey: JourneyLeg[],
): SheetCharts | null {
  if (assessed === null || assessed.fact.result.animals.length === 0) return null
  const { result } = assessed.fact
  const scheduleId = drawnSchedule(assessed, animals)
  const schedule = result.schedules.find(({ id }) => id === scheduleId)
  if (schedule === undefined) return null
  const { legStartMin } = schedule
  const charts = animals.flatMap((animal) => animalChart(animal, scheduleId, result.animals))
  return {
    scheduleId,
    scheduleWords: scheduleInWords(
      scheduleId,
      (legId) => journey.find(({ leg }) => leg.id === legId)?.ordinal,
    ),
    departureMs: journey[0]?.start.ms ?? 0,
    endMin: legStartMin.at(-1) ?? 0,
    zones: zonesOf(journey, legStartMin),
    legs: journey.map(({ leg, ordinal, title, pattern }, index) => ({
      legId: leg.id,
      ordinal,
      title,
      pattern,
      startMin: legStartMin[index] ?? 0,
      endMin: legStartMin[index + 1] ?? legStartMin.at(-1) ?? 0,
    })),
    animals: charts,
    crates: crateCharts(charts, scheduleId, assessed),
  }
}

function drawnSchedule({ effective, fact: { result } }: Assessed, animals: AnimalView[]): string {
  const { decidedBy } = effective.verdict
  const wished = decidedBy === undefined ? undefined : effective.findings[decidedBy]?.scheduleId
  const kept = (id: string) =>
    animals.every(({ animalId }) =>
      result.animals.some((track) => track.id === animalId && track.scheduleId === id),
    )
  return wished !== undefined && kept(wished) ? wished : 'on-time'
}

function zonesOf(journey: JourneyLeg[], legStartMin: readonly number[]): SheetCharts['zones'] {
  const zones: SheetCharts['zones'] = []
  journey.forEach(({ start, end }, index) => {
    const fromMin = legStartMin[index] ?? 0
    if (zones.at(-1)?.zone !== start.zone) zones.push({ zone: start.zone, fromMin })
    if (index === journey.length - 1 && zones.at(-1)?.zone !== end.zone)
      zones.push({ zone: end.zone, fromMin: legStartMin[index + 1] ?? fromMin })
  })
  return zones
}

function animalChart(animal: AnimalView, scheduleId: string, tracks: readonly AnimalTrack[]): AnimalChart[] {
  if (animal.bodyLimits === null) return []
  const trackOf = (variant: Variant) =>
    tracks.find(
      (one) => one.id === animal.animalId && one.variant === variant && one.scheduleId === scheduleId,
    )
  const deciding = trackOf(proneVariant(animal))
  return [
    {
      animalId: animal.animalId,
      crateId: animal.crateId,
      crateLetter: animal.crateLetter,
      name: animal.name,
      limits: animal.bodyLimits,
      typical: bodyTrack(trackOf('typical')),
      deciding: bodyTrack(deciding),
      heat: deciding === undefined ? null : { minutes: deciding.minutes, ...deciding.heat },
    },
  ]
}

/** The prone track that decides; the side of the limit where the finding names no track. */
function proneVariant({ variant, margin }: AnimalView): Variant {
  if (variant === 'heat-prone' || variant === 'cold-prone') return variant
  return margin.side === 'low' ? 'cold-prone' : 'heat-prone'
}

function bodyTrack(track: AnimalTrack | undefined): BodyTrack | null {
  return track === undefined
    ? null
    : { variant: track.variant, minutes: track.minutes, bodyC: track.coreTempC }
}

/** A crate's air on the track its first animal is decided by. */
function crateCharts(charts: AnimalChart[], scheduleId: string, { fact }: Assessed): SheetCharts['crates'] {
  const seen = new Set<string>()
  return charts.flatMap(({ crateId, deciding }) => {
    const variant = deciding?.variant ?? 'typical'
    const track = fact.result.crates.find(
      (one) => one.id === crateId && one.variant === variant && one.scheduleId === scheduleId,
    )
    if (track === undefined || seen.has(crateId)) return []
    seen.add(crateId)
    const { minutes, airTempC, relHumidityPct, co2Ppm } = track
    return [{ crateId, variant, minutes, airTempC, relHumidityPct, co2Ppm }]
  })
}
