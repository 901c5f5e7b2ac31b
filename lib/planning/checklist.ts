import type { Plan, PlanCrate, PlanLeg } from '@/lib/schemas/plan'
import { controlOf } from './climate-control'
import type { Control } from './climate-control'

export type ChecklistItemKind = 'tick' | 'reading' | 'water' | 'condition' | 'handover'

/** One thing a driver does on a leg. The key stays the same for as long as the plan does: entries point to it. */
export interface ChecklistItemPlan {
  key: string
  number: number
  kind: ChecklistItemKind
  text: string
}

/** A condition that our own driver confirms by doing it. */
export interface OwnCondition {
  id: string
  legId: string | null
  text: string
}

/**
 * What a driver does on one of their legs, in the order of doing it: made from the plan and its conditions alone, so that
 * phone, print and PDF hold the same list.
 */
export function checklistItems(
  plan: Plan,
  leg: PlanLeg,
  driverId: number,
  conditions: readonly OwnCondition[],
): ChecklistItemPlan[] {
  const items = [
    ...loadingItems(plan, leg),
    ...airItems(leg),
    ...conditionItems(plan, leg, driverId, conditions),
    ...stopItems(leg),
    ...endItems(plan, leg, driverId),
  ]
  return items.map((item, index) => ({ ...item, number: index + 1 }))
}

type Item = Omit<ChecklistItemPlan, 'number'>

/** The legs on which this driver stands beside the crates. */
export function ownLegs(plan: Plan, driverId: number): PlanLeg[] {
  return plan.legs.filter((leg) => leg.driverId === driverId)
}

function loadingItems(plan: Plan, leg: PlanLeg): Item[] {
  return plan.crates.flatMap((crate): Item[] => [
    {
      key: `openings-${crate.id}`,
      kind: 'tick',
      text: `Crate ${crate.letter}: openings free (${openFaces(crate)}), nothing within ${Math.max(20, crate.rimMm)} mm, door locked.`,
    },
    ...(leg.id === plan.legs[0]?.id ? firstLoading(crate) : []),
  ])
}

function firstLoading(crate: PlanCrate): Item[] {
  const water =
    crate.waterContainerL === null || crate.waterContainerL === 0
      ? ''
      : `, water container filled (${crate.waterContainerL} L)`
  return [
    {
      key: `bedding-${crate.id}`,
      kind: 'tick',
      text: `Crate ${crate.letter}: bedding dry${water}, label and manifest on the crate.`,
    },
  ]
}

function openFaces(crate: PlanCrate): string {
  const faces = [
    ...new Set(crate.openings.filter(({ blockedPct }) => blockedPct < 100).map(({ face }) => face)),
  ]
  return faces.length === 0 ? 'top' : faces.join(', ')
}

function airItems(leg: PlanLeg): Item[] {
  return [
    ...controlItems(leg),
    { key: 'reading-start', kind: 'reading', text: 'Air outside the crates, before moving off.' },
  ]
}

function controlItems({ surroundings: air }: PlanLeg): Item[] {
  const machine = air.type === 'enclosed' ? air.conditioning : null
  const runs = RUNS[controlOf(machine)]
  if (machine?.setPointC == null || runs === null) return []
  return [{ key: 'set-point', kind: 'tick', text: `${runs}, set-point ${degrees(machine.setPointC)}.` }]
}

const RUNS: Record<Control, string | null> = {
  both: 'Climate control runs',
  cooling: 'Cooling runs (there is no heating)',
  heating: 'Heating runs (there is no cooling)',
  none: null,
}

/** A condition of the whole journey stands on the driver's first leg. */
function conditionItems(
  plan: Plan,
  leg: PlanLeg,
  driverId: number,
  conditions: readonly OwnCondition[],
): Item[] {
  const first = ownLegs(plan, driverId)[0]?.id
  return conditions
    .filter(({ legId }) => legId === leg.id || (legId === null && leg.id === first))
    .map(({ id, text }) => ({ key: `condition-${id}`, kind: 'tick', text }))
}

const STOP_ITEMS: Record<PlanLeg['stops'][number]['kind'], { kind: ChecklistItemKind; text: string }> = {
  look: { kind: 'condition', text: 'Stop and look at every animal.' },
  water: { kind: 'water', text: 'Stop and offer water.' },
  food: { kind: 'tick', text: 'Stop and feed.' },
}

function stopItems(leg: PlanLeg): Item[] {
  return [...leg.stops]
    .sort((a, b) => a.minute - b.minute)
    .flatMap((stop): Item[] => {
      const at = `${stop.minute} min into the leg`
      const { kind, text } = STOP_ITEMS[stop.kind]
      return [
        { key: `stop-${stop.minute}-${stop.kind}`, kind, text: `${text} ${at}.` },
        {
          key: `stop-${stop.minute}-${stop.kind}-reading`,
          kind: 'reading',
          text: `Air outside the crates, ${at}.`,
        },
      ]
    })
}

function endItems(plan: Plan, leg: PlanLeg, driverId: number): Item[] {
  const next = plan.legs[plan.legs.findIndex(({ id }) => id === leg.id) + 1]
  const look: Item = {
    key: 'look-end',
    kind: 'condition',
    text: 'Look at every animal at the end of the leg.',
  }
  if (next?.driverId === driverId) return [look]
  const to = next === undefined ? plan.consignee.name : next.partyInCharge
  return [
    look,
    {
      key: 'handover',
      kind: 'handover',
      text: `Hand the crates over to ${to === '' ? 'the receiver' : to}; count the animals.`,
    },
  ]
}

function degrees(tempC: number): string {
  return `${String(tempC).replace('-', '−')} °C`
}
