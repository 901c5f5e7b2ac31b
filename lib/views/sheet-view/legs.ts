import type { AnimalView, ConditionView, LegCell, LegView } from '../sheet'
import type { Finding } from '@/lib/rules/result'
import type { Assessed } from './assessed'
import type { JourneyLeg } from './journey'
import { limitWords, marginOf, narrowest } from './words'

/** Legs with a cell for each animal, in the order of the animals. */
export function legViews(
  journey: JourneyLeg[],
  animals: Pick<AnimalView, 'animalId'>[],
  assessed: Assessed | null,
  conditions: ConditionView[],
): LegView[] {
  return journey.map(
    ({ leg, ordinal, pattern, title, fromPlace, toPlace, start, end, durationMin, air }) => ({
      legId: leg.id,
      ordinal,
      kind: leg.kind,
      flightPhase: leg.flightPhase,
      pattern,
      title,
      fromPlace,
      toPlace,
      start,
      end,
      durationMin,
      delayTypicalMin: leg.delayTypicalMin,
      delayWorstMin: leg.delayWorstMin,
      airTempC: air.maxC,
      airWords: air.words,
      carrier: leg.carrier,
      serviceNumber: leg.serviceNumber,
      partyInCharge: leg.partyInCharge,
      partyTelephone: leg.partyTelephone,
      partyHours: leg.partyHours,
      attended: leg.attended,
      conditionNumbers: conditions.filter(({ legs }) => legs.includes(ordinal)).map(({ number }) => number),
      cells: animals.map(({ animalId }) => legCell(animalId, leg.id, assessed)),
    }),
  )
}

/**
 * What decides on one leg. Where that is no body limit (a law, a carrier's rule), the room shown is that of the narrowest
 * body limit of the leg, named, and what decides is named beside it.
 */
function legCell(animalId: string, legId: string, assessed: Assessed | null): LegCell {
  const verdict = assessed?.effective.verdicts.find((one) => one.animalId === animalId && one.legId === legId)
  const findings = assessed?.effective.findings ?? []
  const decided = verdict?.decidedBy === undefined ? undefined : findings[verdict.decidedBy]
  const shown =
    decided?.marginMin === undefined
      ? narrowest(findings.filter((one) => one.animalId === animalId && one.legId === legId))
      : decided
  const overridden = (assessed?.effective.overridden ?? []).some(({ findingIndex }) => {
    const finding = assessed?.original[findingIndex]
    return finding?.animalId === animalId && finding.legId === legId
  })
  return {
    animalId,
    verdict: verdict?.verdict ?? null,
    margin: marginOf(shown),
    ...wordsOf(decided, shown),
    overridden,
  }
}

function wordsOf(
  decided: Finding | undefined,
  shown: Finding | undefined,
): Pick<LegCell, 'limitWords' | 'decidedWords'> {
  const finding = shown ?? decided
  const limit = finding === undefined ? '' : limitWords(finding)
  const decides = decided === undefined || decided === finding ? '' : limitWords(decided)
  return { limitWords: limit, decidedWords: decides === limit ? '' : decides }
}
