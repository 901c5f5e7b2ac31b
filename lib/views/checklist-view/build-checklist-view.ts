import { checklistItems, ownLegs } from '@/lib/planning/checklist'
import type { PlanLeg } from '@/lib/schemas/plan'
import type { ConsignmentState } from '@/lib/states/consignment'
import type { ChecklistEndurance, ChecklistLeg, ChecklistStop, ChecklistView, EntryView } from '../checklist'
import type { CallView } from '../manifest'
import type { EnduranceView, LegView, SheetView } from '../sheet'
import { buildSheetView } from '../sheet-view/build-sheet-view'
import type { SheetFacts } from '../sheet-view/facts'

export interface ChecklistFacts {
  /** Of the revision in force. */
  sheet: SheetFacts
  driver: { id: number; name: string }
  entries: readonly EntryView[]
  /** Code of the manifest in force; null where none was issued. */
  documentCode: string | null
  may: { depart: boolean; deliver: boolean; stop: boolean }
}

/** A driver's own legs on the revision in force, with limits in figures and everybody to ring. */
export function buildChecklistView(facts: ChecklistFacts): ChecklistView {
  const sheet = buildSheetView(facts.sheet)
  const own = new Set(ownLegs(facts.sheet.plan, facts.driver.id).map(({ id }) => id))
  return {
    consignmentId: sheet.consignmentId,
    mark: sheet.mark,
    revision: sheet.revision,
    driverName: facts.driver.name,
    state: sheet.state,
    stamp: sheet.stamp,
    headline: sheet.headline,
    overrides: sheet.overrides,
    crates: facts.sheet.plan.crates.map(({ id, letter }) => {
      const animals = sheet.animals.filter(({ crateId }) => crateId === id)
      return {
        crateId: id,
        letter,
        animals: animals.map(({ name }) => name).join(', '),
        animalCount: animals.reduce((sum, { count }) => sum + count, 0),
      }
    }),
    legs: sheet.legs.filter(({ legId }) => own.has(legId)).map((leg) => checklistLeg(leg, sheet, facts)),
    calls: callsOf(facts.sheet),
    entries: [...facts.entries],
    desk: { name: sheet.firm.name, telephone: sheet.firm.deskTelephone },
    made: sheet.made,
    documentCode: facts.documentCode,
    mayDepart: facts.may.depart,
    mayDeliver: facts.may.deliver,
    mayStop: facts.may.stop,
  }
}

function checklistLeg(leg: LegView, sheet: SheetView, facts: ChecklistFacts): ChecklistLeg {
  const { plan, conditions } = facts.sheet
  const typed = plan.legs.find(({ id }) => id === leg.legId)
  const next = sheet.legs.find(({ ordinal }) => ordinal === leg.ordinal + 1)
  const nextIsOwn = plan.legs.find(({ id }) => id === next?.legId)?.driverId === facts.driver.id
  const ours = conditions.filter(({ ours: own, answer }) => own && answer !== 'refused')
  const arrivalZone = sheet.arrives.zone
  return {
    legId: leg.legId,
    ordinal: leg.ordinal,
    title: leg.title,
    pattern: leg.pattern,
    fromPlace: leg.fromPlace,
    toPlace: leg.toPlace,
    start: leg.start,
    end: leg.end,
    endElsewhere: arrivalZone === leg.end.zone ? null : { ms: leg.end.ms, zone: arrivalZone },
    delayWorstMin: leg.delayWorstMin,
    deadlineWords: `At ${leg.toPlace} by`,
    handOverTo: nextIsOwn ? '' : next === undefined ? plan.consignee.name : next.partyInCharge,
    stops: sheet.stopLimits.flatMap((crate) => stopsOn(crate, leg.legId, sheet)),
    endurance: sheet.endurance
      .filter(({ legId }) => legId === leg.legId)
      .map((row) => enduranceOn(row, sheet)),
    signs: signsOf(facts.sheet),
    cautions: leg.cells.some(({ verdict }) => verdict === 'no-go')
      ? ['This leg is NO-GO for an animal aboard: ring the desk before moving.']
      : [],
    conditionWords:
      leg.conditionNumbers.length === 0
        ? ''
        : `Conditions ${leg.conditionNumbers.join(', ')} of the manifest`,
    notes: typed === undefined ? [] : notesOf(typed),
    items: typed === undefined ? [] : checklistItems(plan, typed, facts.driver.id, ours),
  }
}

function notesOf({ lastPointOfReturn, fallback, note }: PlanLeg): ChecklistLeg['notes'] {
  return [
    { head: 'Last point of return', text: lastPointOfReturn },
    { head: 'If you can’t go on', text: fallback },
    { head: 'Note', text: note },
  ].filter(({ text }) => text !== '')
}

function stopsOn(crate: SheetView['stopLimits'][number], legId: string, sheet: SheetView): ChecklistStop[] {
  const limit = crate.byLeg.find((one) => one.legId === legId)
  if (limit === undefined) return []
  const { aboveC, belowC, aboveF, belowF } = limit
  const animals = sheet.animals.filter(({ crateId }) => crateId === crate.crateId).map(({ name }) => name)
  return [
    {
      crateId: crate.crateId,
      crateLetter: crate.crateLetter,
      animals: animals.join(', '),
      aboveC,
      belowC,
      aboveF,
      belowF,
    },
  ]
}

const FAILURE_WORDS: Record<EnduranceView['kind'], string> = {
  climate: 'if the climate control fails',
  ventilation: 'if the ventilation fails',
  stays: 'if the leg goes on as it is',
}

function enduranceOn(
  { animalId, crateLetter, kind, toAlarmMin, toCriticalMin }: EnduranceView,
  sheet: SheetView,
): ChecklistEndurance {
  return {
    crateLetter,
    name: sheet.animals.find((animal) => animal.animalId === animalId)?.name ?? '',
    kindWords: FAILURE_WORDS[kind],
    toAlarmMin,
    toCriticalMin,
  }
}

/** The desk first, then whoever knows the animals, then the parties in charge on the way. */
function callsOf({ firm, plan }: SheetFacts): CallView[] {
  const parties = plan.legs
    .filter(({ partyTelephone }) => partyTelephone !== '')
    .map(({ partyInCharge, partyTelephone, partyHours }) => ({
      who: partyInCharge,
      purpose: partyHours === '' ? 'in charge on the way' : `in charge on the way, ${partyHours}`,
      telephone: partyTelephone,
    }))
  const calls = [
    { who: 'the desk', purpose: firm.deskHours, telephone: firm.deskTelephone },
    {
      who: plan.emergencyContact.name,
      purpose: 'emergency contact',
      telephone: plan.emergencyContact.telephone,
    },
    ...parties,
  ]
  const known = new Set<string>()
  return calls
    .filter(({ telephone }) => !known.has(telephone) && known.add(telephone))
    .map((call, index) => ({ ...call, number: index + 1, ifNoAnswer: 'ring the next' }))
}

/** The states in which a run is on a driver's list. */
export const OPEN_RUN_STATES: readonly ConsignmentState[] = ['released', 'under_way']

/** Signs the vet chose when signing, by crate. */
function signsOf({ plan, approvals }: SheetFacts): ChecklistLeg['signs'] {
  return plan.crates.flatMap(({ id, letter }) => {
    const signed = approvals.filter(({ crateId, inForce }) => inForce && crateId === id)
    return [...new Set(signed.flatMap(({ earlySigns }) => earlySigns))].map((text) => ({
      crateLetter: letter,
      text,
    }))
  })
}
