import type { Plan } from '@/lib/schemas/plan'
import { legsInWords } from '../sheet-view/words'

/** Handling instructions for whoever lifts a crate: what always holds, then what this plan adds. A judgement of ours. */
export function handlingOf(plan: Plan): string[] {
  const own = plan.handlingNote
    .split(/\n+/)
    .map((line) => line.trim())
    .filter(Boolean)
  return [
    'Upright at all times. Lift by the handles or bars, never by a slat or a door.',
    'Last in, first out. Nothing on top of a crate, and every open side kept clear.',
    'Out of sun, rain and draught; away from ice, exhaust and strong smells.',
    ...stopsWords(plan),
    'Don’t open a crate unless the vet on call says so and every door round it is shut.',
    plan.animals.some(({ flags }) => flags.includes('sedated'))
      ? 'A sedative was given: no other may be given.'
      : 'No sedative was given and none may be given.',
    'At each handover write down alive, dead and short, with name and time.',
    ...own,
  ]
}

function stopsWords({ legs }: Plan): string[] {
  const ordinals = (kind: 'water' | 'food' | 'look') =>
    legs.flatMap(({ stops }, index) => (stops.some((stop) => stop.kind === kind) ? [index + 1] : []))
  const water = ordinals('water')
  const food = ordinals('food')
  const words = [
    water.length === 0 ? '' : `Water from outside the crate on ${legsInWords(water)}.`,
    food.length === 0 ? 'No food on the way.' : `Food on ${legsInWords(food)}.`,
  ]
  return [words.filter(Boolean).join(' ')]
}
