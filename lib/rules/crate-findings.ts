import type { Leg, LegExtremes } from '@/lib/thermal'
import { type BaseRuns, type Found, foundIn, proneOf, worstBy } from './base-runs'
import { overrideRefusal } from './body-findings'
import type { Finding } from './result'
import type { Subject } from './subject'
import { degrees, percent, rowWords, scheduleWords } from './wording'

/** Water lost by breath and skin, % of body mass. [judgement] */
export const WATER_LOSS_CONDITION_PCT = 5
export const WATER_LOSS_BREACH_PCT = 8

/** Minutes in a row above 5,000, 15,000 and 30,000 ppm that count. [judgement, after occupational limits of 5,000 and 30,000] */
export const CO2_CONDITION_MIN = 60
export const CO2_BREACH_MIN = 30

const HUMID_PCT = 70
const DRY_PCT = 30
const EFFORT_NOTE_PCT = 60
const ZONE_EFFORT_PCT = 5

/** What one leg says of one animal besides its body limits: carbon dioxide, water, the air backstop, and notes. */
export function crateFindings(subject: Subject, leg: Leg, legs: readonly Leg[], base: BaseRuns): Finding[] {
  const prone = foundIn(proneOf(base.planned), subject.animal.id, leg.id)
  const typical = foundIn(base.planned, subject.animal.id, leg.id).filter(
    ({ variant }) => variant === 'typical',
  )
  const about = { animalId: subject.animal.id, crateId: subject.crate.id, legId: leg.id }
  const when = ({ scheduleId }: Found) => scheduleWords(scheduleId, legs)
  return [
    ...carbonDioxide(prone, about, when),
    ...waterLoss(prone, about, when),
    ...airBackstop(subject, prone, about, when),
    ...notes(typical, about),
  ].map((finding) => refusable(finding, subject, base))
}

type About = Pick<Finding, 'animalId' | 'crateId' | 'legId'>
/** The schedule of a run in words. */
type When = (found: Found) => string

function carbonDioxide(found: readonly Found[], about: About, when: When): Finding[] {
  const worst = worstBy(
    found,
    ({ extremes: { co2OverMin: over, co2MaxPpm } }) =>
      over.over30000 * 1e9 + over.over15000 * 1e6 + over.over5000 * 1e3 + co2MaxPpm / 1e3,
  )
  if (worst === undefined) return []
  const { over5000, over15000, over30000 } = worst.extremes.co2OverMin
  const shared = {
    rule: 'carbon-dioxide',
    basis: 'physiology' as const,
    limitKind: 'other' as const,
    ...about,
    scheduleId: worst.scheduleId,
    variant: worst.variant,
    value: worst.extremes.co2MaxPpm,
    unit: 'ppm',
    sourceTag: 'judgement' as const,
    note: `Crate air reaches ${worst.extremes.co2MaxPpm.toFixed(0)} ppm of carbon dioxide (${worst.variant} animal, ${when(worst)}).`,
  }
  if (over30000 > 0)
    return [
      {
        ...shared,
        status: 'breach',
        limit: 30_000,
        asked: 'Carbon dioxide never above 30,000 ppm.',
        overridable: false,
      },
    ]
  if (over15000 >= CO2_BREACH_MIN)
    return [
      {
        ...shared,
        status: 'breach',
        limit: 15_000,
        minutesPast: Math.ceil(over15000),
        asked: `Carbon dioxide not above 15,000 ppm for ${CO2_BREACH_MIN} minutes.`,
        overridable: true,
      },
    ]
  const status = over5000 >= CO2_CONDITION_MIN ? 'condition' : 'met'
  return [
    {
      ...shared,
      status,
      limit: 5_000,
      asked: `Carbon dioxide not above 5,000 ppm for ${CO2_CONDITION_MIN} minutes.`,
      overridable: false,
    },
  ]
}

function waterLoss(found: readonly Found[], about: About, when: When): Finding[] {
  const worst = worstBy(found, ({ extremes }) => extremes.waterLossPctMass)
  if (worst === undefined) return []
  const value = worst.extremes.waterLossPctMass
  const status =
    value >= WATER_LOSS_BREACH_PCT ? 'breach' : value >= WATER_LOSS_CONDITION_PCT ? 'condition' : 'met'
  const limit = status === 'breach' ? WATER_LOSS_BREACH_PCT : WATER_LOSS_CONDITION_PCT
  return [
    {
      rule: 'water-loss',
      basis: 'physiology',
      status,
      limitKind: 'other',
      ...about,
      scheduleId: worst.scheduleId,
      variant: worst.variant,
      limit,
      value,
      unit: '% of mass',
      asked: `Water lost under ${percent(limit)} of body mass.`,
      note: `Loses ${value.toFixed(1)} % of its mass as water by the end of the leg (${worst.variant} animal, ${when(worst)}).`,
      sourceTag: 'judgement',
      overridable: status === 'breach',
    },
  ]
}

/** Instant, in the crate's air, on any schedule: the backstop of the species row, or what the house put in its place. */
function airBackstop(
  { airLowC, airHighC, row, animal }: Subject,
  found: readonly Found[],
  about: About,
  when: When,
): Finding[] {
  const hottest = worstBy(found, ({ extremes }) => extremes.crateAirMaxC)
  const coldest = worstBy(found, ({ extremes }) => -extremes.crateAirMinC)
  if (hottest === undefined || coldest === undefined) return []
  const one = (side: 'high' | 'low', limit: number, value: number, at: Found): Finding => ({
    rule: side === 'high' ? 'house-air-ceiling' : 'house-air-floor',
    basis: 'house',
    status: (side === 'high' ? value > limit : value < limit) ? 'breach' : 'met',
    side,
    ...about,
    scheduleId: at.scheduleId,
    variant: at.variant,
    limit,
    value,
    unit: '°C',
    asked: `Crate air ${side === 'high' ? 'at most' : 'at least'} ${degrees(limit)} at any time.`,
    note: `Crate air ${side === 'high' ? 'up to' : 'down to'} ${degrees(value)} (${when(at)}).`,
    citation: `${rowWords({ profile: animal.profile, version: row.version })}, or the limit the house put in its place`,
    sourceTag: 'judgement',
    overridable: true,
  })
  return [
    one('high', airHighC, hottest.extremes.crateAirMaxC, hottest),
    one('low', airLowC, coldest.extremes.crateAirMinC, coldest),
  ].map((finding) => ({
    ...finding,
    overridable: finding.status === 'breach',
  }))
}

/** Never change a verdict: humidity, heat effort, thermoneutral zone. */
function notes(found: readonly Found[], about: About): Finding[] {
  const shared = {
    basis: 'physiology' as const,
    status: 'note' as const,
    ...about,
    sourceTag: 'judgement' as const,
    overridable: false,
  }
  const most = (figure: (extremes: LegExtremes) => number) =>
    worstBy(found, ({ extremes }) => figure(extremes))
  const humid = most((extremes) => extremes.crateHumidityMaxPct)?.extremes.crateHumidityMaxPct ?? 0
  const dry =
    found.length === 0 ? 100 : Math.min(...found.map(({ extremes }) => extremes.crateHumidityMeanPct))
  const heat = most((extremes) => extremes.heatEffort.maxPct)?.extremes.heatEffort.maxPct ?? 0
  const cold = most((extremes) => extremes.coldEffort.maxPct)?.extremes.coldEffort.maxPct ?? 0
  const asked = `Humidity ${DRY_PCT} to ${HUMID_PCT} %, as housing guidance has it for most mammals.`
  const list: (Finding | false)[] = [
    humid > HUMID_PCT && {
      ...shared,
      rule: 'humidity',
      side: 'high',
      limit: HUMID_PCT,
      value: humid,
      unit: '%',
      asked,
      note: `Crate air up to ${percent(humid)} humid.`,
      sourceTag: 'seen',
    },
    dry < DRY_PCT && {
      ...shared,
      rule: 'humidity',
      side: 'low',
      limit: DRY_PCT,
      value: dry,
      unit: '%',
      asked,
      note: `Crate air down to ${percent(dry)} humid.`,
      sourceTag: 'seen',
    },
    heat >= EFFORT_NOTE_PCT && {
      ...shared,
      rule: 'heat-effort',
      side: 'high',
      limit: EFFORT_NOTE_PCT,
      value: heat,
      unit: '%',
      asked: `Panting and sweating under ${percent(EFFORT_NOTE_PCT)} of what it can do.`,
      note: `The typical animal uses up to ${percent(heat)} of its power to shed heat.`,
    },
    (heat > ZONE_EFFORT_PCT || cold > ZONE_EFFORT_PCT) && {
      ...shared,
      rule: 'thermoneutral-zone',
      side: heat > ZONE_EFFORT_PCT ? 'high' : 'low',
      value: heat > ZONE_EFFORT_PCT ? heat : cold,
      unit: '%',
      asked: 'Air in which the animal need neither pant nor shiver.',
      note: `The typical animal works at keeping ${heat > ZONE_EFFORT_PCT ? 'cool' : 'warm'}: up to ${percent(Math.max(heat, cold))} of its power.`,
    },
  ]
  return list.filter((finding) => finding !== false)
}

/** No override where the journey 3 °C to the bad side (either, if the finding has none) passes critical. */
function refusable(finding: Finding, subject: Subject, base: BaseRuns): Finding {
  if (!finding.overridable) return finding
  const legIds = [...new Set(base.planned.flatMap(({ run }) => run.extremes.map(({ legId }) => legId)))]
  const sides = finding.side === undefined ? (['high', 'low'] as const) : [finding.side]
  const refusal = sides
    .map((side) => overrideRefusal(subject.animal.id, legIds, side, base))
    .find((reason) => reason !== undefined)
  return refusal === undefined ? finding : { ...finding, overridable: false, overrideRefusedBecause: refusal }
}
